package treadwork.io.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.MarkerSet;

/** What a marker set must hold that the schema cannot say. */
final class MarkerSetChecks {

    private MarkerSetChecks() {}

    /**
     * The set of a standing capture.
     *
     * @return limbs that are mapped in part
     * @throws UnusableInputException if labels repeat, or a segment lacks landmarks that its axes need
     */
    static List<Finding> standing(MarkerSource source) {
        MarkerSet set = source.set();
        if (set.clusters().isEmpty()) {
            throw source.place()
                    .unusable(
                            "marker-set-missing",
                            "no segment has a cluster of markers",
                            "Without one no segment can be followed",
                            "List the labels of each segment under clusters");
        }
        labels(source, set);
        set.clusters().keySet().forEach(segment -> refuseWithoutLandmarks(source, set, segment));
        List<Finding> findings = new ArrayList<>();
        for (Side side : Side.values()) {
            partialLimb(source, set, side).ifPresent(findings::add);
        }
        return findings;
    }

    /**
     * The set of a movement capture against that of its standing capture.
     *
     * @throws UnusableInputException if labels repeat, or a cluster differs in number
     */
    static void trial(MarkerSource source, MarkerSet standing) {
        MarkerSet set = source.set();
        labels(source, set);
        for (Segment segment : Segment.values()) {
            int here = set.clusters().getOrDefault(segment, List.of()).size();
            int there = standing.clusters().getOrDefault(segment, List.of()).size();
            if (here != there) {
                throw source.cluster(segment)
                        .unusable(
                                "marker-set-cluster-differs",
                                "the cluster " + segment.key() + " has " + here + " labels in this trial and " + there
                                        + " in the standing capture",
                                "A segment is followed by the same markers that it was measured with, in the same order",
                                "List the same markers in the same order in both");
            }
        }
    }

    private static void labels(MarkerSource source, MarkerSet set) {
        set.clusters().forEach((segment, labels) -> {
            Set<String> seen = new HashSet<>();
            labels.stream().filter(label -> !seen.add(label)).findFirst().ifPresent(label -> {
                throw source.cluster(segment)
                        .unusable(
                                "marker-set-label-twice",
                                "the label \"" + label + "\" stands twice in the cluster " + segment.key(),
                                "One marker counted twice would pull the segment towards it",
                                "Take one of the two out");
            });
        });
        Map<String, Landmark> first = new HashMap<>();
        set.landmarks().forEach((landmark, label) -> {
            Landmark other = first.putIfAbsent(label, landmark);
            if (other != null && !side(landmark).equals(side(other))) {
                throw source.landmark(landmark)
                        .unusable(
                                "marker-set-label-sides",
                                "the label \"" + label + "\" is both " + other.key() + " and " + landmark.key(),
                                "One marker cannot be on both sides of the body",
                                "Give each side its own label");
            }
        });
    }

    private static Optional<Side> side(Landmark landmark) {
        return Arrays.stream(Side.values())
                .filter(side -> landmark.key().startsWith(side.key() + "_"))
                .findFirst();
    }

    private static void refuseWithoutLandmarks(MarkerSource source, MarkerSet set, Segment segment) {
        Set<Landmark> missing = needed(segment);
        missing.removeAll(set.landmarks().keySet());
        if (set.landmarks().containsKey(Landmark.SACRUM)) {
            missing.removeAll(Set.of(Landmark.RIGHT_PSIS, Landmark.LEFT_PSIS));
        }
        if (!missing.isEmpty()) {
            String names = missing.stream().map(Landmark::key).collect(Collectors.joining(", "));
            throw source.cluster(segment)
                    .unusable(
                            "marker-set-landmark-missing",
                            "the segment " + segment.key() + " lacks the landmarks " + names,
                            "Without them its axes and joint centres cannot be found",
                            "Add them under landmarks"
                                    + (segment == Segment.PELVIS ? " (sacrum serves for both psis)" : "")
                                    + ", or take the cluster out");
        }
    }

    /** The landmarks that give a segment its axes and joint centres, hip centre apart. */
    private static Set<Landmark> needed(Segment segment) {
        List<String> names = switch (segment.kind()) {
            case PELVIS -> List.of("asis", "psis");
            case THIGH -> List.of("lateral_epicondyle", "medial_epicondyle");
            case SHANK -> List.of("lateral_epicondyle", "medial_epicondyle", "lateral_malleolus", "medial_malleolus");
            case FOOT ->
                List.of(
                        "lateral_malleolus",
                        "medial_malleolus",
                        "heel",
                        "first_metatarsal_head",
                        "fifth_metatarsal_head");
        };
        Set<Landmark> landmarks = EnumSet.noneOf(Landmark.class);
        for (Side side : segment.side().map(List::of).orElse(List.of(Side.values()))) {
            names.forEach(name -> landmarks.add(Landmark.of(side, name)));
        }
        return landmarks;
    }

    private static Optional<Finding> partialLimb(MarkerSource source, MarkerSet set, Side side) {
        List<Segment> missing = Arrays.stream(SegmentKind.values())
                .map(kind -> Segment.of(kind, side))
                .filter(segment -> !set.clusters().containsKey(segment))
                .toList();
        if (missing.isEmpty() || !isMapped(set, side)) {
            return Optional.empty();
        }
        String names = missing.stream().map(Segment::key).collect(Collectors.joining(", "));
        return Optional.of(source.place()
                .warning(
                        "marker-set-limb-partial",
                        "the " + side.key() + " limb has no cluster for " + names,
                        "Loads are carried from the foot up: no joint at or above a segment that is missing can be solved",
                        "List the labels of the missing segments under clusters, or leave the whole limb out"));
    }

    /** Whether anything beyond the pelvis and its hip centres is mapped on that side. */
    private static boolean isMapped(MarkerSet set, Side side) {
        boolean segments =
                set.clusters().keySet().stream().anyMatch(s -> s.side().equals(Optional.of(side)));
        boolean landmarks = set.landmarks().keySet().stream()
                .filter(landmark -> !landmark.key().matches(".*_(asis|psis|hip_centre)"))
                .anyMatch(landmark -> side(landmark).equals(Optional.of(side)));
        return segments || landmarks;
    }
}
