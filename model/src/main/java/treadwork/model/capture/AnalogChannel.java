package treadwork.model.capture;

import java.util.function.Supplier;
import treadwork.model.space.ScalarSeries;

/** One analog channel. */
public final class AnalogChannel {

    private final String label;
    private final String unit;
    private final Recorded<ScalarSeries> values;

    private AnalogChannel(String label, String unit, Recorded<ScalarSeries> values) {
        this.label = label;
        this.unit = unit;
        this.values = values;
    }

    /**
     * A channel whose values are there.
     *
     * @param label  as in the file, blanks taken off
     * @param unit   as the file states it, which is often wrong; for display only
     * @param values offset and scales of the file applied, so in what the file calls physical units
     */
    public AnalogChannel(String label, String unit, ScalarSeries values) {
        this(label, unit, new Recorded<>(() -> values));
    }

    /**
     * A channel whose values are made when they are asked for.
     *
     * @param values makes the same series whenever it is asked, on any thread
     */
    public static AnalogChannel recorded(String label, String unit, Supplier<ScalarSeries> values) {
        return new AnalogChannel(label, unit, new Recorded<>(values));
    }

    /** As in the file, blanks taken off. */
    public String label() {
        return label;
    }

    /** As the file states it, which is often wrong; for display only. */
    public String unit() {
        return unit;
    }

    /** Offset and scales of the file applied, so in what the file calls physical units. */
    public ScalarSeries values() {
        return values.get();
    }

    @Override
    public String toString() {
        return "channel " + label;
    }
}
