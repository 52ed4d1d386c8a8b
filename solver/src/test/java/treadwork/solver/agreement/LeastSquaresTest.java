package treadwork.solver.agreement;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class LeastSquaresTest {

    private static final double ROUNDING = 1e-12;

    /** The line through (0, 1), (1, 3), (2, 4): by hand, level 7/6 and slope 3/2, squares left 1/6. */
    @Test
    void fitsALineAsByHand() {
        LeastSquares line = new LeastSquares(2);
        line.add(new double[] {1, 0}, 1, 1);
        line.add(new double[] {1, 1}, 3, 1);
        line.add(new double[] {1, 2}, 4, 1);

        assertEquals(7.0 / 6, line.value(0), ROUNDING);
        assertEquals(1.5, line.value(1), ROUNDING);
        assertEquals(1.0 / 6, line.squares(), ROUNDING);
        // The slope's variance is one over the sum of squared distances from the mean place, 2.
        assertEquals(0.5, line.variance(1), ROUNDING);
    }

    /** Two values of one unknown, spreads 1 and 2: the weights are 1 and 1/4. */
    @Test
    void weighsByTheSpread() {
        LeastSquares mean = new LeastSquares(1);
        mean.add(new double[] {1}, 10, 1);
        mean.add(new double[] {1}, 20, 2);

        assertEquals(12, mean.value(0), ROUNDING);
        assertEquals(0.8, mean.variance(0), ROUNDING);
    }
}
