package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;

/**
 * Where the numbers of every frame stand.
 *
 * <p>Frame: x, y, z and residual of every point, then a sample of every analog channel, then the next sample, and so on. All are
 * 32-bit reals, or all 16-bit integers.
 *
 * @param processor in whose formats they are
 * @param real      reals, not integers
 * @param points    in a frame
 * @param analog    in a frame
 * @param from      byte at which the first frame begins
 * @param span      the frames that are read
 */
record Layout(Processor processor, boolean real, int points, AnalogLayout analog, long from, FrameSpan span) {

    static final int POINT_VALUES = 4;

    private static final double MEGABYTE = 1 << 20;

    /** About what the objects take through which one course is looked up. */
    private static final double SERIES_BYTES = 400;

    /** Part of all memory that one recording may take, so that there is some left to compute with. */
    private static final double USABLE = 0.8;

    private static final double LONGEST_ARRAY = Integer.MAX_VALUE - 16;

    /** Reads counts and places, each against the size of the file. */
    static Layout of(Opening opening, long size, Reading reading) {
        Header header = opening.header();
        Parameters parameters = opening.parameters();
        compare(header, parameters, reading);
        AnalogLayout analog = AnalogLayout.of(header, parameters, reading);
        double scale = scale(header, parameters);
        if (header.points() > 0 && !(Math.abs(scale) > 0 && Math.abs(scale) < Double.POSITIVE_INFINITY)) {
            throw Refusals.scale(reading.file(), scale);
        }
        boolean real = scale < 0;
        long frame = frameBytes(real, header.points(), analog);
        if (frame == 0) {
            throw Refusals.empty(reading.file(), "no point and no analog channel is stated");
        }
        long from = (dataBlock(header, parameters, size, reading) - 1L) * Header.BLOCK;
        long parametersFrom = (header.parameterBlock() - 1L) * Header.BLOCK;
        FrameSpan.Room room =
                new FrameSpan.Room(from, parametersFrom > from ? Math.min(parametersFrom, size) : size, frame);
        FrameSpan span = FrameSpan.of(header, parameters, room, reading);
        Layout layout = new Layout(opening.processor(), real, header.points(), analog, from, span);
        layout.requireMemory(reading);
        return layout;
    }

    /** The step of integer coordinates, below zero for reals: the header's, or the parameter's where the header has none. */
    static double scale(Header header, Parameters parameters) {
        float scale = header.scale();
        return scale < 0 || scale > 0 ? scale : parameters.number("POINT:SCALE").orElse(scale);
    }

    private static long frameBytes(boolean real, int points, AnalogLayout analog) {
        return ((long) points * POINT_VALUES + analog.values()) * (real ? Float.BYTES : Short.BYTES);
    }

    private static int dataBlock(Header header, Parameters parameters, long size, Reading reading) {
        int block = header.dataBlock();
        if (possible(block, header, size)) {
            return block;
        }
        int stated = parameters.count("POINT:DATA_START").orElse(0);
        if (!possible(stated, header, size)) {
            throw Refusals.dataStart(reading.file(), block);
        }
        reading.note(Notices.dataStart(reading.file(), block, stated));
        return stated;
    }

    private static boolean possible(int block, Header header, long size) {
        return block > 1 && block != header.parameterBlock() && (block - 1L) * Header.BLOCK < size;
    }

    private static void compare(Header header, Parameters parameters, Reading reading) {
        List<String> missing = new ArrayList<>();
        for (String name : List.of("POINT:USED", "POINT:FRAMES", "POINT:RATE", "POINT:SCALE", "POINT:DATA_START")) {
            if (parameters.number(name).isEmpty()) {
                missing.add(name);
            }
        }
        if (!missing.isEmpty()) {
            reading.note(Notices.headerOnly(reading.file(), missing));
        }
        int used = parameters.count("POINT:USED").orElse(header.points());
        if (used != header.points()) {
            reading.note(Notices.pointCount(reading.file(), used, header.points()));
        }
    }

    /** Refuses a recording that cannot be held, before anything is set aside for it. */
    private void requireMemory(Reading reading) {
        double needed = (double) span.count() * frameBytes() + SERIES_BYTES * ((double) points + analog.channels());
        double free = Runtime.getRuntime().maxMemory() * USABLE;
        boolean countable = (double) span.count() * analog.samples() < LONGEST_ARRAY;
        if (needed > free || !countable) {
            throw Refusals.tooLarge(reading.file(), needed / MEGABYTE, free / MEGABYTE);
        }
    }

    /** Bytes in a frame. */
    int frameBytes() {
        return (int) frameBytes(real, points, analog);
    }

    /** How the numbers are held, in words. */
    String storage() {
        return processor.words() + (real ? ", 32-bit real" : ", 16-bit integer");
    }
}
