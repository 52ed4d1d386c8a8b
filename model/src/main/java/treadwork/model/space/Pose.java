package treadwork.model.space;

/**
 * Where a rigid body stands: its origin in lab axes, m, and the rotation that takes its own axes to the lab's.
 */
public record Pose(Vector3 origin, Rotation labFromBody) {

    /** A pose that is not known. */
    public static final Pose GAP = new Pose(Vector3.GAP, Rotation.GAP);

    /** The lab position of a point given in body axes, from the body's origin. */
    public Vector3 toLab(Vector3 inBody) {
        return origin.plus(labFromBody.times(inBody));
    }

    /** The body coordinates of a point given in lab axes. */
    public Vector3 toBody(Vector3 inLab) {
        return labFromBody.transposeTimes(inLab.minus(origin));
    }

    public boolean isGap() {
        return origin.isGap() || labFromBody.isGap();
    }
}
