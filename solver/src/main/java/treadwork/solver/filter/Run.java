package treadwork.solver.filter;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntPredicate;
import treadwork.model.space.VectorSeries;

/** Neighbouring frames of one sort, {@code from} included, {@code to} not. */
record Run(int from, int to) {

    int length() {
        return to - from;
    }

    /** The known stretches between the gaps of {@code series}, of at least {@code shortest} frames, in order. */
    static List<Run> known(VectorSeries series, int shortest) {
        List<Run> runs = where(series.size(), i -> !series.isGap(i));
        runs.removeIf(run -> run.length() < shortest);
        return runs;
    }

    /** The gaps of {@code series}, each as long as it goes, in order. */
    static List<Run> gaps(VectorSeries series) {
        return where(series.size(), series::isGap);
    }

    /** Makes a gap of all that no run covers. */
    static void blankBetween(List<Run> runs, double[] values) {
        int end = 0;
        for (Run run : runs) {
            Arrays.fill(values, end, run.from, Double.NaN);
            end = run.to;
        }
        Arrays.fill(values, end, values.length, Double.NaN);
    }

    private static List<Run> where(int size, IntPredicate belongs) {
        List<Run> runs = new ArrayList<>();
        int from = 0;
        while (from < size) {
            if (!belongs.test(from)) {
                from++;
                continue;
            }
            int to = from + 1;
            while (to < size && belongs.test(to)) {
                to++;
            }
            runs.add(new Run(from, to));
            from = to;
        }
        return runs;
    }
}
