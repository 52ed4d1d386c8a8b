package treadwork.io.c3d;

import java.nio.ByteBuffer;

/**
 * The words of the first block that size the file. Counts are unsigned 16-bit numbers.
 *
 * @param parameterBlock block of 512 bytes, counted from 1, in which the parameters begin
 * @param points         in a frame
 * @param analogPerFrame analog values in a frame: channels × samples
 * @param firstFrame     number of the first frame
 * @param lastFrame      number of the last frame; 65535 where that is not enough
 * @param scale          unit of length in one step of an integer coordinate; below zero where coordinates are reals
 * @param dataBlock      block, counted from 1, in which the frames begin
 * @param samplesPerFrame of every analog channel
 * @param rate           frames a second, Hz
 */
record Header(
        int parameterBlock,
        int points,
        int analogPerFrame,
        int firstFrame,
        int lastFrame,
        float scale,
        int dataBlock,
        int samplesPerFrame,
        float rate) {

    static final int BLOCK = 512;

    /** The second byte of every C3D file. */
    static final int KEY = 80;

    /** What a 16-bit counter shows that is full. */
    static final int FULL = 0xFFFF;

    static final int POINTS_AT = 2;
    static final int ANALOG_AT = 4;
    static final int FIRST_AT = 6;
    static final int LAST_AT = 8;
    static final int GAP_AT = 10;
    static final int SCALE_AT = 12;
    static final int DATA_AT = 16;
    static final int SAMPLES_AT = 18;
    static final int RATE_AT = 20;

    /** Reads the words from a block that is in the order of {@code processor}. */
    static Header read(ByteBuffer block, Processor processor) {
        return new Header(
                block.get(0) & 0xFF,
                unsigned(block, POINTS_AT),
                unsigned(block, ANALOG_AT),
                unsigned(block, FIRST_AT),
                unsigned(block, LAST_AT),
                processor.real(block, SCALE_AT),
                unsigned(block, DATA_AT),
                unsigned(block, SAMPLES_AT),
                processor.real(block, RATE_AT));
    }

    private static int unsigned(ByteBuffer block, int index) {
        return block.getShort(index) & FULL;
    }
}
