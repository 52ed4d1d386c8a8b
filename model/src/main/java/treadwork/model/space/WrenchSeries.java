package treadwork.model.space;

/**
 * What one body does to another, a frame, lab axes: a force, N, and a moment, N·m, about a point that stays where it is.
 *
 * @param point  fixed point of the moment, m
 * @param force  a gap where the load is not known
 * @param moment about {@code point}
 */
public record WrenchSeries(Vector3 point, VectorSeries force, VectorSeries moment) {

    public WrenchSeries {
        if (force.size() != moment.size()) {
            throw new IllegalArgumentException(force.size() + " forces beside " + moment.size() + " moments");
        }
    }

    public int size() {
        return force.size();
    }

    public Wrench at(int i) {
        return new Wrench(Axes.LAB, point, force.at(i), moment.at(i));
    }

    /** The samples from {@code from} on, every {@code step}th, {@code count} of them. */
    public WrenchSeries every(int from, int step, int count) {
        return new WrenchSeries(point, force.every(from, step, count), moment.every(from, step, count));
    }
}
