package treadwork.solver.pose;

/**
 * Singular value decomposition A V = U Σ of a 3×3 matrix by one-sided Jacobi rotations (Hestenes 1958): columns of A are
 * turned in pairs until they are perpendicular; their lengths are then the singular values.
 *
 * <p>A workspace: it is used again and again and allocates nothing after it is made. Not for two threads at once.
 */
final class OneSidedJacobi {

    /** Two columns count as perpendicular when the cosine between them is below this: a few roundings. */
    private static final double PERPENDICULAR = 1e-15;

    /** A column counts as nothing when its square is below this share of the other's: the square of a rounding. */
    private static final double NOTHING = 1e-30;

    /** Six sweeps do for any matrix tried; the bound only guarantees an end. */
    private static final int SWEEPS = 30;

    private final double[] b = new double[9];
    private final double[] v = new double[9];
    private final double[] squares = new double[3];
    private final int[] order = new int[3];

    /**
     * Decomposes the matrix.
     *
     * @param byColumns nine elements, column after column; left as they are
     */
    void decompose(double[] byColumns) {
        for (int i = 0; i < 9; i++) {
            b[i] = byColumns[i];
            v[i] = i % 4 == 0 ? 1 : 0;
        }
        boolean turned = true;
        for (int sweep = 0; turned && sweep < SWEEPS; sweep++) {
            turned = perpendicular(0, 3);
            turned |= perpendicular(0, 6);
            turned |= perpendicular(3, 6);
        }
        for (int k = 0; k < 3; k++) {
            squares[k] = dot(b, 3 * k, 3 * k);
            order[k] = k;
        }
        sort(0, 1);
        sort(0, 2);
        sort(1, 2);
    }

    /** The singular value of that rank, 0 for the largest. */
    double value(int rank) {
        return Math.sqrt(squares[order[rank]]);
    }

    /** An element of the right singular vector of that rank, of length one. */
    double right(int rank, int row) {
        return v[3 * order[rank] + row];
    }

    /** An element of the left singular vector of that rank times its singular value. */
    double scaledLeft(int rank, int row) {
        return b[3 * order[rank] + row];
    }

    private boolean perpendicular(int p, int q) {
        double alpha = dot(b, p, p);
        double beta = dot(b, q, q);
        double gamma = dot(b, p, q);
        boolean negligible = Math.min(alpha, beta) <= NOTHING * Math.max(alpha, beta);
        if (negligible || !(Math.abs(gamma) > PERPENDICULAR * Math.sqrt(alpha * beta))) {
            return false;
        }
        double zeta = (beta - alpha) / (2 * gamma);
        double t = Math.copySign(1, zeta) / (Math.abs(zeta) + Math.sqrt(1 + zeta * zeta));
        turn(b, p, q, t);
        turn(v, p, q, t);
        return true;
    }

    /** Turns two columns in their plane by the angle whose tangent is {@code t}. */
    private static void turn(double[] m, int p, int q, double t) {
        double c = 1 / Math.sqrt(1 + t * t);
        double s = c * t;
        for (int row = 0; row < 3; row++) {
            double first = m[p + row];
            double second = m[q + row];
            m[p + row] = c * first - s * second;
            m[q + row] = s * first + c * second;
        }
    }

    private static double dot(double[] m, int p, int q) {
        return m[p] * m[q] + m[p + 1] * m[q + 1] + m[p + 2] * m[q + 2];
    }

    private void sort(int i, int j) {
        if (squares[order[j]] > squares[order[i]]) {
            int kept = order[i];
            order[i] = order[j];
            order[j] = kept;
        }
    }
}
