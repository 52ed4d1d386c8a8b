package treadwork.solver.pose;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MarkerSet;

/**
 * The mapped markers of a standing capture, each at one place: the median over the frames, gaps left out.
 * Lab axes, m.
 */
record StandingMarkers(Capture capture, MarkerSet set) {

    /**
     * Where a landmark is.
     *
     * @param segment the segment that needs it
     * @throws UnusableInputException {@code segment-incomplete} where it is not mapped, or as {@link #median} refuses
     */
    Vector3 at(Landmark landmark, Segment segment) {
        return ifMapped(landmark).orElseThrow(() -> incomplete(landmark.key(), segment));
    }

    Vector3 at(Side side, String name, Segment segment) {
        return at(Landmark.of(side, name), segment);
    }

    Optional<Vector3> ifMapped(Landmark landmark) {
        return Optional.ofNullable(set.landmarks().get(landmark))
                .map(label -> median(label, "landmark " + landmark.key()));
    }

    /** The point midway between the PSISs, or the sacrum in their place. */
    Vector3 midPsis(Segment segment) {
        Optional<Vector3> right = ifMapped(Landmark.RIGHT_PSIS);
        Optional<Vector3> left = ifMapped(Landmark.LEFT_PSIS);
        if (right.isPresent() && left.isPresent()) {
            return right.orElseThrow().midpoint(left.orElseThrow());
        }
        return ifMapped(Landmark.SACRUM).orElseThrow(() -> incomplete("right_psis and left_psis, or sacrum", segment));
    }

    /**
     * The markers of a segment's cluster, in the order of the marker set.
     *
     * @throws UnusableInputException {@code cluster-small} for fewer than three, {@code cluster-line} where they are near
     *     one line
     */
    List<Vector3> cluster(Segment segment) {
        List<String> labels = set.clusters().get(segment);
        if (new LinkedHashSet<>(labels).size() < Math.max(RigidFit.LEAST_MARKERS, labels.size())) {
            throw refusal(
                    "cluster-small",
                    "cluster of " + segment.key(),
                    "its labels are " + labels + ", three or more different ones are needed",
                    "Fewer markers do not fix a segment in space",
                    "Give the cluster three or more markers that move with the segment");
        }
        List<Vector3> places = new ArrayList<>();
        for (String label : labels) {
            places.add(median(label, "cluster of " + segment.key()));
        }
        double spread = RigidFit.spread(places);
        if (!(spread >= RigidFit.LEAST_SPREAD)) {
            throw refusal(
                    "cluster-line",
                    "cluster of " + segment.key() + ", labels " + labels,
                    String.format(
                            Locale.ROOT,
                            "the markers lie nearly on one line: width over length is %.3f, at least %.3f is needed",
                            spread,
                            RigidFit.LEAST_SPREAD),
                    "The segment's turn about that line would be little but noise",
                    "Choose markers for the cluster that are spread in two directions");
        }
        return places;
    }

    /**
     * The middle of a marker's places.
     *
     * @throws UnusableInputException {@code label-missing}, {@code label-repeated} or {@code label-never-seen}
     */
    Vector3 median(String label, String wantedFor) {
        VectorSeries course = MarkerCourses.find(capture, label, wantedFor);
        if (!MarkerCourses.isEverSeen(course)) {
            throw refusal(
                    "label-never-seen",
                    "label \"" + label + "\"",
                    "the point, mapped to " + wantedFor + ", is missing in all " + course.size() + " frames",
                    "Without it the segment cannot be built",
                    "Use a standing capture in which the marker is seen, or map another one");
        }
        return SpatialMedian.of(course);
    }

    UnusableInputException refusal(String code, String what, String figure, String meaning, String mend) {
        return new UnusableInputException(
                new Finding(code, Severity.REFUSES, capture.name() + ", " + what, figure, meaning, mend));
    }

    private UnusableInputException incomplete(String missing, Segment segment) {
        return refusal(
                "segment-incomplete",
                "segment " + segment.key(),
                "the marker set gives it a cluster but does not map " + missing,
                "Without it the segment's axes or its joint centre cannot be built",
                "Map the landmark, or take the segment's cluster out of the marker set");
    }
}
