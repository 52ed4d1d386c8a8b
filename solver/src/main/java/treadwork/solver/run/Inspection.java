package treadwork.solver.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Processing;
import treadwork.solver.plate.LabUp;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateLoads;

/**
 * What is in one capture file, and what the file alone shows to be wrong with it.
 *
 * @param up       the lab axis that points up, where plates and markers show it
 * @param plates   a summary a plate of the file
 * @param markers  a summary a point of the file
 * @param findings of the reading and of the plates
 */
public record Inspection(
        Capture capture,
        Optional<LabAxis> up,
        List<PlateSummary> plates,
        List<MarkerSummary> markers,
        List<Finding> findings) {

    public Inspection {
        plates = List.copyOf(plates);
        markers = List.copyOf(markers);
        findings = List.copyOf(findings);
    }

    /**
     * @param number counted from 1
     * @param plate  as described
     * @param push   how hard it pushes up, zeroed, N, an analog sample; empty where it cannot be resolved
     */
    public record PlateSummary(int number, Plate plate, Optional<ScalarSeries> push) {

        /** The greatest push, N; NaN where there is none. */
        public double peak() {
            return push.map(Inspection::greatest).orElse(Double.NaN);
        }
    }

    /**
     * @param course      where it was seen
     * @param seen        frames in which it is known
     * @param gaps        stretches within the record in which it is not
     * @param longestGapS the longest of them, s
     */
    public record MarkerSummary(String label, VectorSeries course, int seen, int gaps, double longestGapS) {}

    /** Looks at a capture by itself, with the settings that hold where a study file says nothing. */
    public static Inspection of(Capture capture) {
        List<Finding> findings = new ArrayList<>(capture.findings());
        LabUp up = LabUp.find(capture, capture.plates(), Optional.empty());
        List<PlateLoad> loads = new ArrayList<>();
        if (up.axis().isPresent()) {
            PlateLoads resolved =
                    PlateLoads.resolve(capture, capture.plates(), up.axis().orElseThrow(), Processing.DEFAULT);
            loads.addAll(resolved.plates());
            findings.addAll(resolved.findings());
        }
        return new Inspection(capture, up.axis(), plates(capture.plates(), loads), markers(capture), findings);
    }

    /** Looks at a movement with all that its study says: all checks of plates, markers and body against each other, too. */
    static Inspection of(TrialInput input) {
        Measured measured = Measured.of(input);
        Capture capture = input.movement();
        List<Plate> described = input.trial().lab().plates().orElse(capture.plates());
        return new Inspection(
                capture,
                Optional.of(measured.up()),
                plates(described, measured.plates().plates()),
                markers(capture),
                measured.findings());
    }

    private static List<PlateSummary> plates(List<Plate> described, List<PlateLoad> loads) {
        List<PlateSummary> summaries = new ArrayList<>();
        for (int i = 0; i < described.size(); i++) {
            int number = i + 1;
            Optional<ScalarSeries> push = loads.stream()
                    .filter(load -> load.number() == number)
                    .findFirst()
                    .map(PlateLoad::rawPush);
            summaries.add(new PlateSummary(number, described.get(i), push));
        }
        return summaries;
    }

    private static List<MarkerSummary> markers(Capture capture) {
        return capture.points().stream()
                .map(point -> summary(point, capture.pointRate()))
                .toList();
    }

    private static MarkerSummary summary(PointSeries point, double rate) {
        VectorSeries course = point.positions();
        int seen = 0;
        int gaps = 0;
        int longest = 0;
        int sinceSeen = 0;
        for (int i = 0; i < course.size(); i++) {
            if (course.isGap(i)) {
                sinceSeen++;
                continue;
            }
            if (seen > 0 && sinceSeen > 0) {
                gaps++;
                longest = Math.max(longest, sinceSeen);
            }
            sinceSeen = 0;
            seen++;
        }
        return new MarkerSummary(point.label(), course, seen, gaps, longest / rate);
    }

    private static double greatest(ScalarSeries series) {
        double greatest = Double.NaN;
        for (int i = 0; i < series.size(); i++) {
            greatest = series.at(i) > greatest || Double.isNaN(greatest) ? series.at(i) : greatest;
        }
        return greatest;
    }
}
