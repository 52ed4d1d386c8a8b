package treadwork.io.c3d;

import java.io.IOException;
import java.nio.ByteBuffer;

/** Reads the frames in blocks that stay in the processor's cache, and deals their numbers out to the courses. */
final class SampleReader {

    /** Numbers in a block; as bytes, as reals and as the courses they become, together half a megabyte. */
    private static final int BLOCK_VALUES = 32 * 1024;

    private SampleReader() {}

    /** Fills both with all frames of the layout. */
    static void read(Bytes bytes, Layout layout, PointCourses points, AnalogCourses analog) throws IOException {
        int frames = layout.span().count();
        int perBlock = Math.min(frames, Math.max(1, BLOCK_VALUES / layout.values()));
        float[] values = new float[perBlock * layout.values()];
        for (int first = 0; first < frames; first += perBlock) {
            int count = Math.min(perBlock, frames - first);
            ByteBuffer block = bytes.at(layout.from() + (long) first * layout.frameBytes(), count * layout.frameBytes())
                    .order(layout.processor().order());
            decode(block, layout, values, count * layout.values());
            points.take(values, first, count);
            analog.take(values, first, count);
        }
    }

    private static void decode(ByteBuffer block, Layout layout, float[] values, int count) {
        if (layout.real()) {
            layout.processor().reals(block, values, count);
            return;
        }
        short[] integers = new short[count];
        block.asShortBuffer().get(integers);
        for (int i = 0; i < count; i++) {
            values[i] = integers[i];
        }
    }
}
