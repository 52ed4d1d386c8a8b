package treadwork.model.space;

/** A point or a free vector in three dimensions; which axes and which unit, its holder says. */
public record Vector3(double x, double y, double z) {

    public static final Vector3 ZERO = new Vector3(0, 0, 0);

    /** A vector that is not known. */
    public static final Vector3 GAP = new Vector3(Double.NaN, Double.NaN, Double.NaN);

    public Vector3 plus(Vector3 other) {
        return new Vector3(x + other.x, y + other.y, z + other.z);
    }

    public Vector3 minus(Vector3 other) {
        return new Vector3(x - other.x, y - other.y, z - other.z);
    }

    public Vector3 times(double factor) {
        return new Vector3(x * factor, y * factor, z * factor);
    }

    public Vector3 negated() {
        return new Vector3(-x, -y, -z);
    }

    public double dot(Vector3 other) {
        return x * other.x + y * other.y + z * other.z;
    }

    public Vector3 cross(Vector3 other) {
        return new Vector3(y * other.z - z * other.y, z * other.x - x * other.z, x * other.y - y * other.x);
    }

    public double norm() {
        return Math.sqrt(dot(this));
    }

    /** This direction with length one; a gap when the length is zero or not known. */
    public Vector3 unit() {
        double length = norm();
        return length > 0 ? times(1 / length) : GAP;
    }

    /** The point halfway to {@code other}. */
    public Vector3 midpoint(Vector3 other) {
        return plus(other).times(0.5);
    }

    /** Whether any component is not known. */
    public boolean isGap() {
        return Double.isNaN(x + y + z);
    }
}
