package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;

/** The markers that move with each segment: between its ends as one stands, and rigid in motion. */
final class ClusterGuesses {

    private static final int LEAST_MARKERS = 3;

    /** Joint markers may share a neighbour's motion; cluster markers keep this far from the joint's height, m. */
    private static final double FROM_JOINT = 0.02;

    /** From the long axis of a limb to a marker on it, m. */
    private static final double FARTHEST = 0.17;

    private static final List<String> KNEE = List.of("lateral_epicondyle", "medial_epicondyle");
    private static final List<String> ANKLE = List.of("lateral_malleolus", "medial_malleolus");

    private final Anatomy anatomy;
    private final Rigidity rigidity;
    private final Map<Landmark, Guess> landmarks;
    private final Set<String> taken;
    private final Set<String> inCluster = new LinkedHashSet<>();

    ClusterGuesses(Anatomy anatomy, Rigidity rigidity, List<Guess> landmarks) {
        this.anatomy = anatomy;
        this.rigidity = rigidity;
        this.landmarks = landmarks.stream().collect(Collectors.toMap(Guess::landmark, guess -> guess));
        this.taken = landmarks.stream().map(Guess::label).collect(Collectors.toCollection(LinkedHashSet::new));
    }

    List<ClusterGuess> all() {
        List<ClusterGuess> clusters = new ArrayList<>();
        add(clusters, Segment.PELVIS, pelvis());
        for (Side side : Side.values()) {
            Limb limb = anatomy.limbs().get(side);
            Optional<Vector3> knee = limb.middle(limb.knee());
            Optional<Vector3> ankle = limb.middle(limb.ankle());
            if (knee.isPresent() && ankle.isPresent()) {
                Bone thigh = new Bone(hip(knee.orElseThrow()), knee.orElseThrow());
                Bone shank = new Bone(knee.orElseThrow(), ankle.orElseThrow());
                List<String> atKnee = recorded(side, KNEE);
                List<String> atAnkle = recorded(side, ANKLE);
                add(clusters, Segment.of(SegmentKind.THIGH, side), along(limb, thigh, List.of(atKnee)));
                add(clusters, Segment.of(SegmentKind.SHANK, side), along(limb, shank, List.of(atAnkle, atKnee)));
                add(clusters, Segment.of(SegmentKind.FOOT, side), foot(limb, side));
            }
        }
        return clusters;
    }

    private record Bone(Vector3 upper, Vector3 lower) {

        double distance(Vector3 place) {
            Vector3 along = lower.minus(upper).unit();
            Vector3 arm = place.minus(upper);
            return arm.minus(along.times(arm.dot(along))).norm();
        }
    }

    /** Of a limb seen as a right one: from the ASISs where they are known, else straight above the knee. */
    private Vector3 hip(Vector3 knee) {
        double scale = anatomy.stature() / Template.STATURE;
        Vector3 usual = Template.ASIS_HEIGHT.from().times(scale).plus(new Vector3(knee.x(), 0, 0));
        Vector3 down = Template.HIP_CENTRE.from().times(scale);
        return anatomy.hips()
                .middle()
                .map(middle -> middle.plus(down))
                .orElse(usual.plus(new Vector3(0, down.y(), down.z())));
    }

    private List<String> pelvis() {
        List<String> marks = landmarks.values().stream()
                .filter(guess -> guess.landmark().name().endsWith("SIS") || guess.landmark() == Landmark.SACRUM)
                .sorted(Comparator.comparing(Guess::landmark))
                .map(Guess::label)
                .filter(rigidity::isRecorded)
                .collect(Collectors.toCollection(ArrayList::new));
        if (marks.size() < LEAST_MARKERS) {
            double scale = anatomy.stature() / Template.STATURE;
            double asis = anatomy.hips()
                    .middle()
                    .map(Vector3::y)
                    .orElse(Template.ASIS_HEIGHT.from().y() * scale);
            anatomy.hips().spots().stream()
                    .filter(spot -> Math.abs(spot.at().y() - asis) < 0.12 * scale
                            && Math.abs(spot.at().z()) < 0.2 * scale)
                    .map(Spot::label)
                    .filter(label -> !taken.contains(label) && rigidity.isRecorded(label))
                    .filter(label -> marks.isEmpty() || rigidity.change(label, marks) < Rigidity.LIMIT)
                    .toList()
                    .forEach(marks::add);
        }
        return marks;
    }

    /** The rigid group nearest to the bone; with the joints' markers where it is too small. */
    private List<String> along(Limb limb, Bone bone, List<List<String>> joints) {
        double clear = FROM_JOINT * limb.stature() / Template.STATURE;
        Map<String, Vector3> between = limb.spots().stream()
                .filter(spot -> spot.at().y() < bone.upper().y() - clear
                        && spot.at().y() > bone.lower().y() + clear)
                .filter(spot -> bone.distance(spot.at()) < FARTHEST * limb.stature() / Template.STATURE)
                .filter(spot -> !taken.contains(spot.label()) && rigidity.isRecorded(spot.label()))
                .collect(Collectors.toMap(Spot::label, Spot::at, (one, other) -> one, java.util.LinkedHashMap::new));
        List<List<String>> groups = rigidity.groups(List.copyOf(between.keySet()));
        int most = groups.stream().mapToInt(List::size).max().orElse(0);
        List<String> best = groups.stream()
                .filter(group -> group.size() >= Math.min(LEAST_MARKERS, most))
                .min(Comparator.comparingDouble(group -> group.stream()
                        .mapToDouble(label -> bone.distance(between.get(label)))
                        .average()
                        .orElse(0)))
                .map(ArrayList::new)
                .orElseGet(ArrayList::new);
        for (List<String> joint : joints) {
            if (best.size() < LEAST_MARKERS) {
                joint.stream()
                        .filter(label -> best.isEmpty() || rigidity.change(label, best) < Rigidity.LIMIT)
                        .toList()
                        .forEach(best::add);
            }
        }
        return best;
    }

    private List<String> foot(Limb limb, Side side) {
        List<String> marks = new ArrayList<>(recorded(side, LandmarkGuesses.FOOT));
        limb.onFoot(limb.ankle()).stream()
                .map(i -> limb.spots().get(i).label())
                .filter(label -> !taken.contains(label) && rigidity.isRecorded(label))
                .filter(label -> !marks.isEmpty() && rigidity.change(label, marks) < Rigidity.LIMIT)
                .toList()
                .forEach(marks::add);
        return marks;
    }

    private List<String> recorded(Side side, List<String> names) {
        return names.stream()
                .map(name -> landmarks.get(Landmark.of(side, name)))
                .filter(guess -> guess != null && rigidity.isRecorded(guess.label()))
                .map(Guess::label)
                .toList();
    }

    private void add(List<ClusterGuess> clusters, Segment segment, List<String> found) {
        List<String> labels = found.stream().filter(inCluster::add).toList();
        if (labels.size() >= LEAST_MARKERS) {
            double change = labels.stream()
                    .mapToDouble(label -> rigidity.change(
                            label,
                            labels.stream()
                                    .filter(other -> !other.equals(label))
                                    .toList()))
                    .average()
                    .orElse(Double.NaN);
            boolean sure = change < Rigidity.LIMIT && hasAxes(segment);
            String why = String.format(
                    Locale.ROOT, "their distances change by %.1f mm in the mean as they move", 1000 * change);
            clusters.add(new ClusterGuess(segment, labels, sure, why));
        }
    }

    /** Whether the landmarks that give the segment its axes are sure; without them the cluster cannot be used. */
    private boolean hasAxes(Segment segment) {
        if (segment == Segment.PELVIS) {
            boolean front = isSure(Landmark.RIGHT_ASIS) && isSure(Landmark.LEFT_ASIS);
            return front && (isSure(Landmark.SACRUM) || (isSure(Landmark.RIGHT_PSIS) && isSure(Landmark.LEFT_PSIS)));
        }
        Side side = segment.side().orElseThrow();
        List<String> names = switch (segment.kind()) {
            case PELVIS -> List.of();
            case THIGH -> KNEE;
            case SHANK -> List.of(KNEE.get(0), KNEE.get(1), ANKLE.get(0), ANKLE.get(1));
            case FOOT -> List.of(ANKLE.get(0), ANKLE.get(1), "heel", "first_metatarsal_head", "fifth_metatarsal_head");
        };
        return names.stream().allMatch(name -> isSure(Landmark.of(side, name)));
    }

    private boolean isSure(Landmark landmark) {
        return landmarks.containsKey(landmark) && landmarks.get(landmark).isSure();
    }
}
