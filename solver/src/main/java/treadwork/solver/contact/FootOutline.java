package treadwork.solver.contact;

import java.util.List;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * The outline of a foot's sole as its landmarks give it, going round: heel, fifth metatarsal head, toe, first metatarsal
 * head. Lab axes, m, a frame.
 */
public record FootOutline(Side side, VectorSeries heel, VectorSeries fifth, VectorSeries toe, VectorSeries first) {

    static final int POINTS = 4;

    public FootOutline {
        int size = heel.size();
        if (fifth.size() != size || toe.size() != size || first.size() != size) {
            throw new IllegalArgumentException("the points of an outline have " + size + ", " + fifth.size() + ", "
                    + toe.size() + " and " + first.size() + " frames");
        }
    }

    /** The four points, going round. */
    List<VectorSeries> points() {
        return List.of(heel, fifth, toe, first);
    }

    boolean isKnown(int frame) {
        return !heel.isGap(frame) && !fifth.isGap(frame) && !toe.isGap(frame) && !first.isGap(frame);
    }

    /**
     * How far {@code point} lies outside the outline, both seen along {@code normal}, m; 0 inside, NaN where the outline is
     * not known. A point is inside when it is on the same side of all four edges.
     */
    public double distance(Vector3 point, int frame, Vector3 normal) {
        if (!isKnown(frame)) {
            return Double.NaN;
        }
        double nearest = Double.POSITIVE_INFINITY;
        int left = 0;
        int right = 0;
        for (int k = 0; k < POINTS; k++) {
            Vector3 from = point(k).at(frame);
            Vector3 edge = level(point((k + 1) % POINTS).at(frame).minus(from), normal);
            Vector3 arm = level(point.minus(from), normal);
            double turn = edge.cross(arm).dot(normal);
            left += turn >= 0 ? 1 : 0;
            right += turn <= 0 ? 1 : 0;
            double length = edge.dot(edge);
            double along = length > 0 ? Math.min(1, Math.max(0, arm.dot(edge) / length)) : 0;
            nearest = Math.min(nearest, arm.minus(edge.times(along)).norm());
        }
        return left == POINTS || right == POINTS ? 0 : nearest;
    }

    VectorSeries point(int k) {
        return switch (k) {
            case 0 -> heel;
            case 1 -> fifth;
            case 2 -> toe;
            default -> first;
        };
    }

    private static Vector3 level(Vector3 v, Vector3 normal) {
        return v.minus(normal.times(v.dot(normal)));
    }
}
