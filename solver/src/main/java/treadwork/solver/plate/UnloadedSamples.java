package treadwork.solver.plate;

import java.util.List;
import java.util.Optional;
import treadwork.model.space.ScalarSeries;

/** Finds the samples in which a plate carries nothing, wherever in the trial they are. */
final class UnloadedSamples {

    /** A quiet level this small a part of the loads is no load itself: a body never rests at a tenth of what it does else. */
    private static final double SMALL_PART = 0.1;

    /** Shares of occupied frames that differ by this much tell an empty plate from one that is stood on. */
    private static final double CLEARLY = 0.25;

    private UnloadedSamples() {}

    /**
     * The quiet level at an end of the force that is credible as that of an empty plate; of two, the one with fewer
     * markers over the plate, and where that does not tell, the smaller one. Empty where the plate is never unloaded:
     * somebody who stands still throughout is quiet too.
     *
     * @param push      up or down, not zeroed, N
     * @param leastLoad N, below which nothing counts as a load
     */
    static Optional<QuietLevel> find(ScalarSeries push, double rate, double leastLoad, Surroundings surroundings) {
        List<QuietLevel> credible = QuietLevel.atEnds(push, rate).stream()
                .filter(level -> isSmall(level.level(), push, leastLoad)
                        || surroundings.shareOccupied(level.samples()) < 1 - CLEARLY)
                .toList();
        return credible.stream().reduce((one, other) -> emptier(one, other, surroundings));
    }

    /** Whether the figures alone show that a level is no load: near zero, small beside the loads, or of the other sign. */
    private static boolean isSmall(double level, ScalarSeries push, double leastLoad) {
        double farthest = level;
        for (int i = 0; i < push.size(); i++) {
            if (Math.abs(push.at(i) - level) > Math.abs(farthest - level)) {
                farthest = push.at(i);
            }
        }
        boolean opposite = level * farthest < 0 && Math.abs(farthest) > leastLoad;
        return Math.abs(level) <= leastLoad || opposite || Math.abs(level) <= SMALL_PART * Math.abs(farthest - level);
    }

    private static QuietLevel emptier(QuietLevel one, QuietLevel other, Surroundings surroundings) {
        double difference = surroundings.shareOccupied(one.samples()) - surroundings.shareOccupied(other.samples());
        if (Math.abs(difference) > CLEARLY) {
            return difference < 0 ? one : other;
        }
        return Math.abs(one.level()) <= Math.abs(other.level()) ? one : other;
    }
}
