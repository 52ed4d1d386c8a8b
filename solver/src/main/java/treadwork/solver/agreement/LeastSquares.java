package treadwork.solver.agreement;

/** A small weighted least-squares problem, by its normal equations and Cholesky's factorisation. */
final class LeastSquares {

    private final int unknowns;
    private final double[][] normal;
    private final double[] right;
    private double measured;

    LeastSquares(int unknowns) {
        this.unknowns = unknowns;
        normal = new double[unknowns][unknowns];
        right = new double[unknowns];
    }

    /** Adds {@code row · x = value ± spread}. */
    void add(double[] row, double value, double spread) {
        double weight = 1 / (spread * spread);
        for (int i = 0; i < unknowns; i++) {
            for (int j = 0; j < unknowns; j++) {
                normal[i][j] += weight * row[i] * row[j];
            }
            right[i] += weight * row[i] * value;
        }
        measured += weight * value * value;
    }

    /** The {@code k}th unknown. */
    double value(int k) {
        return solve(right)[k];
    }

    /** Its variance. */
    double variance(int k) {
        double[] unit = new double[unknowns];
        unit[k] = 1;
        return solve(unit)[k];
    }

    /** The weighted sum of squares that is left. */
    double squares() {
        double[] x = solve(right);
        double explained = 0;
        for (int i = 0; i < unknowns; i++) {
            explained += x[i] * right[i];
        }
        return Math.max(0, measured - explained);
    }

    private double[] solve(double[] b) {
        double[][] lower = new double[unknowns][unknowns];
        double[] x = b.clone();
        for (int i = 0; i < unknowns; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = normal[i][j];
                for (int k = 0; k < j; k++) {
                    sum -= lower[i][k] * lower[j][k];
                }
                lower[i][j] = i == j ? Math.sqrt(sum) : sum / lower[j][j];
            }
        }
        for (int i = 0; i < unknowns; i++) {
            for (int k = 0; k < i; k++) {
                x[i] -= lower[i][k] * x[k];
            }
            x[i] /= lower[i][i];
        }
        for (int i = unknowns - 1; i >= 0; i--) {
            for (int k = i + 1; k < unknowns; k++) {
                x[i] -= lower[k][i] * x[k];
            }
            x[i] /= lower[i][i];
        }
        return x;
    }
}
