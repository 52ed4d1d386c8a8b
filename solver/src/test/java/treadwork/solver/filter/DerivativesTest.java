package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

class DerivativesTest {

    private static final double RATE = 200;

    /**
     * Expected in closed form: p(t) = a + b t + c t² + d t³ + e t⁴ + f t⁵ in each component. Rounding: 1e-16 of values
     * below 2, times the rate, times its square.
     */
    @Test
    void aQuinticMovementHasItsExactDerivatives() {
        VectorSeries.Builder moved = new VectorSeries.Builder(100);
        for (int i = 0; i < 100; i++) {
            double t = i / RATE;
            moved.set(i, 0.9 + 1.3 * t, 0.2 - 0.4 * t * t, 1.1 * Math.pow(t, 5) - 0.7 * Math.pow(t, 3));
        }

        Derivatives derivatives = Derivatives.of(moved.build(), RATE);

        for (int i = 0; i < 100; i++) {
            double t = i / RATE;
            Vector3 velocity = new Vector3(1.3, -0.8 * t, 5.5 * Math.pow(t, 4) - 2.1 * t * t);
            Vector3 acceleration = new Vector3(0, -0.8, 22 * Math.pow(t, 3) - 4.2 * t);
            assertClose(velocity, derivatives.first().at(i), 1e-11, "velocity in frame " + i);
            assertClose(acceleration, derivatives.second().at(i), 1e-8, "acceleration in frame " + i);
        }
    }

    /**
     * A sine of 8 Hz at 200 Hz, sixteen phases. Tolerance 0.1 % of the second derivative's range, which the very first
     * and last frame just keep; theory says (ω h)⁴/720/2 = 2.8e-6 of the range between the ends.
     */
    @Test
    void eightHertzAtTwoHundredStayWithinATenthPercentOfRange() {
        double w = 2 * Math.PI * 8;
        for (int phase = 0; phase < 16; phase++) {
            VectorSeries.Builder wave = new VectorSeries.Builder(200);
            for (int i = 0; i < 200; i++) {
                wave.set(i, Math.sin(w * i / RATE + Math.PI * phase / 8), 0, 0);
            }

            VectorSeries second = Derivatives.of(wave.build(), RATE).second();

            for (int i = 0; i < 200; i++) {
                double expected = -w * w * Math.sin(w * i / RATE + Math.PI * phase / 8);
                boolean inside = i >= 10 && i < 190;
                double share = inside ? 3e-6 : 1e-3;
                assertEquals(expected, second.x(i), share * 2 * w * w, "phase " + phase + ", frame " + i);
            }
        }
    }

    /** Expected: the parts on their own, to the last bit; gaps where a part has fewer than six frames. */
    @Test
    void aGapAnywhereLeavesTwoRunsThatKnowNothingOfOneAnother() {
        VectorSeries whole = wave(30);
        for (int from = 0; from < 30; from++) {
            int to = Math.min(30, from + 2);
            VectorSeries.Builder holed = new VectorSeries.Builder(30);
            for (int i = 0; i < 30; i++) {
                holed.set(i, i >= from && i < to ? Vector3.GAP : whole.at(i));
            }

            Derivatives derivatives = Derivatives.of(holed.build(), RATE);

            assertRun(whole, derivatives, new Run(0, from));
            assertRun(whole, derivatives, new Run(to, 30));
            for (int i = from; i < to; i++) {
                assertTrue(derivatives.first().isGap(i) && derivatives.second().isGap(i), "gap kept at " + i);
            }
        }
    }

    @Test
    void refusesARateThatIsNone() {
        assertThrows(IllegalArgumentException.class, () -> Derivatives.of(wave(30), -1));
        assertThrows(IllegalArgumentException.class, () -> Derivatives.of(wave(30), Double.NaN));
    }

    /**
     * Bytes, warm: 6 doubles a frame of results, 6 of copies, 3 of coefficients, 9 of factors, 2 of sites and knots; an
     * object a frame would add 16 bytes or more.
     */
    @Test
    void allocatesNothingAFrameButArrays() {
        VectorSeries some = wave(4000);
        VectorSeries twice = wave(8000);
        for (int i = 0; i < 100; i++) {
            Derivatives.of(some, RATE);
            Derivatives.of(twice, RATE);
        }

        long bytes = allocatedBy(twice) - allocatedBy(some);

        assertTrue(bytes <= 4000 * 27 * 8L, bytes + " bytes for 4000 frames more");
    }

    private static long allocatedBy(VectorSeries series) {
        com.sun.management.ThreadMXBean threads = (com.sun.management.ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getCurrentThreadAllocatedBytes();
        Derivatives.of(series, RATE);
        return threads.getCurrentThreadAllocatedBytes() - before;
    }

    private static void assertRun(VectorSeries whole, Derivatives derivatives, Run run) {
        Derivatives alone = Derivatives.of(whole.every(run.from(), 1, run.length()), RATE);
        for (int i = 0; i < run.length(); i++) {
            assertEquals(run.length() < 6, alone.first().isGap(i), "known from six frames on: " + run);
            assertEquals(alone.first().at(i), derivatives.first().at(run.from() + i));
            assertEquals(alone.second().at(i), derivatives.second().at(run.from() + i));
        }
    }

    private static void assertClose(Vector3 expected, Vector3 actual, double tolerance, String what) {
        assertEquals(0, expected.minus(actual).norm(), tolerance, what);
    }

    private static VectorSeries wave(int count) {
        VectorSeries.Builder wave = new VectorSeries.Builder(count);
        for (int i = 0; i < count; i++) {
            wave.set(i, Math.sin(0.2 * i), Math.cos(0.1 * i), 0.01 * i * i);
        }
        return wave.build();
    }
}
