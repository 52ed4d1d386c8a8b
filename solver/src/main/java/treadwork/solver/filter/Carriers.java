package treadwork.solver.filter;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * Three markers that carry a lost one over a gap, and the frames from which its place in their axes is known.
 *
 * @param triangle the three
 * @param before   the last frame before the gap with all four known, -1 if there is none
 * @param after    the first frame after the gap with all four known, -1 if there is none
 */
record Carriers(Triangle triangle, int before, int after) {

    /** Least height of the three's triangle as a share of its longest side: our choice, flatter ones carry nothing. */
    private static final double FLATTEST = 0.1;

    private static final int NONE = -1;

    /**
     * The best three of the other markers: known throughout the gap, nowhere near one line, and with the lost marker
     * known together with them on both sides rather than one, near the gap rather than far; of those alike in this, with
     * the largest least height of their triangle.
     *
     * @return empty when no three are so
     */
    static Optional<Carriers> choose(List<VectorSeries> markers, int lost, Run gap) {
        List<VectorSeries> others = new ArrayList<>();
        for (int m = 0; m < markers.size(); m++) {
            if (m != lost && isKnown(markers.get(m), gap)) {
                others.add(markers.get(m));
            }
        }
        List<Carriers> choices = new ArrayList<>();
        for (int a = 0; a < others.size(); a++) {
            for (int b = a + 1; b < others.size(); b++) {
                for (int c = b + 1; c < others.size(); c++) {
                    Triangle three = Triangle.onLongestSide(others.get(a), others.get(b), others.get(c), gap.from());
                    choices.add(of(three, markers.get(lost), gap));
                }
            }
        }
        return choices.stream()
                .filter(choice -> choice.sides() > 0 && !choice.isFlatSomewhere(gap))
                .min(Comparator.comparingInt((Carriers choice) -> -choice.sides())
                        .thenComparingInt(choice -> choice.framesFrom(gap))
                        .thenComparingDouble(choice -> -choice.leastHeight(gap)));
    }

    private static Carriers of(Triangle triangle, VectorSeries lost, Run gap) {
        int before = gap.from() - 1;
        while (before >= 0 && (lost.isGap(before) || triangle.isGap(before))) {
            before--;
        }
        int after = gap.to();
        while (after < lost.size() && (lost.isGap(after) || triangle.isGap(after))) {
            after++;
        }
        return new Carriers(triangle, before, after < lost.size() ? after : NONE);
    }

    /** Writes the lost marker's positions in the gap into {@code course}. */
    void carry(VectorSeries lost, Run gap, VectorSeries.Builder course) {
        int start = before == NONE ? after : before;
        int end = after == NONE ? before : after;
        Vector3 from = triangle.local(start, lost.at(start));
        Vector3 change = triangle.local(end, lost.at(end)).minus(from);
        for (int i = gap.from(); i < gap.to(); i++) {
            double share = start == end ? 0 : (double) (i - start) / (end - start);
            course.set(i, triangle.lab(i, from.plus(change.times(share))));
        }
    }

    private static boolean isKnown(VectorSeries marker, Run run) {
        for (int i = run.from(); i < run.to(); i++) {
            if (marker.isGap(i)) {
                return false;
            }
        }
        return true;
    }

    private int sides() {
        return (before == NONE ? 0 : 1) + (after == NONE ? 0 : 1);
    }

    private int framesFrom(Run gap) {
        return (before == NONE ? 0 : gap.from() - 1 - before) + (after == NONE ? 0 : after - gap.to());
    }

    private boolean isFlatSomewhere(Run gap) {
        boolean flat = (before != NONE && triangle.isFlat(before, FLATTEST))
                || (after != NONE && triangle.isFlat(after, FLATTEST));
        for (int i = gap.from(); i < gap.to() && !flat; i++) {
            flat = triangle.isFlat(i, FLATTEST);
        }
        return flat;
    }

    private double leastHeight(Run gap) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = gap.from(); i < gap.to(); i++) {
            least = Math.min(least, triangle.height(i));
        }
        return least;
    }

    /**
     * Three markers and the axes they make: origin in the middle of the three, X along the base, Z along the normal of
     * their plane, Y = Z × X.
     */
    record Triangle(VectorSeries baseStart, VectorSeries baseEnd, VectorSeries tip) {

        /** The three so that the base is their longest side in {@code frame}: its direction suffers least from noise. */
        static Triangle onLongestSide(VectorSeries a, VectorSeries b, VectorSeries c, int frame) {
            double ab = b.at(frame).minus(a.at(frame)).norm();
            double bc = c.at(frame).minus(b.at(frame)).norm();
            double ca = a.at(frame).minus(c.at(frame)).norm();
            if (ab >= bc && ab >= ca) {
                return new Triangle(a, b, c);
            }
            return bc >= ca ? new Triangle(b, c, a) : new Triangle(c, a, b);
        }

        boolean isGap(int frame) {
            return baseStart.isGap(frame) || baseEnd.isGap(frame) || tip.isGap(frame);
        }

        /** Distance of the tip from the line of the base, m. */
        double height(int frame) {
            return base(frame).unit().cross(side(frame)).norm();
        }

        /** Whether the height is less than this share of the base; a triangle without size is flat. */
        boolean isFlat(int frame, double share) {
            return !(height(frame) >= share * base(frame).norm());
        }

        /** A place in lab axes as seen in the three's. */
        Vector3 local(int frame, Vector3 place) {
            return labFromThree(frame).transposeTimes(place.minus(middle(frame)));
        }

        /** A place in the three's axes as seen in the lab. */
        Vector3 lab(int frame, Vector3 place) {
            return labFromThree(frame).times(place).plus(middle(frame));
        }

        private Vector3 base(int frame) {
            return baseEnd.at(frame).minus(baseStart.at(frame));
        }

        private Vector3 side(int frame) {
            return tip.at(frame).minus(baseStart.at(frame));
        }

        private Vector3 middle(int frame) {
            return baseStart.at(frame).plus(base(frame).plus(side(frame)).times(1.0 / 3));
        }

        private Rotation labFromThree(int frame) {
            Vector3 x = base(frame).unit();
            Vector3 z = x.cross(side(frame)).unit();
            return Rotation.ofColumns(x, z.cross(x), z);
        }
    }
}
