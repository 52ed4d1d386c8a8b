package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.space.ScalarSeries;

/** The courses of all analog channels while they are read: (stored - offset) × scale. */
final class AnalogCourses {

    /** What an unsigned 16-bit number is more than the signed one of the same bits, when that is below zero. */
    private static final int WRAP = 0x10000;

    private final Layout layout;
    private final AnalogScaling scaling;
    private final boolean unsigned;
    private final List<ScalarSeries.Builder> courses;

    AnalogCourses(Layout layout, AnalogScaling scaling) {
        this.layout = layout;
        this.scaling = scaling;
        this.unsigned = scaling.unsigned() && !layout.real();
        int channels = layout.analog().channels();
        this.courses = new ArrayList<>(channels);
        for (int i = 0; i < channels; i++) {
            courses.add(new ScalarSeries.Builder(
                    layout.span().count() * layout.analog().samples()));
        }
    }

    /** Takes {@code count} frames from {@code values}, the first of which is the frame with index {@code first}. */
    void take(float[] values, int first, int count) {
        for (int i = 0; i < courses.size(); i++) {
            take(values, i, first, count);
        }
    }

    private void take(float[] values, int channel, int first, int count) {
        ScalarSeries.Builder course = courses.get(channel);
        double scale = scaling.scale(channel);
        double offset = scaling.offset(channel);
        int samples = layout.analog().samples();
        int channels = layout.analog().channels();
        int stride = layout.values();
        int frameAt = layout.points() * Layout.POINT_VALUES + channel;
        int to = first * samples;
        int end = to + count * samples;
        while (to < end) {
            int at = frameAt;
            for (int sample = 0; sample < samples; sample++) {
                double stored = unsigned && values[at] < 0 ? values[at] + WRAP : values[at];
                double value = (stored - offset) * scale;
                course.set(to, Math.abs(value) <= Double.MAX_VALUE ? value : Double.NaN);
                to++;
                at += channels;
            }
            frameAt += stride;
        }
    }

    /** Ends the reading. */
    List<ScalarSeries> finish() {
        return courses.stream().map(ScalarSeries.Builder::build).toList();
    }
}
