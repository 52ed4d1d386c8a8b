package treadwork.solver.pose;

import java.util.ArrayList;
import java.util.Collection;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.Pose;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MarkerSet;

/**
 * An invented standing body whose landmarks are placed from chosen segment poses, so that these poses are what the
 * definitions of the axes must give back. Lab X is forward, Z up, so that -Y is the subject's right; the left limb is the
 * right one mirrored.
 */
public record StandingModel(
        Map<Landmark, Vector3> landmarks, Map<Segment, List<Vector3>> clusters, Map<Segment, Pose> poses) {

    public static final String FILE = "S01/standing.c3d";
    public static final double PELVIS_WIDTH = 0.24;
    public static final double PELVIS_DEPTH = 0.15;
    public static final double THIGH_LENGTH = 0.43;
    public static final double SHANK_LENGTH = 0.41;
    private static final int FRAMES = 5;

    private static final Rotation UPRIGHT =
            Rotation.ofColumns(new Vector3(1, 0, 0), new Vector3(0, 0, 1), new Vector3(0, -1, 0));

    /** The whole lower body. */
    public static StandingModel whole() {
        Map<Segment, Pose> poses = new EnumMap<>(Segment.class);
        Pose pelvis = new Pose(new Vector3(0.3, 0, 1.02), UPRIGHT.times(Rotation.about(new Vector3(0, 0, 1), -0.15)));
        Pose thigh = new Pose(pelvis.toLab(new Vector3(-0.05, -0.08, 0.09)), tilted(0.3, -0.5, 0.9, 0.17));
        Pose shank = new Pose(thigh.toLab(new Vector3(0, -THIGH_LENGTH, 0)), tilted(0.2, 0.6, -0.9, 0.21));
        Pose foot = new Pose(shank.toLab(new Vector3(0, -SHANK_LENGTH, 0)), tilted(-0.1, -0.9, -0.4, 0.24));
        poses.put(Segment.PELVIS, pelvis);
        poses.put(Segment.RIGHT_THIGH, thigh);
        poses.put(Segment.RIGHT_SHANK, shank);
        poses.put(Segment.RIGHT_FOOT, foot);
        for (SegmentKind kind : List.of(SegmentKind.THIGH, SegmentKind.SHANK, SegmentKind.FOOT)) {
            poses.put(Segment.of(kind, Side.LEFT), mirrored(poses.get(Segment.of(kind, Side.RIGHT))));
        }
        Map<Landmark, Vector3> landmarks = new EnumMap<>(Landmark.class);
        Map<Segment, List<Vector3>> clusters = new EnumMap<>(Segment.class);
        for (Landmark landmark : Landmark.values()) {
            place(landmark, poses).ifPresent(place -> landmarks.put(landmark, place));
        }
        poses.forEach((segment, pose) -> clusters.put(
                segment, clusterInSegment(segment).stream().map(pose::toLab).toList()));
        return new StandingModel(landmarks, clusters, poses);
    }

    /** The markers of a cluster in segment axes: four, in no plane, the left ones mirrored. */
    public static List<Vector3> clusterInSegment(Segment segment) {
        double z = segment.side().orElse(Side.RIGHT).sign();
        return List.of(
                new Vector3(0.05, -0.03, 0.06 * z),
                new Vector3(-0.04, -0.05, 0.05 * z),
                new Vector3(0.06, -0.12, 0.03 * z),
                new Vector3(0.01, -0.09, 0.08 * z));
    }

    /** A landmark in axes of the segment it is placed from; right side. */
    public static Optional<Vector3> inSegment(String name) {
        return Optional.ofNullable(
                switch (name) {
                    case "asis" -> new Vector3(0, 0, PELVIS_WIDTH / 2);
                    case "psis" -> new Vector3(-PELVIS_DEPTH, 0, 0.045);
                    case "hip_centre" -> Vector3.ZERO;
                    case "lateral_epicondyle" -> new Vector3(0, -THIGH_LENGTH + 0.004, 0.05);
                    case "medial_epicondyle" -> new Vector3(0, -THIGH_LENGTH - 0.004, -0.05);
                    case "lateral_malleolus" -> new Vector3(0, -SHANK_LENGTH - 0.006, 0.036);
                    case "medial_malleolus" -> new Vector3(0, -SHANK_LENGTH + 0.006, -0.036);
                    case "heel" -> new Vector3(-0.05, -0.05, -0.004);
                    case "first_metatarsal_head" -> new Vector3(0.135 + 0.012, -0.05, -0.004 - 0.04);
                    case "fifth_metatarsal_head" -> new Vector3(0.135 - 0.012, -0.05, -0.004 + 0.04);
                    case "second_metatarsal_head" -> new Vector3(0.149, -0.045, -0.014);
                    case "toe_tip" -> new Vector3(0.21, -0.055, -0.02);
                    default -> null;
                });
    }

    /** Every mapped landmark is labelled with its own name in capitals, every cluster marker with segment and number. */
    public MarkerSet markerSet() {
        Map<Landmark, String> labels = new EnumMap<>(Landmark.class);
        landmarks.keySet().forEach(landmark -> labels.put(landmark, landmark.name()));
        Map<Segment, List<String>> clusterLabels = new EnumMap<>(Segment.class);
        clusters.forEach((segment, places) -> clusterLabels.put(segment, labels(segment, places.size())));
        return new MarkerSet(labels, clusterLabels);
    }

    public Capture capture() {
        Map<String, Vector3> points = new LinkedHashMap<>();
        landmarks.forEach((landmark, place) -> points.put(landmark.name(), place));
        clusters.forEach((segment, places) -> {
            List<String> labels = labels(segment, places.size());
            for (int m = 0; m < places.size(); m++) {
                points.put(labels.get(m), places.get(m));
            }
        });
        List<PointSeries> series = new ArrayList<>();
        points.forEach((label, place) -> series.add(point(label, VectorSeries.constant(place, FRAMES))));
        return captureOf(series);
    }

    public StandingModel without(Landmark landmark) {
        Map<Landmark, Vector3> fewer = new EnumMap<>(landmarks);
        fewer.remove(landmark);
        return new StandingModel(fewer, clusters, poses);
    }

    public StandingModel with(Landmark landmark, Vector3 place) {
        Map<Landmark, Vector3> more = new EnumMap<>(landmarks);
        more.put(landmark, place);
        return new StandingModel(more, clusters, poses);
    }

    public StandingModel withCluster(Segment segment, List<Vector3> places) {
        Map<Segment, List<Vector3>> other = new EnumMap<>(clusters);
        other.put(segment, places);
        return new StandingModel(landmarks, other, poses);
    }

    /** The same body, of which only these segments have clusters. */
    public StandingModel tracking(Collection<Segment> segments) {
        Map<Segment, List<Vector3>> fewer = new EnumMap<>(clusters);
        fewer.keySet().retainAll(segments);
        return new StandingModel(landmarks, fewer, poses);
    }

    /** Every point moved. */
    public StandingModel moved(UnaryOperator<Vector3> move) {
        Map<Landmark, Vector3> points = new EnumMap<>(Landmark.class);
        landmarks.forEach((landmark, place) -> points.put(landmark, move.apply(place)));
        Map<Segment, List<Vector3>> groups = new EnumMap<>(Segment.class);
        clusters.forEach((segment, places) ->
                groups.put(segment, places.stream().map(move).toList()));
        return new StandingModel(points, groups, poses);
    }

    public static PointSeries point(String label, VectorSeries course) {
        return new PointSeries(label, "", course);
    }

    public static Capture captureOf(List<PointSeries> points) {
        return new Capture(
                FILE,
                1,
                points.isEmpty() ? 0 : points.get(0).positions().size(),
                200,
                points,
                0,
                List.of(),
                List.of(),
                Optional.empty(),
                List.of(),
                LengthUnit.MM,
                "",
                List.of());
    }

    /** The mirror of a pose in the lab's X-Z plane; its segment's Z points to the subject's right again. */
    private static Pose mirrored(Pose pose) {
        Rotation r = pose.labFromBody();
        return new Pose(
                mirrored(pose.origin()),
                Rotation.ofColumns(
                        mirrored(r.columnX()),
                        mirrored(r.columnY()),
                        mirrored(r.columnZ()).negated()));
    }

    static Vector3 mirrored(Vector3 point) {
        return new Vector3(point.x(), -point.y(), point.z());
    }

    private static Optional<Vector3> place(Landmark landmark, Map<Segment, Pose> poses) {
        if (landmark == Landmark.SACRUM) {
            return Optional.empty();
        }
        Side side = landmark.name().startsWith("RIGHT") ? Side.RIGHT : Side.LEFT;
        String name = landmark.key().substring(side.key().length() + 1);
        Pose pose = poses.get(Segment.of(kindOf(name), side));
        return inSegment(name)
                .map(inRight -> new Vector3(inRight.x(), inRight.y(), side.sign() * inRight.z()))
                .map(pose::toLab);
    }

    private static SegmentKind kindOf(String name) {
        return switch (name) {
            case "asis", "psis" -> SegmentKind.PELVIS;
            case "hip_centre", "lateral_epicondyle", "medial_epicondyle" -> SegmentKind.THIGH;
            case "lateral_malleolus", "medial_malleolus" -> SegmentKind.SHANK;
            default -> SegmentKind.FOOT;
        };
    }

    private static Rotation tilted(double x, double y, double z, double angle) {
        return UPRIGHT.times(Rotation.about(new Vector3(x, y, z).unit(), angle));
    }

    private static List<String> labels(Segment segment, int count) {
        List<String> labels = new ArrayList<>();
        for (int m = 1; m <= count; m++) {
            labels.add(segment.key() + " " + m);
        }
        return labels;
    }
}
