package treadwork.solver.pose;

import treadwork.model.body.Joint;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * The axes about which joint angles turn: e1 = Z of the proximal segment, e3 = Y of the distal one, e2 = unit(e3 × e1), which
 * is the rotated X since e3 × e1 = cos b · X' (Grood and Suntay 1983).
 *
 * <p>They are not perpendicular, yet ω_d - ω_p = a' e1 + b' e2 + g' e3. So the projections of a moment on them, each times the
 * rate of its angle, add up to M·(ω_d - ω_p).
 */
public final class JointAxes {

    private JointAxes() {}

    /**
     * One axis in each frame, of length one, lab axes, turned so that a right-handed turn of the distal segment about it is
     * positive in the named direction. A gap in either pose is one here; so is e2 where e1 and e3 are one line.
     *
     * @param axis 0, 1 or 2 for e1, e2, e3
     */
    public static VectorSeries of(Joint joint, PoseSeries proximal, PoseSeries distal, int axis) {
        int sign = joint.kind().sign(axis, joint.side());
        return switch (axis) {
            case 0 -> fixed(proximal.axisZ(), sign, proximal, distal);
            case 1 -> floating(proximal, distal, sign);
            case 2 -> fixed(distal.axisY(), sign, proximal, distal);
            default -> throw new IllegalArgumentException("a joint has axes 0, 1 and 2, not " + axis);
        };
    }

    private static VectorSeries fixed(VectorSeries axis, int sign, PoseSeries proximal, PoseSeries distal) {
        VectorSeries.Builder axes = new VectorSeries.Builder(axis.size());
        for (int i = 0; i < axis.size(); i++) {
            double factor = proximal.isGap(i) || distal.isGap(i) ? Double.NaN : sign;
            axes.set(i, axis.at(i).times(factor));
        }
        return axes.build();
    }

    private static VectorSeries floating(PoseSeries proximal, PoseSeries distal, int sign) {
        VectorSeries.Builder axes = new VectorSeries.Builder(proximal.size());
        for (int i = 0; i < proximal.size(); i++) {
            Vector3 normal = distal.axisY().at(i).cross(proximal.axisZ().at(i));
            double length = normal.norm();
            boolean known = !proximal.isGap(i) && !distal.isGap(i) && length > JointAngles.LOCKED;
            axes.set(i, normal.times(known ? sign / length : Double.NaN));
        }
        return axes.build();
    }
}
