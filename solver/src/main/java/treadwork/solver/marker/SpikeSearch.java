package treadwork.solver.marker;

import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.marker.MarkerScreen.MarkerPlace;

/**
 * {@code marker-noise}, single frames: a marker jumps away and is back at once, while its cluster goes on smoothly.
 *
 * <p>Seen in fourth differences: a jump by d in one frame makes them 6 d there and 4 d beside it; the movement that a cluster
 * shares hardly reaches them, and is told by the other markers.
 */
final class SpikeSearch {

    /** A jump by less is left to the filter, m. */
    static final double LIMIT = 0.012;

    /** Of a jump's size, its fourth difference. */
    private static final double GAIN = 6;

    /** A jump is this many times what the other markers of the cluster do in the same frame. */
    private static final double TIMES = 4;

    private SpikeSearch() {}

    /** The frames in which each marker that jumps does so; a finding for each. */
    static Map<MarkerPlace, BitSet> in(MarkerCluster cluster, MarkerScreen.Recording record, List<Finding> findings) {
        double[][] sizes = new double[cluster.size()][];
        for (int marker = 0; marker < sizes.length; marker++) {
            sizes[marker] = FourthDifferences.sizes(cluster.courses().get(marker));
        }
        Map<MarkerPlace, BitSet> spikes = new LinkedHashMap<>();
        for (int marker = 0; marker < sizes.length; marker++) {
            BitSet frames = new BitSet();
            for (int i = 0; i < sizes[marker].length; i++) {
                frames.set(i, isSpike(sizes, marker, i) && isBack(cluster, marker, i));
            }
            if (!frames.isEmpty()) {
                spikes.put(new MarkerPlace(cluster, marker), frames);
                findings.add(finding(cluster, marker, frames, record));
            }
        }
        return spikes;
    }

    /** Whether the marker is where its cluster takes it one frame later; one that stays away has not jumped back. */
    private static boolean isBack(MarkerCluster cluster, int marker, int frame) {
        Vector3 own = Vector3.ZERO;
        Vector3 others = Vector3.ZERO;
        int known = 0;
        for (int k = 0; k < cluster.size(); k++) {
            VectorSeries course = cluster.courses().get(k);
            Vector3 step = course.at(frame + 1).minus(course.at(frame - 1));
            if (k == marker) {
                own = step;
            } else if (!step.isGap()) {
                others = others.plus(step);
                known++;
            }
        }
        return known > 0 && own.minus(others.times(1.0 / known)).norm() < LIMIT;
    }

    private static boolean isSpike(double[][] sizes, int marker, int frame) {
        double here = sizes[marker][frame];
        if (!(here > GAIN * LIMIT)) {
            return false;
        }
        for (int i = Math.max(0, frame - 2); i <= Math.min(sizes[marker].length - 1, frame + 2); i++) {
            if (sizes[marker][i] > here) {
                return false;
            }
        }
        double others = 0;
        for (int other = 0; other < sizes.length; other++) {
            others = other != marker && sizes[other][frame] > others ? sizes[other][frame] : others;
        }
        return here > TIMES * others;
    }

    private static Finding finding(MarkerCluster cluster, int marker, BitSet frames, MarkerScreen.Recording record) {
        return new Finding(
                "marker-noise",
                Severity.REFUSES,
                record.where(cluster, marker) + ", " + Frames.inWords(Frames.runs(frames, record.firstFrame())),
                String.format(
                        Locale.ROOT,
                        "it jumps by more than %.0f mm in %d frame%s and is back at once, its cluster does not",
                        1e3 * LIMIT,
                        frames.cardinality(),
                        frames.cardinality() == 1 ? "" : "s"),
                "A filter would spread each jump over its neighbours, so the marker is taken as missing there",
                "Look at the marker in these frames where it was tracked; nothing else is needed");
    }
}
