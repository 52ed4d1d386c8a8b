package treadwork.solver.marker;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/**
 * {@code cluster-shape}: distances between a segment's markers differ from standing ones by more than skin moves, on average
 * over the movement or over one half of it. Skin comes and goes with every step, so it averages out; a marker that has
 * slipped does not.
 */
final class ShapeCheck {

    /**
     * On average over a few steps, m. Real clusters of four on a shank differ by 5.5 mm between standing and walking (open
     * recordings); a marker this far off turns a segment by some 5 degrees.
     */
    static final double LIMIT = 0.012;

    /** A half of the movement is looked at by itself when it has this many seconds. */
    private static final double LEAST_S = 0.5;

    private ShapeCheck() {}

    static List<Finding> of(MarkerCluster cluster, MarkerScreen.Recording record) {
        int frames = cluster.frames();
        Change worst = change(cluster, 0, frames);
        if (frames >= 2 * LEAST_S * record.rate()) {
            worst = worse(worst, change(cluster, 0, frames / 2));
            worst = worse(worst, change(cluster, frames / 2, frames));
        }
        if (!(worst.greatest > LIMIT)) {
            return List.of();
        }
        List<Finding> findings = new ArrayList<>();
        findings.add(new Finding(
                "cluster-shape",
                Severity.WARNING,
                record.where(cluster, worst.marker),
                String.format(
                        Locale.ROOT,
                        "its distances from the other markers of the cluster differ from standing by up to %.0f mm on average;"
                                + " limit %.0f mm",
                        1e3 * worst.greatest,
                        1e3 * LIMIT),
                "The marker seems to have slipped, or to be another one, which turns the segment and shifts its joint centres",
                "Leave the marker out of the cluster where three others remain, or record a new standing capture"));
        return findings;
    }

    /** The marker whose distances have changed most together, and its greatest change, m. */
    private record Change(int marker, double sum, double greatest) {}

    private static Change worse(Change one, Change other) {
        return other.greatest > one.greatest ? other : one;
    }

    private static Change change(MarkerCluster cluster, int from, int end) {
        int n = cluster.size();
        double[][] change = new double[n][n];
        for (int one = 0; one < n; one++) {
            for (int other = one + 1; other < n; other++) {
                double mean = meanDistance(cluster, one, other, from, end);
                change[one][other] = Math.abs(mean - cluster.standingDistance(one, other));
                change[other][one] = change[one][other];
            }
        }
        Change worst = new Change(0, 0, 0);
        for (int marker = 0; marker < n; marker++) {
            double sum = 0;
            double greatest = 0;
            for (double value : change[marker]) {
                sum += Double.isNaN(value) ? 0 : value;
                greatest = value > greatest ? value : greatest;
            }
            worst = sum > worst.sum ? new Change(marker, sum, greatest) : worst;
        }
        return worst;
    }

    private static double meanDistance(MarkerCluster cluster, int one, int other, int from, int end) {
        double sum = 0;
        int known = 0;
        for (int i = from; i < end; i++) {
            double distance = cluster.distance(one, other, i);
            if (!Double.isNaN(distance)) {
                sum += distance;
                known++;
            }
        }
        return known == 0 ? Double.NaN : sum / known;
    }
}
