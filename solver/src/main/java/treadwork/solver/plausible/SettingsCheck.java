package treadwork.solver.plausible;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.Processing;

/** {@code filter-unlike} and {@code rate-low}: settings that do not go with each other or with the movement. */
public final class SettingsCheck {

    /** Cut-offs that differ by less are the same, as a share. */
    private static final double SAME = 0.01;

    /** Samples in a period of the cut-off that keep a filtered course smooth between them (common practice: 5 to 10 times). */
    private static final double LEAST_SAMPLES = 5;

    /** Between two frames a marker's path may bend away from a straight line by this much, m. */
    private static final double LARGEST_BEND = 0.005;

    /** A path bends more in at most this share of the frames. */
    private static final double SHARE = 0.01;

    private SettingsCheck() {}

    /** @param markers the tracked markers' courses, as recorded */
    public static List<Finding> of(Capture capture, Processing processing, boolean plates, List<VectorSeries> markers) {
        List<Finding> findings = new ArrayList<>();
        if (plates && unlike(processing.markerFilter(), processing.plateFilter())) {
            findings.add(filterUnlike(capture.name(), processing));
        }
        rate(findings, capture.name() + ", markers", capture.pointRate(), processing.markerFilter());
        if (plates) {
            rate(findings, capture.name() + ", plates", capture.analogRate(), processing.plateFilter());
        }
        if (findings.stream().noneMatch(finding -> finding.code().equals("rate-low"))) {
            bend(findings, capture, markers);
        }
        return findings;
    }

    private static boolean unlike(FilterSettings markers, FilterSettings plates) {
        if (markers.kind() != plates.kind()) {
            return true;
        }
        return markers.kind() == FilterSettings.Kind.BUTTERWORTH
                && (markers.order() != plates.order()
                        || Math.abs(markers.cutoffHz() - plates.cutoffHz()) > SAME * markers.cutoffHz());
    }

    private static Finding filterUnlike(String name, Processing processing) {
        FilterSettings markers = processing.markerFilter();
        return new Finding(
                        "filter-unlike",
                        Severity.WARNING,
                        name,
                        "markers are smoothed by " + inWords(markers) + ", plates by "
                                + inWords(processing.plateFilter()),
                        "At impact the reaction then moves and the segment does not yet, which makes false peaks of knee and hip"
                                + " moments (Bisseling and Hof 2006; Kristianslund et al. 2012)",
                        "Smooth both alike")
                .proposing(new Proposal(
                        Proposal.Scope.TRIAL,
                        String.format(
                                Locale.ROOT,
                                "{ \"processing\": { \"plateFilter\": { \"kind\": \"%s\", \"cutoffHz\": %s, \"order\": %d } } }",
                                markers.kind().key(),
                                markers.cutoffHz(),
                                markers.order())));
    }

    private static String inWords(FilterSettings filter) {
        return filter.kind() == FilterSettings.Kind.BUTTERWORTH
                ? String.format(Locale.ROOT, "butterworth of %.4g Hz, order %d", filter.cutoffHz(), filter.order())
                : filter.kind().key();
    }

    private static void rate(List<Finding> findings, String where, double rate, FilterSettings filter) {
        double least = LEAST_SAMPLES * filter.cutoffHz();
        if (filter.kind() == FilterSettings.Kind.BUTTERWORTH && rate < least) {
            findings.add(rateLow(
                    where,
                    String.format(
                            Locale.ROOT,
                            "%.4g Hz is less than %.0f times the cut-off of %.4g Hz; limit %.4g Hz",
                            rate,
                            LEAST_SAMPLES,
                            filter.cutoffHz(),
                            least)));
        }
    }

    /** The middle of a path's arc between two frames is off its chord by an eighth of the second difference. */
    private static void bend(List<Finding> findings, Capture capture, List<VectorSeries> markers) {
        int bent = 0;
        int known = 0;
        for (VectorSeries marker : markers) {
            for (int i = 1; i < marker.size() - 1; i++) {
                double x = marker.x(i - 1) - 2 * marker.x(i) + marker.x(i + 1);
                double y = marker.y(i - 1) - 2 * marker.y(i) + marker.y(i + 1);
                double z = marker.z(i - 1) - 2 * marker.z(i) + marker.z(i + 1);
                double bend = Math.sqrt(x * x + y * y + z * z) / 8;
                known += Double.isNaN(bend) ? 0 : 1;
                bent += bend > LARGEST_BEND ? 1 : 0;
            }
        }
        if (bent > SHARE * known) {
            findings.add(rateLow(
                    capture.name() + ", markers",
                    String.format(
                            Locale.ROOT,
                            "in %.1f %% of the frames at %.4g Hz a marker's path bends by more than %.0f mm between two of them; limit"
                                    + " %.0f %%",
                            100.0 * bent / known,
                            capture.pointRate(),
                            1e3 * LARGEST_BEND,
                            100 * SHARE)));
        }
    }

    private static Finding rateLow(String where, String figure) {
        return new Finding(
                "rate-low",
                Severity.WARNING,
                where,
                figure,
                "What happens between two samples is lost, so accelerations and the loads at impact are too small",
                "Record at a higher rate, or choose a lower cut-off if the movement allows it");
    }
}
