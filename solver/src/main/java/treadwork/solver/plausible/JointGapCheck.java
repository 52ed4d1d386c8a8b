package treadwork.solver.plausible;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.body.Joint;
import treadwork.model.body.Segment;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.pose.SegmentMotion;
import treadwork.solver.pose.StandingBody;

/** {@code joint-gap}: a joint centre as carried by one segment and by the other. */
public final class JointGapCheck {

    /** Soft tissue moves thigh markers by up to 20 to 30 mm in walking (Peters et al. 2010, from memory), and levers magnify it, m. */
    private static final double LIMIT = 0.05;

    private JointGapCheck() {}

    public static List<Finding> of(String name, StandingBody body, Map<Segment, SegmentMotion> motions) {
        List<Finding> findings = new ArrayList<>();
        for (Map.Entry<Joint, Vector3> entry : body.joints().entrySet()) {
            Joint joint = entry.getKey();
            SegmentMotion proximal = motions.get(joint.proximal());
            SegmentMotion distal = motions.get(joint.distal());
            if (proximal != null && distal != null) {
                Vector3 centre =
                        body.segments().get(joint.proximal()).standing().toLab(entry.getValue());
                Vector3 inDistal =
                        body.segments().get(joint.distal()).standing().toBody(centre);
                double gap = gap(
                        proximal.pose().toLab(entry.getValue()), distal.pose().toLab(inDistal));
                if (gap > LIMIT) {
                    findings.add(finding(name, joint, gap));
                }
            }
        }
        return findings;
    }

    /** Root mean square distance over the frames in which both are known, m. */
    private static double gap(VectorSeries one, VectorSeries other) {
        double squares = 0;
        int known = 0;
        for (int i = 0; i < one.size(); i++) {
            double x = one.x(i) - other.x(i);
            double y = one.y(i) - other.y(i);
            double z = one.z(i) - other.z(i);
            double square = x * x + y * y + z * z;
            if (!Double.isNaN(square)) {
                squares += square;
                known++;
            }
        }
        return Math.sqrt(squares / known);
    }

    private static Finding finding(String name, Joint joint, double gap) {
        return new Finding(
                "joint-gap",
                Severity.WARNING,
                name + ", " + joint.key(),
                String.format(
                        Locale.ROOT,
                        "its centre as the %s carries it and as the %s does part by %.0f mm, root mean square; limit %.0f mm",
                        joint.proximal().key(),
                        joint.distal().key(),
                        1e3 * gap,
                        1e3 * LIMIT),
                "One of the two segments is not where it seems, and a moment is off by the force times that distance",
                "Check that both clusters sit where they sat while standing, and that their labels are the same");
    }
}
