package treadwork.solver.filter;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.List;
import treadwork.model.space.VectorSeries;

/**
 * Fills gaps of the markers of one segment, from each marker's own course where that is short, else from the others.
 *
 * <p>First, gaps of at most the longest length with known samples on both sides are bridged by a spline of degree five
 * through three known samples on either side, a quarter of the gap and at least two frames apart (degree three through two
 * on either side where no more are known). The spread sites keep noise small: walking movement with 0.2 mm of noise at
 * 200 Hz is filled over 0.1 s to 0.6 mm rms a component; through the neighbouring samples the same spline is off by some
 * 8 mm, one of degree three by 1.3 mm.
 *
 * <p>Then longer gaps, and those at the ends, are filled over every stretch through which three other markers of the
 * segment are known, by now, and are not on one line: the lost marker keeps its place in their axes, moved linearly from where it was
 * before the gap to where it was after it, so that its course is continuous at both ends; if it is known on one side
 * only, it stays where it was there. The places are taken from the nearest frames in which all four markers are known;
 * where these are not next to the gap, the course may jump by as much as the cluster changed its shape in between.
 *
 * <p>All else stays a gap; no marker is filled from one that was itself filled from the cluster.
 */
public final class ClusterFilling {

    /** So many markers fix a segment. */
    private static final int CARRIERS = 3;

    private ClusterFilling() {}

    /**
     * The markers with all gaps filled that can be.
     *
     * @param markers    of one segment, any axes, m, all of one length
     * @param longestGap most frames that a spline fills; 0 for none
     */
    public static FilledCluster fill(List<VectorSeries> markers, int longestGap) {
        if (longestGap < 0) {
            throw new IllegalArgumentException("longest gap must be 0 frames or more, is " + longestGap);
        }
        requireOneLength(markers);
        List<FilledGap> gaps = new ArrayList<>();
        List<VectorSeries> bridged = new ArrayList<>();
        for (int m = 0; m < markers.size(); m++) {
            bridged.add(bridged(markers.get(m), m, longestGap, gaps));
        }
        List<VectorSeries> filled = new ArrayList<>();
        for (int m = 0; m < markers.size(); m++) {
            filled.add(carried(bridged, m, gaps));
        }
        gaps.sort(Comparator.comparingInt(FilledGap::marker).thenComparingInt(FilledGap::from));
        return new FilledCluster(filled, gaps);
    }

    private static VectorSeries bridged(VectorSeries marker, int number, int longestGap, List<FilledGap> filled) {
        VectorSeries.Builder course = copy(marker);
        for (Run gap : Run.gaps(marker)) {
            if (gap.length() <= longestGap && SplineBridge.fill(marker, gap, longestGap, course)) {
                filled.add(new FilledGap(number, gap.from(), gap.to(), FilledGap.Kind.SPLINE));
            }
        }
        return course.build();
    }

    private static VectorSeries carried(List<VectorSeries> markers, int number, List<FilledGap> filled) {
        VectorSeries marker = markers.get(number);
        VectorSeries.Builder course = copy(marker);
        for (Run gap : Run.gaps(marker)) {
            for (Run stretch : carriable(markers, number, gap)) {
                Carriers.choose(markers, number, stretch).ifPresent(carriers -> {
                    carriers.carry(marker, stretch, course);
                    filled.add(new FilledGap(number, stretch.from(), stretch.to(), FilledGap.Kind.CLUSTER));
                });
            }
        }
        return course.build();
    }

    /** The stretches of a gap, each as long as it goes, throughout which the same three other markers or more are known. */
    private static List<Run> carriable(List<VectorSeries> markers, int lost, Run gap) {
        List<Run> stretches = new ArrayList<>();
        int from = gap.from();
        while (from < gap.to()) {
            BitSet throughout = knownOthers(markers, lost, from);
            int to = from + 1;
            while (to < gap.to() && stillEnough(throughout, knownOthers(markers, lost, to))) {
                to++;
            }
            if (throughout.cardinality() >= CARRIERS) {
                stretches.add(new Run(from, to));
            }
            from = to;
        }
        return stretches;
    }

    /** Takes from {@code throughout} what is not known here, if that leaves enough; else leaves it. */
    private static boolean stillEnough(BitSet throughout, BitSet here) {
        here.and(throughout);
        boolean enough = here.cardinality() >= CARRIERS;
        if (enough) {
            throughout.and(here);
        }
        return enough;
    }

    private static BitSet knownOthers(List<VectorSeries> markers, int lost, int frame) {
        BitSet known = new BitSet();
        for (int m = 0; m < markers.size(); m++) {
            known.set(m, m != lost && !markers.get(m).isGap(frame));
        }
        return known;
    }

    private static VectorSeries.Builder copy(VectorSeries series) {
        VectorSeries.Builder copy = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            copy.set(i, series.x(i), series.y(i), series.z(i));
        }
        return copy;
    }

    private static void requireOneLength(List<VectorSeries> markers) {
        for (VectorSeries marker : markers) {
            if (marker.size() != markers.get(0).size()) {
                throw new IllegalArgumentException("markers of one segment differ in length: "
                        + markers.get(0).size() + " and " + marker.size() + " frames");
            }
        }
    }
}
