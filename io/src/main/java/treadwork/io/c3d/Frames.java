package treadwork.io.c3d;

import java.util.List;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/**
 * The frames as they lie in the file, and the series that are made from them when they are asked for.
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
        int width = number.width();
        int pointAt = point * Layout.POINT_VALUES * width;
        int frames = layout.span().count();
        VectorSeries.Builder course = new VectorSeries.Builder(frames);
        for (int i = 0; i < frames; i++) {
            byte[] chunk = bytes.get(chunks.of(i));
            int at = chunks.byteOf(i) + pointAt;
            if (number.firstUnseen(chunk, at, 0, 1) == 1) {
                course.set(
                        i,
                        number.at(chunk, at) * metres,
                        number.at(chunk, at + width) * metres,
                        number.at(chunk, at + 2 * width) * metres);
            } else {
                course.set(i, Double.NaN, Double.NaN, Double.NaN);
            }
        }
        return course.build();
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
        int frames = layout.span().count();
        ScalarSeries.Builder course = new ScalarSeries.Builder(frames * samples);
        for (int i = 0; i < frames; i++) {
            byte[] chunk = bytes.get(chunks.of(i));
            int at = chunks.byteOf(i) + from * number.width();
            for (int sample = 0; sample < samples; sample++) {
                float stored = number.at(chunk, at);
                float value = (float) (((stored < 0 ? stored + wrap : stored) - offset) * scale);
                course.set(i * samples + sample, Math.abs(value) <= Float.MAX_VALUE ? value : Double.NaN);
                at += analog.channels() * number.width();
            }
        }
        return course.build();
    }
}
