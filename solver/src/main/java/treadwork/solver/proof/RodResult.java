package treadwork.solver.proof;

import java.util.List;
import java.util.OptionalDouble;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.space.Vector3;

/**
 * What a rod test says about a plate.
 *
 * @param plate     its number, counted from 1
 * @param frames    in which the rod was pressed and seen
 * @param places    at how many places
 * @param tip       from the rod's tip to its first marker, m
 * @param tipError  standard error of that, m; 0 where it was stated
 * @param moved     from where the plate is described to where it is, along the lab's axes, m; empty where not determined
 * @param turned    from how it is described to how it lies, about the lab's axes, rad; empty where not determined
 * @param asFound   how far the plate's loads miss the rod as described
 * @param corrected and after the correction
 * @param proposed  the plate with its corners corrected
 * @param findings  of the plates on the way
 */
public record RodResult(
        int plate,
        int frames,
        int places,
        double tip,
        double tipError,
        List<Component> moved,
        List<Component> turned,
        Miss asFound,
        Miss corrected,
        Plate proposed,
        List<Finding> findings) {

    /** Centre of pressure from the tip, m (common practice, from memory). */
    public static final double ACCEPTED_DISTANCE = 0.005;

    /** Force from the rod, rad: 1 to 2 degrees (common practice, from memory). */
    public static final double ACCEPTED_ANGLE = Math.toRadians(2);

    public RodResult {
        moved = List.copyOf(moved);
        turned = List.copyOf(turned);
        findings = List.copyOf(findings);
    }

    /**
     * One of three numbers.
     *
     * @param value m or rad; empty where the data do not determine it
     * @param error standard error, if the errors of frames are independent
     */
    public record Component(OptionalDouble value, double error) {}

    /**
     * How far the plate's loads miss the rod, root mean square, weighted by the force.
     *
     * @param distance on the surface between centre of pressure and tip, m
     * @param angle    between force and rod, rad
     */
    public record Miss(double distance, double angle) {

        public boolean isAccepted() {
            return distance <= ACCEPTED_DISTANCE && angle <= ACCEPTED_ANGLE;
        }
    }

    /** The motion of the centre as a vector, components that are not known being 0. */
    public Vector3 movedVector() {
        return vector(moved);
    }

    /** The turn as a rotation vector, components that are not known being 0. */
    public Vector3 turnedVector() {
        return vector(turned);
    }

    private static Vector3 vector(List<Component> components) {
        return new Vector3(
                components.get(0).value.orElse(0),
                components.get(1).value.orElse(0),
                components.get(2).value.orElse(0));
    }
}
