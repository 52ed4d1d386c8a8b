package treadwork.solver.pose;

import java.util.List;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * Places a rigid template on markers by least squares: of all poses, the one with the smallest sum of |y - (R p + t)|².
 *
 * <p>With both sets centred, R maximises tr(Rᵀ H), H = Σ y pᵀ. From H = U Σ Vᵀ (Arun, Huang and Blostein 1987; Kabsch
 * 1976) the two largest pairs of singular vectors are kept and both sets are completed right-handed: R = u1 v1ᵀ + u2 v2ᵀ +
 * (u1 × u2)(v1 × v2)ᵀ. So R is a proper rotation also for planar clusters and for noise that mirrors them. t = ȳ - R p̄.
 *
 * <p>A workspace: {@link #fit} allocates nothing. Not for two threads at once.
 */
public final class RigidFit {

    public static final int LEAST_MARKERS = 3;

    /**
     * Least ratio of the second to the first singular value of a centred cluster. Noise turns a cluster about its longest
     * axis in inverse proportion to its width across that axis (Söderkvist and Wedin 1993): twenty times narrower than
     * long, a millimetre becomes a centimetre. The limit is our choice.
     */
    public static final double LEAST_SPREAD = 0.05;

    /** Below this share of the largest singular value no rotation is better than its neighbours: far above rounding. */
    private static final double UNDECIDED = 1e-9;

    private final double[] template;
    private final int count;
    private final OneSidedJacobi jacobi = new OneSidedJacobi();
    private final double[] cross = new double[9];
    private final double[] scatter = new double[9];
    private final double[] left = new double[9];
    private final double[] right = new double[9];
    private int known;
    private double px;
    private double py;
    private double pz;
    private double yx;
    private double yy;
    private double yz;
    private double squares;

    /**
     * Makes the workspace.
     *
     * @param template the markers in segment axes, m
     * @throws IllegalArgumentException if these are fewer than three, or on one line
     */
    public RigidFit(List<Vector3> template) {
        if (template.size() < LEAST_MARKERS) {
            throw new IllegalArgumentException(template.size() + " markers do not fix a segment, three are needed");
        }
        if (!(spread(template) >= LEAST_SPREAD)) {
            throw new IllegalArgumentException("the markers lie on one line");
        }
        count = template.size();
        this.template = flat(template);
    }

    /**
     * How far from a line points are spread: the second singular value of the centred points over the first; 1 for a
     * square, 0 on a line, NaN when all coincide.
     */
    public static double spread(List<Vector3> points) {
        Vector3 centre = points.stream().reduce(Vector3.ZERO, Vector3::plus).times(1.0 / points.size());
        double[] sums = new double[9];
        for (Vector3 point : points) {
            Vector3 p = point.minus(centre);
            addProduct(sums, p.x(), p.y(), p.z());
        }
        return spread(sums, new OneSidedJacobi());
    }

    /**
     * Fits the template to the markers that are known in a frame.
     *
     * @param markers in the template's order, lab axes, m
     * @return false when the frame is a gap: fewer than three markers known, or those on one line
     */
    public boolean fit(List<VectorSeries> markers, int frame) {
        if (markers.size() != count) {
            throw new IllegalArgumentException(markers.size() + " markers for a template of " + count);
        }
        centre(markers, frame);
        if (known < LEAST_MARKERS) {
            return false;
        }
        correlate(markers, frame);
        if (known < count && !(spread(scatter, jacobi) >= LEAST_SPREAD)) {
            return false;
        }
        if (!decompose()) {
            return false;
        }
        measure(markers, frame);
        return true;
    }

    /** The segment's origin in the frame last fitted, lab axes, m. */
    public Vector3 origin() {
        return new Vector3(
                yx - (element(0, 0) * px + element(0, 1) * py + element(0, 2) * pz),
                yy - (element(1, 0) * px + element(1, 1) * py + element(1, 2) * pz),
                yz - (element(2, 0) * px + element(2, 1) * py + element(2, 2) * pz));
    }

    /** The segment's rotation in the frame last fitted. */
    public Rotation labFromSegment() {
        return new Rotation(
                element(0, 0),
                element(0, 1),
                element(0, 2),
                element(1, 0),
                element(1, 1),
                element(1, 2),
                element(2, 0),
                element(2, 1),
                element(2, 2));
    }

    /** How many markers were known in the frame last fitted. */
    public int known() {
        return known;
    }

    /** The sum of squared distances of the known markers from the fitted template, m². */
    public double squares() {
        return squares;
    }

    private double element(int row, int column) {
        return left[row] * right[column] + left[3 + row] * right[3 + column] + left[6 + row] * right[6 + column];
    }

    private void centre(List<VectorSeries> markers, int frame) {
        known = 0;
        px = py = pz = 0;
        yx = yy = yz = 0;
        for (int m = 0; m < count; m++) {
            VectorSeries marker = markers.get(m);
            if (!marker.isGap(frame)) {
                known++;
                px += template[3 * m];
                py += template[3 * m + 1];
                pz += template[3 * m + 2];
                yx += marker.x(frame);
                yy += marker.y(frame);
                yz += marker.z(frame);
            }
        }
        px /= known;
        py /= known;
        pz /= known;
        yx /= known;
        yy /= known;
        yz /= known;
    }

    /** Fills H, column after column, and the scatter of the known part of the template. */
    private void correlate(List<VectorSeries> markers, int frame) {
        for (int i = 0; i < 9; i++) {
            cross[i] = 0;
            scatter[i] = 0;
        }
        for (int m = 0; m < count; m++) {
            VectorSeries marker = markers.get(m);
            if (!marker.isGap(frame)) {
                double x = marker.x(frame) - yx;
                double y = marker.y(frame) - yy;
                double z = marker.z(frame) - yz;
                for (int column = 0; column < 3; column++) {
                    double p = template[3 * m + column] - mean(column);
                    cross[3 * column] += x * p;
                    cross[3 * column + 1] += y * p;
                    cross[3 * column + 2] += z * p;
                }
                addProduct(scatter, template[3 * m] - px, template[3 * m + 1] - py, template[3 * m + 2] - pz);
            }
        }
    }

    private double mean(int column) {
        return column == 0 ? px : column == 1 ? py : pz;
    }

    private boolean decompose() {
        jacobi.decompose(cross);
        double first = jacobi.value(0);
        for (int row = 0; row < 3; row++) {
            left[row] = jacobi.scaledLeft(0, row) / first;
            right[row] = jacobi.right(0, row);
            left[3 + row] = jacobi.scaledLeft(1, row);
            right[3 + row] = jacobi.right(1, row);
        }
        perpendicularUnit(left);
        perpendicularUnit(right);
        complete(left);
        complete(right);
        double third = 0;
        double alike = 0;
        for (int row = 0; row < 3; row++) {
            third += left[6 + row] * jacobi.scaledLeft(2, row);
            alike += right[6 + row] * jacobi.right(2, row);
        }
        return jacobi.value(1) + third * alike > UNDECIDED * first;
    }

    /** Takes out of the second vector what rounding left along the first, and makes it of length one. */
    private static void perpendicularUnit(double[] vectors) {
        double along = vectors[0] * vectors[3] + vectors[1] * vectors[4] + vectors[2] * vectors[5];
        double square = 0;
        for (int row = 0; row < 3; row++) {
            vectors[3 + row] -= along * vectors[row];
            square += vectors[3 + row] * vectors[3 + row];
        }
        double length = Math.sqrt(square);
        for (int row = 0; row < 3; row++) {
            vectors[3 + row] /= length;
        }
    }

    private static void complete(double[] vectors) {
        vectors[6] = vectors[1] * vectors[5] - vectors[2] * vectors[4];
        vectors[7] = vectors[2] * vectors[3] - vectors[0] * vectors[5];
        vectors[8] = vectors[0] * vectors[4] - vectors[1] * vectors[3];
    }

    private void measure(List<VectorSeries> markers, int frame) {
        squares = 0;
        for (int m = 0; m < count; m++) {
            VectorSeries marker = markers.get(m);
            if (!marker.isGap(frame)) {
                double x = template[3 * m] - px;
                double y = template[3 * m + 1] - py;
                double z = template[3 * m + 2] - pz;
                double dx = marker.x(frame) - yx - (element(0, 0) * x + element(0, 1) * y + element(0, 2) * z);
                double dy = marker.y(frame) - yy - (element(1, 0) * x + element(1, 1) * y + element(1, 2) * z);
                double dz = marker.z(frame) - yz - (element(2, 0) * x + element(2, 1) * y + element(2, 2) * z);
                squares += dx * dx + dy * dy + dz * dz;
            }
        }
    }

    /** The singular values of a scatter matrix are the squares of those of its points. */
    private static double spread(double[] scatter, OneSidedJacobi jacobi) {
        jacobi.decompose(scatter);
        return Math.sqrt(jacobi.value(1) / jacobi.value(0));
    }

    private static void addProduct(double[] sums, double x, double y, double z) {
        sums[0] += x * x;
        sums[1] += x * y;
        sums[2] += x * z;
        sums[3] += x * y;
        sums[4] += y * y;
        sums[5] += y * z;
        sums[6] += x * z;
        sums[7] += y * z;
        sums[8] += z * z;
    }

    private static double[] flat(List<Vector3> points) {
        double[] numbers = new double[3 * points.size()];
        for (int m = 0; m < points.size(); m++) {
            numbers[3 * m] = points.get(m).x();
            numbers[3 * m + 1] = points.get(m).y();
            numbers[3 * m + 2] = points.get(m).z();
        }
        return numbers;
    }
}
