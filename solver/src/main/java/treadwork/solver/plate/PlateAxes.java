package treadwork.solver.plate;

import java.util.Locale;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Plane;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;

/**
 * The axes of a plate as its corners give them. The corners stand in the plate's quadrants (+x,+y), (-x,+y), (-x,-y),
 * (+x,-y); so x runs from the middle of corners 2 and 3 to that of 1 and 4, y from the middle of 3 and 4 to that of 1
 * and 2, z = x × y, and y is then made square to both.
 *
 * @param labFromPlate takes components in plate axes to lab axes; a gap where the corners span no surface
 * @param centre       of the surface, the mean of the corners, lab axes, m
 */
record PlateAxes(Rotation labFromPlate, Vector3 centre) {

    /** The lengths of side that a plate one can stand on may have, m. */
    private static final double SHORTEST = 0.05;

    private static final double LONGEST = 10;

    /** Real corners lie up to 5 mm out of level; a corner further off its plane is a slip of the pen, m. */
    private static final double FLAT = 0.02;

    /** Cosine of 60°: a surface that is tilted more is a wall. */
    private static final double STEEPEST = 0.5;

    static PlateAxes of(Plate plate) {
        Vector3 right = plate.corners().get(0).midpoint(plate.corners().get(3));
        Vector3 left = plate.corners().get(1).midpoint(plate.corners().get(2));
        Vector3 front = plate.corners().get(0).midpoint(plate.corners().get(1));
        Vector3 back = plate.corners().get(2).midpoint(plate.corners().get(3));
        Vector3 x = right.minus(left).unit();
        Vector3 z = x.cross(front.minus(back)).unit();
        return new PlateAxes(Rotation.ofColumns(x, z.cross(x), z), plate.centre());
    }

    /** Whether the four corners are those of a flat plate of a size that one can stand on. */
    boolean describe(Plate plate) {
        boolean sound = !labFromPlate.isGap();
        for (int i = 0; i < Plate.CORNERS; i++) {
            Vector3 corner = plate.corners().get(i);
            double side =
                    plate.corners().get((i + 1) % Plate.CORNERS).minus(corner).norm();
            double off = Math.abs(corner.minus(centre).dot(labFromPlate.columnZ()));
            sound &= side >= SHORTEST && side <= LONGEST && off <= FLAT;
        }
        return sound;
    }

    /** Whether a person can stand on the plate when {@code up} is up. */
    boolean isFloor(Vector3 up) {
        return Math.abs(labFromPlate.columnZ().dot(up)) >= STEEPEST;
    }

    /** +1 where the plate's own z points to the side of {@code up}, -1 where it points into the ground. */
    double side(Vector3 up) {
        return labFromPlate.columnZ().dot(up) < 0 ? -1 : 1;
    }

    /** The top of the plate, its normal on the side of {@code up}. */
    PlateTop top(Plate plate, Vector3 up) {
        return new PlateTop(
                plate.corners(), new Plane(centre, labFromPlate.columnZ().times(side(up))));
    }

    static Finding unusable(Plate plate, String where) {
        Vector3 first = plate.corners().get(0);
        Vector3 across = plate.corners().get(2);
        return new Finding(
                "plate-corners",
                Severity.REFUSES,
                where,
                String.format(
                        Locale.ROOT,
                        "corners 1 and 3 stand at (%.3f, %.3f, %.3f) and (%.3f, %.3f, %.3f) m; the four are not those of a flat floor"
                                + " plate with sides of %.2f to %.0f m",
                        first.x(),
                        first.y(),
                        first.z(),
                        across.x(),
                        across.y(),
                        across.z(),
                        SHORTEST,
                        LONGEST),
                "Where this plate stands is not known, so nothing that stands on it is measured",
                "Give the plate's corners in lab.plates of the study file");
    }
}
