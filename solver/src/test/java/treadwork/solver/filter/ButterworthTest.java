package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.FilterSettings.Kind;

class ButterworthTest {

    private static final double RATE = 200;

    /** Rounding of some 20 operations on values near one, fed back: agreement of three other programs is 1e-12. */
    private static final double ROUNDING = 1e-11;

    @ParameterizedTest
    @ValueSource(doubles = {6, 10})
    void matchesTheCheckValuesOfTwoCorrectedPasses(double cutoffHz) throws IOException {
        JsonNode values = SharedFiles.filterCheckValues();
        double[] expected = null;
        for (JsonNode one : values.get("butterworth")) {
            if (one.get("correction").asText().equals("prewarped")
                    && one.get("fc_hz").doubleValue() == cutoffHz) {
                expected = SharedFiles.numbers(one.get("y"));
            }
        }

        double[] smooth = filtered(SharedFiles.numbers(values.get("x")), cutoffHz, 4, RATE);

        assertArrayEquals(expected, smooth, ROUNDING);
    }

    /**
     * Expected: samples 0, 1, 7, 20, 39 of scipy 1.17.1 {@code sosfiltfilt(butter(N, fd, fs=100, output='sos'), x)}, N
     * half the order, fd = 100/π atan(tan(7 π/100)/C), C = (√2 - 1)^(1/(2 N)).
     */
    @Test
    void matchesAnotherProgramAtEveryOrder() {
        double[] x = samples(
                40,
                i -> 0.9
                        + 0.05 * Math.sin(2 * Math.PI * 1.7 * i / 100 + 0.3)
                        + 0.02 * Math.cos(2 * Math.PI * 20 * i / 100)
                        + 0.3 * i / 100);
        double[][] expected = {
            {0.9347461550227305, 0.9315137974953509, 0.9604056045603734, 0.9953835066125021, 0.9746531501680288},
            {0.9346887432703385, 0.934206416226501, 0.9625738313666291, 0.9927908566793558, 0.9744467964933763},
            {0.9350873688516949, 0.9357221285818588, 0.9619244304044394, 0.9923353882630903, 0.9747822674499323},
            {0.9345278806839746, 0.9358064813285941, 0.9614588941853541, 0.9920608600461929, 0.9749675793932613}
        };

        for (int n = 1; n <= 4; n++) {
            double[] y = filtered(x, 7, 2 * n, 100);

            assertArrayEquals(
                    expected[n - 1], new double[] {y[0], y[1], y[7], y[20], y[39]}, ROUNDING, "passes of order " + n);
        }
    }

    /**
     * Expected by the definition of the filter, |H|² = 1/(1 + (√2 - 1) (tan(π f/fs)/tan(π fc/fs))^(2N)): 1/√2 at the
     * cut-off. Tolerance: the start's transient has died down to e^-(π fc/fs 2 x 2000) or less, the rest is rounding.
     */
    @ParameterizedTest
    @ValueSource(ints = {2, 4, 6, 8})
    void bothPassesTogetherHaveTheGainOfTheDefinition(int order) {
        for (double cutoffHz : new double[] {3, 6, 20, 60}) {
            for (double f : new double[] {cutoffHz, cutoffHz / 2, cutoffHz * 1.5}) {
                double warped = Math.tan(Math.PI * f / RATE) / Math.tan(Math.PI * cutoffHz / RATE);
                double expected = 1 / (1 + (Math.sqrt(2) - 1) * Math.pow(warped, order));

                double[] y = filtered(samples(8000, i -> Math.cos(2 * Math.PI * f * i / RATE)), cutoffHz, order, RATE);

                assertEquals(expected, middleAmplitude(y, f, Math::cos), 1e-10, "gain at " + f + " Hz of " + cutoffHz);
                assertEquals(0, middleAmplitude(y, f, Math::sin), 1e-10, "out of phase at " + f + " Hz");
            }
        }
    }

    @Test
    void halfPowerAtTheCutoffIsOneOverRootTwoOfTheAmplitude() {
        double[] y = filtered(samples(8000, i -> Math.cos(2 * Math.PI * 6 * i / RATE)), 6, 4, RATE);

        assertEquals(0.70710678, middleAmplitude(y, 6, Math::cos), 1e-8, "gain at the cut-off");
    }

    /** The two passes are one another's mirror image; only the ends, where they start, tell which was first. */
    @Test
    void aSignalRunBackwardComesOutBackward() {
        double[] x = noise(600, 1);
        double[] backward = samples(600, i -> x[599 - i]);

        double[] y = filtered(x, 6, 4, RATE);
        double[] mirrored = filtered(backward, 6, 4, RATE);

        for (int i = 250; i < 350; i++) {
            assertEquals(y[i], mirrored[599 - i], 1e-13, "sample " + i);
        }
    }

    /** Sums of values near ten, rounding 1e-15 each. */
    @Test
    void isLinearUpToTheEnds() {
        double[] a = noise(100, 2);
        double[] b = noise(100, 3);

        double[] ofSum = filtered(samples(100, i -> 2 * a[i] - 3 * b[i]), 6, 4, RATE);

        double[] ya = filtered(a, 6, 4, RATE);
        double[] yb = filtered(b, 6, 4, RATE);
        assertArrayEquals(samples(100, i -> 2 * ya[i] - 3 * yb[i]), ofSum, 1e-13);
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 4, 6, 8})
    void leavesAConstantAsItIsUpToTheEnds(int order) {
        double[] y = filtered(samples(50, i -> -0.7), 6, order, RATE);

        assertArrayEquals(samples(50, i -> -0.7), y, 1e-13);
    }

    /** At a plate's rate the corner lies at 1/3000 of it; rounding grows with the square of that, 1e-16 x 1e6. */
    @Test
    void keepsItsPrecisionAtAPlatesRate() {
        double[] y = filtered(samples(30000, i -> 700 + Math.cos(2 * Math.PI * 6 * i / 20000)), 6, 4, 20000);

        double expected = 700 + Math.sqrt(0.5) * Math.cos(2 * Math.PI * 6 * 15000 / 20000);
        assertEquals(expected, y[15000], 700 * 1e-10, "N, in the middle");
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -6, 100, 150, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesACutoffThatThisRateCannotHave(double cutoffHz) {
        UnusableInputException refusal =
                assertThrows(UnusableInputException.class, () -> filtered(new double[50], cutoffHz, 4, RATE));

        assertEquals("filter-cutoff", refusal.finding().code());
        assertEquals(
                "the cut-off is " + cutoffHz + " Hz, the sampling rate 200.0 Hz",
                refusal.finding().figure());
    }

    @ParameterizedTest
    @ValueSource(ints = {-2, 0, 1, 3, 5, 10})
    void refusesAnOrderThatTwoEqualPassesCannotHave(int order) {
        UnusableInputException refusal =
                assertThrows(UnusableInputException.class, () -> filtered(new double[50], 6, order, RATE));

        assertEquals("filter-order", refusal.finding().code());
    }

    /**
     * D. A. Winter, Biomechanics and Motor Control of Human Movement, 4th ed. 2009, Tables A.1 and A.2, six markers at
     * 69.95 Hz, which 5 Hz after both passes reproduces. Both tables are rounded to 0.1 mm: print alone gives
     * 0.1/√12 = 0.029 mm rms, and 2 x 0.05 mm at the most. The book's trial went on beyond the
     * table: its ends are left out, 12 frames for the rms, 13 for the largest difference.
     */
    @Test
    void turnsTheHandbooksRawMarkersIntoItsFilteredOnes() throws IOException {
        Path raw = SharedFiles.path("data/handbook-walking/a1-raw-markers-cm.csv");
        Path printed = SharedFiles.path("data/handbook-walking/a2-filtered-markers.csv");
        double squares = 0;
        double largest = 0;
        int count = 0;
        for (String marker : new String[] {"rib_cage", "hip", "knee", "fibula", "ankle", "heel"}) {
            for (String axis : new String[] {"_x", "_y"}) {
                double[] expected = SharedFiles.column(printed, marker + axis + "_m");

                double[] smooth = filtered(SharedFiles.column(raw, marker + axis + "_cm"), 5, 4, 69.95);

                for (int i = 12; i < smooth.length - 12; i++) {
                    double off = smooth[i] * 10 - expected[i] * 1000;
                    squares += off * off;
                    largest = i > 12 && i < smooth.length - 13 ? Math.max(largest, Math.abs(off)) : largest;
                    count++;
                }
            }
        }

        assertEquals(12 * 82, count, "values compared");
        assertEquals(0, Math.sqrt(squares / count), 0.03, "rms, mm");
        assertEquals(0, largest, 0.1, "largest, mm");
    }

    private static double[] filtered(double[] x, double cutoffHz, int order, double rate) {
        FilterSettings settings = new FilterSettings(Kind.BUTTERWORTH, cutoffHz, order);
        VectorSeries series = VectorSeries.of(new double[x.length], x, new double[x.length]);
        return Smoothing.smooth(series, settings, rate).series().componentY().toArray();
    }

    private static double[] samples(int count, IntToDoubleFunction value) {
        double[] samples = new double[count];
        Arrays.setAll(samples, value);
        return samples;
    }

    private static double[] noise(int count, long seed) {
        Random random = new Random(seed);
        return samples(count, i -> random.nextGaussian());
    }

    /** Amplitude of the part of {@code y} that goes with {@code wave} at f, over 4000 samples: whole periods of f. */
    private static double middleAmplitude(double[] y, double f, DoubleUnaryOperator wave) {
        double sum = 0;
        for (int i = 2000; i < 6000; i++) {
            sum += y[i] * wave.applyAsDouble(2 * Math.PI * f * i / RATE);
        }
        return sum / 2000;
    }
}
