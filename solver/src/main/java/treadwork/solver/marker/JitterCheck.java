package treadwork.solver.marker;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.VectorSeries;

/**
 * {@code marker-noise}, throughout: a marker that jitters more than its peers.
 *
 * <p>Measured by the median length of {@link FourthDifferences}, whatever a few frames do.
 */
final class JitterCheck {

    /** Good systems are below 0.5 mm; filtered at 6 Hz, 2 mm shakes a hip moment by some newton metres, m. */
    static final double LIMIT = 0.002;

    /** ... and more than this many times the median of its cluster. */
    private static final double TIMES = 3;

    private static final int FEWEST = 20;

    /** Of the length of three independent normal numbers of standard deviation 1: √2.366, the median of χ² with three. */
    private static final double MEDIAN = 1.538;

    private JitterCheck() {}

    static List<Finding> of(MarkerCluster cluster, MarkerScreen.Recording record) {
        double[] jitter =
                cluster.courses().stream().mapToDouble(JitterCheck::jitter).toArray();
        double[] sorted = Arrays.stream(jitter)
                .filter(value -> !Double.isNaN(value))
                .sorted()
                .toArray();
        List<Finding> findings = new ArrayList<>();
        for (int marker = 0; marker < jitter.length; marker++) {
            double peers = sorted.length == 0 ? Double.NaN : sorted[(sorted.length - 1) / 2];
            if (jitter[marker] > Math.max(LIMIT, TIMES * peers)) {
                findings.add(new Finding(
                        "marker-noise",
                        Severity.WARNING,
                        record.where(cluster, marker),
                        String.format(
                                Locale.ROOT,
                                "it jitters by %.1f mm, its cluster by %.1f mm; limit %.1f mm",
                                1e3 * jitter[marker],
                                1e3 * peers,
                                1e3 * Math.max(LIMIT, TIMES * peers)),
                        "Accelerations magnify jitter, so the loads of this segment and those above it shake",
                        "Look at how the marker was tracked, or leave it out of the cluster"));
            }
        }
        return findings;
    }

    /** Of one component, m; NaN where too little is known. */
    private static double jitter(VectorSeries course) {
        double[] sizes = Arrays.stream(FourthDifferences.sizes(course))
                .filter(size -> !Double.isNaN(size))
                .sorted()
                .toArray();
        return sizes.length < FEWEST ? Double.NaN : sizes[sizes.length / 2] / MEDIAN / Math.sqrt(70);
    }
}
