package treadwork.solver.filter;

import treadwork.model.space.VectorSeries;

/**
 * Where a smoothed course ends, what lies beyond has been made up, and its second derivative is mostly that: there it is
 * not known.
 */
public final class RunEnds {

    private RunEnds() {}

    /**
     * How many frames next to a gap or an end of the record are so: one time constant 1/(2π f) of the filter, in which a
     * first-order low-pass forgets all but 37 % (our choice; with 0.5 mm of marker noise the errors of hip moments, several
     * times those of other frames, have died down by then).
     *
     * @param cutoffHz where the filter is at -3 dB; NaN where nothing was smoothed
     */
    public static int frames(double cutoffHz, double rate) {
        return cutoffHz > 0 ? (int) Math.ceil(rate / (2 * Math.PI * cutoffHz)) : 0;
    }

    /** The series with that many frames at both ends of each known stretch made gaps. */
    public static VectorSeries blank(VectorSeries series, int frames) {
        if (frames == 0) {
            return series;
        }
        VectorSeries.Builder blanked = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            blanked.set(i, Double.NaN, Double.NaN, Double.NaN);
        }
        for (Run run : Run.known(series, 1)) {
            for (int i = run.from() + frames; i < run.to() - frames; i++) {
                blanked.set(i, series.x(i), series.y(i), series.z(i));
            }
        }
        return blanked.build();
    }
}
