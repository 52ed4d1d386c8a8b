package treadwork.model.space;

/**
 * What one body does to another: a force, and a moment about a stated point.
 *
 * @param axes   axes in which all three vectors are written
 * @param point  where the moment is taken, m
 * @param force  N
 * @param moment about {@code point}, N·m
 */
public record Wrench(Axes axes, Vector3 point, Vector3 force, Vector3 moment) {

    /** The same load, its moment taken about {@code other}: M' = M + (P - P') × F. */
    public Wrench about(Vector3 other) {
        return new Wrench(axes, other, force, moment.plus(point.minus(other).cross(force)));
    }

    /**
     * Both loads together, about this wrench's point.
     *
     * @throws IllegalArgumentException if the axes differ
     */
    public Wrench plus(Wrench other) {
        axes.requireSame(other.axes, "add two wrenches");
        Wrench moved = other.about(point);
        return new Wrench(axes, point, force.plus(moved.force), moment.plus(moved.moment));
    }
}
