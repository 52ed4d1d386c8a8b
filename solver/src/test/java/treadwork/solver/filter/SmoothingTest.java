package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.FilterSettings.Kind;

class SmoothingTest {

    private static final double RATE = 200;
    private static final FilterSettings BUTTERWORTH = FilterSettings.DEFAULT;

    /** Nine samples are reflected at either end, so ten are needed. */
    private static final int SHORTEST = 10;

    @Test
    void noneReturnsTheSeriesAsItIs() {
        VectorSeries series = noisy(30, 1);

        Smoothed smoothed = Smoothing.smooth(series, FilterSettings.NONE, RATE);

        assertSame(series, smoothed.series());
        assertTrue(Double.isNaN(smoothed.cutoffHz()), "there is no cut-off");
    }

    @Test
    void reportsTheCutoffItUsed() {
        assertEquals(6, Smoothing.smooth(noisy(30, 1), BUTTERWORTH, RATE).cutoffHz());
    }

    /** Expected: each part filtered on its own, to the last bit; a gap wherever a part has fewer than ten frames. */
    @Test
    void aGapAnywhereLeavesTwoRunsThatKnowNothingOfOneAnother() {
        VectorSeries whole = noisy(40, 2);
        for (int from = 0; from < 40; from++) {
            int to = Math.min(40, from + 3);

            VectorSeries smooth = butterworth(withGap(whole, from, to));

            assertRun(whole, smooth, new Run(0, from));
            assertRun(whole, smooth, new Run(to, 40));
            for (int i = from; i < to; i++) {
                assertTrue(smooth.isGap(i), "gap kept at " + i);
            }
        }
    }

    @Test
    void oneMissingComponentIsAGapOfTheWholeVector() {
        VectorSeries whole = noisy(40, 3);
        VectorSeries.Builder holed = new VectorSeries.Builder(40);
        for (int i = 0; i < 40; i++) {
            holed.set(i, whole.x(i), i == 20 ? Double.NaN : whole.y(i), whole.z(i));
        }

        VectorSeries smooth = butterworth(holed.build());

        assertRun(whole, smooth, new Run(0, 20));
        assertRun(whole, smooth, new Run(21, 40));
        assertTrue(Double.isNaN(smooth.x(20)) && Double.isNaN(smooth.y(20)) && Double.isNaN(smooth.z(20)));
    }

    @ParameterizedTest
    @EnumSource(Kind.class)
    void gapsAndNothingStayGapsAndNothing(Kind kind) {
        FilterSettings settings = new FilterSettings(kind, 6, 4);

        VectorSeries gaps =
                Smoothing.smooth(VectorSeries.gaps(30), settings, RATE).series();
        VectorSeries nothing =
                Smoothing.smooth(VectorSeries.gaps(0), settings, RATE).series();

        assertEquals(30, Run.gaps(gaps).get(0).length());
        assertEquals(0, nothing.size());
    }

    @ParameterizedTest
    @EnumSource(value = Kind.class, names = "NONE", mode = EnumSource.Mode.EXCLUDE)
    void aSingleFrameIsTooShortForAnyFilter(Kind kind) {
        VectorSeries smooth = Smoothing.smooth(noisy(1, 4), new FilterSettings(kind, 6, 4), RATE)
                .series();

        assertTrue(smooth.isGap(0));
    }

    @Test
    void refusesARateThatIsNone() {
        assertThrows(IllegalArgumentException.class, () -> Smoothing.smooth(noisy(30, 1), BUTTERWORTH, 0));
        assertThrows(IllegalArgumentException.class, () -> Smoothing.smooth(noisy(30, 1), BUTTERWORTH, Double.NaN));
    }

    /** Expected: force and moment through the vector form. */
    @Test
    void smoothsTheSixComponentsOfALoadAlike() {
        WrenchSeries load = new WrenchSeries(new Vector3(0.3, 0.2, 0.1), noisy(60, 5), noisy(60, 6));

        SmoothedWrench smooth = Smoothing.smooth(load, BUTTERWORTH, RATE);

        assertEquals(6, smooth.cutoffHz());
        assertEquals(load.point(), smooth.series().point());
        assertRun(load.force(), smooth.series().force(), new Run(0, 60));
        assertRun(load.moment(), smooth.series().moment(), new Run(0, 60));
    }

    /** Expected: the moment filtered at the cut-off that was found for the force. */
    @Test
    void theForceChoosesTheCutoffOfItsMoment() {
        VectorSeries slow = movement(400, 1, 0.01);
        VectorSeries fast = movement(400, 4, 0.01);
        FilterSettings residual = new FilterSettings(Kind.RESIDUAL, 6, 4);

        SmoothedWrench smooth = Smoothing.smooth(new WrenchSeries(Vector3.ZERO, slow, fast), residual, RATE);

        double cutoffHz = Smoothing.smooth(slow, residual, RATE).cutoffHz();
        assertEquals(cutoffHz, smooth.cutoffHz());
        VectorSeries expected = Smoothing.smooth(fast, new FilterSettings(Kind.BUTTERWORTH, cutoffHz, 4), RATE)
                .series();
        assertEquals(expected.at(200), smooth.series().moment().at(200));
    }

    /**
     * Bytes, warm: three result arrays and one to work in are 4 x 8 bytes a frame; an object a frame would add 16 or
     * more.
     */
    @Test
    void allocatesNothingAFrameButArrays() {
        VectorSeries some = noisy(4000, 7);
        VectorSeries twice = noisy(8000, 8);
        for (int i = 0; i < 200; i++) {
            butterworth(some);
            butterworth(twice);
        }

        long bytes = allocatedBy(twice) - allocatedBy(some);

        assertTrue(bytes <= 4000 * 33L, bytes + " bytes for 4000 frames more");
    }

    private static long allocatedBy(VectorSeries series) {
        com.sun.management.ThreadMXBean threads = (com.sun.management.ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getCurrentThreadAllocatedBytes();
        butterworth(series);
        return threads.getCurrentThreadAllocatedBytes() - before;
    }

    private static void assertRun(VectorSeries raw, VectorSeries smooth, Run run) {
        VectorSeries expected = run.length() < SHORTEST
                ? VectorSeries.gaps(run.length())
                : butterworth(raw.every(run.from(), 1, run.length()));
        for (int i = 0; i < run.length(); i++) {
            assertEquals(run.length() < SHORTEST, smooth.isGap(run.from() + i), "known from ten frames on: " + run);
            assertEquals(expected.at(i), smooth.at(run.from() + i), "frame " + i + " of " + run);
        }
    }

    private static VectorSeries butterworth(VectorSeries series) {
        return Smoothing.smooth(series, BUTTERWORTH, RATE).series();
    }

    private static VectorSeries withGap(VectorSeries series, int from, int to) {
        VectorSeries.Builder holed = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            holed.set(i, i >= from && i < to ? Vector3.GAP : series.at(i));
        }
        return holed.build();
    }

    private static VectorSeries noisy(int count, long seed) {
        return movement(count, 2, 0.1, new Random(seed));
    }

    private static VectorSeries movement(int count, double hertz, double noise) {
        return movement(count, hertz, noise, new Random(9));
    }

    private static VectorSeries movement(int count, double hertz, double noise, Random random) {
        VectorSeries.Builder samples = new VectorSeries.Builder(count);
        for (int i = 0; i < count; i++) {
            double angle = 2 * Math.PI * hertz * i / RATE;
            samples.set(
                    i,
                    Math.sin(angle) + noise * random.nextGaussian(),
                    Math.cos(angle) + noise * random.nextGaussian(),
                    0.2 * Math.sin(2 * angle + 1) + noise * random.nextGaussian());
        }
        return samples.build();
    }
}
