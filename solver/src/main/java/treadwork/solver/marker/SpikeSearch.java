package treadwork.solver.marker;

import java.util.Arrays;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.solver.marker.MarkerScreen.MarkerPlace;

/**
 * {@code marker-noise}, single frames: a marker jumps away from its cluster and is back at once. Seen in its distances from
 * the others, which the cluster's own motion does not change.
 */
final class SpikeSearch {

    /** From the median of five frames, m: skin does not move so in a hundredth of a second. */
    static final double LIMIT = 0.015;

    private static final int WINDOW = 5;

    private SpikeSearch() {}

    /** The frames in which each marker that jumps does so; a finding for each. */
    static Map<MarkerPlace, BitSet> in(MarkerCluster cluster, MarkerScreen.Recording record, List<Finding> findings) {
        int n = cluster.size();
        int frames = cluster.frames();
        int[][] jumps = new int[n][frames];
        for (int one = 0; one < n; one++) {
            for (int other = one + 1; other < n; other++) {
                BitSet jumped = jumps(cluster, one, other);
                for (int i = jumped.nextSetBit(0); i >= 0; i = jumped.nextSetBit(i + 1)) {
                    jumps[one][i]++;
                    jumps[other][i]++;
                }
            }
        }
        Map<MarkerPlace, BitSet> spikes = new LinkedHashMap<>();
        for (int marker = 0; marker < n; marker++) {
            BitSet frame = new BitSet();
            for (int i = 0; i < frames; i++) {
                // The one that jumped does so from two others at least; each of those only from it.
                frame.set(i, jumps[marker][i] >= 2);
            }
            if (!frame.isEmpty()) {
                spikes.put(new MarkerPlace(cluster, marker), frame);
                findings.add(finding(cluster, marker, frame, record));
            }
        }
        return spikes;
    }

    private static BitSet jumps(MarkerCluster cluster, int one, int other) {
        BitSet jumped = new BitSet();
        double[] window = new double[WINDOW];
        for (int i = WINDOW / 2; i < cluster.frames() - WINDOW / 2; i++) {
            for (int k = 0; k < WINDOW; k++) {
                window[k] = cluster.distance(one, other, i + k - WINDOW / 2);
            }
            double here = window[WINDOW / 2];
            if (Math.abs(here - window[0]) > LIMIT || Math.abs(here - window[WINDOW - 1]) > LIMIT) {
                Arrays.sort(window);
                jumped.set(i, Math.abs(here - window[WINDOW / 2]) > LIMIT);
            }
        }
        return jumped;
    }

    private static Finding finding(MarkerCluster cluster, int marker, BitSet frames, MarkerScreen.Recording record) {
        return new Finding(
                "marker-noise",
                Severity.REFUSES,
                record.where(cluster, marker) + ", " + Frames.inWords(Frames.runs(frames, record.firstFrame())),
                String.format(
                        Locale.ROOT,
                        "it jumps by more than %.0f mm against its cluster in %d frames and is back at once",
                        1e3 * LIMIT,
                        frames.cardinality()),
                "A filter would spread each jump over its neighbours, so the marker is taken as missing there",
                "Look at the marker in these frames where it was tracked; nothing else is needed");
    }
}
