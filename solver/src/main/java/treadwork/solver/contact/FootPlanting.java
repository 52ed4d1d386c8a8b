package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateTop;

/**
 * In which frames a foot bears load, as far as its own motion tells: some point of its outline is planted, that is low
 * and nearly at rest. Standing and the heel's or the toe's turn as the foot rolls are all of this kind; a foot that
 * swings is low for a while but fast, one that is held up or turns round in a jump is slow for a while but high.
 */
final class FootPlanting {

    /**
     * Points count as low up to this height above their own level of standing, m. Some point of a real foot's outline stays
     * within 10 mm from landing to push-off; a landing heel is still 15 mm up 50 ms before it bears load.
     */
    private static final double LOW = 0.015;

    /**
     * Points count as at rest below this speed, m/s: in measured stance at 1.5 to 1.7 m/s some point is below 0.5 m/s
     * from 35 ms after contact to 15 ms before it ends, in swing none is below 2.9 m/s from 50 ms on.
     */
    private static final double SLOW = 0.5;

    /** Speed is taken across this time to either side, s: long enough for noise of 1 mm to be 0.04 m/s. */
    private static final double SPEED_REACH_S = 0.02;

    /** The level of standing is the height that a point is below in this share of its frames. */
    private static final double LEVEL_SHARE = 0.02;

    /** A foot that never gets as low as the other one plus this never stands, m. */
    private static final double HELD_UP = 0.05;

    /** Markers of a standing foot's outline are lower than this above the plates, m. */
    private static final double MARKER_HEIGHT = 0.15;

    /** No foot stands, or leaves the ground between two steps, for less, s. */
    private static final double SHORTEST_S = 0.05;

    private final FootOutline outline;
    private final List<BitSet> planted;
    private final BitSet bearing;

    private FootPlanting(FootOutline outline, List<BitSet> planted, BitSet bearing) {
        this.outline = outline;
        this.planted = planted;
        this.bearing = bearing;
    }

    /** Both feet together, since each tells how low the other one's points are when it stands. */
    static Map<Side, FootPlanting> of(List<FootOutline> feet, List<PlateLoad> plates, Vector3 up, Clock clock) {
        double ceiling = plates.stream()
                .mapToDouble(plate -> plate.surface().point().dot(up) + MARKER_HEIGHT)
                .max()
                .orElse(Double.POSITIVE_INFINITY);
        Map<Side, FootPlanting> planting = new EnumMap<>(Side.class);
        for (FootOutline foot : feet) {
            List<BitSet> planted = new ArrayList<>();
            for (int k = 0; k < FootOutline.POINTS; k++) {
                double level = level(foot.point(k), up);
                double lowest = lowestLevel(feet, k, up);
                double standing = level > lowest + HELD_UP ? lowest : level;
                planted.add(standing <= ceiling ? planted(foot.point(k), standing, up, clock) : new BitSet());
            }
            planting.put(foot.side(), new FootPlanting(foot, planted, bearing(planted, clock)));
        }
        return planting;
    }

    private static BitSet bearing(List<BitSet> planted, Clock clock) {
        BitSet any = new BitSet();
        planted.forEach(any::or);
        int shortest = clock.framesIn(SHORTEST_S);
        return FrameRuns.atLeast(FrameRuns.withoutHoles(any, shortest), shortest);
    }

    private static BitSet planted(VectorSeries point, double standing, Vector3 up, Clock clock) {
        int reach = Math.max(1, (int) Math.round(SPEED_REACH_S * clock.rate()));
        BitSet frames = new BitSet();
        for (int i = 0; i < point.size(); i++) {
            boolean low = point.at(i).dot(up) < standing + LOW;
            if (low && speed(point, i, reach) * clock.rate() < SLOW) {
                frames.set(i);
            }
        }
        return frames;
    }

    /** Path between the known frames {@code reach} before and after, or this one in their place, m a frame. */
    private static double speed(VectorSeries point, int i, int reach) {
        int before = i >= reach && !point.isGap(i - reach) ? i - reach : i;
        int after = i + reach < point.size() && !point.isGap(i + reach) ? i + reach : i;
        return point.at(after).minus(point.at(before)).norm() / (after - before);
    }

    private static double lowestLevel(List<FootOutline> feet, int k, Vector3 up) {
        return feet.stream().mapToDouble(foot -> level(foot.point(k), up)).min().orElseThrow();
    }

    private static double level(VectorSeries point, Vector3 up) {
        double[] heights = new double[point.size()];
        int known = 0;
        for (int i = 0; i < point.size(); i++) {
            if (!point.isGap(i)) {
                heights[known++] = point.at(i).dot(up);
            }
        }
        Arrays.sort(heights, 0, known);
        return known == 0 ? Double.POSITIVE_INFINITY : heights[(int) (LEVEL_SHARE * known)];
    }

    Side side() {
        return outline.side();
    }

    /** The frames in which the foot bears load, short flickers of either kind taken out. */
    BitSet bearing() {
        return bearing;
    }

    /** The frames in which the foot's motion tells nothing. */
    BitSet unknown() {
        BitSet unknown = new BitSet();
        for (int i = 0; i < outline.heel().size(); i++) {
            unknown.set(i, !outline.isKnown(i) && !bearing.get(i));
        }
        return unknown;
    }

    /** How far each planted point lies beyond the edge of the nearest of {@code plates}, m, sorted; empty when none is. */
    double[] overhangs(int frame, List<PlateTop> plates) {
        double[] overhangs = new double[FootOutline.POINTS];
        int count = 0;
        for (int k = 0; k < FootOutline.POINTS; k++) {
            if (planted.get(k).get(frame)) {
                double least = Double.POSITIVE_INFINITY;
                for (PlateTop plate : plates) {
                    least = Math.min(least, plate.overhang(outline.point(k).at(frame)));
                }
                overhangs[count++] = least;
            }
        }
        Arrays.sort(overhangs, 0, count);
        return Arrays.copyOf(overhangs, count);
    }
}
