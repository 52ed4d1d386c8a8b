package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.space.VectorSeries;

/** The courses of all points while they are read, m; what was not seen is a gap. */
final class PointCourses {

    private final int stride;
    private final double metres;
    private final List<VectorSeries.Builder> courses;
    private final boolean[] anyZero;
    private long valid;
    private long zeros;

    /** @param metres in one step of a stored coordinate */
    PointCourses(Layout layout, double metres) {
        this.stride = layout.values();
        this.metres = metres;
        this.courses = new ArrayList<>(layout.points());
        this.anyZero = new boolean[layout.points()];
        for (int i = 0; i < layout.points(); i++) {
            courses.add(new VectorSeries.Builder(layout.span().count()));
        }
    }

    /** Takes {@code count} frames from {@code values}, the first of which is the frame with index {@code first}. */
    void take(float[] values, int first, int count) {
        Frames frames = new Frames(first, count);
        for (int i = 0; i < courses.size(); i++) {
            long zerosBefore = zeros;
            take(values, Layout.POINT_VALUES * i, courses.get(i), frames);
            anyZero[i] |= zeros > zerosBefore;
        }
    }

    private record Frames(int first, int count) {}

    /**
     * A sample counts as seen when its residual is not below zero, its coordinates are numbers, and not all three are exactly
     * zero: |x| + |y| + |z| tells the last two by one figure.
     */
    private void take(float[] values, int from, VectorSeries.Builder course, Frames frames) {
        int at = from;
        int end = frames.first() + frames.count();
        int seen = 0;
        int zero = 0;
        for (int i = frames.first(); i < end; i++) {
            double x = values[at];
            double y = values[at + 1];
            double z = values[at + 2];
            double size = Math.abs(x) + Math.abs(y) + Math.abs(z);
            boolean flaggedValid = values[at + 3] >= 0;
            if (flaggedValid && size > 0 && size <= Double.MAX_VALUE) {
                course.set(i, x * metres, y * metres, z * metres);
                seen++;
            } else {
                course.set(i, Double.NaN, Double.NaN, Double.NaN);
                zero += flaggedValid && size == 0 ? 1 : 0;
            }
            at += stride;
        }
        valid += seen;
        zeros += zero;
    }

    /** Notes what was found odd, and ends the reading. */
    List<VectorSeries> finish(int frames, Reading reading) {
        if (zeros > 0) {
            int markers = 0;
            for (boolean any : anyZero) {
                markers += any ? 1 : 0;
            }
            reading.note(Notices.markerZero(reading.file(), zeros, markers));
        }
        if (valid == 0 && !courses.isEmpty()) {
            reading.note(Notices.noPoint(reading.file(), courses.size(), frames));
        }
        return courses.stream().map(VectorSeries.Builder::build).toList();
    }
}
