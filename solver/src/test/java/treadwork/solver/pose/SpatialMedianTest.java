package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

class SpatialMedianTest {

    /** The iteration ends when it steps less than 1e-13 m and a step shrinks the error at least to a half. */
    private static final double SETTLED = 1e-12;

    /** Of four corners of a convex quadrangle it is where the diagonals cross (Fagnano). */
    @Test
    void isTheCrossingOfTheDiagonalsAndLeavesGapsOut() {
        VectorSeries places = VectorSeries.of(
                new double[] {0, 4, Double.NaN, 6, 0}, new double[] {0, 0, 9, 6, 4}, new double[] {1, 1, 9, 1, 1});

        Vector3 median = SpatialMedian.of(places);

        assertEquals(0, median.minus(new Vector3(2, 2, 1)).norm(), SETTLED);
    }

    /** Closed form: with more than half of the places at one point the median is that point, to the nearest distance told apart. */
    @Test
    void aFewWildFramesDoNotMoveIt() {
        VectorSeries.Builder places = new VectorSeries.Builder(20);
        for (int i = 0; i < 20; i++) {
            places.set(i, i < 8 ? new Vector3(i, -3, 40) : new Vector3(0.2, 0.3, 0.9));
        }

        Vector3 median = SpatialMedian.of(places.build());

        assertEquals(0, median.minus(new Vector3(0.2, 0.3, 0.9)).norm(), 1e-9);
    }

    @Test
    void turnsWithTheLab() {
        Random random = new Random(5);
        Rotation turn = Rotation.about(new Vector3(1, 2, -2).unit(), 1.1);
        VectorSeries.Builder places = new VectorSeries.Builder(101);
        VectorSeries.Builder turned = new VectorSeries.Builder(101);
        for (int i = 0; i < 101; i++) {
            Vector3 place = new Vector3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
            places.set(i, place);
            turned.set(i, turn.times(place));
        }

        Vector3 median = SpatialMedian.of(places.build());

        assertEquals(
                0, turn.times(median).minus(SpatialMedian.of(turned.build())).norm(), SETTLED);
    }

    @Test
    void isAGapWhereNothingIsSeen() {
        assertTrue(SpatialMedian.of(VectorSeries.gaps(4)).isGap());
    }
}
