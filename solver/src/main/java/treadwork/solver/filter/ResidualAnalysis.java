package treadwork.solver.filter;

import java.util.List;
import org.apache.commons.math3.stat.regression.SimpleRegression;
import treadwork.model.space.VectorSeries;

/**
 * Residual analysis: the cut-off at which what the filter takes away is as large as the noise.
 *
 * <p>R(fc) is the rms distance between the raw vectors and those filtered at fc, over all runs long enough for the
 * filter. At high fc only noise is taken away and R falls along a straight line; its value at fc = 0 estimates the rms
 * of all noise, and the cut-off is the fc with R(fc) equal to it: as much signal is lost as noise is let through (D. A.
 * Winter, Biomechanics and Motor Control of Human Movement, 4th ed. 2009, section 3.4.4.3).
 *
 * <p>The book leaves the ranges to the eye. Here, to be repeatable: the line is the least-squares one through 11 evenly
 * spaced fc from fs/10 to fs/5, and the cut-off is sought between 0.5 Hz and fs/10, to 0.01 Hz. For white noise alone,
 * R over that range is straight to 0.2 %, and the line meets fc = 0 2 % below the true rms with order 4 (10 % below with
 * order 2, within 0.6 % with 6 and 8; by integrating (1 - |H|²)²). Signal above fs/10 passes for noise.
 */
final class ResidualAnalysis {

    private static final double LOWEST_HZ = 0.5;
    private static final double LINE_FROM = 0.1;
    private static final double LINE_TO = 0.2;
    private static final int LINE_POINTS = 11;
    private static final double CLOSE_HZ = 0.01;

    private final VectorSeries raw;
    private final List<Run> runs;
    private final int order;
    private final double rate;

    private ResidualAnalysis(VectorSeries raw, int order, double rate) {
        this.raw = raw;
        this.order = order;
        this.rate = rate;
        runs = Run.known(raw, Butterworth.shortestRun(order));
    }

    /**
     * The cut-off, Hz, of a zero-lag Butterworth filter of this order.
     *
     * @return NaN when no run is long enough
     */
    static double cutoff(VectorSeries series, int order, double rate) {
        ResidualAnalysis analysis = new ResidualAnalysis(series, order, rate);
        return analysis.runs.isEmpty() ? Double.NaN : analysis.crossing(analysis.noise());
    }

    /** Where the line through the residuals of high cut-offs meets a cut-off of zero. */
    private double noise() {
        SimpleRegression line = new SimpleRegression();
        for (int i = 0; i < LINE_POINTS; i++) {
            double fc = rate * (LINE_FROM + (LINE_TO - LINE_FROM) * i / (LINE_POINTS - 1));
            line.addData(fc, residual(fc));
        }
        return line.getIntercept();
    }

    /** Halves the range until it is short; R falls as fc rises. */
    private double crossing(double noise) {
        double high = rate * LINE_FROM;
        double low = Math.min(LOWEST_HZ, high);
        if (residual(low) <= noise) {
            return low;
        }
        while (high - low > CLOSE_HZ) {
            double middle = (low + high) / 2;
            if (residual(middle) > noise) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }

    private double residual(double cutoffHz) {
        VectorSeries smooth = new Butterworth(cutoffHz, order, rate).filter(raw, runs);
        double squares = 0;
        int count = 0;
        for (Run run : runs) {
            for (int i = run.from(); i < run.to(); i++) {
                double dx = raw.x(i) - smooth.x(i);
                double dy = raw.y(i) - smooth.y(i);
                double dz = raw.z(i) - smooth.z(i);
                squares += dx * dx + dy * dy + dz * dz;
            }
            count += run.length();
        }
        return Math.sqrt(squares / count);
    }
}
