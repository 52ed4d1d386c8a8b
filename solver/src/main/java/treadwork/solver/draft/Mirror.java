package treadwork.solver.draft;

import java.util.List;
import java.util.Optional;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;

/**
 * The plane in which a standing body is most like its mirror image.
 *
 * @param ahead  horizontal, in the plane, lab axes
 * @param middle where the plane cuts the direction {@code ahead × up}, m
 */
record Mirror(Vector3 ahead, double middle) {

    /** Two markers of a pair are placed by hand to about this, m (common practice). */
    private static final double PAIR_SPREAD = 0.02;

    private static final double FINE_TURN = Math.toRadians(1);
    private static final double TURN = Math.toRadians(3);
    /** The direction of travel may differ from the standing body's by so much. */
    private static final double GREATEST_TURN = Math.toRadians(36);

    private static final double STEP = 0.005;
    private static final double FARTHEST = 0.1;

    /** Near {@code travel} where it is known, else anywhere; front and back are then not yet told apart. */
    static Mirror of(List<Vector3> places, Vector3 up, Optional<Vector3> travel) {
        Vector3 start = travel.orElseGet(() -> acrossOf(up));
        double reach = travel.isPresent() ? GREATEST_TURN : Math.PI / 2;
        Vector3 coarse = best(places, up, start, new double[] {reach, TURN}).ahead;
        return best(places, up, coarse, new double[] {TURN, FINE_TURN});
    }

    Mirror turnedRound() {
        return new Mirror(ahead.negated(), -middle);
    }

    private static Vector3 acrossOf(Vector3 up) {
        Vector3 other = Math.abs(up.x()) > 0.5 ? new Vector3(0, 1, 0) : new Vector3(1, 0, 0);
        return other.minus(up.times(up.dot(other))).unit();
    }

    /** @param turns the farthest turn from {@code start} that is tried, and the step, rad */
    private static Mirror best(List<Vector3> places, Vector3 up, Vector3 start, double[] turns) {
        Mirror best = new Mirror(start, 0);
        double most = -1;
        for (double turn = -turns[0]; turn <= turns[0]; turn += turns[1]) {
            Vector3 ahead = Rotation.about(up, turn).times(start);
            Vector3 right = ahead.cross(up);
            double centre = Places.median(
                    places.stream().mapToDouble(place -> place.dot(right)).toArray());
            double[][] seen = seen(places, ahead, up);
            for (double middle = centre - FARTHEST; middle <= centre + FARTHEST; middle += STEP) {
                double likeness = likeness(seen, middle);
                if (likeness > most) {
                    most = likeness;
                    best = new Mirror(ahead, middle);
                }
            }
        }
        return best;
    }

    private static double[][] seen(List<Vector3> places, Vector3 ahead, Vector3 up) {
        Vector3 right = ahead.cross(up);
        return places.stream()
                .map(place -> new double[] {place.dot(ahead), place.dot(up), place.dot(right)})
                .toArray(double[][]::new);
    }

    /** How many markers have a partner where the mirror shows them, each counted by exp(-d²/2s²). */
    private static double likeness(double[][] seen, double middle) {
        double sum = 0;
        for (double[] one : seen) {
            double nearest = Double.POSITIVE_INFINITY;
            for (double[] other : seen) {
                double dx = one[0] - other[0];
                double dy = one[1] - other[1];
                double dz = one[2] + other[2] - 2 * middle;
                nearest = Math.min(nearest, dx * dx + dy * dy + dz * dz);
            }
            sum += Math.exp(-nearest / (2 * PAIR_SPREAD * PAIR_SPREAD));
        }
        return sum;
    }
}
