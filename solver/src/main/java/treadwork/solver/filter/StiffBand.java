package treadwork.solver.filter;

/**
 * The matrix B = R + λ QᵀQ of the smoothing spline, five diagonals, as B = L D Lᵀ with ones on the diagonal of L.
 *
 * <p>R has 2/3 on and 1/6 beside the diagonal, QᵀQ has 6, -4, 1.
 */
final class StiffBand {

    private final double stiffness;
    private final double[] d;
    /** L[i + 1][i] and L[i + 2][i]. */
    private final double[] next;

    private final double[] second;

    private StiffBand(double stiffness, int size) {
        this.stiffness = stiffness;
        d = new double[size];
        next = new double[size];
        second = new double[size];
    }

    static StiffBand of(int size, double stiffness) {
        StiffBand band = new StiffBand(stiffness, size);
        double diagonal = 2.0 / 3 + 6 * stiffness;
        double beside = 1.0 / 6 - 4 * stiffness;
        for (int i = 0; i < size; i++) {
            double d = diagonal;
            double e = beside;
            if (i >= 1) {
                d -= band.d[i - 1] * band.next[i - 1] * band.next[i - 1];
                e -= band.d[i - 1] * band.next[i - 1] * band.second[i - 1];
            }
            if (i >= 2) {
                d -= band.d[i - 2] * band.second[i - 2] * band.second[i - 2];
            }
            band.d[i] = d;
            band.next[i] = e / d;
            band.second[i] = stiffness / d;
        }
        return band;
    }

    /**
     * Puts B⁻¹ w in the place of w.
     *
     * @param w several columns, row by row: a row's columns depend on nothing but themselves, so they go side by side
     */
    void solve(double[] w, int columns) {
        int n = d.length;
        for (int i = 1; i < n; i++) {
            double l1 = next[i - 1];
            double l2 = i >= 2 ? second[i - 2] : 0;
            int before2 = i >= 2 ? 2 * columns : columns;
            for (int j = i * columns; j < (i + 1) * columns; j++) {
                w[j] -= l1 * w[j - columns] + l2 * w[j - before2];
            }
        }
        for (int i = n - 1; i >= 0; i--) {
            double inverse = 1 / d[i];
            double l1 = i + 1 < n ? next[i] : 0;
            double l2 = i + 2 < n ? second[i] : 0;
            int after1 = i + 1 < n ? columns : 0;
            int after2 = i + 2 < n ? 2 * columns : 0;
            for (int j = i * columns; j < (i + 1) * columns; j++) {
                w[j] = inverse * w[j] - l1 * w[j + after1] - l2 * w[j + after2];
            }
        }
    }

    /**
     * n - tr A = λ tr(QᵀQ S), S = B⁻¹. From S = D⁻¹ L⁻¹ + (I - Lᵀ) S, upwards from the last row and for the middle
     * diagonals only: S[i][j] = (1/d_i if i = j) - L[i+1][i] S[i+1][j] - L[i+2][i] S[i+2][j].
     */
    double lostFreedom() {
        double trace = 0;
        double below = 0;
        double below1 = 0;
        double below2 = 0;
        for (int i = d.length - 1; i >= 0; i--) {
            double far = -next[i] * below1 - second[i] * below2;
            double near = -next[i] * below - second[i] * below1;
            double here = 1 / d[i] - next[i] * near - second[i] * far;
            trace += 6 * here - 8 * near + 2 * far;
            below2 = below;
            below1 = near;
            below = here;
        }
        return stiffness * trace;
    }
}
