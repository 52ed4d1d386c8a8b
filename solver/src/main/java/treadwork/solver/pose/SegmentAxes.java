package treadwork.solver.pose;

import treadwork.model.space.Pose;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;

/**
 * Segment axes from points of the body (after Wu et al. 2002, J Biomech 35:543-548): X forward, Y towards the head, Z to
 * the subject's right, on both sides. All points in the same axes, m.
 *
 * <p>{@code w} is a medio-lateral vector that points to the subject's right: lateral minus medial on the right, medial
 * minus lateral on the left.
 */
public final class SegmentAxes {

    private SegmentAxes() {}

    /** Origin midway between the ASISs, Z along them, Y = unit(Z × (mid-ASIS - mid-PSIS)), X = Y × Z. */
    public static Pose pelvis(Vector3 rightAsis, Vector3 leftAsis, Vector3 midPsis) {
        Vector3 origin = rightAsis.midpoint(leftAsis);
        Vector3 z = rightAsis.minus(leftAsis).unit();
        Vector3 y = z.cross(origin.minus(midPsis)).unit();
        return new Pose(origin, Rotation.ofColumns(y.cross(z), y, z));
    }

    /** Thigh or shank. Origin in the upper joint centre, Y = unit(upper - lower), X = unit(Y × w), Z = X × Y. */
    public static Pose longBone(Vector3 upperCentre, Vector3 lowerCentre, Vector3 w) {
        Vector3 y = upperCentre.minus(lowerCentre).unit();
        Vector3 x = y.cross(w).unit();
        return new Pose(upperCentre, Rotation.ofColumns(x, y, x.cross(y)));
    }

    /**
     * Foot. Origin in the ankle centre, X = unit({@code forward}), Y = unit(w × X), Z = X × Y.
     *
     * @param forward from the heel to the midpoint of the first and fifth metatarsal heads
     * @param w       between the same two heads
     */
    public static Pose foot(Vector3 ankleCentre, Vector3 forward, Vector3 w) {
        Vector3 x = forward.unit();
        Vector3 y = w.cross(x).unit();
        return new Pose(ankleCentre, Rotation.ofColumns(x, y, x.cross(y)));
    }
}
