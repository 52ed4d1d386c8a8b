package treadwork.model.space;

import java.util.Arrays;
import java.util.function.IntToDoubleFunction;
import java.util.function.UnaryOperator;

/** One number a frame or sample; NaN is a gap. What was recorded may stay where it lies, see {@link #lookedUp}. */
public final class ScalarSeries {

    private static final double[] NONE = {};

    private final double[] values;
    private final Recorded recorded;

    /** Where the numbers are looked up that are not in the array; null where they are. */
    private record Recorded(int size, IntToDoubleFunction at) {}

    private ScalarSeries(double[] values) {
        this.values = values;
        this.recorded = null;
    }

    private ScalarSeries(Recorded recorded) {
        this.values = NONE;
        this.recorded = recorded;
    }

    /**
     * A series whose numbers stay where they lie, in whatever precision they were recorded, and are looked up one by one. The same
     * index must give the same number for ever, on any thread.
     */
    public static ScalarSeries lookedUp(int size, IntToDoubleFunction at) {
        return new ScalarSeries(new Recorded(size, at));
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
        return recorded == null ? values.length : recorded.size;
    }

    public double at(int i) {
        return recorded == null ? values[i] : recorded.at.applyAsDouble(i);
    }

    /** A copy of the values. */
    public double[] toArray() {
        return recorded == null ? values.clone() : copy(recorded.size, recorded.at);
    }

    static double[] copy(int size, IntToDoubleFunction at) {
        double[] copy = new double[size];
        for (int i = 0; i < size; i++) {
            copy[i] = at.applyAsDouble(i);
        }
        return copy;
    }

    /** The series that {@code operation} makes of a copy of the values; what it returns is kept, so it must not go on writing there. */
    public ScalarSeries map(UnaryOperator<double[]> operation) {
        return new ScalarSeries(operation.apply(toArray()));
    }

    /** The samples from {@code from} on, every {@code step}th, {@code count} of them. */
    public ScalarSeries every(int from, int step, int count) {
        double[] picked = new double[count];
        for (int i = 0; i < count; i++) {
            picked[i] = at(from + i * step);
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
