package treadwork.model.space;

/**
 * A rotation matrix, by rows. Name one destination-from-source: {@code labFromShank.times(v)} takes the components of
 * {@code v} in shank axes to its components in lab axes; the columns are the shank's axes written in lab axes.
 */
public record Rotation(
        double xx, double xy, double xz, double yx, double yy, double yz, double zx, double zy, double zz) {

    public static final Rotation IDENTITY = new Rotation(1, 0, 0, 0, 1, 0, 0, 0, 1);

    /** A rotation that is not known. */
    public static final Rotation GAP = ofColumns(Vector3.GAP, Vector3.GAP, Vector3.GAP);

    /** The rotation whose columns are the source's axes, written in the destination's. */
    public static Rotation ofColumns(Vector3 x, Vector3 y, Vector3 z) {
        return new Rotation(x.x(), y.x(), z.x(), x.y(), y.y(), z.y(), x.z(), y.z(), z.z());
    }

    /**
     * A turn by {@code angle} rad, right-handed, about {@code axis}, by Rodrigues' formula R = I + sin a K + (1 - cos a) K².
     *
     * @param axis of length one
     */
    public static Rotation about(Vector3 axis, double angle) {
        double s = Math.sin(angle);
        double c = Math.cos(angle);
        double t = 1 - c;
        double x = axis.x();
        double y = axis.y();
        double z = axis.z();
        return new Rotation(
                t * x * x + c,
                t * x * y - s * z,
                t * x * z + s * y,
                t * x * y + s * z,
                t * y * y + c,
                t * y * z - s * x,
                t * x * z - s * y,
                t * y * z + s * x,
                t * z * z + c);
    }

    public Vector3 times(Vector3 v) {
        return new Vector3(
                xx * v.x() + xy * v.y() + xz * v.z(),
                yx * v.x() + yy * v.y() + yz * v.z(),
                zx * v.x() + zy * v.y() + zz * v.z());
    }

    /** The transpose applied to {@code v}: back from the destination's components to the source's. */
    public Vector3 transposeTimes(Vector3 v) {
        return new Vector3(
                xx * v.x() + yx * v.y() + zx * v.z(),
                xy * v.x() + yy * v.y() + zy * v.z(),
                xz * v.x() + yz * v.y() + zz * v.z());
    }

    public Rotation times(Rotation other) {
        return ofColumns(times(other.columnX()), times(other.columnY()), times(other.columnZ()));
    }

    public Rotation transpose() {
        return new Rotation(xx, yx, zx, xy, yy, zy, xz, yz, zz);
    }

    public Vector3 columnX() {
        return new Vector3(xx, yx, zx);
    }

    public Vector3 columnY() {
        return new Vector3(xy, yy, zy);
    }

    public Vector3 columnZ() {
        return new Vector3(xz, yz, zz);
    }

    public double determinant() {
        return columnX().dot(columnY().cross(columnZ()));
    }

    /** Whether any element is not known. */
    public boolean isGap() {
        return Double.isNaN(xx + xy + xz + yx + yy + yz + zx + zy + zz);
    }
}
