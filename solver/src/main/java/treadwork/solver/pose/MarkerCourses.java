package treadwork.solver.pose;

import java.util.List;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.VectorSeries;

/** Finds the points of a capture by their labels. */
public final class MarkerCourses {

    private MarkerCourses() {}

    /**
     * The positions of the point of that label, matched exactly. A point that is never seen comes back as gaps. Where the
     * label stands more than once, points that are never seen do not count, and equal ones are one.
     *
     * @param wantedFor what the label is mapped to, for messages: {@code landmark right_asis}
     * @throws UnusableInputException {@code label-missing}, or {@code label-repeated} where points of one label differ
     */
    public static VectorSeries find(Capture capture, String label, String wantedFor) {
        List<VectorSeries> found = capture.points().stream()
                .filter(point -> point.label().equals(label))
                .map(PointSeries::positions)
                .toList();
        if (found.isEmpty()) {
            throw missing(capture, label, wantedFor);
        }
        List<VectorSeries> seen =
                found.stream().filter(MarkerCourses::isEverSeen).toList();
        if (seen.isEmpty()) {
            return found.get(0);
        }
        VectorSeries first = seen.get(0);
        if (!seen.stream().allMatch(course -> same(first, course))) {
            throw repeated(capture, label, wantedFor);
        }
        return first;
    }

    /** Whether the point is known in any frame. */
    static boolean isEverSeen(VectorSeries course) {
        for (int i = 0; i < course.size(); i++) {
            if (!course.isGap(i)) {
                return true;
            }
        }
        return false;
    }

    private static boolean same(VectorSeries one, VectorSeries other) {
        for (int i = 0; i < one.size(); i++) {
            if (!one.at(i).equals(other.at(i))) {
                return false;
            }
        }
        return true;
    }

    private static UnusableInputException missing(Capture capture, String label, String wantedFor) {
        List<String> labels = capture.points().stream().map(PointSeries::label).toList();
        return new UnusableInputException(new Finding(
                "label-missing",
                Severity.REFUSES,
                capture.name() + ", label \"" + label + "\"",
                "no point has this label, which is mapped to " + wantedFor + NearestName.hint(label, labels),
                "Without it the segment cannot be built or tracked",
                "Correct the label in the marker set, or give this capture a marker set of its own"));
    }

    private static UnusableInputException repeated(Capture capture, String label, String wantedFor) {
        return new UnusableInputException(new Finding(
                "label-repeated",
                Severity.REFUSES,
                capture.name() + ", label \"" + label + "\"",
                "several points have this label, mapped to " + wantedFor + ", and their positions differ",
                "Which of them is meant cannot be known",
                "Give the points different labels in the capture file"));
    }
}
