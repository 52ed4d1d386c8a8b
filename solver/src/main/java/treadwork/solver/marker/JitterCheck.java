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
 * <p>Measured by fourth differences, which movement hardly reaches: of white noise they have √70 times its standard deviation.
 * The median of their sizes over 0.6745 is that deviation, whatever a few frames do.
 */
final class JitterCheck {

    /** Good systems are below 0.5 mm; filtered at 6 Hz, 2 mm shakes a hip moment by some newton metres, m. */
    static final double LIMIT = 0.002;

    /** ... and more than this many times the median of its cluster. */
    private static final double TIMES = 3;

    private static final int FEWEST = 20;

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

    private static double jitter(VectorSeries course) {
        double[] sizes = new double[3 * course.size()];
        int count = 0;
        for (int i = 2; i < course.size() - 2; i++) {
            double x = difference(course.x(i - 2), course.x(i - 1), course.x(i), course.x(i + 1), course.x(i + 2));
            double y = difference(course.y(i - 2), course.y(i - 1), course.y(i), course.y(i + 1), course.y(i + 2));
            double z = difference(course.z(i - 2), course.z(i - 1), course.z(i), course.z(i + 1), course.z(i + 2));
            if (!Double.isNaN(x + y + z)) {
                sizes[count++] = Math.abs(x);
                sizes[count++] = Math.abs(y);
                sizes[count++] = Math.abs(z);
            }
        }
        if (count < FEWEST) {
            return Double.NaN;
        }
        Arrays.sort(sizes, 0, count);
        return sizes[count / 2] / 0.6745 / Math.sqrt(70);
    }

    private static double difference(double a, double b, double c, double d, double e) {
        return a - 4 * b + 6 * c - 4 * d + e;
    }
}
