package treadwork.solver.filter;

import java.util.Arrays;

/**
 * The interpolating spline of odd degree k through n sites with the not-a-knot condition at both ends: the outermost
 * (k - 1)/2 inner sites of each end are no knots.
 *
 * <p>f(u) = Σ c_j B_j(u) over B-splines on the knots u_0 (k + 1 times), u_m .. u_{n-1-m}, u_{n-1} (k + 1 times),
 * m = (k + 1)/2, evaluated by the recurrence of Cox and de Boor (C. de Boor, A Practical Guide to Splines, 1978, ch. X).
 * The matrix B_j(u_i) is totally positive, so that elimination without exchange of rows is stable (C. de Boor and
 * A. Pinkus, Numerische Mathematik 27, 1977, 485-490). One factorisation serves any number of value columns; time and
 * memory grow with n.
 */
final class Spline {

    private static final int HIGHEST_DERIVATIVE = 2;

    private final int degree;
    private final double[] sites;
    private final double[] knots;
    /** Rows at either end that are kept one by one; the rows between are all alike and kept once. */
    private final int kept;
    /** The k + 1 factors of the B-splines at a site, a kept row after the other; an array a derivative. */
    private final double[][] rows = new double[HIGHEST_DERIVATIVE + 1][];

    private final int band;
    /** Triangular factors of the collocation matrix, a row after the other, its diagonal (inverted) in the middle. */
    private final double[] factors;

    private Spline(int degree, double[] sites, int kept) {
        this.degree = degree;
        this.sites = sites;
        this.kept = kept;
        knots = knots(degree, sites);
        band = degree - 1;
        for (int order = 0; order <= HIGHEST_DERIVATIVE; order++) {
            rows[order] = rows(order);
        }
        factors = factorised();
    }

    /** The fewest sites a spline of this degree needs. */
    static int fewest(int degree) {
        return degree + 1;
    }

    /**
     * Through any sites.
     *
     * @param degree 3 or 5
     * @param sites  rising, at least {@link #fewest}
     */
    static Spline through(int degree, double... sites) {
        requireEnough(degree, sites.length);
        return new Spline(degree, sites.clone(), sites.length);
    }

    /**
     * Through the sites 0, 1, .. {@code count} - 1.
     *
     * @param degree 3 or 5
     * @param count  at least {@link #fewest}
     */
    static Spline uniform(int degree, int count) {
        requireEnough(degree, count);
        double[] sites = new double[count];
        Arrays.setAll(sites, i -> i);
        // From 2 k rows away from an end on, a row meets evenly spaced knots only.
        return new Spline(degree, sites, Math.min(2 * degree, count));
    }

    private static void requireEnough(int degree, int sites) {
        if (degree != 3 && degree != 5) {
            throw new IllegalArgumentException("spline of degree " + degree + ", known are 3 and 5");
        }
        if (sites < fewest(degree)) {
            throw new IllegalArgumentException(
                    "a spline of degree " + degree + " needs " + fewest(degree) + " sites, has " + sites);
        }
    }

    /** Turns the values at the sites, {@code values[from]} on, into the spline's coefficients, in place. */
    void solve(double[] values, int from) {
        int n = sites.length;
        int width = 2 * band + 1;
        for (int i = 1; i < n; i++) {
            double sum = values[from + i];
            for (int j = Math.max(0, i - band); j < i; j++) {
                sum -= factors[i * width + band + j - i] * values[from + j];
            }
            values[from + i] = sum;
        }
        for (int i = n - 1; i >= 0; i--) {
            double sum = values[from + i];
            for (int j = Math.min(n - 1, i + band); j > i; j--) {
                sum -= factors[i * width + band + j - i] * values[from + j];
            }
            values[from + i] = sum * factors[i * width + band];
        }
    }

    /**
     * The derivative of the given order at every site, by the unit in which the sites are counted.
     *
     * @param order        0, 1 or 2
     * @param coefficients from {@code from} on, as {@link #solve} left them
     * @param into         takes the derivatives, from {@code from} on; another array
     */
    void differentiate(int order, double[] coefficients, int from, double[] into) {
        double[] factor = rows[order];
        for (int i = 0; i < sites.length; i++) {
            int row = row(i) * (degree + 1);
            int column = from + firstColumn(i);
            double sum = 0;
            for (int j = 0; j <= degree; j++) {
                sum += factor[row + j] * coefficients[column + j];
            }
            into[from + i] = sum;
        }
    }

    /** The derivative of the given order at {@code u}, anywhere; beyond the sites the end pieces go on. */
    double at(double u, int order, double[] coefficients) {
        int found = Arrays.binarySearch(sites, u);
        int site = Math.max(0, found >= 0 ? found : -found - 2);
        double[] factor = factorsAt(u, firstColumn(site), order);
        double sum = 0;
        for (int j = 0; j <= degree; j++) {
            sum += factor[j] * coefficients[firstColumn(site) + j];
        }
        return sum;
    }

    private static double[] knots(int degree, double[] sites) {
        int n = sites.length;
        double[] knots = new double[n + degree + 1];
        Arrays.fill(knots, 0, degree + 1, sites[0]);
        System.arraycopy(sites, (degree + 1) / 2, knots, degree + 1, n - degree - 1);
        Arrays.fill(knots, n, n + degree + 1, sites[n - 1]);
        return knots;
    }

    /** The first of the k + 1 B-splines that may differ from zero between site {@code i} and the next. */
    private int firstColumn(int i) {
        return Math.max(0, Math.min(i - (degree - 1) / 2, sites.length - degree - 1));
    }

    /** Where the row of site {@code i} is kept. */
    private int row(int i) {
        int fromEnd = sites.length - 1 - i;
        if (i < kept) {
            return i;
        }
        return fromEnd < kept ? 2 * kept - fromEnd : kept;
    }

    private double[] rows(int order) {
        double[] all = new double[(2 * kept + 1) * (degree + 1)];
        for (int i = 0; i < sites.length; i++) {
            if (i > kept && row(i) == kept) {
                continue;
            }
            double[] factor = factorsAt(sites[i], firstColumn(i), order);
            System.arraycopy(factor, 0, all, row(i) * (degree + 1), degree + 1);
        }
        return all;
    }

    /** What the coefficients from {@code column} on are multiplied by to give the derivative at {@code u}. */
    private double[] factorsAt(double u, int column, int order) {
        int span = column + degree;
        double[] factor = basis(u, span, degree - order);
        for (int p = degree - order + 1; p <= degree; p++) {
            factor = raised(factor, span, p);
        }
        return factor;
    }

    /** The {@code p} + 1 B-splines of degree {@code p} that are not zero between the knots span and span + 1, at u. */
    private double[] basis(double u, int span, int p) {
        double[] basis = new double[p + 1];
        basis[0] = 1;
        for (int q = 1; q <= p; q++) {
            double carried = 0;
            for (int r = 0; r < q; r++) {
                double right = knots[span + r + 1];
                double left = knots[span + 1 - q + r];
                double share = basis[r] / (right - left);
                basis[r] = carried + (right - u) * share;
                carried = (u - left) * share;
            }
            basis[q] = carried;
        }
        return basis;
    }

    /** From factors on splines of degree p - 1 to those of degree p: B'_p,i = p (B_p-1,i/(t_i+p - t_i) - next). */
    private double[] raised(double[] lower, int span, int p) {
        double[] factor = new double[p + 1];
        for (int r = 0; r < p; r++) {
            int i = span - p + 1 + r;
            double share = p * lower[r] / (knots[i + p] - knots[i]);
            factor[r] -= share;
            factor[r + 1] += share;
        }
        return factor;
    }

    private double[] factorised() {
        int n = sites.length;
        int width = 2 * band + 1;
        double[] matrix = new double[n * width];
        for (int i = 0; i < n; i++) {
            int column = firstColumn(i);
            for (int j = Math.max(column, i - band); j <= Math.min(column + degree, i + band); j++) {
                matrix[i * width + band + j - i] = rows[0][row(i) * (degree + 1) + j - column];
            }
        }
        for (int pivot = 0; pivot < n; pivot++) {
            double inverse = 1 / matrix[pivot * width + band];
            matrix[pivot * width + band] = inverse;
            for (int i = pivot + 1; i <= Math.min(n - 1, pivot + band); i++) {
                eliminate(matrix, pivot, i, inverse);
            }
        }
        return matrix;
    }

    private void eliminate(double[] matrix, int pivot, int row, double inverse) {
        int width = 2 * band + 1;
        int lower = row * width + band + pivot - row;
        if (matrix[lower] == 0) {
            return;
        }
        double factor = matrix[lower] * inverse;
        matrix[lower] = factor;
        for (int j = 1; j <= Math.min(band, sites.length - 1 - pivot); j++) {
            matrix[lower + j] -= factor * matrix[pivot * width + band + j];
        }
    }
}
