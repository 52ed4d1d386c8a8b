package treadwork.solver.marker;

import treadwork.model.space.VectorSeries;

/**
 * Fourth differences of a marker's course: x(i-2) - 4 x(i-1) + 6 x(i) - 4 x(i+1) + x(i+2). Movement at angular frequency ω has
 * (ω h)⁴ of its size in them, 1e-3 at 6 Hz and 200 Hz; white noise √70 times its standard deviation.
 */
final class FourthDifferences {

    private FourthDifferences() {}

    /** Their lengths, m, a frame; NaN within two frames of a gap or an end. */
    static double[] sizes(VectorSeries course) {
        double[] sizes = new double[course.size()];
        for (int i = 0; i < sizes.length; i++) {
            if (i < 2 || i >= sizes.length - 2) {
                sizes[i] = Double.NaN;
                continue;
            }
            double x = course.x(i - 2) - 4 * course.x(i - 1) + 6 * course.x(i) - 4 * course.x(i + 1) + course.x(i + 2);
            double y = course.y(i - 2) - 4 * course.y(i - 1) + 6 * course.y(i) - 4 * course.y(i + 1) + course.y(i + 2);
            double z = course.z(i - 2) - 4 * course.z(i - 1) + 6 * course.z(i) - 4 * course.z(i + 1) + course.z(i + 2);
            sizes[i] = Math.sqrt(x * x + y * y + z * z);
        }
        return sizes;
    }
}
