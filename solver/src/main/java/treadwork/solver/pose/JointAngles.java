package treadwork.solver.pose;

import java.util.Locale;
import java.util.Optional;
import treadwork.model.body.Joint;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * Joint angles as the Cardan sequence Z-X'-Y'' of R = Rpᵀ Rd = Rz(a) Rx(b) Ry(g), the joint coordinate system of Grood and
 * Suntay (1983, J Biomech Eng 105:136-144).
 *
 * <p>a = atan2(-R12, R22), b = asin(R32), g = atan2(-R31, R33), each times the sign of its named direction.
 */
public final class JointAngles {

    /** Beyond this second angle the first and third are poorly told apart; from memory of common practice. */
    public static final double NEAR_LOCK = Math.toRadians(75);

    /** Cosine of the second angle below which the first and third axis are one, far above rounding. */
    static final double LOCKED = 1e-6;

    private JointAngles() {}

    /**
     * The three angles of each frame, rad, positive in their named directions. A gap in either pose is one here, and so is
     * a frame whose second angle is 90°. Within a run between gaps the first and third angle go on past ±180° without a
     * jump; the run begins within ±180°.
     */
    public static VectorSeries of(Joint joint, PoseSeries proximal, PoseSeries distal) {
        int firstSign = joint.kind().sign(0, joint.side());
        int secondSign = joint.kind().sign(1, joint.side());
        int thirdSign = joint.kind().sign(2, joint.side());
        VectorSeries.Builder angles = new VectorSeries.Builder(proximal.size());
        double lastFirst = Double.NaN;
        double lastThird = Double.NaN;
        for (int i = 0; i < proximal.size(); i++) {
            Rotation r = proximal.rotation(i).transpose().times(distal.rotation(i));
            double cosine = Math.hypot(r.xy(), r.yy());
            boolean known = cosine > LOCKED;
            lastFirst = known ? near(lastFirst, Math.atan2(-r.xy(), r.yy())) : Double.NaN;
            lastThird = known ? near(lastThird, Math.atan2(-r.zx(), r.zz())) : Double.NaN;
            double second = known ? Math.atan2(r.zy(), cosine) : Double.NaN;
            angles.set(i, firstSign * lastFirst, secondSign * second, thirdSign * lastThird);
        }
        return angles.build();
    }

    /**
     * A note where the second angle passes {@link #NEAR_LOCK}.
     *
     * @param firstFrame the capture's own number of the first frame
     */
    public static Optional<Finding> lockNote(Joint joint, VectorSeries angles, int firstFrame) {
        int largest = -1;
        for (int i = 0; i < angles.size(); i++) {
            if (Math.abs(angles.y(i)) > NEAR_LOCK
                    && (largest < 0 || Math.abs(angles.y(i)) > Math.abs(angles.y(largest)))) {
                largest = i;
            }
        }
        return largest < 0 ? Optional.empty() : Optional.of(note(joint, angles.at(largest), firstFrame + largest));
    }

    private static Finding note(Joint joint, Vector3 angles, int frame) {
        return new Finding(
                "angle-lock",
                Severity.NOTE,
                joint.key() + ", frame " + frame,
                String.format(
                        Locale.ROOT,
                        "the %s angle reaches %.1f°, beyond %.0f°",
                        joint.kind().directions().get(1),
                        Math.toDegrees(angles.y()),
                        Math.toDegrees(NEAR_LOCK)),
                "The other two angles, and moments about their axes, are poorly told apart there",
                "Read this joint in proximal, distal or lab axes");
    }

    /** The angle that many whole turns on that is nearest to the last; itself after a gap. */
    private static double near(double last, double angle) {
        return Double.isNaN(last) ? angle : angle + 2 * Math.PI * Math.rint((last - angle) / (2 * Math.PI));
    }
}
