package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

class RunEndsTest {

    /** Closed form: 200 Hz / (2π 6 Hz) = 5.3 frames, rounded up. */
    @Test
    void oneTimeConstantIsCountedInWholeFrames() {
        assertEquals(6, RunEnds.frames(6, 200));
    }

    @Test
    void nothingIsLeftOutWhereNothingWasSmoothed() {
        assertEquals(0, RunEnds.frames(Double.NaN, 200));
    }

    @Test
    void bothEndsOfEachKnownStretchBecomeGaps() {
        VectorSeries.Builder course = new VectorSeries.Builder(20);
        for (int i = 0; i < 20; i++) {
            course.set(i, i == 9 ? Vector3.GAP : new Vector3(i, 2 * i, -i));
        }

        VectorSeries blanked = RunEnds.blank(course.build(), 2);

        for (int i = 0; i < 20; i++) {
            boolean known = (i >= 2 && i < 7) || (i >= 12 && i < 18);
            assertEquals(known, !blanked.isGap(i), "frame " + i);
        }
        assertEquals(new Vector3(5, 10, -5), blanked.at(5));
    }

    @Test
    void aStretchThatIsAllEndsVanishes() {
        VectorSeries blanked = RunEnds.blank(VectorSeries.constant(Vector3.ZERO, 4), 2);

        for (int i = 0; i < 4; i++) {
            assertTrue(blanked.isGap(i), "frame " + i);
        }
    }
}
