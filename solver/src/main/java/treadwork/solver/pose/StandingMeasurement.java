package treadwork.solver.pose;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.space.Pose;
import treadwork.model.space.Vector3;
import treadwork.model.study.BodySettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.ShankAxis;

/** Puts a {@link StandingBody} together, segment by segment. */
record StandingMeasurement(StandingMarkers markers, BodySettings settings) {

    private static final List<String> THIGH_MARKS = List.of("hip_centre", "lateral_epicondyle", "medial_epicondyle");
    private static final List<String> SHANK_MARKS =
            List.of("lateral_epicondyle", "medial_epicondyle", "lateral_malleolus", "medial_malleolus");
    private static final List<String> FOOT_MARKS = List.of(
            "lateral_malleolus",
            "medial_malleolus",
            "heel",
            "first_metatarsal_head",
            "second_metatarsal_head",
            "fifth_metatarsal_head",
            "toe_tip");
    private static final List<Landmark> PELVIS_MARKS = List.of(
            Landmark.RIGHT_ASIS,
            Landmark.LEFT_ASIS,
            Landmark.RIGHT_PSIS,
            Landmark.LEFT_PSIS,
            Landmark.SACRUM,
            Landmark.RIGHT_HIP_CENTRE,
            Landmark.LEFT_HIP_CENTRE);

    StandingBody body() {
        Map<Segment, SegmentGeometry> segments = new EnumMap<>(Segment.class);
        for (Segment segment : markers.set().clusters().keySet()) {
            segments.put(segment, geometry(segment));
        }
        boolean anyThigh = segments.keySet().stream().anyMatch(segment -> segment.kind() == SegmentKind.THIGH);
        return new StandingBody(
                segments,
                joints(segments),
                pelvisSize(segments),
                legLengths(segments),
                anyThigh ? HipCentres.source(settings.hipCentre()) : "",
                SideCheck.of(markers.capture().name(), segments));
    }

    private Map<Joint, Vector3> joints(Map<Segment, SegmentGeometry> segments) {
        Map<Joint, Vector3> joints = new LinkedHashMap<>();
        for (Side side : Side.values()) {
            for (JointKind kind : JointKind.values()) {
                Joint joint = new Joint(side, kind);
                if (segments.containsKey(joint.proximal()) && segments.containsKey(joint.distal())) {
                    Pose proximal = segments.get(joint.proximal()).standing();
                    joints.put(
                            joint,
                            proximal.toBody(
                                    segments.get(joint.distal()).standing().origin()));
                }
            }
        }
        if (joints.isEmpty()) {
            throw markers.refusal(
                    "joint-none",
                    "marker set",
                    "the clusters mapped are " + keys(segments) + ", and no two of these segments meet in a joint",
                    "There is no joint to compute",
                    "Map the clusters of at least two neighbouring segments, a shank and a foot for example");
        }
        return joints;
    }

    private static List<String> keys(Map<Segment, SegmentGeometry> segments) {
        return segments.keySet().stream().map(Segment::key).toList();
    }

    private SegmentGeometry geometry(Segment segment) {
        Pose standing = pose(segment);
        List<Vector3> cluster =
                markers.cluster(segment).stream().map(standing::toBody).toList();
        Map<Landmark, Vector3> landmarks = new EnumMap<>(Landmark.class);
        for (Landmark landmark : marksOf(segment)) {
            markers.ifMapped(landmark).ifPresent(place -> landmarks.put(landmark, standing.toBody(place)));
        }
        return new SegmentGeometry(segment, standing, cluster, landmarks, length(segment));
    }

    private static List<Landmark> marksOf(Segment segment) {
        List<String> names = switch (segment.kind()) {
            case PELVIS -> List.of();
            case THIGH -> THIGH_MARKS;
            case SHANK -> SHANK_MARKS;
            case FOOT -> FOOT_MARKS;
        };
        return segment.side()
                .map(side -> names.stream().map(name -> Landmark.of(side, name)).toList())
                .orElse(PELVIS_MARKS);
    }

    private Pose pose(Segment segment) {
        if (segment.kind() == SegmentKind.PELVIS) {
            return pelvis(segment);
        }
        Side side = segment.side().orElseThrow();
        return switch (segment.kind()) {
            case THIGH -> longBone(segment, hip(side, segment), knee(side, segment));
            case SHANK -> longBone(segment, knee(side, segment), ankle(side, segment));
            default -> foot(segment, side);
        };
    }

    private Pose pelvis(Segment segment) {
        Vector3 right = markers.at(Landmark.RIGHT_ASIS, segment);
        Vector3 left = markers.at(Landmark.LEFT_ASIS, segment);
        Vector3 midPsis = markers.midPsis(segment);
        plane(segment, "ASISs and PSISs or sacrum")
                .require(right.minus(left), right.midpoint(left).minus(midPsis));
        return SegmentAxes.pelvis(right, left, midPsis);
    }

    private Pose longBone(Segment segment, Vector3 upper, Vector3 lower) {
        Side side = segment.side().orElseThrow();
        boolean malleoli = segment.kind() == SegmentKind.SHANK && settings.shankAxis() == ShankAxis.MALLEOLI;
        String name = malleoli ? "malleolus" : "epicondyle";
        Vector3 w = towardsRight(
                side, markers.at(side, "lateral_" + name, segment), markers.at(side, "medial_" + name, segment));
        plane(segment, "joint centres and " + (malleoli ? "malleoli" : "epicondyles"))
                .require(upper.minus(lower), w);
        return SegmentAxes.longBone(upper, lower, w);
    }

    private Pose foot(Segment segment, Side side) {
        Vector3 first = markers.at(side, "first_metatarsal_head", segment);
        Vector3 fifth = markers.at(side, "fifth_metatarsal_head", segment);
        Vector3 forward = first.midpoint(fifth).minus(markers.at(side, "heel", segment));
        Vector3 w = towardsRight(side, fifth, first);
        plane(segment, "heel and metatarsal heads").require(forward, w);
        return SegmentAxes.foot(ankle(side, segment), forward, w);
    }

    private static Vector3 towardsRight(Side side, Vector3 lateral, Vector3 medial) {
        return lateral.minus(medial).times(side.sign());
    }

    private PlaneCheck plane(Segment segment, String points) {
        return new PlaneCheck(markers, segment, points);
    }

    private Vector3 knee(Side side, Segment segment) {
        return markers.at(side, "lateral_epicondyle", segment).midpoint(markers.at(side, "medial_epicondyle", segment));
    }

    private Vector3 ankle(Side side, Segment segment) {
        return markers.at(side, "lateral_malleolus", segment).midpoint(markers.at(side, "medial_malleolus", segment));
    }

    private Vector3 hip(Side side, Segment segment) {
        HipCentreRule rule = settings.hipCentre();
        if (rule == HipCentreRule.MARKER) {
            return markers.at(side, "hip_centre", segment);
        }
        if (rule == HipCentreRule.FUNCTIONAL) {
            throw markers.refusal(
                    "hip-centre-not-offered",
                    "segment " + segment.key(),
                    "body.hipCentre is \"" + rule.key() + "\", which this version does not offer",
                    "Without a hip centre the thigh cannot be built",
                    "Set body.hipCentre to harrington-2007, hara-2016, bell-1989, leardini-1999 or marker");
        }
        double leg = HipCentres.needsLegLength(rule) ? legLength(side, segment) : Double.NaN;
        return pelvis(segment).toLab(HipCentres.inPelvis(rule, pelvisSize(segment), leg, side));
    }

    /** ASIS to medial malleolus, straight; for the rule that asks for it, by way of the knee and ankle centres. */
    private double legLength(Side side, Segment segment) {
        Vector3 asis = markers.at(side, "asis", segment);
        if (HipCentres.legIsByWayOfTheKnee(settings.hipCentre())) {
            Vector3 knee = knee(side, segment);
            return asis.minus(knee).norm() + knee.minus(ankle(side, segment)).norm();
        }
        return asis.minus(markers.at(side, "medial_malleolus", segment)).norm();
    }

    private PelvisSize pelvisSize(Segment segment) {
        return PelvisSize.of(
                markers.at(Landmark.RIGHT_ASIS, segment),
                markers.at(Landmark.LEFT_ASIS, segment),
                markers.midPsis(segment));
    }

    private Optional<PelvisSize> pelvisSize(Map<Segment, SegmentGeometry> segments) {
        boolean regressed = settings.hipCentre() != HipCentreRule.MARKER;
        return segments.keySet().stream()
                .filter(segment ->
                        segment.kind() == SegmentKind.PELVIS || (segment.kind() == SegmentKind.THIGH && regressed))
                .findFirst()
                .map(this::pelvisSize);
    }

    private Map<Side, Double> legLengths(Map<Segment, SegmentGeometry> segments) {
        Map<Side, Double> lengths = new EnumMap<>(Side.class);
        if (HipCentres.needsLegLength(settings.hipCentre())) {
            Arrays.stream(Side.values())
                    .filter(side -> segments.containsKey(Segment.of(SegmentKind.THIGH, side)))
                    .forEach(side -> lengths.put(side, legLength(side, Segment.of(SegmentKind.THIGH, side))));
        }
        return lengths;
    }

    private double length(Segment segment) {
        if (segment.kind() == SegmentKind.PELVIS) {
            return Double.NaN;
        }
        Side side = segment.side().orElseThrow();
        return switch (segment.kind()) {
            case THIGH -> hip(side, segment).minus(knee(side, segment)).norm();
            case SHANK -> knee(side, segment).minus(ankle(side, segment)).norm();
            default -> footLength(side, segment);
        };
    }

    private double footLength(Side side, Segment foot) {
        Vector3 heel = markers.at(side, "heel", foot);
        Vector3 heads = markers.at(side, "first_metatarsal_head", foot)
                .midpoint(markers.at(side, "fifth_metatarsal_head", foot));
        return markers.ifMapped(Landmark.of(side, "toe_tip"))
                .orElseGet(() -> FootPoints.estimatedToeTip(heel, heads))
                .minus(heel)
                .norm();
    }
}
