package treadwork.solver.draft;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import treadwork.model.body.Side;

/**
 * What the standing markers can be, for the stature that fits best.
 *
 * @param limbs a side, each seen as a right one
 */
record Anatomy(double stature, Hips hips, Map<Side, Limb> limbs) {

    private static final double SHORTEST = 1.0;
    private static final double TALLEST = 2.1;
    private static final double STEP = 0.02;

    /** Of adults and of half-grown children (common practice), m; loose, so that the markers decide. */
    private static final double USUAL = 1.65;

    private static final double USUAL_SPREAD = 0.25;

    static Anatomy of(List<Spot> spots) {
        Anatomy best = at(spots, USUAL);
        double least = Double.POSITIVE_INFINITY;
        for (double stature = SHORTEST; stature <= TALLEST; stature += STEP) {
            Anatomy anatomy = at(spots, stature);
            double off = (stature - USUAL) / USUAL_SPREAD;
            double cost = anatomy.cost() + off * off;
            if (cost < least) {
                least = cost;
                best = anatomy;
            }
        }
        return best;
    }

    private static Anatomy at(List<Spot> spots, double stature) {
        Map<Side, Limb> limbs = new EnumMap<>(Side.class);
        for (Side side : Side.values()) {
            Stream<Spot> seen =
                    side == Side.RIGHT ? spots.stream() : spots.stream().map(Spot::mirrored);
            limbs.put(side, new Limb(seen.filter(spot -> spot.at().z() > 0).toList(), stature));
        }
        return new Anatomy(stature, new Hips(spots, stature), limbs);
    }

    private double cost() {
        double cost = hips.shares().least();
        for (Limb limb : limbs.values()) {
            cost += limb.knee().least() + limb.ankle().least();
        }
        return cost;
    }
}
