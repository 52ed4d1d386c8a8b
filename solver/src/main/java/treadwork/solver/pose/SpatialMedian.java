package treadwork.solver.pose;

import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * The middle of a marker's places: the point with the least sum of distances to them (geometric median). As with any median
 * a few wild frames do not move it; and it turns with the lab, which a median of each component does not.
 */
final class SpatialMedian {

    /** A step this small, m, ends the search: far below what any camera sees. */
    private static final double END = 1e-13;

    /** Nearer places count as this far, m, so that the search may come to rest on one of them. */
    private static final double NEAREST = 1e-9;

    /** Twenty steps do for a cloud of noise; the bound only guarantees an end. */
    private static final int STEPS = 500;

    private SpatialMedian() {}

    /**
     * The middle of the known places, by Weiszfeld's iteration (1937): the mean with weights 1 / distance, again and again
     * from the plain mean.
     *
     * @return a gap where no place is known
     */
    static Vector3 of(VectorSeries places) {
        Vector3 middle = weightedMean(places, Vector3.GAP);
        for (int step = 0; step < STEPS; step++) {
            Vector3 next = weightedMean(places, middle);
            boolean settled = !(next.minus(middle).norm() > END);
            middle = next;
            if (settled) {
                break;
            }
        }
        return middle;
    }

    /** The mean of the known places with weights 1 / distance from {@code middle}; all alike where that is a gap. */
    private static Vector3 weightedMean(VectorSeries places, Vector3 middle) {
        Vector3 sum = Vector3.ZERO;
        double weights = 0;
        for (int i = 0; i < places.size(); i++) {
            if (!places.isGap(i)) {
                Vector3 place = places.at(i);
                double weight = middle.isGap()
                        ? 1
                        : 1 / Math.max(NEAREST, place.minus(middle).norm());
                sum = sum.plus(place.times(weight));
                weights += weight;
            }
        }
        return weights > 0 ? sum.times(1 / weights) : Vector3.GAP;
    }
}
