package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.SingularValueDecomposition_F64;
import org.junit.jupiter.api.Test;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

class RigidFitTest {

    /** Rounding of lengths near 1 m and of rotation elements: a few hundred operations, each good to 1e-16. */
    private static final double ROUNDING = 1e-12;

    private static final List<Vector3> P = List.of(
            new Vector3(0.031, 0.052, 0.118),
            new Vector3(-0.047, 0.061, 0.083),
            new Vector3(0.022, -0.058, 0.121),
            new Vector3(-0.011, 0.017, -0.094),
            new Vector3(0.065, 0.008, 0.004));

    private static final List<Vector3> Y = List.of(
            new Vector3(0.27512906227844436, -0.15234882008973313, 1.0749583645689171),
            new Vector3(0.2540912211864154, -0.17659763147057392, 0.9961592449963927),
            new Vector3(0.3710053883373752, -0.20275301715339916, 1.0731188478706095),
            new Vector3(0.36308586908255225, -0.06281721982774958, 0.8943941804432313),
            new Vector3(0.35847104814919495, -0.07541203406570836, 1.0173210517221147));

    /** scipy 1.10.1: Rotation.align_vectors(Y - mean(Y), P - mean(P)); numpy's SVD agrees to 4e-16. */
    @Test
    void agreesWithAnIndependentFitOfNoisyMarkers() {
        RigidFit fit = new RigidFit(P);

        boolean done = fit.fit(courses(Y), 0);

        assertTrue(done);
        Rotation expected = new Rotation(
                0.2779360295176432,
                -0.9078356033862813,
                -0.31398420457124,
                0.6660574886000146,
                0.41765812058560625,
                -0.6180041392974165,
                0.6921842134690801,
                -0.03736591405500089,
                0.7207529417845098);
        assertEquals(0, distance(expected, fit.labFromSegment()), ROUNDING);
        Vector3 t = new Vector3(0.3501155221988707, -0.11998557225060258, 0.970039045484703);
        assertEquals(0, fit.origin().minus(t).norm(), ROUNDING, "origin, m");
        assertEquals(0.004306350439481733, Math.sqrt(fit.squares()), ROUNDING, "root of the summed squares, m");
        assertEquals(5, fit.known());
    }

    /** scipy 1.10.1, as above, of the first three points alone. */
    @Test
    void leavesOutMarkersThatAreNotKnown() {
        List<Vector3> seen = new ArrayList<>(Y);
        seen.set(3, Vector3.GAP);
        seen.set(4, new Vector3(0.3, Double.NaN, 1));
        RigidFit fit = new RigidFit(P);

        fit.fit(courses(seen), 0);

        Rotation expected = new Rotation(
                0.27642982919183157,
                -0.9170220517386855,
                -0.28750148896648564,
                0.6576094888758833,
                0.39864500650583856,
                -0.6392432392511938,
                0.7008111797576961,
                -0.012357807772065466,
                0.7132397737883764);
        assertEquals(3, fit.known());
        assertEquals(0, distance(expected, fit.labFromSegment()), ROUNDING);
    }

    /** Second opinion: the textbook formula R = U diag(1, 1, det(U Vᵀ)) Vᵀ with EJML's decomposition. */
    @Test
    void agreesWithATextbookDecompositionOnRandomClusters() {
        Random random = new Random(1);
        for (int run = 0; run < 200; run++) {
            List<Vector3> template = randomPoints(random, 3 + run % 4, 0.1);
            if (RigidFit.spread(template) < 0.2) {
                continue;
            }
            Rotation turn = randomRotation(random);
            List<Vector3> seen = template.stream()
                    .map(p -> turn.times(p).plus(new Vector3(1, 2, 3)).plus(randomVector(random, 0.004)))
                    .toList();
            RigidFit fit = new RigidFit(template);

            fit.fit(courses(seen), 0);

            assertEquals(0, distance(textbook(template, seen), fit.labFromSegment()), ROUNDING, "run " + run);
            assertEquals(1, fit.labFromSegment().determinant(), ROUNDING, "run " + run);
        }
    }

    /** By construction: the exact pose is the best fit. */
    @Test
    void findsTheExactPoseOfAPlanarCluster() {
        List<Vector3> flat = List.of(
                new Vector3(0, 0, 0.02),
                new Vector3(0.1, 0, 0.02),
                new Vector3(0, 0.06, 0.02),
                new Vector3(0.1, 0.06, 0.02));
        Rotation turn = Rotation.about(new Vector3(0.6, -0.64, 0.48), 2.8);
        Vector3 t = new Vector3(0.4, -2, 1.1);
        RigidFit fit = new RigidFit(flat);

        fit.fit(courses(flat.stream().map(p -> turn.times(p).plus(t)).toList()), 0);

        assertEquals(0, distance(turn, fit.labFromSegment()), ROUNDING);
        assertEquals(0, fit.origin().minus(t).norm(), ROUNDING);
        assertEquals(0, fit.squares(), ROUNDING * ROUNDING);
    }

    /** Noise through the plane of a flat cluster mirrors it; scipy and EJML then agree on the best proper rotation. */
    @Test
    void staysAProperRotationWhenNoiseMirrorsTheMarkers() {
        List<Vector3> template = List.of(
                new Vector3(0, 0, 0.001), new Vector3(0.1, 0, 0), new Vector3(0, 0.06, 0), new Vector3(0.1, 0.07, 0));
        List<Vector3> mirrored = template.stream()
                .map(p -> new Vector3(p.x(), p.y(), -5 * p.z()))
                .toList();
        RigidFit fit = new RigidFit(template);

        fit.fit(courses(mirrored), 0);

        assertEquals(1, fit.labFromSegment().determinant(), ROUNDING);
        assertEquals(0, distance(textbook(template, mirrored), fit.labFromSegment()), ROUNDING);
    }

    @Test
    void treatsAFrameWithTwoKnownMarkersAsAGap() {
        List<Vector3> seen = new ArrayList<>(Y);
        seen.set(0, Vector3.GAP);
        seen.set(2, Vector3.GAP);
        seen.set(4, Vector3.GAP);

        boolean done = new RigidFit(P).fit(courses(seen), 0);

        assertFalse(done);
    }

    @Test
    void treatsAFrameWhoseKnownMarkersLieOnOneLineAsAGap() {
        List<Vector3> template = List.of(
                new Vector3(0, 0, 0), new Vector3(0.1, 0.001, 0), new Vector3(0.2, 0, 0), new Vector3(0.1, 0.1, 0));
        List<Vector3> seen = new ArrayList<>(template);
        seen.set(3, Vector3.GAP);

        boolean done = new RigidFit(template).fit(courses(seen), 0);

        assertFalse(done);
    }

    @Test
    void treatsAFrameInWhichAllMarkersCoincideAsAGap() {
        List<Vector3> seen = P.stream().map(p -> new Vector3(1, 2, 3)).toList();

        boolean done = new RigidFit(P).fit(courses(seen), 0);

        assertFalse(done);
    }

    /** By symmetry: mirrored along one of two equal axes, the markers fit as well after any turn about the third. */
    @Test
    void treatsAFrameInWhichNoRotationIsBestAsAGap() {
        List<Vector3> template = List.of(
                new Vector3(0.2, 0, 0),
                new Vector3(-0.2, 0, 0),
                new Vector3(0, 0.1, 0),
                new Vector3(0, -0.1, 0),
                new Vector3(0, 0, 0.1),
                new Vector3(0, 0, -0.1));
        List<Vector3> mirrored =
                template.stream().map(p -> new Vector3(p.x(), p.y(), -p.z())).toList();

        boolean done = new RigidFit(template).fit(courses(mirrored), 0);

        assertFalse(done);
    }

    @Test
    void refusesATemplateOnOneLine() {
        List<Vector3> line = List.of(new Vector3(0, 0, 0), new Vector3(0.1, 0.002, 0), new Vector3(0.2, 0, 0));

        assertThrows(IllegalArgumentException.class, () -> new RigidFit(line));
    }

    /** Closed form: centred 2a × 2b rectangle, root sums of squares 2a and 2b. */
    @Test
    void measuresSpreadAsWidthOverLengthOfARectangle() {
        List<Vector3> rectangle = List.of(
                new Vector3(0, 0, 1), new Vector3(0.2, 0, 1), new Vector3(0, 0.03, 1), new Vector3(0.2, 0.03, 1));

        double spread = RigidFit.spread(rectangle);

        assertEquals(0.15, spread, ROUNDING);
    }

    @Test
    void allocatesNothingAFit() {
        RigidFit fit = new RigidFit(P);
        List<VectorSeries> markers = courses(Y);
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        fitOften(fit, markers, 50_000);

        long before = threads.getCurrentThreadAllocatedBytes();
        fitOften(fit, markers, 10_000);
        long first = threads.getCurrentThreadAllocatedBytes();
        fitOften(fit, markers, 20_000);
        long second = threads.getCurrentThreadAllocatedBytes();

        assertTrue(
                second - first - (first - before) < 10_000,
                "bytes for 10 000 more fits: " + (second - 2 * first + before));
    }

    private static void fitOften(RigidFit fit, List<VectorSeries> markers, int times) {
        for (int i = 0; i < times; i++) {
            fit.fit(markers, 0);
        }
    }

    private static Rotation textbook(List<Vector3> template, List<Vector3> seen) {
        Vector3 p0 = mean(template);
        Vector3 y0 = mean(seen);
        DMatrixRMaj h = new DMatrixRMaj(3, 3);
        for (int m = 0; m < template.size(); m++) {
            double[] p = array(template.get(m).minus(p0));
            double[] y = array(seen.get(m).minus(y0));
            for (int i = 0; i < 9; i++) {
                h.add(i / 3, i % 3, y[i / 3] * p[i % 3]);
            }
        }
        SingularValueDecomposition_F64<DMatrixRMaj> svd = DecompositionFactory_DDRM.svd(3, 3, true, true, false);
        svd.decompose(h);
        DMatrixRMaj u = svd.getU(null, false);
        DMatrixRMaj v = svd.getV(null, false);
        double sign = Math.signum(determinant(u) * determinant(v));
        int smallest = smallest(svd.getSingularValues());
        double[] r = new double[9];
        for (int i = 0; i < 9; i++) {
            for (int k = 0; k < 3; k++) {
                r[i] += (k == smallest ? sign : 1) * u.get(i / 3, k) * v.get(i % 3, k);
            }
        }
        return new Rotation(r[0], r[1], r[2], r[3], r[4], r[5], r[6], r[7], r[8]);
    }

    private static int smallest(double[] values) {
        int best = 0;
        for (int k = 1; k < 3; k++) {
            best = values[k] < values[best] ? k : best;
        }
        return best;
    }

    private static double determinant(DMatrixRMaj m) {
        return Rotation.ofColumns(column(m, 0), column(m, 1), column(m, 2)).determinant();
    }

    private static Vector3 column(DMatrixRMaj m, int k) {
        return new Vector3(m.get(0, k), m.get(1, k), m.get(2, k));
    }

    private static double[] array(Vector3 v) {
        return new double[] {v.x(), v.y(), v.z()};
    }

    private static Vector3 mean(List<Vector3> points) {
        return points.stream().reduce(Vector3.ZERO, Vector3::plus).times(1.0 / points.size());
    }

    private static List<VectorSeries> courses(List<Vector3> places) {
        return places.stream().map(place -> VectorSeries.constant(place, 1)).toList();
    }

    private static List<Vector3> randomPoints(Random random, int count, double size) {
        List<Vector3> points = new ArrayList<>();
        for (int m = 0; m < count; m++) {
            points.add(randomVector(random, size));
        }
        return points;
    }

    private static Vector3 randomVector(Random random, double size) {
        return new Vector3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian()).times(size);
    }

    private static Rotation randomRotation(Random random) {
        return Rotation.about(randomVector(random, 1).unit(), Math.PI * random.nextDouble());
    }

    private static double distance(Rotation one, Rotation other) {
        return Math.max(
                one.columnX().minus(other.columnX()).norm(),
                Math.max(
                        one.columnY().minus(other.columnY()).norm(),
                        one.columnZ().minus(other.columnZ()).norm()));
    }
}
