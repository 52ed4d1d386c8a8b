package treadwork.solver.filter;

import java.util.Arrays;
import treadwork.model.space.VectorSeries;

/**
 * A spline over one gap, through known samples on either side that lie a quarter of the gap apart.
 *
 * <p>Samples next to one another would give the slope and the bend at the gap's edges as differences over a frame, and
 * their noise would grow with the gap; spread with it, the sites keep their weights. On walking movement of up to 6 Hz
 * with 0.2 mm of noise, gaps of 0.1 s at 100 and 200 Hz came out best, or within a tenth of it, at a quarter of the gap.
 */
final class SplineBridge {

    private static final int SITES_PER_SIDE = 3;

    /** Frames between two sites beside the shortest gaps. */
    private static final int CLOSEST = 2;

    private SplineBridge() {}

    /**
     * Writes the gap's frames into {@code course}.
     *
     * @param reach frames by which a site may lie further off, across other gaps, than three steps
     * @return false, and nothing written, when fewer than two known samples lie within reach on either side
     */
    static boolean fill(VectorSeries marker, Run gap, int reach, VectorSeries.Builder course) {
        int[] before = sites(marker, gap, reach, -1);
        int[] after = sites(marker, gap, reach, 1);
        int perSide = Math.min(before.length, after.length);
        if (perSide < SITES_PER_SIDE - 1) {
            return false;
        }
        int[] sites = new int[2 * perSide];
        for (int i = 0; i < perSide; i++) {
            sites[perSide - 1 - i] = before[i];
            sites[perSide + i] = after[i];
        }
        write(marker, sites, gap, course);
        return true;
    }

    private static void write(VectorSeries marker, int[] sites, Run gap, VectorSeries.Builder course) {
        int n = sites.length;
        double[] at = new double[n];
        double[] x = new double[n];
        double[] y = new double[n];
        double[] z = new double[n];
        for (int i = 0; i < n; i++) {
            // Counted from the gap: small numbers keep their digits.
            at[i] = sites[i] - gap.from();
            x[i] = marker.x(sites[i]);
            y[i] = marker.y(sites[i]);
            z[i] = marker.z(sites[i]);
        }
        Spline spline = Spline.through(n - 1, at);
        spline.solve(x, 0);
        spline.solve(y, 0);
        spline.solve(z, 0);
        for (int i = gap.from(); i < gap.to(); i++) {
            int u = i - gap.from();
            course.set(i, spline.at(u, 0, x), spline.at(u, 0, y), spline.at(u, 0, z));
        }
    }

    /** Known frames on one side, the nearest first, closer together where three are not found else. */
    private static int[] sites(VectorSeries marker, Run gap, int reach, int direction) {
        int[] sites = {};
        for (int step = Math.max(CLOSEST, (gap.length() + 3) / 4); step >= 1; step--) {
            int[] found = sites(marker, gap, new Search(direction, step, reach + SITES_PER_SIDE * step));
            if (found.length > sites.length) {
                sites = found;
            }
        }
        return sites;
    }

    private static int[] sites(VectorSeries marker, Run gap, Search search) {
        int[] sites = new int[SITES_PER_SIDE];
        int edge = search.direction < 0 ? gap.from() - 1 : gap.to();
        int found = 0;
        int away = 0;
        while (found < SITES_PER_SIDE && away <= search.furthest) {
            int frame = edge + search.direction * away;
            if (frame < 0 || frame >= marker.size()) {
                break;
            }
            boolean known = !marker.isGap(frame);
            if (known) {
                sites[found++] = frame;
            }
            away += known ? search.step : 1;
        }
        return Arrays.copyOf(sites, found);
    }

    /**
     * A way to go from the gap.
     *
     * @param direction -1 backward, 1 forward
     * @param step      least frames between two sites
     * @param furthest  most frames from the gap's edge
     */
    private record Search(int direction, int step, int furthest) {}
}
