package treadwork.model.space;

import java.util.Arrays;
import java.util.function.UnaryOperator;

/** One number a frame or sample; NaN is a gap. */
public final class ScalarSeries {

    private final double[] values;

    private ScalarSeries(double[] values) {
        this.values = values;
    }

    public static ScalarSeries of(double... values) {
        return new ScalarSeries(values.clone());
    }

    /** A series of gaps. */
    public static ScalarSeries gaps(int size) {
        double[] values = new double[size];
        Arrays.fill(values, Double.NaN);
        return new ScalarSeries(values);
    }

    public int size() {
        return values.length;
    }

    public double at(int i) {
        return values[i];
    }

    /** A copy of the values. */
    public double[] toArray() {
        return values.clone();
    }

    /** The series that {@code operation} makes of a copy of the values; what it returns is kept, so it must not go on writing there. */
    public ScalarSeries map(UnaryOperator<double[]> operation) {
        return new ScalarSeries(operation.apply(values.clone()));
    }

    /** The samples from {@code from} on, every {@code step}th, {@code count} of them. */
    public ScalarSeries every(int from, int step, int count) {
        double[] picked = new double[count];
        for (int i = 0; i < count; i++) {
            picked[i] = values[from + i * step];
        }
        return new ScalarSeries(picked);
    }

    /** Fills a series value by value. */
    public static final class Builder {

        private double[] values;

        public Builder(int size) {
            values = new double[size];
        }

        public void set(int i, double value) {
            values[i] = value;
        }

        /** Ends the filling: the builder cannot be used again. */
        public ScalarSeries build() {
            ScalarSeries series = new ScalarSeries(values);
            values = null;
            return series;
        }
    }
}
