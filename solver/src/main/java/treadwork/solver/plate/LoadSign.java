package treadwork.solver.plate;

import java.util.Locale;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;

/**
 * Whether a plate's channels are what the ground does to the body, or the opposite: the ground can push but not pull.
 *
 * @param meanLoad push over all loaded samples, N, positive up
 * @param seconds  how long the plate is loaded
 */
record LoadSign(double meanLoad, double seconds) {

    /** As long as a contact has to be: a knock on a plate decides nothing, s. */
    private static final double LONG_ENOUGH_S = 0.05;

    /**
     * @param push      zeroed, N
     * @param threshold N, beyond which a sample counts as loaded, whatever its sign
     * @param unloaded  what the empty plate would show, N
     */
    static LoadSign of(ScalarSeries push, double rate, double threshold, double unloaded) {
        double sum = 0;
        int loaded = 0;
        for (int i = 0; i < push.size(); i++) {
            double load = push.at(i) - unloaded;
            if (Math.abs(load) > threshold) {
                sum += load;
                loaded++;
            }
        }
        return new LoadSign(loaded == 0 ? 0 : sum / loaded, loaded / rate);
    }

    boolean isReversed() {
        return meanLoad < 0 && seconds >= LONG_ENOUGH_S;
    }

    Finding finding(String where) {
        return new Finding(
                "plate-sign",
                Severity.WARNING,
                where,
                String.format(
                        Locale.ROOT,
                        "over the %.2f s in which the plate is loaded its reaction is %.0f N downward on average; all six components"
                                + " were turned",
                        seconds,
                        -meanLoad),
                "The ground pushes a foot up, so the channels hold what the foot does to the plate, or the corners stand in the"
                        + " wrong order",
                "Check one contact's centre of pressure against the foot; if it runs with the foot, nothing else is needed",
                true);
    }
}
