package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.DoubleSummaryStatistics;
import java.util.List;
import java.util.Optional;
import treadwork.model.space.ScalarSeries;

/**
 * A level at one end of a plate's normal force at which it comes to rest.
 *
 * <p>Whatever stands on a plate pushes one way, so the unloaded level is an end of the force's distribution, and there
 * the signal is flat but for its noise. What is looked for is therefore the highest, and the lowest, level of the
 * windows in which the signal is quiet, with next to no samples beyond it.
 *
 * @param level   mean over {@code samples}, N
 * @param samples those in quiet windows at this level
 */
record QuietLevel(double level, BitSet samples) {

    /** As short as a contact may be: a flight or a swing that matters is longer, s. */
    private static final double WINDOW_S = 0.05;

    /** Below this a scatter says nothing. */
    private static final int FEWEST_SAMPLES = 5;

    /** A window is quiet when it scatters no more than this many times as much as the quietest tenth of them. */
    private static final double TIMES_NOISE = 3;

    /** Standard deviation that is quiet on any plate, and one that is quiet on none (recorded plates scatter by 0.3 to 1.2 N), N. */
    private static final double SURELY_QUIET = 2;

    private static final double SURELY_LOUD = 10;

    /** Beyond the noise neither is more than this part of all that the force ranges over: its unit may be another. */
    private static final double QUIET_PART = 0.02;

    private static final double LOUD_PART = 0.1;

    /** Of all samples may lie beyond an end: a plate rings when it is hit or left. */
    private static final double SHARE_BEYOND = 0.02;

    /** The levels at the upper and the lower end; one, when they are the same; none, when the force never rests there. */
    static List<QuietLevel> atEnds(ScalarSeries push, double rate) {
        int length = Math.max(FEWEST_SAMPLES, (int) Math.ceil(WINDOW_S * rate));
        if (push.size() < length) {
            return List.of();
        }
        double[] values = push.toArray();
        Windows windows = Windows.of(values, length);
        double range = range(values);
        double scatter = TIMES_NOISE * windows.quietestTenth();
        double quiet = Math.min(SURELY_QUIET, QUIET_PART * range);
        double loud = Math.min(SURELY_LOUD, Math.max(scatter, LOUD_PART * range));
        double loudest = Math.min(loud, Math.max(quiet, scatter));
        double ringing = Math.max(loud, TIMES_NOISE * loudest);
        List<QuietLevel> levels = new ArrayList<>();
        atEnd(values, windows, new Noise(loudest, ringing), 1).ifPresent(levels::add);
        atEnd(values, windows, new Noise(loudest, ringing), -1)
                .filter(low -> levels.isEmpty() || !low.samples.intersects(levels.get(0).samples))
                .ifPresent(levels::add);
        return levels;
    }

    /**
     * @param loudest the greatest standard deviation of a quiet window, N
     * @param ringing how far beyond a level samples do not count against it, N
     */
    private record Noise(double loudest, double ringing) {}

    private static double range(double[] values) {
        DoubleSummaryStatistics known =
                Arrays.stream(values).filter(value -> !Double.isNaN(value)).summaryStatistics();
        return known.getMax() - known.getMin();
    }

    private static Optional<QuietLevel> atEnd(double[] values, Windows windows, Noise noise, int end) {
        double loudest = noise.loudest;
        double outermost = Double.NEGATIVE_INFINITY;
        for (int j = 0; j < windows.count(); j++) {
            if (windows.spread[j] <= loudest) {
                outermost = Math.max(outermost, end * windows.mean[j]);
            }
        }
        BitSet samples = new BitSet(values.length);
        for (int j = 0; j < windows.count(); j++) {
            if (windows.spread[j] <= loudest && end * windows.mean[j] >= outermost - TIMES_NOISE * loudest) {
                samples.set(j, j + windows.length);
            }
        }
        if (samples.isEmpty()) {
            return Optional.empty();
        }
        withoutEnds(samples, windows.length);
        double level = samples.stream().mapToDouble(i -> values[i]).sum() / samples.cardinality();
        double edge = end * level + noise.ringing;
        long beyond = Arrays.stream(values).filter(value -> end * value > edge).count();
        return beyond > SHARE_BEYOND * values.length ? Optional.empty() : Optional.of(new QuietLevel(level, samples));
    }

    /** Takes a window, but no more than a third, off either end of every run: a load that begins slowly is quiet at first. */
    private static void withoutEnds(BitSet samples, int window) {
        int from = samples.nextSetBit(0);
        while (from >= 0) {
            int end = samples.nextClearBit(from);
            int cut = Math.min(window, (end - from) / 3);
            samples.clear(from, from + cut);
            samples.clear(end - cut, end);
            from = samples.nextSetBit(end);
        }
    }

    /** Mean and standard deviation of the signal in every window of {@code length} samples; of a gap neither is known. */
    private static final class Windows {

        private static final int STRIDE = 8;

        private final int length;
        private final double[] mean;
        private final double[] spread;

        private Windows(int length, double[] mean, double[] spread) {
            this.length = length;
            this.mean = mean;
            this.spread = spread;
        }

        /** Sums run along, about the first known value so that a high level costs no digits. */
        static Windows of(double[] values, int length) {
            double base = Arrays.stream(values)
                    .filter(value -> !Double.isNaN(value))
                    .findFirst()
                    .orElse(0);
            int count = values.length - length + 1;
            double[] mean = new double[count];
            double[] spread = new double[count];
            double sum = 0;
            double squares = 0;
            int gaps = 0;
            for (int i = 0; i < values.length; i++) {
                double in = values[i] - base;
                gaps += Double.isNaN(in) ? 1 : 0;
                sum += Double.isNaN(in) ? 0 : in;
                squares += Double.isNaN(in) ? 0 : in * in;
                int first = i - length + 1;
                if (first >= 0) {
                    double average = sum / length;
                    mean[first] = base + average;
                    spread[first] =
                            gaps > 0 ? Double.NaN : Math.sqrt(Math.max(0, squares / length - average * average));
                    double out = values[first] - base;
                    gaps -= Double.isNaN(out) ? 1 : 0;
                    sum -= Double.isNaN(out) ? 0 : out;
                    squares -= Double.isNaN(out) ? 0 : out * out;
                }
            }
            return new Windows(length, mean, spread);
        }

        int count() {
            return mean.length;
        }

        /** The spread that one window in ten stays below; every eighth is looked at, since neighbours share their samples. */
        double quietestTenth() {
            double[] sorted = new double[(count() + STRIDE - 1) / STRIDE];
            for (int j = 0; j < sorted.length; j++) {
                sorted[j] = spread[j * STRIDE];
            }
            Arrays.sort(sorted);
            return sorted[sorted.length / 10];
        }
    }
}
