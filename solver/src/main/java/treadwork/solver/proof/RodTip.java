package treadwork.solver.proof;

import java.util.List;
import java.util.Locale;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;

/**
 * How far before the first marker the rod's tip is.
 *
 * @param distance m
 * @param error    standard error, m; 0 where the distance was stated
 * @param residual root mean square distance of the tip from its place, m
 */
record RodTip(double distance, double error, double residual) {

    /** A tip known no better than this spoils the test, m. */
    private static final double LARGEST_ERROR = 0.001;

    /**
     * While the rod turns about its tip at P, x - d u = P for the first marker's place x and the axis u, so with both about
     * their means over the place, d = Σ (x - x̄)·(u - ū)/Σ |u - ū|² (least squares over all places at once).
     */
    static RodTip byTurning(RodCourse rod, PressedFrames frames, String where) {
        double product = 0;
        double turned = 0;
        for (List<Integer> place : frames.places()) {
            Vector3 x = mean(rod.first()::at, place);
            Vector3 u = mean(rod.axis()::at, place);
            for (int i : place) {
                Vector3 off = rod.axis().at(i).minus(u);
                product += rod.first().at(i).minus(x).dot(off);
                turned += off.dot(off);
            }
        }
        double distance = product / turned;
        double residual = residual(rod, frames, distance);
        double error = residual / Math.sqrt(turned);
        if (!(error <= LARGEST_ERROR)) {
            throw new UnusableInputException(turnedTooLittle(error, where));
        }
        return new RodTip(distance, error, residual);
    }

    static RodTip stated(RodCourse rod, PressedFrames frames, double distance) {
        return new RodTip(distance, 0, residual(rod, frames, distance));
    }

    /** Along one axis. */
    private static double residual(RodCourse rod, PressedFrames frames, double distance) {
        double squares = 0;
        int count = 0;
        for (List<Integer> place : frames.places()) {
            Vector3 middle = mean(i -> rod.tip(i, distance), place);
            for (int i : place) {
                Vector3 off = rod.tip(i, distance).minus(middle);
                squares += off.dot(off) / 3;
                count++;
            }
        }
        return Math.sqrt(squares / count);
    }

    private interface Place {
        Vector3 at(int frame);
    }

    private static Vector3 mean(Place course, List<Integer> frames) {
        Vector3 sum = Vector3.ZERO;
        for (int i : frames) {
            sum = sum.plus(course.at(i));
        }
        return sum.times(1.0 / frames.size());
    }

    private static Finding turnedTooLittle(double error, String where) {
        return new Finding(
                "rod-tip",
                Severity.REFUSES,
                where,
                String.format(
                        Locale.ROOT,
                        "the rod turns too little about its tip to find it: standard error %.1f mm, limit %.1f mm",
                        1e3 * error,
                        1e3 * LARGEST_ERROR),
                "Where the tip is not known, the plate's place cannot be told",
                "Measure the distance from the tip to the first marker and give it with --tip-mm, or tilt the rod by 20 degrees and"
                        + " more to all sides with its tip held in place");
    }
}
