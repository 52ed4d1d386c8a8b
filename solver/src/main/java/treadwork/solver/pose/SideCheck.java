package treadwork.solver.pose;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;

/**
 * Whether left and right, or medial and lateral, are exchanged. The subject's right is forward × up, forward from the heels
 * to the metatarsal heads and up from the ankles to the knees: neither depends on what is called left or medial.
 */
final class SideCheck {

    /** Below this sine between forward and up, 30°, the feet do not say where right is; our choice. */
    private static final double LEAST_SINE = 0.5;

    private SideCheck() {}

    /** What was noticed; nothing where no foot and shank of one side are known. */
    static List<Finding> of(String file, Map<Segment, SegmentGeometry> segments) {
        Optional<Vector3> towardsRight = towardsRight(segments);
        if (towardsRight.isEmpty()) {
            return List.of();
        }
        Vector3 right = towardsRight.orElseThrow();
        List<Finding> sides = exchangedSides(file, segments, right);
        return sides.isEmpty() ? exchangedBorders(file, segments, right) : sides;
    }

    private static Optional<Vector3> towardsRight(Map<Segment, SegmentGeometry> segments) {
        Vector3 forward = Vector3.ZERO;
        Vector3 up = Vector3.ZERO;
        for (Side side : Side.values()) {
            SegmentGeometry foot = segments.get(Segment.of(SegmentKind.FOOT, side));
            SegmentGeometry shank = segments.get(Segment.of(SegmentKind.SHANK, side));
            if (foot != null && shank != null) {
                forward = forward.plus(foot.standing().labFromBody().columnX());
                up = up.plus(shank.standing().labFromBody().columnY());
            }
        }
        Vector3 right = forward.unit().cross(up.unit());
        return right.norm() >= LEAST_SINE ? Optional.of(right) : Optional.empty();
    }

    private static List<Finding> exchangedSides(String file, Map<Segment, SegmentGeometry> segments, Vector3 right) {
        List<Finding> findings = new ArrayList<>();
        SegmentGeometry pelvis = segments.get(Segment.PELVIS);
        if (pelvis != null && pelvis.standing().labFromBody().columnZ().dot(right) < 0) {
            findings.add(sideFinding(file + ", landmarks right_asis and left_asis"));
        }
        for (SegmentKind kind : List.of(SegmentKind.THIGH, SegmentKind.SHANK, SegmentKind.FOOT)) {
            SegmentGeometry onRight = segments.get(Segment.of(kind, Side.RIGHT));
            SegmentGeometry onLeft = segments.get(Segment.of(kind, Side.LEFT));
            if (onRight != null && onLeft != null) {
                Vector3 apart =
                        onRight.standing().origin().minus(onLeft.standing().origin());
                if (apart.dot(right) < 0) {
                    findings.add(sideFinding(file + ", landmarks of right_" + kind.key() + " and left_" + kind.key()));
                }
            }
        }
        return findings;
    }

    private static List<Finding> exchangedBorders(String file, Map<Segment, SegmentGeometry> segments, Vector3 right) {
        return segments.values().stream()
                .filter(part -> part.segment() != Segment.PELVIS)
                .filter(part -> part.standing().labFromBody().columnZ().dot(right) < 0)
                .map(part -> orderFinding(file + ", segment " + part.segment().key()))
                .toList();
    }

    private static Finding sideFinding(String where) {
        return new Finding(
                "landmark-side",
                Severity.WARNING,
                where,
                "by the direction of the feet, what is mapped to the right side stands on the left",
                "Loads would be reported for the wrong side and with wrong signs",
                "Exchange the left and right labels in the marker set, or those of heel and metatarsal heads if these are"
                        + " exchanged");
    }

    private static Finding orderFinding(String where) {
        return new Finding(
                "landmark-order",
                Severity.WARNING,
                where,
                "by the direction of the feet, its medial and lateral landmarks (on the foot the first and fifth metatarsal"
                        + " heads) stand the wrong way round",
                "The segment's axes point backward and its loads have wrong signs",
                "Exchange the two labels in the marker set");
    }
}
