package treadwork.solver.proof;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.space.ScalarSeries;

/**
 * Samples in which a plate bears a mass that rests.
 *
 * @param from first sample
 * @param end  first after it
 */
record Plateau(int from, int end) {

    private static final double WINDOW_S = 0.1;

    /** A mass that is left alone rests at least so long, s. */
    static final double SHORTEST_S = 1;

    /** Off either end: setting down and taking hold, s. */
    private static final double ENDS_S = 0.2;

    /** Windows of a resting mass differ by less, N, or as a share of the load. */
    private static final double STEADY = 2;

    private static final double STEADY_SHARE = 0.005;

    /** Stretches of windows of 0.1 s whose means stay together and above {@code least} newtons. */
    static List<Plateau> find(ScalarSeries push, double rate, double least) {
        int length = Math.max(2, (int) Math.round(WINDOW_S * rate));
        int count = push.size() / length;
        List<Plateau> plateaus = new ArrayList<>();
        int from = 0;
        for (int k = 1; k <= count; k++) {
            boolean goesOn =
                    k < count && isSteady(mean(push, from * length, length), mean(push, k * length, length), least);
            if (!goesOn) {
                int cut = (int) Math.ceil(ENDS_S * rate);
                if ((k - from) * length >= SHORTEST_S * rate && mean(push, from * length, length) >= least) {
                    plateaus.add(new Plateau(from * length + cut, k * length - cut));
                }
                from = k;
            }
        }
        return plateaus;
    }

    private static boolean isSteady(double first, double now, double least) {
        return first >= least && Math.abs(now - first) <= Math.max(STEADY, STEADY_SHARE * first);
    }

    private static double mean(ScalarSeries push, int from, int length) {
        double sum = 0;
        for (int i = from; i < from + length; i++) {
            sum += push.at(i);
        }
        return sum / length;
    }
}
