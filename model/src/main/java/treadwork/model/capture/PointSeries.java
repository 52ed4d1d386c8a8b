package treadwork.model.capture;

import java.util.function.Supplier;
import treadwork.model.space.VectorSeries;

/** One labelled point of a capture. */
public final class PointSeries {

    private final String label;
    private final String description;
    private final Recorded<VectorSeries> positions;

    private PointSeries(String label, String description, Recorded<VectorSeries> positions) {
        this.label = label;
        this.description = description;
        this.positions = positions;
    }

    /**
     * A point whose positions are there.
     *
     * @param label       as in the file, blanks and a common {@code subject:} prefix taken off
     * @param description the file's longer name, or empty
     * @param positions   lab axes, m; a gap where the point was not seen
     */
    public PointSeries(String label, String description, VectorSeries positions) {
        this(label, description, new Recorded<>(() -> positions));
    }

    /**
     * A point whose positions are made when they are asked for.
     *
     * @param positions makes the same series whenever it is asked, on any thread
     */
    public static PointSeries recorded(String label, String description, Supplier<VectorSeries> positions) {
        return new PointSeries(label, description, new Recorded<>(positions));
    }

    /** As in the file, blanks and a common {@code subject:} prefix taken off. */
    public String label() {
        return label;
    }

    /** The file's longer name, or empty. */
    public String description() {
        return description;
    }

    /** Lab axes, m; a gap where the point was not seen. */
    public VectorSeries positions() {
        return positions.get();
    }

    @Override
    public String toString() {
        return "point " + label;
    }
}
