package treadwork.io.c3d;

import java.util.List;
import java.util.Optional;
import treadwork.model.capture.Plate;
import treadwork.model.space.Vector3;

/** Whether four corners can be those of a plate. */
final class CornerShape {

    /**
     * Most that the diagonals may pass each other by, as part of their length. Common practice: a top is flat to 0.1 mm and its corners
     * are surveyed to some millimetres, so on half a metre one part in a hundred; five leave room for a bad survey, and
     * numbers that were never set do not come near.
     */
    private static final double MOST_WARP = 0.05;

    /** Least side as part of the longest; a belt is 2 m by 0.5 m, a beam plate 1 m by 0.1 m. */
    private static final double LEAST_SIDE = 0.02;

    private CornerShape() {}

    /** What is wrong with the corners, as a figure for a message. */
    static Optional<String> fault(List<Vector3> corners) {
        double shortest = Double.POSITIVE_INFINITY;
        double longest = 0;
        for (int i = 0; i < Plate.CORNERS; i++) {
            double side = side(corners, i).norm();
            shortest = Math.min(shortest, side);
            longest = Math.max(longest, side);
        }
        if (!(longest < Double.POSITIVE_INFINITY)) {
            return Optional.of("a corner is not a number");
        }
        if (!(longest > 0) || !(shortest > LEAST_SIDE * longest)) {
            return Optional.of("sides of " + millimetres(shortest) + " to " + millimetres(longest)
                    + " mm are no plate; the shortest must be above 2 % of the longest");
        }
        for (int i = 0; i < Plate.CORNERS; i++) {
            if (!(turn(corners, i).dot(turn(corners, 0)) > 0)) {
                return Optional.of(
                        "the corners do not go once round the plate, at corner " + ((i + 1) % Plate.CORNERS + 1));
            }
        }
        Vector3 diagonal = corners.get(2).minus(corners.get(0));
        Vector3 normal = diagonal.cross(corners.get(3).minus(corners.get(1))).unit();
        double warp = Math.abs(normal.dot(side(corners, 0)));
        if (!(warp <= MOST_WARP * longest)) {
            return Optional.of("the diagonals miss each other by " + millimetres(warp)
                    + " mm; in a plane they meet, 5 % of the longest side are allowed");
        }
        return Optional.empty();
    }

    /** Normal to the turn at the corner behind side {@code i}. */
    private static Vector3 turn(List<Vector3> corners, int i) {
        return side(corners, i).cross(side(corners, (i + 1) % Plate.CORNERS));
    }

    private static Vector3 side(List<Vector3> corners, int from) {
        return corners.get((from + 1) % Plate.CORNERS).minus(corners.get(from));
    }

    private static String millimetres(double metres) {
        return Notices.number(metres * 1e3);
    }
}
