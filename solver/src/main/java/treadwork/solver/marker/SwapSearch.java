package treadwork.solver.marker;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.model.space.VectorSeries;
import treadwork.solver.marker.MarkerScreen.MarkerPlace;
import treadwork.solver.pose.RigidFit;

/**
 * Looks for exchanged labels: frames in which a cluster has not its standing shape, and has it once two of its labels, or one
 * of its and one of another cluster that has lost its shape at the same time, are exchanged.
 */
final class SwapSearch {

    /** A distance between two markers that has changed by less is skin motion, m. */
    private static final double SUSPECT = 0.02;

    /** Clusters on skin fit their standing shape to this, root mean square, m: soft tissue moves them by 5 to 10 mm. */
    static final double FITS = 0.015;

    /** Exchanged labels miss the shape by at least this, m ... */
    private static final double MISSES = 0.012;

    /** ... and by this many times what is left when they are exchanged. */
    private static final double TIMES = 2;

    /** Frames between two exchanged ones that are too few to tell apart. */
    private static final int HOLE = 2;

    private final List<MarkerCluster> clusters;
    private final List<RigidFit> fits;
    private final Map<String, Found> found = new LinkedHashMap<>();

    private SwapSearch(List<MarkerCluster> clusters) {
        this.clusters = clusters;
        fits = clusters.stream()
                .map(cluster -> new RigidFit(cluster.template()))
                .toList();
    }

    static List<Swap> in(List<MarkerCluster> clusters) {
        SwapSearch search = new SwapSearch(clusters);
        List<BitSet> suspect = clusters.stream().map(SwapSearch::suspect).toList();
        for (int a = 0; a < clusters.size(); a++) {
            BitSet frames = suspect.get(a);
            for (int i = frames.nextSetBit(0); i >= 0; i = frames.nextSetBit(i + 1)) {
                if (!search.within(a, i)) {
                    for (int b = a + 1; b < clusters.size(); b++) {
                        if (suspect.get(b).get(i)) {
                            search.between(a, b, i);
                        }
                    }
                }
            }
        }
        return search.found.values().stream().map(Found::swap).toList();
    }

    private static BitSet suspect(MarkerCluster cluster) {
        BitSet suspect = new BitSet();
        for (int one = 0; one < cluster.size(); one++) {
            for (int other = one + 1; other < cluster.size(); other++) {
                double standing = cluster.standingDistance(one, other);
                for (int i = 0; i < cluster.frames(); i++) {
                    if (Math.abs(cluster.distance(one, other, i) - standing) > SUSPECT) {
                        suspect.set(i);
                    }
                }
            }
        }
        return suspect;
    }

    /** Root mean square misfit of a cluster with these courses in a frame; NaN where it cannot be fitted. */
    private double misfit(int cluster, List<VectorSeries> courses, int frame) {
        RigidFit fit = fits.get(cluster);
        return fit.fit(courses, frame) ? Math.sqrt(fit.squares() / fit.known()) : Double.NaN;
    }

    private boolean within(int a, int frame) {
        MarkerCluster cluster = clusters.get(a);
        double before = misfit(a, cluster.courses(), frame);
        double least = Double.POSITIVE_INFINITY;
        int first = -1;
        int second = -1;
        for (int one = 0; one < cluster.size(); one++) {
            for (int other = one + 1; other < cluster.size(); other++) {
                double after = misfit(a, exchanged(cluster.courses(), one, other), frame);
                if (after < least) {
                    least = after;
                    first = one;
                    second = other;
                }
            }
        }
        if (!mends(before, least)) {
            return false;
        }
        add(new MarkerPlace(cluster, first), new MarkerPlace(cluster, second), frame, before, least);
        return true;
    }

    private void between(int a, int b, int frame) {
        MarkerCluster one = clusters.get(a);
        MarkerCluster other = clusters.get(b);
        double beforeOne = misfit(a, one.courses(), frame);
        double beforeOther = misfit(b, other.courses(), frame);
        List<Integer> strangers = strangers(other, frame);
        for (int i : strangers.isEmpty() ? strangers : strangers(one, frame)) {
            for (int k : strangers) {
                double afterOne =
                        misfit(a, with(one.courses(), i, other.courses().get(k)), frame);
                double afterOther =
                        misfit(b, with(other.courses(), k, one.courses().get(i)), frame);
                if (mends(beforeOne, afterOne) && mends(beforeOther, afterOther)) {
                    add(
                            new MarkerPlace(one, i),
                            new MarkerPlace(other, k),
                            frame,
                            Math.max(beforeOne, beforeOther),
                            Math.max(afterOne, afterOther));
                    return;
                }
            }
        }
    }

    /** The markers without which the rest of the cluster has its standing shape: one of them may be another cluster's. */
    private static List<Integer> strangers(MarkerCluster cluster, int frame) {
        List<Integer> strangers = new ArrayList<>();
        for (int marker = 0; marker < cluster.size(); marker++) {
            boolean restFits = true;
            for (int one = 0; one < cluster.size(); one++) {
                for (int other = one + 1; other < cluster.size(); other++) {
                    double change = cluster.distance(one, other, frame) - cluster.standingDistance(one, other);
                    restFits &= one == marker || other == marker || !(Math.abs(change) > SUSPECT);
                }
            }
            if (restFits) {
                strangers.add(marker);
            }
        }
        return strangers;
    }

    private static boolean mends(double before, double after) {
        return before > MISSES && after < FITS && before > TIMES * after;
    }

    private static List<VectorSeries> exchanged(List<VectorSeries> courses, int one, int other) {
        return with(with(courses, one, courses.get(other)), other, courses.get(one));
    }

    private static List<VectorSeries> with(List<VectorSeries> courses, int place, VectorSeries course) {
        List<VectorSeries> changed = new ArrayList<>(courses);
        changed.set(place, course);
        return changed;
    }

    private void add(MarkerPlace first, MarkerPlace second, int frame, double before, double after) {
        found.computeIfAbsent(first.label() + "\n" + second.label(), key -> new Found(first, second))
                .add(frame, before, after);
    }

    /** The frames of one exchange as they come. */
    private static final class Found {

        private final MarkerPlace first;
        private final MarkerPlace second;
        private final BitSet frames = new BitSet();
        private double before;
        private double after;
        private int count;

        Found(MarkerPlace first, MarkerPlace second) {
            this.first = first;
            this.second = second;
        }

        void add(int frame, double misfit, double mended) {
            int last = frames.previousSetBit(frame);
            frames.set(last >= 0 && frame - last <= HOLE + 1 ? last : frame, frame + 1);
            before += misfit;
            after += mended;
            count++;
        }

        Swap swap() {
            return new Swap(first, second, frames, before / count, after / count);
        }
    }
}
