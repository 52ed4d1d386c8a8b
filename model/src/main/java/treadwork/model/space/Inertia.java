package treadwork.model.space;

/**
 * An inertia tensor, kg·m², about a stated point in stated axes. The six numbers are the matrix's own elements, so a
 * product of inertia carries the sign that it has in the matrix.
 */
public record Inertia(double xx, double yy, double zz, double xy, double xz, double yz) {

    public static final Inertia ZERO = new Inertia(0, 0, 0, 0, 0, 0);

    /** A tensor whose axes are its principal ones. */
    public static Inertia diagonal(double xx, double yy, double zz) {
        return new Inertia(xx, yy, zz, 0, 0, 0);
    }

    public Vector3 times(Vector3 v) {
        return new Vector3(
                xx * v.x() + xy * v.y() + xz * v.z(),
                xy * v.x() + yy * v.y() + yz * v.z(),
                xz * v.x() + yz * v.y() + zz * v.z());
    }

    public Inertia plus(Inertia other) {
        return new Inertia(xx + other.xx, yy + other.yy, zz + other.zz, xy + other.xy, xz + other.xz, yz + other.yz);
    }

    public Inertia times(double factor) {
        return new Inertia(xx * factor, yy * factor, zz * factor, xy * factor, xz * factor, yz * factor);
    }

    /** The same tensor in other axes: R I Rᵀ. */
    public Inertia in(Rotation newFromOld) {
        Rotation transposed = newFromOld.transpose();
        Vector3 x = newFromOld.times(times(transposed.columnX()));
        Vector3 y = newFromOld.times(times(transposed.columnY()));
        Vector3 z = newFromOld.times(times(transposed.columnZ()));
        return new Inertia(x.x(), y.y(), z.z(), x.y(), x.z(), y.z());
    }

    /** What a point mass at {@code arm} from the reference point adds (parallel axes): m (|d|² E - d dᵀ). */
    public static Inertia ofPointMass(double mass, Vector3 arm) {
        double square = arm.dot(arm);
        return new Inertia(
                mass * (square - arm.x() * arm.x()),
                mass * (square - arm.y() * arm.y()),
                mass * (square - arm.z() * arm.z()),
                -mass * arm.x() * arm.y(),
                -mass * arm.x() * arm.z(),
                -mass * arm.y() * arm.z());
    }

    /**
     * Whether a real body can have this tensor: positive definite, and no principal moment above the sum of the other
     * two. The second holds exactly when tr(I)/2 E - I, the tensor of second moments, has no negative eigenvalue.
     */
    public boolean isPhysical() {
        double half = (xx + yy + zz) / 2;
        Inertia secondMoments = new Inertia(half - xx, half - yy, half - zz, -xy, -xz, -yz);
        double rounding = 1e-12 * half;
        return principalMinorsAtLeast(0) && secondMoments.principalMinorsAtLeast(-rounding);
    }

    private boolean principalMinorsAtLeast(double least) {
        double determinant = xx * (yy * zz - yz * yz) - xy * (xy * zz - yz * xz) + xz * (xy * yz - yy * xz);
        return xx >= least
                && yy >= least
                && zz >= least
                && xx * yy - xy * xy >= least
                && xx * zz - xz * xz >= least
                && yy * zz - yz * yz >= least
                && determinant >= least;
    }
}
