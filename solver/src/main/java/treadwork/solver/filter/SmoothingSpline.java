package treadwork.solver.filter;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import treadwork.model.space.VectorSeries;

/**
 * Cubic smoothing spline with natural ends, its stiffness λ chosen by generalised cross-validation.
 *
 * <p>Of all f, it is the one with the least Σ (z_k - f(k))² + λ ∫ f''(u)² du, u counted in samples. With Q the second
 * differences and R the tridiagonal matrix (1/6, 2/3, 1/6), (R + λ QᵀQ) γ = Qᵀ z and f = z - λ Q γ (C. H. Reinsch,
 * Numerische Mathematik 10, 1967, 177-183). With A the matrix that takes z to f, n samples and q components,
 * cross-validation takes the λ with the least
 * <pre>
 * GCV(λ) = (Σ (z - f)²/(q n)) / (1 - tr A/n)²
 * </pre>
 * (P. Craven and G. Wahba, Numerische Mathematik 31, 1979, 377-403), sums and traces over all runs and components: one
 * λ a series. n - tr A = λ tr(QᵀQ (R + λ QᵀQ)⁻¹) needs the five middle diagonals of the inverse only (M. F. Hutchinson
 * and F. R. de Hoog, Numerische Mathematik 47, 1985, 99-106), so that time grows with n. The noise is taken to be white:
 * coherent ripple is kept as signal, and an impact spoils the choice.
 */
final class SmoothingSpline {

    /** As many as the derivatives of what comes out need. */
    static final int SHORTEST_RUN = Derivatives.SHORTEST_RUN;

    /** Decades of λ searched: from next to no smoothing at any frequency to -3 dB at 1/2500 of the sampling rate. */
    private static final double LEAST = -6;

    private static final double MOST = 9;

    /** Between two values on the first, even grid; the filter's own flank is two decades of λ wide. */
    private static final double GRID = 0.5;

    /** Decades to which the minimum is found: closer, GCV is flat to rounding. */
    private static final double CLOSE = 1e-6;

    private static final int COMPONENTS = 3;

    private static final int MOST_STEPS = 200;

    private SmoothingSpline() {}

    /** The λ of the least GCV over all runs of at least {@link #SHORTEST_RUN}; NaN when there is none. */
    static double stiffness(VectorSeries series) {
        List<double[]> bends = bends(series);
        if (bends.isEmpty()) {
            return Double.NaN;
        }
        DoubleUnaryOperator score = decade -> score(bends, Math.pow(10, decade));
        double best = LEAST;
        double least = score.applyAsDouble(best);
        for (double decade = LEAST + GRID; decade <= MOST; decade += GRID) {
            double here = score.applyAsDouble(decade);
            if (here < least) {
                best = decade;
                least = here;
            }
        }
        return Math.pow(10, refined(score, best));
    }

    private static double refined(DoubleUnaryOperator score, double best) {
        double low = Math.max(LEAST, best - GRID);
        double high = Math.min(MOST, best + GRID);
        return new BrentOptimizer(CLOSE, CLOSE)
                .optimize(
                        new UnivariateObjectiveFunction(score::applyAsDouble),
                        GoalType.MINIMIZE,
                        new SearchInterval(low, high, best),
                        new MaxEval(MOST_STEPS))
                .getPoint();
    }

    /**
     * The frequency that comes through at 1/√2: far from the ends a sine of ω rad a sample is multiplied by
     * 1/(1 + λ ω⁴), so that ω⁴ = (√2 - 1)/λ.
     */
    static double cutoff(double stiffness, double rate) {
        return rate / (2 * Math.PI) * Math.pow((Math.sqrt(2) - 1) / stiffness, 0.25);
    }

    /** All runs of at least {@link #SHORTEST_RUN} smoothed, all else gaps. */
    static VectorSeries smooth(VectorSeries series, double stiffness) {
        List<Run> runs = Run.known(series, SHORTEST_RUN);
        List<StiffBand> bands = runs.stream()
                .map(run -> StiffBand.of(run.length() - 2, stiffness))
                .toList();
        return series.eachComponent(values -> {
            for (int r = 0; r < runs.size(); r++) {
                Run run = runs.get(r);
                double[] bend = new double[run.length() - 2];
                for (int i = 0; i < bend.length; i++) {
                    bend[i] = bend(values, run.from() + i);
                }
                bands.get(r).solve(bend, 1);
                for (int i = 0; i < run.length(); i++) {
                    values[run.from() + i] -= stiffness * spread(bend, i, 1);
                }
            }
            Run.blankBetween(runs, values);
            return values;
        });
    }

    /** GCV(λ) but for a factor that does not depend on λ. */
    private static double score(List<double[]> bends, double stiffness) {
        double squares = 0;
        double lost = 0;
        for (double[] bend : bends) {
            StiffBand band = StiffBand.of(bend.length / COMPONENTS, stiffness);
            double[] work = bend.clone();
            band.solve(work, COMPONENTS);
            for (int i = 0; i < work.length + 2 * COMPONENTS; i++) {
                double residual = stiffness * spread(work, i, COMPONENTS);
                squares += residual * residual;
            }
            lost += band.lostFreedom();
        }
        return squares / (lost * lost);
    }

    /** Qᵀ z of each run, its three components side by side. */
    private static List<double[]> bends(VectorSeries series) {
        double[] x = series.componentX().toArray();
        double[] y = series.componentY().toArray();
        double[] z = series.componentZ().toArray();
        List<double[]> bends = new ArrayList<>();
        for (Run run : Run.known(series, SHORTEST_RUN)) {
            double[] bend = new double[COMPONENTS * (run.length() - 2)];
            for (int i = 0; i < run.length() - 2; i++) {
                bend[COMPONENTS * i] = bend(x, run.from() + i);
                bend[COMPONENTS * i + 1] = bend(y, run.from() + i);
                bend[COMPONENTS * i + 2] = bend(z, run.from() + i);
            }
            bends.add(bend);
        }
        return bends;
    }

    /** An element of Qᵀ z: the second difference from sample {@code k} on. */
    private static double bend(double[] z, int k) {
        return z[k] - 2 * z[k + 1] + z[k + 2];
    }

    /** The i-th element of Q γ; γ has several columns, row by row. */
    private static double spread(double[] gamma, int i, int columns) {
        double before = i >= 2 * columns ? gamma[i - 2 * columns] : 0;
        double here = i >= columns && i < gamma.length + columns ? gamma[i - columns] : 0;
        double after = i < gamma.length ? gamma[i] : 0;
        return before - 2 * here + after;
    }
}
