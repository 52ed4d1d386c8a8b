package treadwork.io.c3d;

import java.util.List;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/**
 * What a stored number is worth: one for reals; for integers as little as lets the largest value still be stored.
 *
 * @param pointStep    unit of length in one step of a coordinate; below zero for reals
 * @param analogSteps  one a channel
 * @param analogOffset stored number that means zero, of every channel
 */
record WriteScaling(float pointStep, List<Double> analogSteps, int analogOffset) {

    /** Steps from zero to the largest value; 32767 less some room for rounding. */
    private static final double MOST_STEPS = 32_000;

    private static final float LEAST_STEP = 1e-30f;

    /** Middle of the range of unsigned 16-bit numbers. */
    private static final int MIDDLE = 0x8000;

    static WriteScaling of(Capture capture, C3dEncoding encoding) {
        double largest = 0;
        for (PointSeries point : capture.points()) {
            largest = Math.max(largest, largest(point.positions()));
        }
        float step = step(largest / capture.pointUnit().metres());
        if (encoding.real()) {
            List<Double> ones = capture.analog().stream().map(channel -> 1.0).toList();
            return new WriteScaling(-step, ones, 0);
        }
        List<Double> steps = capture.analog().stream()
                .map(channel -> (double) step(largest(channel)))
                .toList();
        return new WriteScaling(step, steps, encoding.unsignedAnalog() ? MIDDLE : 0);
    }

    private static float step(double largest) {
        return Math.max((float) (largest / MOST_STEPS), LEAST_STEP);
    }

    private static double largest(VectorSeries positions) {
        double largest = 0;
        for (int i = 0; i < positions.size(); i++) {
            if (!positions.isGap(i)) {
                double longer = Math.max(Math.abs(positions.x(i)), Math.abs(positions.y(i)));
                largest = Math.max(largest, Math.max(longer, Math.abs(positions.z(i))));
            }
        }
        return largest;
    }

    private static double largest(AnalogChannel channel) {
        ScalarSeries values = channel.values();
        double largest = 0;
        for (int i = 0; i < values.size(); i++) {
            if (Double.isNaN(values.at(i))) {
                throw new IllegalArgumentException(
                        "channel " + channel.label() + " has a gap at sample " + i + ", which an integer cannot hold");
            }
            largest = Math.max(largest, Math.abs(values.at(i)));
        }
        return largest;
    }
}
