package treadwork.io.c3d;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.stream.IntStream;

/** Copies the frames out of the file, and counts on the way what of the points was seen. */
final class FrameReader {

    /** Bytes copied at a time, so that they are still in the processor's cache when they are looked through. */
    private static final int PIECE = 128 << 10;

    private final Bytes file;
    private final Layout layout;
    private final Chunks chunks;
    private final StoredNumber number;

    private FrameReader(Bytes file, Layout layout) {
        this.file = file;
        this.layout = layout;
        this.chunks = Chunks.of(layout.span().count(), layout.frameBytes());
        this.number = StoredNumber.of(layout.processor(), layout.real());
    }

    /** An array that has been filled, and what of its points was seen. */
    private static final class Filled {

        private final byte[] bytes;
        private final Sightings sightings;

        Filled(byte[] bytes, Sightings sightings) {
            this.bytes = bytes;
            this.sightings = sightings;
        }
    }

    /** Reads all frames of the layout, several arrays at a time, and notes what is odd about the points. */
    static Frames read(Bytes file, Layout layout, Reading reading) throws IOException {
        FrameReader reader = new FrameReader(file, layout);
        List<Filled> filled;
        try {
            filled = IntStream.range(0, reader.chunks.count())
                    .parallel()
                    .mapToObj(reader::fill)
                    .toList();
        } catch (UncheckedIOException e) {
            throw e.getCause();
        }
        Sightings sightings = new Sightings(layout.points());
        filled.forEach(each -> sightings.add(each.sightings));
        sightings.note(layout.span().count(), reading);
        return new Frames(
                layout, reader.chunks, filled.stream().map(each -> each.bytes).toList());
    }

    private Filled fill(int chunk) {
        int frameBytes = layout.frameBytes();
        int first = chunks.first(chunk);
        int size = chunks.size(chunk);
        int step = Math.max(1, PIECE / frameBytes);
        byte[] bytes = new byte[size * frameBytes];
        Sightings sightings = new Sightings(layout.points());
        for (int frame = 0; frame < size; frame += step) {
            int count = Math.min(step, size - frame);
            int at = frame * frameBytes;
            copy(layout.from() + (long) (first + frame) * frameBytes, bytes, at, count * frameBytes);
            for (int i = 0; i < count; i++) {
                sightings.look(number, bytes, at + i * frameBytes);
            }
        }
        return new Filled(bytes, sightings);
    }

    private void copy(long from, byte[] to, int at, int length) {
        try {
            file.copy(from, to, at, length);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
