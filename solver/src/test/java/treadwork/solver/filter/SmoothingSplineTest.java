package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.util.Random;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.FilterSettings.Kind;

class SmoothingSplineTest {

    private static final FilterSettings GCV = new FilterSettings(Kind.GCV_SPLINE, 6, 4);

    @Test
    void matchesTheCheckValuesAtAGivenStiffness() throws IOException {
        JsonNode values = SharedFiles.filterCheckValues();
        JsonNode expected = values.get("smoothing_spline").get("x_lambda_10");

        VectorSeries smooth = SmoothingSpline.smooth(series(SharedFiles.numbers(values.get("x"))), 10);

        assertArrayEquals(
                SharedFiles.numbers(expected.get("y")), smooth.componentX().toArray(), 1e-10);
    }

    @ParameterizedTest
    @CsvSource({"x_gcv, x_gcv_case", "x, x_case"})
    void findsTheStiffnessOfLeastCrossValidation(String signal, String name) throws IOException {
        JsonNode values = SharedFiles.filterCheckValues();
        JsonNode expected = values.get("smoothing_spline").get(name);
        VectorSeries series = series(SharedFiles.numbers(values.get(signal)));
        double stiffness = expected.get("lambda_dense").doubleValue();

        double found = SmoothingSpline.stiffness(series);

        assertEquals(stiffness, found, 1e-4 * stiffness);
        assertArrayEquals(
                SharedFiles.numbers(expected.get("y_dense")),
                Smoothing.smooth(series, GCV, 200).series().componentX().toArray(),
                1e-7);
    }

    @Test
    void theDegreesOfFreedomAreThoseOfTheCheckValues() throws IOException {
        JsonNode expected = SharedFiles.filterCheckValues().get("smoothing_spline");

        double kept10 = 60 - StiffBand.of(58, 10).lostFreedom();
        double stiffness = expected.get("x_gcv_case").get("lambda_dense").doubleValue();
        double kept = 60 - StiffBand.of(58, stiffness).lostFreedom();

        assertEquals(expected.get("x_lambda_10").get("trace_A").doubleValue(), kept10, 1e-10);
        assertEquals(expected.get("x_gcv_case").get("trace_A_dense").doubleValue(), kept, 1e-10);
    }

    /** Expected: n - tr A = tr(λ Q (R + λ QᵀQ)⁻¹ Qᵀ) by a dense inverse; its condition is at most 16 λ n⁰, 1e-16 x 1e7. */
    @ParameterizedTest
    @CsvSource({"6, 0.01", "6, 1e6", "7, 3", "40, 0.5", "40, 1e6"})
    void theLostDegreesOfFreedomAreThoseOfTheDenseMatrix(int n, double stiffness) {
        RealMatrix q = new Array2DRowRealMatrix(n, n - 2);
        RealMatrix r = MatrixUtils.createRealIdentityMatrix(n - 2).scalarMultiply(2.0 / 3);
        for (int j = 0; j < n - 2; j++) {
            q.setEntry(j, j, 1);
            q.setEntry(j + 1, j, -2);
            q.setEntry(j + 2, j, 1);
            if (j > 0) {
                r.setEntry(j, j - 1, 1.0 / 6);
                r.setEntry(j - 1, j, 1.0 / 6);
            }
        }
        RealMatrix b = r.add(q.transpose().multiply(q).scalarMultiply(stiffness));
        RealMatrix inverse = new LUDecomposition(b).getSolver().getInverse();
        double expected = q.multiply(inverse)
                .multiply(q.transpose())
                .scalarMultiply(stiffness)
                .getTrace();

        assertEquals(expected, StiffBand.of(n - 2, stiffness).lostFreedom(), 1e-8 * expected);
    }

    /** The result must not depend on how the lab axes lie: one stiffness for all components. */
    @Test
    void turnedAxesGiveTheTurnedResult() {
        VectorSeries series = noisy(200, 1, 0.01);
        VectorSeries.Builder turned = new VectorSeries.Builder(200);
        for (int i = 0; i < 200; i++) {
            turned.set(i, 0.6 * series.x(i) - 0.8 * series.y(i), 0.8 * series.x(i) + 0.6 * series.y(i), series.z(i));
        }

        VectorSeries smooth = Smoothing.smooth(series, GCV, 200).series();
        VectorSeries smoothTurned = Smoothing.smooth(turned.build(), GCV, 200).series();

        for (int i = 0; i < 200; i++) {
            assertEquals(0.6 * smooth.x(i) - 0.8 * smooth.y(i), smoothTurned.x(i), 1e-8, "frame " + i);
        }
    }

    /** A straight movement has nothing to bend, whatever the stiffness. Values up to 3, rounding. */
    @Test
    void leavesAStraightMovementAsItIs() {
        VectorSeries.Builder straight = new VectorSeries.Builder(100);
        for (int i = 0; i < 100; i++) {
            straight.set(i, 0.3 + 0.02 * i, 1, -0.01 * i);
        }
        VectorSeries series = straight.build();

        VectorSeries smooth = Smoothing.smooth(series, GCV, 200).series();

        for (int i = 0; i < 100; i++) {
            assertEquals(0, smooth.at(i).minus(series.at(i)).norm(), 1e-11, "frame " + i);
        }
    }

    /** White noise of 5 mm on 1 Hz at 200 Hz; a filter passing 1 to 5 Hz leaves a tenth to a third of it. */
    @Test
    void takesMostOfWhiteNoiseAway() {
        VectorSeries raw = noisy(1000, 2, 0.005);
        VectorSeries truth = noisy(1000, 2, 0);

        Smoothed smooth = Smoothing.smooth(raw, GCV, 200);

        assertTrue(rms(smooth.series(), truth) < 0.005 / 3, "rms from the truth, m: " + rms(smooth.series(), truth));
        assertTrue(smooth.cutoffHz() > 1 && smooth.cutoffHz() < 5, "cut-off, Hz: " + smooth.cutoffHz());
    }

    /** Expected: the frequency response 1/(1 + λ ω⁴) at the reported cut-off is 1/√2, measured on a long sine. */
    @Test
    void reportsTheFrequencyThatComesThroughAtOneOverRootTwo() {
        double stiffness = 300;
        double w = 2 * Math.PI * SmoothingSpline.cutoff(stiffness, 200) / 200;
        double[] wave = new double[2000];
        for (int i = 0; i < 2000; i++) {
            wave[i] = Math.cos(w * (i - 1000));
        }

        double crest = SmoothingSpline.smooth(series(wave), stiffness).x(1000);

        // Sampled bends, (2 sin(w/2))⁴ over the spline's (2 + cos w)/3, part from w⁴ by w⁴/720: 2e-6 here.
        assertEquals(Math.sqrt(0.5), crest, 1e-5);
    }

    /** Expected: each part on its own at the stiffness found for both together. */
    @Test
    void aGapPartsTheSeriesButNotItsStiffness() {
        VectorSeries whole = noisy(200, 3, 0.01);
        VectorSeries.Builder holed = new VectorSeries.Builder(200);
        for (int i = 0; i < 200; i++) {
            boolean lost = (i >= 80 && i < 90) || (i >= 95 && i < 97);
            holed.set(i, lost ? Vector3.GAP : whole.at(i));
        }
        VectorSeries series = holed.build();

        VectorSeries smooth = Smoothing.smooth(series, GCV, 200).series();

        double stiffness = SmoothingSpline.stiffness(series);
        VectorSeries first = SmoothingSpline.smooth(whole.every(0, 1, 80), stiffness);
        VectorSeries last = SmoothingSpline.smooth(whole.every(97, 1, 103), stiffness);
        for (int i = 0; i < 200; i++) {
            Vector3 expected = i < 80 ? first.at(i) : i < 97 ? Vector3.GAP : last.at(i - 97);
            assertEquals(expected, smooth.at(i), "five frames are too few; frame " + i);
        }
    }

    private static double rms(VectorSeries a, VectorSeries b) {
        double squares = 0;
        for (int i = 0; i < a.size(); i++) {
            Vector3 off = a.at(i).minus(b.at(i));
            squares += off.dot(off);
        }
        return Math.sqrt(squares / a.size() / 3);
    }

    private static VectorSeries series(double[] x) {
        return VectorSeries.of(x, new double[x.length], new double[x.length]);
    }

    private static VectorSeries noisy(int count, long seed, double noise) {
        Random random = new Random(seed);
        VectorSeries.Builder samples = new VectorSeries.Builder(count);
        for (int i = 0; i < count; i++) {
            double angle = 2 * Math.PI * i / 200;
            samples.set(
                    i,
                    0.3 * Math.sin(angle) + noise * random.nextGaussian(),
                    0.2 * Math.cos(angle) + noise * random.nextGaussian(),
                    0.1 * Math.sin(angle + 1) + noise * random.nextGaussian());
        }
        return samples.build();
    }
}
