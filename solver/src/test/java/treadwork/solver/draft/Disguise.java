package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Figure;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.LabPlan;
import treadwork.fixtures.walker.MarkerGap;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;
import treadwork.model.study.MarkerSet;

/**
 * A walk whose markers tell nothing by name or order, with cluster markers elsewhere on their segments, and arms.
 *
 * @param truth the labels as disguised
 */
record Disguise(Capture standing, Capture walking, MarkerSet truth, WalkerSettings settings) {

    private static final double NOISE = 0.0005;
    private static final double SKIN = 0.004;
    /** Cluster markers are moved by up to this along each axis of their segment, m. */
    private static final double MOVED = 0.03;

    static Disguise of(long seed) {
        Random random = new Random(seed * 7919 + 13);
        WalkerSettings clean = settings(random, seed);
        Disturbance disturbance = Disturbance.NONE
                .withMarkerNoise(NOISE)
                .withSkinMotion(SKIN)
                .withPlateNoise(1)
                .withSeed(seed)
                .withGaps(gaps(random));
        Walk exact = Walk.of(clean);
        Walk spoilt = Walk.of(clean.with(disturbance));
        Map<String, Vector3> moved = new HashMap<>();
        Map<String, List<String>> bases = new HashMap<>();
        exact.markerSet().clusters().forEach((segment, labels) -> {
            if (segment.kind() == SegmentKind.THIGH || segment.kind() == SegmentKind.SHANK) {
                labels.forEach(label -> moved.put(label, new Vector3(offset(random), offset(random), offset(random))));
                labels.forEach(label -> bases.put(label, labels));
            }
        });
        Map<String, String> names = names(exact.standing(), random);
        Shuffle shuffle = new Shuffle(moved, bases, names, clean.lab().up().direction());
        return new Disguise(
                shuffle.of(exact.standing(), spoilt.standing(), random),
                shuffle.of(exact.walking(), spoilt.walking(), random),
                renamed(exact.markerSet(), names),
                clean);
    }

    private static double offset(Random random) {
        return MOVED * (2 * random.nextDouble() - 1);
    }

    private static WalkerSettings settings(Random random, long seed) {
        Figure figure = Figure.DEFAULT
                .withMassKg(50 + 50 * random.nextDouble())
                .withHeightM(1.5 + 0.45 * random.nextDouble())
                .withSeed(seed)
                .withMirrored(random.nextBoolean());
        Gait gait = Gait.DEFAULT
                .withSeed(seed)
                .withPointRate(100)
                .withStrideS(1.0 + 0.3 * random.nextDouble())
                .withStrideRatio(0.66 + 0.12 * random.nextDouble());
        LabPlan lab = LabPlan.DEFAULT
                .withUp(List.of(LabAxis.values()).get(random.nextInt(LabAxis.values().length)))
                .withHeadingRad(2 * Math.PI * random.nextDouble());
        return WalkerSettings.DEFAULT.with(figure).with(gait).with(lab);
    }

    private static List<MarkerGap> gaps(Random random) {
        List<MarkerGap> gaps = new ArrayList<>();
        for (String label : List.of("right heel", "left thigh 2", "left asis", "right shank 3")) {
            int from = 20 + random.nextInt(150);
            gaps.add(new MarkerGap(label, new FrameRange(from, from + 60)));
        }
        return gaps;
    }

    private static Map<String, String> names(Capture standing, Random random) {
        List<String> labels = new ArrayList<>();
        standing.points().forEach(point -> labels.add(point.label()));
        for (String extra : Arms.LABELS) {
            labels.add(extra);
        }
        List<Integer> numbers = new ArrayList<>();
        for (int i = 0; i < labels.size(); i++) {
            numbers.add(100 + i);
        }
        Collections.shuffle(numbers, random);
        Map<String, String> names = new HashMap<>();
        for (int i = 0; i < labels.size(); i++) {
            names.put(labels.get(i), "Q" + numbers.get(i));
        }
        return names;
    }

    private static MarkerSet renamed(MarkerSet set, Map<String, String> names) {
        Map<treadwork.model.body.Landmark, String> marks = new EnumMap<>(treadwork.model.body.Landmark.class);
        set.landmarks().forEach((landmark, label) -> marks.put(landmark, names.get(label)));
        Map<Segment, List<String>> clusters = new EnumMap<>(Segment.class);
        set.clusters()
                .forEach((segment, labels) ->
                        clusters.put(segment, labels.stream().map(names::get).toList()));
        return new MarkerSet(marks, clusters);
    }

    /** All that is done to a capture. */
    private record Shuffle(
            Map<String, Vector3> moved, Map<String, List<String>> bases, Map<String, String> names, Vector3 up) {

        Capture of(Capture exact, Capture spoilt, Random random) {
            Map<String, VectorSeries> clean = new HashMap<>();
            exact.points().forEach(point -> clean.put(point.label(), point.positions()));
            List<PointSeries> points = new ArrayList<>();
            for (PointSeries point : spoilt.points()) {
                VectorSeries course = moved.containsKey(point.label()) ? displaced(point, clean) : point.positions();
                points.add(new PointSeries(names.get(point.label()), "", course));
            }
            new Arms(clean, up)
                    .courses()
                    .forEach((label, course) -> points.add(new PointSeries(names.get(label), "", course)));
            Collections.shuffle(points, random);
            return spoilt.withPoints(points);
        }

        /** Moved along axes made of three exact markers of its cluster, so rigidly with its segment. */
        private VectorSeries displaced(PointSeries point, Map<String, VectorSeries> clean) {
            List<String> base = bases.get(point.label());
            Vector3 by = moved.get(point.label());
            VectorSeries.Builder course =
                    new VectorSeries.Builder(point.positions().size());
            for (int i = 0; i < point.positions().size(); i++) {
                Vector3 origin = clean.get(base.get(0)).at(i);
                Vector3 x = clean.get(base.get(1)).at(i).minus(origin).unit();
                Vector3 z = x.cross(clean.get(base.get(2)).at(i).minus(origin)).unit();
                Vector3 y = z.cross(x);
                course.set(
                        i,
                        point.positions()
                                .at(i)
                                .plus(x.times(by.x()))
                                .plus(y.times(by.y()))
                                .plus(z.times(by.z())));
            }
            return course.build();
        }
    }

    /** Arms that swing: an elbow, and three points of a hand at the height of the thigh. */
    private record Arms(Map<String, VectorSeries> clean, Vector3 up) {

        static final List<String> LABELS = List.of(
                "right elbow",
                "right wrist",
                "right hand",
                "right knuckle",
                "left elbow",
                "left wrist",
                "left hand",
                "left knuckle");
        private static final List<Vector3> PLACES = List.of(
                new Vector3(-0.08, 0.12, 0.27),
                new Vector3(-0.02, -0.1, 0.29),
                new Vector3(0.01, -0.17, 0.31),
                new Vector3(0.03, -0.2, 0.28));

        Map<String, VectorSeries> courses() {
            Map<String, VectorSeries> courses = new HashMap<>();
            for (int k = 0; k < LABELS.size(); k++) {
                int side = k < PLACES.size() ? 1 : -1;
                courses.put(LABELS.get(k), course(PLACES.get(k % PLACES.size()), side));
            }
            return courses;
        }

        private VectorSeries course(Vector3 place, int side) {
            VectorSeries right = clean.get("right asis");
            VectorSeries left = clean.get("left asis");
            VectorSeries knee = clean.get((side > 0 ? "right" : "left") + " lateral epicondyle");
            VectorSeries.Builder course = new VectorSeries.Builder(right.size());
            for (int i = 0; i < right.size(); i++) {
                Vector3 across = right.at(i).minus(left.at(i)).unit();
                Vector3 ahead = up.cross(across).unit();
                Vector3 middle = right.at(i).midpoint(left.at(i));
                double swing = -0.5 * knee.at(i).minus(middle).dot(ahead) * (place.y() < 0 ? 1 : 0.4);
                course.set(
                        i,
                        middle.plus(ahead.times(place.x() - 0.07 + swing))
                                .plus(up.times(place.y()))
                                .plus(across.times(side * place.z())));
            }
            return course.build();
        }
    }

    /** What a draft says that is not so, in words; empty where all is right and nothing that is there is missing. */
    Set<String> faults(MarkerDraft draft) {
        Set<String> faults = new TreeSet<>();
        MarkerSet sure = draft.sure();
        truth.landmarks().forEach((landmark, label) -> {
            String said = sure.landmarks().get(landmark);
            if (!label.equals(said)) {
                faults.add(landmark.key() + (said == null ? " is missing" : " is wrong"));
            }
        });
        sure.landmarks().keySet().stream()
                .filter(landmark -> !truth.landmarks().containsKey(landmark))
                .forEach(landmark -> faults.add(landmark.key() + " is invented"));
        truth.clusters().forEach((segment, labels) -> {
            Set<String> said = new TreeSet<>(sure.clusters().getOrDefault(segment, List.of()));
            if (!said.equals(new TreeSet<>(labels))) {
                faults.add("cluster of " + segment.key() + " has " + said.size() + " of " + labels.size() + ", right "
                        + labels.stream().filter(said::contains).count());
            }
        });
        return faults;
    }

    /** Sided landmarks and clusters that stand on the other side of the truth. */
    long exchangedSides(MarkerDraft draft) {
        Set<String> right = new TreeSet<>();
        Set<String> left = new TreeSet<>();
        truth.landmarks().forEach((landmark, label) -> (landmark.name().startsWith("RIGHT") ? right : left).add(label));
        truth.clusters().forEach((segment, labels) -> {
            if (segment != Segment.PELVIS) {
                (segment.name().startsWith("RIGHT") ? right : left).addAll(labels);
            }
        });
        MarkerSet sure = draft.sure();
        long marks = sure.landmarks().entrySet().stream()
                .filter(entry -> (entry.getKey().name().startsWith("RIGHT") ? left : right).contains(entry.getValue()))
                .count();
        long clusters = sure.clusters().entrySet().stream()
                .filter(entry -> entry.getKey() != Segment.PELVIS)
                .flatMap(entry -> entry.getValue().stream()
                        .filter((entry.getKey().name().startsWith("RIGHT") ? left : right)::contains))
                .count();
        return marks + clusters;
    }
}
