package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SplineTest {

    /** Tolerances as the check values state them: other programs part by 2e-14 and 2e-11 there. */
    @Test
    void theCubicMatchesTheCheckValuesAtTheSamples() throws IOException {
        JsonNode values = SharedFiles.filterCheckValues();
        JsonNode expected = values.get("cubic_spline").get("not-a-knot");
        double[] x = SharedFiles.numbers(values.get("x"));
        Spline spline = Spline.uniform(3, 60);

        spline.solve(x, 0);

        assertArrayEquals(SharedFiles.numbers(expected.get("d1")), derivative(spline, 1, x, 200), 1e-10);
        assertArrayEquals(SharedFiles.numbers(expected.get("d2")), derivative(spline, 2, x, 200), 1e-8);
    }

    @Test
    void theCubicMatchesTheCheckValuesBetweenTheSamples() throws IOException {
        JsonNode values = SharedFiles.filterCheckValues();
        JsonNode expected = values.get("cubic_spline").get("not-a-knot");
        double[] x = SharedFiles.numbers(values.get("x"));
        double[] times = SharedFiles.numbers(expected.get("query_t"));
        Spline spline = Spline.uniform(3, 60);

        spline.solve(x, 0);

        for (int i = 0; i < times.length; i++) {
            double u = times[i] * 200;
            assertEquals(expected.get("value").get(i).doubleValue(), spline.at(u, 0, x), 1e-12);
            assertEquals(expected.get("d1_query").get(i).doubleValue(), spline.at(u, 1, x) * 200, 1e-10);
            assertEquals(expected.get("d2_query").get(i).doubleValue(), spline.at(u, 2, x) * 40000, 1e-8);
        }
    }

    /** Expected: scipy 1.17.1 {@code make_interp_spline(t, x, k=5).derivative(1)(t)} and {@code (2)}; relative 1e-11. */
    @Test
    void theQuinticMatchesAnotherProgramAtTheSamples() {
        double[] x = new double[12];
        Arrays.setAll(x, i -> Math.sin(2 * Math.PI * 3 * i / 50 + 0.4) + 0.3 * (i / 50.0) * (i / 50.0));
        double[] first = {
            17.348972090284228,
            13.454437709894966,
            7.654412496987283,
            0.7867881268485575,
            -6.187871607858918,
            -12.286074022520307,
            -16.65051545396101,
            -18.66640255721553,
            -18.048440718459272,
            -14.883215087280202,
            -9.609711982467283,
            -2.9827021857598
        };
        double[] second = {
            -134.7663092237518,
            -248.79917970247203,
            -324.2209109609017,
            -354.46461391088303,
            -334.6965323419087,
            -267.8996249843908,
            -163.35982045856758,
            -35.82061652129529,
            96.87883062238099,
            215.95664193653977,
            305.1039120302577,
            348.7046451704895
        };
        Spline spline = Spline.uniform(5, 12);

        spline.solve(x, 0);

        assertArrayEquals(first, derivative(spline, 1, x, 50), 2e-10);
        assertArrayEquals(second, derivative(spline, 2, x, 50), 4e-9);
    }

    /** Expected: scipy 1.17.1 {@code make_interp_spline(k, cos(0.7 k), k=5)} and its second derivative, good to 1e-11 there. */
    @Test
    void theQuinticThroughUnevenSitesMatchesAnotherProgram() {
        double[] sites = {0, 1, 2, 4, 7, 8, 9, 11};
        double[] at = {0.5, 3, 5.5, 6.25, 10};
        double[] value = {
            0.9382481800998433, -0.5074146649180891, -0.7486565212909212, -0.3245659782327197, 0.7313399266196151
        };
        double[] second = {
            -0.45286345874375555, 0.2525835071685513, 0.3563520846660974, 0.157924269177611, -0.3482594409577585
        };
        double[] values = Arrays.stream(sites).map(u -> Math.cos(0.7 * u)).toArray();
        Spline spline = Spline.through(5, sites);

        spline.solve(values, 0);

        for (int i = 0; i < at.length; i++) {
            assertEquals(value[i], spline.at(at[i], 0, values), 1e-13);
            assertEquals(second[i], spline.at(at[i], 2, values), 1e-11);
        }
    }

    /** Every length from the fewest sites past the first with rows that are kept once; values below 10, u below 1. */
    @ParameterizedTest
    @CsvSource({"3, 4, 20", "5, 6, 40"})
    void aPolynomialOfItsDegreeIsItself(int degree, int fewest, int most) {
        double[] c = {0.3, -1.1, 0.7, 2.3, degree == 5 ? -1.9 : 0, degree == 5 ? 0.8 : 0};
        for (int n = fewest; n <= most; n++) {
            int samples = n;
            double[] values = new double[n];
            Arrays.setAll(values, i -> polynomial(c, (double) i / samples));
            Spline spline = Spline.uniform(degree, n);

            spline.solve(values, 0);

            double[] first = derivative(spline, 1, values, n);
            double[] second = derivative(spline, 2, values, n);
            for (int i = 0; i < n; i++) {
                double u = (double) i / n;
                assertEquals(slope(c, u), first[i], 1e-12 * n, n + " sites, slope at " + i);
                assertEquals(curvature(c, u), second[i], 1e-12 * n * n, n + " sites, curvature at " + i);
                assertEquals(polynomial(c, u + 0.5 / n), spline.at(i + 0.5, 0, values), 1e-12, "between");
            }
        }
    }

    /** Theory: a quintic spline's second derivative at the knots is off by h⁴ f⁽⁶⁾/720, a cubic's by h² f⁽⁴⁾/12. */
    @ParameterizedTest
    @CsvSource({"3, 2, 12", "5, 4, 720"})
    void theErrorOfTheSecondDerivativeFallsAsTheTheorySays(int degree, int power, double divisor) {
        for (int n : new int[] {48, 96, 192}) {
            double h = 2 * Math.PI / n;
            double[] values = new double[2 * n];
            Arrays.setAll(values, i -> Math.sin(h * i));
            Spline spline = Spline.uniform(degree, 2 * n);

            spline.solve(values, 0);

            int top = n + n / 4;
            double off = derivative(spline, 2, values, 1 / h)[top] + 1;
            double expected = Math.pow(h, power) / divisor;
            assertEquals(expected, Math.abs(off), 0.05 * expected, "at the crest, " + n + " samples a turn");
        }
    }

    /** A spline through noise passes through it; 10 000 sites show whether elimination without exchange stays sound. */
    @Test
    void staysSoundOverLongRunsOfNoise() {
        Random random = new Random(5);
        double[] noise = random.doubles(10000, -1, 1).toArray();
        double[] coefficients = noise.clone();
        Spline spline = Spline.uniform(5, noise.length);

        spline.solve(coefficients, 0);

        assertArrayEquals(noise, derivative(spline, 0, coefficients, 1), 1e-13);
    }

    @Test
    void refusesADegreeItDoesNotKnowAndTooFewSites() {
        assertThrows(IllegalArgumentException.class, () -> Spline.uniform(4, 20));
        assertThrows(IllegalArgumentException.class, () -> Spline.uniform(5, 5));
        IllegalArgumentException refusal =
                assertThrows(IllegalArgumentException.class, () -> Spline.through(3, 0, 1, 2));
        assertTrue(refusal.getMessage().contains("needs 4 sites, has 3"), refusal.getMessage());
    }

    private static double[] derivative(Spline spline, int order, double[] coefficients, double rate) {
        double[] derivative = new double[coefficients.length];
        spline.differentiate(order, coefficients, 0, derivative);
        return Arrays.stream(derivative).map(v -> v * Math.pow(rate, order)).toArray();
    }

    private static double polynomial(double[] c, double u) {
        return c[0] + u * (c[1] + u * (c[2] + u * (c[3] + u * (c[4] + u * c[5]))));
    }

    private static double slope(double[] c, double u) {
        return c[1] + u * (2 * c[2] + u * (3 * c[3] + u * (4 * c[4] + u * 5 * c[5])));
    }

    private static double curvature(double[] c, double u) {
        return 2 * c[2] + u * (6 * c[3] + u * (12 * c[4] + u * 20 * c[5]));
    }
}
