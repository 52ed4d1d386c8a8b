package treadwork.solver.filter;

import java.util.List;
import treadwork.model.space.VectorSeries;

/**
 * First and second derivatives by time, at the samples.
 *
 * @param first  unit of the series a second
 * @param second unit of the series a second squared
 */
public record Derivatives(VectorSeries first, VectorSeries second) {

    private static final int DEGREE = 5;

    /** Known frames in a row that have derivatives; a shorter run between gaps becomes a gap. */
    public static final int SHORTEST_RUN = Spline.fewest(DEGREE);

    /**
     * Derivatives of the interpolating spline of degree five (not-a-knot ends) through each run between gaps.
     *
     * <p>With h the sampling interval and ω the angular frequency of a sine, the second derivative is off by
     * (ω h)⁴/720 of its size between the ends: 6e-6 for 8 Hz at 200 Hz; in the first and the last frame by up to 2e-3,
     * in the second by a tenth of that (measured). A central difference is off by (ω h)²/12 = 5e-3 everywhere.
     *
     * @param rate samples a second
     * @return gaps where the series has one and in runs shorter than {@link #SHORTEST_RUN}
     */
    public static Derivatives of(VectorSeries series, double rate) {
        if (!(rate > 0)) {
            throw new IllegalArgumentException("sampling rate must be above 0 Hz, is " + rate + " Hz");
        }
        List<Run> runs = Run.known(series, SHORTEST_RUN);
        List<Spline> splines =
                runs.stream().map(run -> Spline.uniform(DEGREE, run.length())).toList();
        VectorSeries coefficients = series.eachComponent(values -> {
            for (int i = 0; i < splines.size(); i++) {
                splines.get(i).solve(values, runs.get(i).from());
            }
            return values;
        });
        return new Derivatives(
                differentiated(coefficients, runs, splines, new Order(1, rate)),
                differentiated(coefficients, runs, splines, new Order(2, rate * rate)));
    }

    private static VectorSeries differentiated(
            VectorSeries coefficients, List<Run> runs, List<Spline> splines, Order order) {
        return coefficients.eachComponent(values -> {
            double[] derivative = new double[values.length];
            for (int i = 0; i < splines.size(); i++) {
                splines.get(i).differentiate(order.order, values, runs.get(i).from(), derivative);
            }
            for (int i = 0; i < derivative.length; i++) {
                derivative[i] *= order.scale;
            }
            Run.blankBetween(runs, derivative);
            return derivative;
        });
    }

    /** Which derivative, and its factor from a sample to a second. */
    private record Order(int order, double scale) {}
}
