package treadwork.solver.dynamics;

import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/**
 * What a neighbour does to a segment, a frame, lab axes.
 *
 * @param point  where the moment is taken, m; it may move
 * @param force  N; a gap where the load is not known
 * @param moment about {@code point}, N·m
 */
public record LoadSeries(VectorSeries point, VectorSeries force, VectorSeries moment) {

    /** What the ground does to a foot. */
    public static LoadSeries of(WrenchSeries reaction) {
        return new LoadSeries(
                VectorSeries.constant(reaction.point(), reaction.size()), reaction.force(), reaction.moment());
    }

    /** What the segment does to that neighbour in return. */
    LoadSeries reaction() {
        return new LoadSeries(point, negated(force), negated(moment));
    }

    private static VectorSeries negated(VectorSeries series) {
        VectorSeries.Builder builder = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            builder.set(i, -series.x(i), -series.y(i), -series.z(i));
        }
        return builder.build();
    }

    /** The moment of frame {@code i} about another point: M + (P - Q) × F. */
    Vector3 momentAbout(Vector3 other, int i) {
        return moment.at(i).plus(point.at(i).minus(other).cross(force.at(i)));
    }
}
