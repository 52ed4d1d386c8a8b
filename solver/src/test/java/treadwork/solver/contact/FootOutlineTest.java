package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** Distances by plane geometry: the outline runs (0,0) (0.2,-0.1) (0.3,0) (0.2,0.1), its points at different heights. */
class FootOutlineTest {

    private static final Vector3 UP = new Vector3(0, 0, 1);

    /** Rounding of sums of lengths below 1 m. */
    private static final double ROUNDING = 1e-14;

    private static final FootOutline FOOT =
            new FootOutline(Side.RIGHT, at(0, 0, 0.05), at(0.2, -0.1, 0.02), at(0.3, 0, 0.03), at(0.2, 0.1, 0.04));

    @Test
    void holdsAPointInsideAtNoDistance() {
        assertEquals(0, FOOT.distance(new Vector3(0.15, 0.02, -0.4), 0, UP), ROUNDING);
        assertEquals(
                0,
                mirrored().distance(new Vector3(0.15, 0.02, -0.4), 0, UP),
                ROUNDING,
                "on the left, going the other way round");
    }

    @Test
    void measuresToTheNearestCornerOrEdgeSeenFromAbove() {
        assertEquals(0.05, FOOT.distance(new Vector3(-0.04, 0.03, 1), 0, UP), ROUNDING, "behind the heel");
        assertEquals(0.1, FOOT.distance(new Vector3(0.4, 0, 1), 0, UP), ROUNDING, "ahead of the toe");
        assertEquals(
                0.05 * Math.sqrt(2),
                FOOT.distance(new Vector3(0.30, 0.10, 0), 0, UP),
                ROUNDING,
                "square to the edge x + y = 0.3");
    }

    @Test
    void seesAlongTheNormalThatIsUp() {
        FootOutline yUp =
                new FootOutline(Side.RIGHT, at(0, 0.05, 0), at(0.2, 0.02, 0.1), at(0.3, 0.03, 0), at(0.2, 0.04, -0.1));

        assertEquals(0.1, yUp.distance(new Vector3(0.4, 7, 0), 0, new Vector3(0, 1, 0)), ROUNDING);
    }

    @Test
    void isNotKnownWhereAPointIsMissing() {
        FootOutline foot =
                new FootOutline(Side.RIGHT, at(0, 0, 0), at(0.2, -0.1, 0), VectorSeries.gaps(1), at(0.2, 0.1, 0));

        assertTrue(Double.isNaN(foot.distance(Vector3.ZERO, 0, UP)));
    }

    @Test
    void refusesPointsOfUnlikeLength() {
        VectorSeries two = VectorSeries.gaps(2);

        assertThrows(IllegalArgumentException.class, () -> new FootOutline(Side.LEFT, two, two, two, at(0, 0, 0)));
    }

    private static FootOutline mirrored() {
        return new FootOutline(
                Side.LEFT, FOOT.heel(), /* fifth= */ FOOT.first(), FOOT.toe(), /* first= */ FOOT.fifth());
    }

    private static VectorSeries at(double x, double y, double z) {
        return VectorSeries.constant(new Vector3(x, y, z), 1);
    }
}
