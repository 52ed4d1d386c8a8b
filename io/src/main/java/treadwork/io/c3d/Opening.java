package treadwork.io.c3d;

import java.io.IOException;
import java.nio.ByteBuffer;

/**
 * What stands before the frames.
 *
 * @param processor  in whose formats all numbers are
 * @param header     the first block
 * @param parameters the parameter section to which the header points
 */
record Opening(Processor processor, Header header, Parameters parameters) {

    /** Sections whose block count is stated as 0 are read this far, which is what the count can reach. */
    private static final int MOST_BLOCKS = 255;

    static Opening read(Bytes bytes, Reading reading) throws IOException {
        long size = bytes.size();
        if (size == 0) {
            throw Refusals.empty(reading.file(), "the file has no bytes");
        }
        if (size >= 2 && (bytes.at(1, 1).get(0) & 0xFF) != Header.KEY) {
            throw Refusals.notC3d(reading.file(), bytes.at(1, 1).get(0) & 0xFF);
        }
        if (size < Header.BLOCK) {
            throw Refusals.cutShort(reading.file(), "header", Header.BLOCK, size);
        }
        int block = bytes.at(0, 1).get(0) & 0xFF;
        if (block < 2) {
            throw Refusals.parameterBlock(reading.file(), block);
        }
        long start = (block - 1L) * Header.BLOCK;
        if (start + ParameterParser.OPENING > size) {
            throw Refusals.cutShort(reading.file(), "parameter section", start + ParameterParser.OPENING, size);
        }
        ByteBuffer opening = bytes.at(start, ParameterParser.OPENING);
        int blocks = opening.get(2) & 0xFF;
        int code = opening.get(3) & 0xFF;
        Processor processor = Processor.ofCode(code).orElseThrow(() -> Refusals.processor(reading.file(), code));
        Header header = Header.read(bytes.at(0, Header.BLOCK).order(processor.order()), processor);
        ByteBuffer section = section(bytes, start, end(header, start, blocks, size));
        return new Opening(
                processor, header, ParameterParser.parse(processor, section.order(processor.order()), reading));
    }

    /**
     * Where the section ends. The frames bound it, since the stated count of blocks is too small in some files, and a single byte
     * anyway; the count serves where the frames do not follow the section.
     */
    private static long end(Header header, long start, int blocks, long size) {
        long data = (header.dataBlock() - 1L) * Header.BLOCK;
        if (data > start) {
            return Math.min(data, size);
        }
        return Math.min(start + (blocks == 0 ? MOST_BLOCKS : blocks) * (long) Header.BLOCK, size);
    }

    private static ByteBuffer section(Bytes bytes, long start, long end) throws IOException {
        ByteBuffer view = bytes.at(start, (int) (end - start));
        byte[] copy = new byte[view.limit()];
        view.get(copy);
        return ByteBuffer.wrap(copy);
    }
}
