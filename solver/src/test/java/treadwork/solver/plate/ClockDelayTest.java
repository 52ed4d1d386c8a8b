package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

class ClockDelayTest {

    /** A cubic in time, which the cubic through four samples gives back to rounding. */
    private static final WrenchSeries CUBIC = load(0);

    private static WrenchSeries load(double ahead) {
        VectorSeries.Builder force = new VectorSeries.Builder(20);
        for (int k = 0; k < 20; k++) {
            double t = k + ahead;
            force.set(k, t * t * t - 5 * t, 2 * t, 1);
        }
        VectorSeries series = force.build();
        return new WrenchSeries(Vector3.ZERO, series, series);
    }

    @Test
    void aLagThatIsNoWholeSampleIsTakenOutExactlyForACubic() {
        WrenchSeries onTime = ClockDelay.takenOut(CUBIC, 2.3);

        WrenchSeries expected = load(2.3);
        for (int k = 0; k < 15; k++) {
            assertEquals(0, onTime.force().at(k).minus(expected.force().at(k)).norm(), 1e-9, "sample " + k);
        }
    }

    @Test
    void whatLiesBeyondTheRecordIsAGap() {
        WrenchSeries lagging = ClockDelay.takenOut(CUBIC, 3);
        WrenchSeries leading = ClockDelay.takenOut(CUBIC, -3);

        assertTrue(lagging.force().isGap(17) && !lagging.force().isGap(16));
        assertTrue(leading.moment().isGap(2) && !leading.moment().isGap(3));
    }

    @Test
    void noLagChangesNothing() {
        assertSame(CUBIC, ClockDelay.takenOut(CUBIC, 0));
    }
}
