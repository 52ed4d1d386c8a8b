package treadwork.solver.filter;

import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.FilterSettings;

/**
 * Takes the noise out of a series, run by run between its gaps; no sample feels what lies across a gap.
 *
 * <p>The three components of a vector are smoothed alike, so that the result does not depend on how the lab axes lie.
 */
public final class Smoothing {

    private Smoothing() {}

    /**
     * The series smoothed by the chosen kind of filter.
     *
     * @param rate samples a second
     * @return for {@code NONE} the series as it is; else a run too short for the filter becomes a gap
     * @throws treadwork.model.finding.UnusableInputException {@code filter-cutoff} or {@code filter-order} when there is
     *     no such filter at this rate
     */
    public static Smoothed smooth(VectorSeries series, FilterSettings settings, double rate) {
        requireRate(rate);
        return smoother(series, settings, rate).smooth(series);
    }

    /**
     * The load smoothed, all six components alike, before anything is divided or compared with a threshold: a centre of
     * pressure needs the moment and the force through the same filter. Where the kind chooses its own stiffness or
     * cut-off, the force decides.
     *
     * @param rate samples a second
     * @throws treadwork.model.finding.UnusableInputException as for a vector series
     */
    public static SmoothedWrench smooth(WrenchSeries wrench, FilterSettings settings, double rate) {
        requireRate(rate);
        Smoother smoother = smoother(wrench.force(), settings, rate);
        Smoothed force = smoother.smooth(wrench.force());
        VectorSeries moment = smoother.smooth(wrench.moment()).series();
        return new SmoothedWrench(new WrenchSeries(wrench.point(), force.series(), moment), force.cutoffHz());
    }

    private static Smoother smoother(VectorSeries series, FilterSettings settings, double rate) {
        return switch (settings.kind()) {
            case NONE -> original -> new Smoothed(original, Double.NaN);
            case BUTTERWORTH -> butterworth(settings.cutoffHz(), settings.order(), rate);
            case RESIDUAL -> residual(series, settings.order(), rate);
            case GCV_SPLINE -> spline(SmoothingSpline.stiffness(series), rate);
        };
    }

    private static Smoother butterworth(double cutoffHz, int order, double rate) {
        Butterworth filter = new Butterworth(cutoffHz, order, rate);
        int shortest = Butterworth.shortestRun(order);
        return series -> new Smoothed(filter.filter(series, Run.known(series, shortest)), cutoffHz);
    }

    private static Smoother residual(VectorSeries series, int order, double rate) {
        double cutoffHz = ResidualAnalysis.cutoff(series, order, rate);
        return Double.isNaN(cutoffHz)
                ? tooShort -> new Smoothed(VectorSeries.gaps(tooShort.size()), Double.NaN)
                : butterworth(cutoffHz, order, rate);
    }

    private static Smoother spline(double stiffness, double rate) {
        double cutoffHz = SmoothingSpline.cutoff(stiffness, rate);
        return series -> new Smoothed(SmoothingSpline.smooth(series, stiffness), cutoffHz);
    }

    private static void requireRate(double rate) {
        if (!(rate > 0)) {
            throw new IllegalArgumentException("sampling rate must be above 0 Hz, is " + rate + " Hz");
        }
    }

    /** One choice of filter, ready for any series of the same rate. */
    private interface Smoother {
        Smoothed smooth(VectorSeries series);
    }
}
