package treadwork.solver.anthropometry;

import java.util.Locale;
import java.util.Optional;
import treadwork.model.body.BodyPoint;
import treadwork.model.body.InertiaRow;
import treadwork.model.body.SegmentKind;
import treadwork.model.space.Vector3;
import treadwork.solver.pose.FootPoints;
import treadwork.solver.pose.SegmentGeometry;

/**
 * The two ends between which a table measures a segment, in segment axes, m.
 *
 * @param words both, with what stands in for a point that is not mapped
 */
record Ends(Vector3 from, Vector3 to, String words) {

    /** One end, and the words for it. */
    private record End(Vector3 place, String words) {}

    static Ends of(InertiaRow row, SegmentGeometry segment) {
        End from = end(row.from(), segment);
        End to = end(row.to(), segment);
        return new Ends(from.place, to.place, from.words + " to " + to.words);
    }

    double length() {
        return to.minus(from).norm();
    }

    /** Both ends moved into the segment's X-Y plane: as they are seen from the side. */
    Ends fromTheSide() {
        return new Ends(flat(from), flat(to), words);
    }

    /** The words and the length, for the result sheet. */
    String description() {
        return String.format(Locale.ROOT, "%s, %.4f m", words, length());
    }

    private static Vector3 flat(Vector3 point) {
        return new Vector3(point.x(), point.y(), 0);
    }

    private static End end(BodyPoint point, SegmentGeometry segment) {
        return switch (point) {
            case HIP_CENTRE -> new End(upperCentre(segment, SegmentKind.THIGH), point.words());
            case GREATER_TROCHANTER ->
                new End(upperCentre(segment, SegmentKind.THIGH), "hip centre (in place of the greater trochanter)");
            case KNEE_CENTRE -> new End(kneeCentre(segment), point.words());
            case FEMORAL_CONDYLES -> new End(kneeCentre(segment), "knee centre (between the femoral condyles)");
            case ANKLE_CENTRE -> new End(ankleCentre(segment), point.words());
            case MEDIAL_MALLEOLUS, LATERAL_MALLEOLUS ->
                new End(segment.landmark(point.key()).orElseThrow(), point.words());
            case HEEL -> new End(FootPoints.of(segment).heel(), point.words());
            case MID_METATARSAL_HEADS -> new End(midHeads(segment), "midpoint of the first and fifth metatarsal heads");
            case SECOND_METATARSAL_HEAD -> secondHead(segment);
            case TOE_TIP -> toeTip(segment);
        };
    }

    private static End secondHead(SegmentGeometry foot) {
        Optional<Vector3> mapped = foot.landmark("second_metatarsal_head");
        return mapped.map(place -> new End(place, "second metatarsal head"))
                .orElseGet(
                        () -> new End(
                                midHeads(foot),
                                "midpoint of the first and fifth metatarsal heads (in place of the second, which is not mapped)"));
    }

    private static End toeTip(SegmentGeometry foot) {
        FootPoints points = FootPoints.of(foot);
        String estimated = String.format(
                Locale.ROOT,
                "toe tip (not mapped: estimated, the metatarsal heads lying at %.2f of the way from the heel, a share from"
                        + " memory)",
                FootPoints.HEADS_SHARE);
        return new End(points.toeTip(), points.toeEstimated() ? estimated : "toe tip");
    }

    private static Vector3 midHeads(SegmentGeometry foot) {
        FootPoints points = FootPoints.of(foot);
        return points.firstHead().midpoint(points.fifthHead());
    }

    private static Vector3 kneeCentre(SegmentGeometry segment) {
        return segment.segment().kind() == SegmentKind.THIGH
                ? lowerCentre(segment)
                : upperCentre(segment, SegmentKind.SHANK);
    }

    private static Vector3 ankleCentre(SegmentGeometry segment) {
        return segment.segment().kind() == SegmentKind.SHANK
                ? lowerCentre(segment)
                : upperCentre(segment, SegmentKind.FOOT);
    }

    /** A thigh's or shank's Y runs from its lower joint centre to its origin, the upper one. */
    private static Vector3 lowerCentre(SegmentGeometry segment) {
        return new Vector3(0, -segment.length(), 0);
    }

    private static Vector3 upperCentre(SegmentGeometry segment, SegmentKind kind) {
        if (segment.segment().kind() != kind) {
            throw new IllegalStateException(
                    "a table ends the " + segment.segment().key() + " at another segment");
        }
        return Vector3.ZERO;
    }
}
