package treadwork.io.c3d;

import java.util.List;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/**
 * The frames as they lie in the file, and the series that look their numbers up there.
 *
 * <p>They stay in the file's own precision: widened to doubles, and sorted by series, reading took five times as long as the bytes
 * alone, and the series up to four times their room, most of it for channels that nobody asks for.
 */
final class Frames {

    private final Layout layout;
    private final StoredNumber number;
    private final Chunks chunks;
    private final List<byte[]> bytes;

    /** @param bytes of each of the {@code chunks}, kept */
    Frames(Layout layout, Chunks chunks, List<byte[]> bytes) {
        this.layout = layout;
        this.number = StoredNumber.of(layout.processor(), layout.real());
        this.chunks = chunks;
        this.bytes = bytes;
    }

    /**
     * The course of a point, m; what was not seen is a gap.
     *
     * @param metres in one step of a stored coordinate
     */
    VectorSeries positions(int point, double metres) {
        int place = point * Layout.POINT_VALUES;
        int width = number.width();
        return VectorSeries.lookedUp(
                layout.span().count(),
                i -> coordinate(i, place * width, 0, metres),
                i -> coordinate(i, place * width, width, metres),
                i -> coordinate(i, place * width, 2 * width, metres));
    }

    private double coordinate(int frame, int pointAt, int coordinateAt, double metres) {
        byte[] chunk = bytes.get(chunks.of(frame));
        int at = chunks.byteOf(frame) + pointAt;
        boolean seen = number.firstUnseen(chunk, at, 0, 1) == 1;
        return seen ? number.at(chunk, at + coordinateAt) * metres : Double.NaN;
    }

    /**
     * The course of an analog channel: (stored - offset) × scale, of which the 24 bits are kept that the scale has. So what is written
     * as reals again comes back to the bit.
     */
    ScalarSeries channel(int channel, AnalogScaling scaling) {
        AnalogLayout analog = layout.analog();
        int samples = analog.samples();
        double offset = scaling.offset(channel);
        double scale = scaling.scale(channel);
        int wrap = scaling.unsigned() && !layout.real() ? AnalogScaling.WRAP : 0;
        int from = layout.points() * Layout.POINT_VALUES + channel;
        return ScalarSeries.lookedUp(layout.span().count() * samples, i -> {
            int frame = i / samples;
            int place = from + (i - frame * samples) * analog.channels();
            float stored = number.at(bytes.get(chunks.of(frame)), chunks.byteOf(frame) + place * number.width());
            float value = (float) (((stored < 0 ? stored + wrap : stored) - offset) * scale);
            return Math.abs(value) <= Float.MAX_VALUE ? value : Double.NaN;
        });
    }
}
