package treadwork.model.space;

import java.util.Arrays;
import java.util.function.IntToDoubleFunction;
import java.util.function.UnaryOperator;

/**
 * One vector a frame or sample; a vector with a NaN is a gap. What is computed is held as three arrays, so that filters run along
 * memory; what was recorded may stay where it lies, see {@link #lookedUp}.
 */
public final class VectorSeries {

    private static final double[] NONE = {};

    private final double[] x;
    private final double[] y;
    private final double[] z;
    private final Recorded recorded;

    /** Where the numbers are looked up that are not in the arrays; null where they are. */
    private record Recorded(int size, IntToDoubleFunction x, IntToDoubleFunction y, IntToDoubleFunction z) {}

    private VectorSeries(Recorded recorded) {
        this.x = NONE;
        this.y = NONE;
        this.z = NONE;
        this.recorded = recorded;
    }

    private VectorSeries(double[] x, double[] y, double[] z) {
        if (x.length != y.length || x.length != z.length) {
            throw new IllegalArgumentException(
                    "components differ in length: " + x.length + ", " + y.length + ", " + z.length);
        }
        this.x = x;
        this.y = y;
        this.z = z;
        this.recorded = null;
    }

    /**
     * A series whose numbers stay where they lie, in whatever precision they were recorded, and are looked up one by one. The same
     * index must give the same number for ever, on any thread.
     */
    public static VectorSeries lookedUp(int size, IntToDoubleFunction x, IntToDoubleFunction y, IntToDoubleFunction z) {
        return new VectorSeries(new Recorded(size, x, y, z));
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
        return recorded == null ? x.length : recorded.size;
    }

    public Vector3 at(int i) {
        return new Vector3(x(i), y(i), z(i));
    }

    public double x(int i) {
        return recorded == null ? x[i] : recorded.x.applyAsDouble(i);
    }

    public double y(int i) {
        return recorded == null ? y[i] : recorded.y.applyAsDouble(i);
    }

    public double z(int i) {
        return recorded == null ? z[i] : recorded.z.applyAsDouble(i);
    }

    public boolean isGap(int i) {
        return Double.isNaN(x(i) + y(i) + z(i));
    }

    /** Applies {@code operation} to a copy of each component; what it returns is kept, so it must not go on writing there. */
    public VectorSeries eachComponent(UnaryOperator<double[]> operation) {
        return new VectorSeries(operation.apply(copyX()), operation.apply(copyY()), operation.apply(copyZ()));
    }

    private double[] copyX() {
        return recorded == null ? x.clone() : ScalarSeries.copy(recorded.size, recorded.x);
    }

    private double[] copyY() {
        return recorded == null ? y.clone() : ScalarSeries.copy(recorded.size, recorded.y);
    }

    private double[] copyZ() {
        return recorded == null ? z.clone() : ScalarSeries.copy(recorded.size, recorded.z);
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
        return recorded == null ? ScalarSeries.of(x) : ScalarSeries.lookedUp(recorded.size, recorded.x);
    }

    public ScalarSeries componentY() {
        return recorded == null ? ScalarSeries.of(y) : ScalarSeries.lookedUp(recorded.size, recorded.y);
    }

    public ScalarSeries componentZ() {
        return recorded == null ? ScalarSeries.of(z) : ScalarSeries.lookedUp(recorded.size, recorded.z);
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
