package treadwork.solver.proof;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * Where the rod is, a frame; a gap where one of its markers is not seen.
 *
 * @param first where the axis passes the first marker, lab axes, m
 * @param axis  of length one, from the tip to the hand
 */
record RodCourse(VectorSeries first, VectorSeries axis) {

    /** Markers that come closer than this give no direction, m. */
    private static final double SHORTEST = 0.1;

    /**
     * Let s be the markers' distances from the first, medians over the capture, and x their places: u is the unit vector along
     * Σ (s - s̄)(x - x̄), and the first marker's place on the axis x̄ - s̄ u (least squares).
     */
    static RodCourse of(Capture capture, List<String> labels) {
        List<VectorSeries> markers =
                labels.stream().map(label -> marker(capture, label)).toList();
        double[] along = distances(markers);
        double mean = Arrays.stream(along).average().orElse(0);
        if (!(along[along.length - 1] >= SHORTEST)) {
            throw new UnusableInputException(new Finding(
                    "rod-markers",
                    Severity.REFUSES,
                    capture.name() + ", markers " + String.join(", ", labels),
                    String.format(
                            Locale.ROOT,
                            "the first and the last are %.0f mm apart, limit %.0f mm",
                            1e3 * along[along.length - 1],
                            1e3 * SHORTEST),
                    "The rod's direction cannot be told from markers that are so close together, or never seen together",
                    "Name two markers far apart on the rod, the one near the tip first"));
        }
        int frames = capture.frames();
        VectorSeries.Builder first = new VectorSeries.Builder(frames);
        VectorSeries.Builder axis = new VectorSeries.Builder(frames);
        for (int i = 0; i < frames; i++) {
            Vector3 sum = Vector3.ZERO;
            Vector3 middle = Vector3.ZERO;
            for (int m = 0; m < along.length; m++) {
                middle = middle.plus(markers.get(m).at(i).times(1.0 / along.length));
                sum = sum.plus(markers.get(m).at(i).times(along[m] - mean));
            }
            Vector3 u = sum.unit();
            axis.set(i, u);
            first.set(i, middle.minus(u.times(mean)));
        }
        return new RodCourse(first.build(), axis.build());
    }

    static VectorSeries marker(Capture capture, String label) {
        return capture.points().stream()
                .filter(point -> point.label().equals(label))
                .findFirst()
                .map(PointSeries::positions)
                .orElseThrow(() -> new UnusableInputException(missing(capture, label)));
    }

    private static Finding missing(Capture capture, String label) {
        List<String> known = capture.points().stream().map(PointSeries::label).toList();
        return new Finding(
                "label-missing",
                Severity.REFUSES,
                capture.name() + ", marker \"" + label + "\"",
                "the capture has no marker of that label" + NearestName.hint(label, known),
                "Without it this test cannot be evaluated",
                "Give the label as the capture has it; \"treadwork inspect\" lists them all");
    }

    private static double[] distances(List<VectorSeries> markers) {
        double[] along = new double[markers.size()];
        VectorSeries first = markers.get(0);
        for (int m = 1; m < along.length; m++) {
            List<Double> distances = new ArrayList<>();
            for (int i = 0; i < first.size(); i++) {
                double distance = markers.get(m).at(i).minus(first.at(i)).norm();
                if (!Double.isNaN(distance)) {
                    distances.add(distance);
                }
            }
            distances.sort(null);
            along[m] = distances.isEmpty() ? Double.NaN : distances.get(distances.size() / 2);
        }
        return along;
    }

    /** Where the tip is that lies {@code distance} before the first marker. */
    Vector3 tip(int frame, double distance) {
        return first.at(frame).minus(axis.at(frame).times(distance));
    }
}
