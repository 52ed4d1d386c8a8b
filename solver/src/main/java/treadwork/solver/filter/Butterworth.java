package treadwork.solver.filter;

import java.util.List;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.VectorSeries;

/**
 * Low-pass Butterworth filter of order N, run forward and backward: no lag, together of order 2 N.
 *
 * <p>One pass is the bilinear transform of the analogue filter |H|² = 1/(1 + (Ω/U)^(2N)), Ω = tan(π f/fs). Two passes
 * multiply the gain to |H|², which is 1/√2 at the wanted cut-off fc when U = tan(π fc/fs)/C with C = (√2 - 1)^(1/(2N)):
 * the pass correction, for N = 2 in D. A. Winter, Biomechanics and Motor Control of Human Movement, 4th ed. 2009, p. 69,
 * here applied to the pre-warped corner so that it holds at any ratio of cut-off to sampling rate.
 *
 * <p>A pass is a chain of sections, each with gain one at 0 Hz:
 * <pre>
 * of order two, 2ζ = 2 sin((2k + 1) π/(2N)), D = 1 + 2ζ U + U²:
 *   y[i] = U²/D (x[i] + 2 x[i-1] + x[i-2]) - 2 (U² - 1)/D y[i-1] - (1 - 2ζ U + U²)/D y[i-2],   k = 0 .. N/2 - 1
 * of order one, for odd N:
 *   y[i] = U/(1 + U) (x[i] + x[i-1]) - (U - 1)/(U + 1) y[i-1]
 * </pre>
 *
 * <p>Ends: the run is continued by 3 (N + 1) samples of its point reflection about the end sample, 2 x_end - x, and each
 * pass starts as if its first sample had lasted for ever.
 */
final class Butterworth {

    private static final int HIGHEST_ORDER = 8;

    private final int padding;
    /** Numerator, then the factors of y[i-1] and y[i-2], a section of order two. */
    private final double[] second;
    /** Numerator and factor of y[i-1]; a numerator of zero: there is no section of order one. */
    private final double firstGain;

    private final double firstBack;

    /**
     * @param cutoffHz where both passes together are at -3 dB
     * @param order    both passes counted: 2, 4, 6 or 8
     * @param rate     samples a second
     * @throws UnusableInputException {@code filter-cutoff} or {@code filter-order} when there is no such filter
     */
    Butterworth(double cutoffHz, int order, double rate) {
        requireOrder(order);
        requireCutoff(cutoffHz, rate);
        int n = order / 2;
        double u = Math.tan(Math.PI * cutoffHz / rate) / Math.pow(Math.sqrt(2) - 1, 1 / (2.0 * n));
        padding = paddingOf(order);
        second = new double[3 * (n / 2)];
        for (int k = 0; k < n / 2; k++) {
            double damping = 2 * Math.sin((2 * k + 1) * Math.PI / (2 * n));
            double d = 1 + damping * u + u * u;
            second[3 * k] = u * u / d;
            second[3 * k + 1] = 2 * (u * u - 1) / d;
            second[3 * k + 2] = (1 - damping * u + u * u) / d;
        }
        firstGain = n % 2 == 1 ? u / (1 + u) : 0;
        firstBack = (u - 1) / (u + 1);
    }

    private static int paddingOf(int order) {
        return 3 * (order / 2 + 1);
    }

    /** The fewest samples a run must have for its ends to be reflected: one more than are reflected. */
    static int shortestRun(int order) {
        requireOrder(order);
        return paddingOf(order) + 1;
    }

    /** The runs filtered, all else gaps. */
    VectorSeries filter(VectorSeries series, List<Run> runs) {
        int longest = 0;
        for (Run run : runs) {
            longest = Math.max(longest, run.length());
        }
        double[] work = new double[longest + 2 * padding];
        return series.eachComponent(values -> {
            for (Run run : runs) {
                filter(values, run, work);
            }
            Run.blankBetween(runs, values);
            return values;
        });
    }

    private void filter(double[] values, Run run, double[] work) {
        int n = run.length();
        int size = n + 2 * padding;
        System.arraycopy(values, run.from(), work, padding, n);
        double first = 2 * work[padding];
        double last = 2 * work[padding + n - 1];
        for (int i = 1; i <= padding; i++) {
            work[padding - i] = first - work[padding + i];
            work[padding + n - 1 + i] = last - work[padding + n - 1 - i];
        }
        pass(work, size);
        reverse(work, size);
        pass(work, size);
        for (int i = 0; i < n; i++) {
            values[run.from() + i] = work[size - 1 - padding - i];
        }
    }

    /** Runs all sections over the first {@code size} samples of {@code work}. */
    private void pass(double[] work, int size) {
        for (int k = 0; k < second.length; k += 3) {
            secondOrder(work, size, k);
        }
        if (firstGain > 0) {
            firstOrder(work, size);
        }
    }

    private void secondOrder(double[] work, int size, int section) {
        double gain = second[section];
        double back1 = second[section + 1];
        double back2 = second[section + 2];
        double x1 = work[0];
        double x2 = x1;
        double y1 = x1;
        double y2 = x1;
        for (int i = 0; i < size; i++) {
            double x = work[i];
            double y = gain * (x + 2 * x1 + x2) - back2 * y2 - back1 * y1;
            x2 = x1;
            x1 = x;
            y2 = y1;
            y1 = y;
            work[i] = y;
        }
    }

    private void firstOrder(double[] work, int size) {
        double x1 = work[0];
        double y1 = x1;
        for (int i = 0; i < size; i++) {
            double x = work[i];
            y1 = firstGain * (x + x1) - firstBack * y1;
            x1 = x;
            work[i] = y1;
        }
    }

    private static void reverse(double[] work, int size) {
        for (int i = 0, j = size - 1; i < j; i++, j--) {
            double kept = work[i];
            work[i] = work[j];
            work[j] = kept;
        }
    }

    private static void requireOrder(int order) {
        if (order < 2 || order > HIGHEST_ORDER || order % 2 != 0) {
            throw new UnusableInputException(new Finding(
                    "filter-order",
                    Severity.REFUSES,
                    "filter",
                    "the order is " + order + ", possible are 2, 4, 6 and 8",
                    "The order counts the forward and the backward pass, which are alike, so it is even",
                    "Set the filter's order in the study file to one of these"));
        }
    }

    private static void requireCutoff(double cutoffHz, double rate) {
        if (!(cutoffHz > 0 && cutoffHz < rate / 2)) {
            throw new UnusableInputException(new Finding(
                    "filter-cutoff",
                    Severity.REFUSES,
                    "filter",
                    "the cut-off is " + cutoffHz + " Hz, the sampling rate " + rate + " Hz",
                    "A cut-off lies above zero and below half the sampling rate",
                    "Set the filter's cutoffHz in the study file within these, or its kind to none"));
        }
    }
}
