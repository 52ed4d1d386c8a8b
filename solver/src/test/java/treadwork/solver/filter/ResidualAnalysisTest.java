package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.FilterSettings.Kind;

class ResidualAnalysisTest {

    private static final double RATE = 200;

    /**
     * Noise of a known size a component, so √3 times that a vector. Expected: the line through the residuals of white
     * noise, integrated over frequency, meets zero at 0.9794 of it. Tolerance 2 %: 4000 x 3 draws have an rms good to
     * 0.7 %, and the signal adds a little.
     */
    @ParameterizedTest
    @CsvSource({"0.0005", "0.002", "0.01"})
    void theResidualAtTheCutoffIsTheNoise(double noise) {
        VectorSeries raw = noisy(4000, noise);

        Smoothed smooth = Smoothing.smooth(raw, settings(Kind.RESIDUAL, Double.NaN), RATE);

        double expected = 0.9794 * Math.sqrt(3) * noise;
        assertEquals(expected, residual(raw, smooth.cutoffHz()), 0.02 * expected, "m");
    }

    /** Second way: least squares by hand over the residuals at 20, 22, .. 40 Hz; the cut-off is sought to 0.01 Hz. */
    @Test
    void theCutoffIsWhereTheResidualMeetsTheLineExtendedToZero() {
        VectorSeries raw = noisy(600, 0.002);
        double sumF = 0;
        double sumR = 0;
        double sumFf = 0;
        double sumFr = 0;
        for (int f = 20; f <= 40; f += 2) {
            double r = residual(raw, f);
            sumF += f;
            sumR += r;
            sumFf += f * f;
            sumFr += f * r;
        }
        double noise = (sumR * sumFf - sumF * sumFr) / (11 * sumFf - sumF * sumF);

        double found = cutoff(raw);

        assertTrue(residual(raw, found) <= noise, "residual above the noise at " + found + " Hz");
        assertTrue(residual(raw, found - 0.01) > noise, "residual below the noise already before " + found + " Hz");
    }

    @Test
    void smoothsAsAButterworthFilterAtTheCutoffItReports() {
        VectorSeries raw = noisy(400, 0.002);

        Smoothed smooth = Smoothing.smooth(raw, settings(Kind.RESIDUAL, Double.NaN), RATE);

        VectorSeries expected = Smoothing.smooth(raw, settings(Kind.BUTTERWORTH, smooth.cutoffHz()), RATE)
                .series();
        for (int i = 0; i < 400; i++) {
            assertEquals(expected.at(i), smooth.series().at(i));
        }
    }

    @Test
    void moreNoiseAsksForALowerCutoff() {
        double quiet = cutoff(noisy(2000, 0.0005));
        double loud = cutoff(noisy(2000, 0.01));

        assertTrue(loud < quiet, loud + " Hz and " + quiet + " Hz");
    }

    /** For noise alone the residual is down to 0.9794 of it at 2.4 Hz, by integration; 1000 draws scatter by 1 to 2 %. */
    @Test
    void aMarkerThatStandsStillGetsALowCutoff() {
        Random random = new Random(3);
        VectorSeries.Builder still = new VectorSeries.Builder(1000);
        for (int i = 0; i < 1000; i++) {
            still.set(i, random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
        }

        double found = cutoff(still.build());

        assertTrue(found >= 0.5 && found < 3.5, found + " Hz");
    }

    /** Whatever cut-off the rounding of a constant leads to, the constant comes out, to the rounding of values near 4. */
    @Test
    void leavesAConstantAsItIs() {
        VectorSeries constant = VectorSeries.constant(new Vector3(1, 2, 4), 100);

        Smoothed smooth = Smoothing.smooth(constant, settings(Kind.RESIDUAL, Double.NaN), RATE);

        assertEquals(0, smooth.series().at(50).minus(constant.at(50)).norm(), 1e-11, "m");
    }

    @Test
    void aSignalWithoutNoiseStaysBelowATenthOfTheRate() {
        double found = cutoff(noisy(1000, 0));

        assertTrue(found > 6 && found <= RATE / 10, found + " Hz");
    }

    /** Expected: a gap costs samples, not the choice; 5 % of 1900 samples missing move it by a few per cent. */
    @Test
    void aGapHardlyChangesTheChoice() {
        VectorSeries whole = noisy(2000, 0.002);
        VectorSeries.Builder holed = new VectorSeries.Builder(2000);
        for (int i = 0; i < 2000; i++) {
            holed.set(i, i >= 700 && i < 800 ? Vector3.GAP : whole.at(i));
        }

        double withGap = cutoff(holed.build());

        assertEquals(cutoff(whole), withGap, 0.05 * cutoff(whole));
    }

    private static double residual(VectorSeries raw, double cutoffHz) {
        VectorSeries smooth = Smoothing.smooth(raw, settings(Kind.BUTTERWORTH, cutoffHz), RATE)
                .series();
        double squares = 0;
        for (int i = 0; i < raw.size(); i++) {
            Vector3 off = raw.at(i).minus(smooth.at(i));
            squares += off.dot(off);
        }
        return Math.sqrt(squares / raw.size());
    }

    private static double cutoff(VectorSeries series) {
        return Smoothing.smooth(series, settings(Kind.RESIDUAL, Double.NaN), RATE)
                .cutoffHz();
    }

    private static FilterSettings settings(Kind kind, double cutoffHz) {
        return new FilterSettings(kind, cutoffHz, 4);
    }

    /** A stride a second with harmonics up to 6 Hz, and white noise of the given size, m. */
    private static VectorSeries noisy(int count, double noise) {
        Random random = new Random(2);
        VectorSeries.Builder samples = new VectorSeries.Builder(count);
        for (int i = 0; i < count; i++) {
            double w = 2 * Math.PI * i / RATE;
            samples.set(
                    i,
                    0.3 * Math.sin(w) + 0.05 * Math.sin(3 * w) + noise * random.nextGaussian(),
                    0.1 * Math.cos(2 * w) + 0.01 * Math.cos(6 * w + 1) + noise * random.nextGaussian(),
                    0.05 * Math.sin(w + 1) + noise * random.nextGaussian());
        }
        return samples.build();
    }
}
