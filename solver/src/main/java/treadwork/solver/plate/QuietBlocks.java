package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import treadwork.model.space.ScalarSeries;

/**
 * Stretches of up to 0.2 s in which a plate carries nothing, wherever in the trial they are, whatever its level does
 * meanwhile: the push is quiet for longer than a moment and low beside what the plate carries.
 */
final class QuietBlocks {

    private static final double WINDOW_S = 0.05;
    private static final int FEWEST_SAMPLES = 5;
    private static final int WINDOWS = 4;

    /** As for the level of an unloaded plate: see {@link QuietLevel}; N. */
    private static final double SURELY_QUIET = 2;

    private static final double SURELY_LOUD = 10;
    private static final double TIMES_NOISE = 3;

    /** A body never rests at a tenth of what it does else. */
    private static final double SMALL_PART = 0.1;

    private QuietBlocks() {}

    static int window(double rate) {
        return Math.max(FEWEST_SAMPLES, (int) Math.ceil(WINDOW_S * rate));
    }

    /** In the order of time. */
    static List<Stretch> of(ScalarSeries push, double rate) {
        double[] values = push.toArray();
        int length = window(rate);
        int count = values.length / length;
        double[] means = new double[count];
        double[] spreads = new double[count];
        for (int k = 0; k < count; k++) {
            Spread spread = Spread.of(values, k * length, length);
            means[k] = spread.mean();
            spreads[k] = spread.deviation();
        }
        double loudest =
                Math.min(SURELY_LOUD, Math.max(SURELY_QUIET, TIMES_NOISE * Medians.share(spreads, SMALL_PART)));
        double lowest = Double.POSITIVE_INFINITY;
        for (int k = 0; k < count; k++) {
            lowest = spreads[k] <= loudest ? Math.min(lowest, means[k]) : lowest;
        }
        double highest = lowest
                + SMALL_PART
                        * (Arrays.stream(values)
                                        .filter(value -> !Double.isNaN(value))
                                        .max()
                                        .orElse(0)
                                - lowest);
        BitSet quiet = new BitSet();
        for (int k = 0; k < count; k++) {
            quiet.set(k, spreads[k] <= loudest && means[k] <= highest);
        }
        return blocks(quiet, length);
    }

    /** Without the first and the last window of every stretch: a load that begins slowly is quiet at first. */
    private static List<Stretch> blocks(BitSet quiet, int length) {
        List<Stretch> blocks = new ArrayList<>();
        for (Stretch stretch : Stretch.of(quiet)) {
            for (int k = stretch.from() + 1; k + 2 < stretch.end(); k += WINDOWS) {
                blocks.add(new Stretch(k * length, Math.min(k + WINDOWS, stretch.end() - 1) * length));
            }
        }
        return blocks;
    }

    /** Mean and standard deviation of some neighbouring samples. */
    record Spread(double mean, double deviation) {

        static Spread of(double[] values, int from, int length) {
            double sum = 0;
            for (int i = from; i < from + length; i++) {
                sum += values[i];
            }
            double mean = sum / length;
            double squares = 0;
            for (int i = from; i < from + length; i++) {
                squares += (values[i] - mean) * (values[i] - mean);
            }
            return new Spread(mean, Math.sqrt(squares / length));
        }
    }
}
