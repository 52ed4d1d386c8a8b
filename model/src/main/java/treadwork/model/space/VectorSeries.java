package treadwork.model.space;

import java.util.Arrays;
import java.util.function.UnaryOperator;

/** One vector a frame or sample, held as three arrays so that filters run along memory; a vector with a NaN is a gap. */
public final class VectorSeries {

    private final double[] x;
    private final double[] y;
    private final double[] z;

    private VectorSeries(double[] x, double[] y, double[] z) {
        if (x.length != y.length || x.length != z.length) {
            throw new IllegalArgumentException(
                    "components differ in length: " + x.length + ", " + y.length + ", " + z.length);
        }
        this.x = x;
        this.y = y;
        this.z = z;
    }

    public static VectorSeries of(double[] x, double[] y, double[] z) {
        return new VectorSeries(x.clone(), y.clone(), z.clone());
    }

    /** The same vector in every frame. */
    public static VectorSeries constant(Vector3 value, int size) {
        double[] x = new double[size];
        double[] y = new double[size];
        double[] z = new double[size];
        Arrays.fill(x, value.x());
        Arrays.fill(y, value.y());
        Arrays.fill(z, value.z());
        return new VectorSeries(x, y, z);
    }

    /** A series of gaps. */
    public static VectorSeries gaps(int size) {
        return constant(Vector3.GAP, size);
    }

    public int size() {
        return x.length;
    }

    public Vector3 at(int i) {
        return new Vector3(x[i], y[i], z[i]);
    }

    public double x(int i) {
        return x[i];
    }

    public double y(int i) {
        return y[i];
    }

    public double z(int i) {
        return z[i];
    }

    public boolean isGap(int i) {
        return Double.isNaN(x[i] + y[i] + z[i]);
    }

    /** Applies {@code operation} to a copy of each component; what it returns is kept, so it must not go on writing there. */
    public VectorSeries eachComponent(UnaryOperator<double[]> operation) {
        return new VectorSeries(operation.apply(x.clone()), operation.apply(y.clone()), operation.apply(z.clone()));
    }

    /** The samples from {@code from} on, every {@code step}th, {@code count} of them. */
    public VectorSeries every(int from, int step, int count) {
        Builder picked = new Builder(count);
        for (int i = 0; i < count; i++) {
            picked.set(i, at(from + i * step));
        }
        return picked.build();
    }

    public ScalarSeries componentX() {
        return ScalarSeries.of(x);
    }

    public ScalarSeries componentY() {
        return ScalarSeries.of(y);
    }

    public ScalarSeries componentZ() {
        return ScalarSeries.of(z);
    }

    /** Fills a series vector by vector. */
    public static final class Builder {

        private double[] x;
        private double[] y;
        private double[] z;

        public Builder(int size) {
            x = new double[size];
            y = new double[size];
            z = new double[size];
        }

        public void set(int i, Vector3 value) {
            set(i, value.x(), value.y(), value.z());
        }

        public void set(int i, double vx, double vy, double vz) {
            x[i] = vx;
            y[i] = vy;
            z[i] = vz;
        }

        /** Ends the filling: the builder cannot be used again. */
        public VectorSeries build() {
            VectorSeries series = new VectorSeries(x, y, z);
            x = null;
            y = null;
            z = null;
            return series;
        }
    }
}
