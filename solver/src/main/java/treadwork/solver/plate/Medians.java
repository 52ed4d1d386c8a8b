package treadwork.solver.plate;

import java.util.Arrays;

/** The value that half of the values stay below. */
final class Medians {

    private Medians() {}

    /** Gaps aside; of nothing not a number. */
    static double of(double[] values) {
        return share(values, 0.5);
    }

    /** The value that a share of the values stays below. */
    static double share(double[] values, double share) {
        double[] sorted = Arrays.stream(values)
                .filter(value -> !Double.isNaN(value))
                .sorted()
                .toArray();
        return sorted.length == 0 ? Double.NaN : sorted[Math.min(sorted.length - 1, (int) (share * sorted.length))];
    }
}
