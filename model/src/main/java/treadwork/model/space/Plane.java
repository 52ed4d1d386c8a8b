package treadwork.model.space;

/**
 * A plane through {@code point}.
 *
 * @param point  any point of it, m
 * @param normal of length one, on the side that counts as above
 */
public record Plane(Vector3 point, Vector3 normal) {

    /** How far {@code other} lies above the plane, m. */
    public double heightOf(Vector3 other) {
        return other.minus(point).dot(normal);
    }
}
