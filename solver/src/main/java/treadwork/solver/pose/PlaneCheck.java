package treadwork.solver.pose;

import java.util.Locale;
import treadwork.model.body.Segment;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;

/** Refuses landmarks that do not span a plane: axes built from them would point anywhere. */
record PlaneCheck(StandingMarkers markers, Segment segment, String points) {

    /** Landmarks nearer than this are taken as one point, m: below any such distance on a child, above marker noise. */
    private static final double LEAST_DISTANCE = 0.005;

    /** Least angle between the two directions, rad (6°): a landmark error of 5 mm on 50 mm turns a plane less. Our choice. */
    private static final double LEAST_ANGLE = Math.toRadians(6);

    /**
     * Checks the two directions that fix the axes.
     *
     * @throws UnusableInputException {@code landmark-line} where either is too short or both run nearly the same way
     */
    void require(Vector3 one, Vector3 other) {
        double shorter = Math.min(one.norm(), other.norm());
        if (!(shorter >= LEAST_DISTANCE)) {
            throw refusal(String.format(
                    Locale.ROOT,
                    "%s coincide: %.1f mm apart, at least %.0f mm are needed",
                    points,
                    shorter * 1e3,
                    LEAST_DISTANCE * 1e3));
        }
        double angle = Math.asin(Math.min(1, one.cross(other).norm() / (one.norm() * other.norm())));
        if (!(angle >= LEAST_ANGLE)) {
            throw refusal(String.format(
                    Locale.ROOT,
                    "%s lie on one line: %.1f° between the two directions, at least %.0f° are needed",
                    points,
                    Math.toDegrees(angle),
                    Math.toDegrees(LEAST_ANGLE)));
        }
    }

    private UnusableInputException refusal(String figure) {
        return markers.refusal(
                "landmark-line",
                "segment " + segment.key(),
                figure,
                "The segment's axes cannot be built from them",
                "Check that each landmark is mapped to its own marker, and that the markers stand where they belong");
    }
}
