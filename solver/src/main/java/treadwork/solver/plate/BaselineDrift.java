package treadwork.solver.plate;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.WrenchSeries;

/** Whether the level of an unloaded plate moves within a trial, so that no one level can be taken off. */
final class BaselineDrift {

    /**
     * Between the lowest and the highest level of unloaded stretches. 5 N are half of the push at which a contact ends; 1 N·m
     * moves the centre of pressure by 2.5 mm at 400 N, and by 10 mm at 100 N.
     */
    private static final double FORCE = 5;

    private static final double MOMENT = 1;

    private static final List<String> NAMES =
            List.of("force x", "force y", "force z", "moment x", "moment y", "moment z");

    private BaselineDrift() {}

    /** @param quiet stretches in which the plate carries nothing */
    static Optional<Finding> of(MeasuredPlate plate, List<Stretch> quiet) {
        Optional<Finding> worst = Optional.empty();
        double most = 1;
        for (int row = 0; row < NAMES.size(); row++) {
            Course course = Course.of(component(plate.load(), row), quiet, plate.rate());
            double limit = row < 3 ? FORCE : MOMENT;
            if (course.range() / limit > most) {
                most = course.range() / limit;
                worst = Optional.of(finding(plate, row, course));
            }
        }
        return worst;
    }

    private static double[] component(WrenchSeries load, int row) {
        var of = row < 3 ? load.force() : load.moment();
        return switch (row % 3) {
            case 0 -> of.componentX().toArray();
            case 1 -> of.componentY().toArray();
            default -> of.componentZ().toArray();
        };
    }

    /**
     * The means over the stretches.
     *
     * @param range     between the lowest and the highest
     * @param perSecond slope of their line of least squares
     */
    private record Course(double range, double perSecond) {

        static Course of(double[] signal, List<Stretch> quiet, double rate) {
            double lowest = Double.POSITIVE_INFINITY;
            double highest = Double.NEGATIVE_INFINITY;
            double t = 0;
            double x = 0;
            double tt = 0;
            double tx = 0;
            for (Stretch block : quiet) {
                double mean = QuietBlocks.Spread.of(signal, block.from(), block.length())
                        .mean();
                double time = (block.from() + block.end()) / (2 * rate);
                lowest = Math.min(lowest, mean);
                highest = Math.max(highest, mean);
                t += time;
                x += mean;
                tt += time * time;
                tx += time * mean;
            }
            int n = quiet.size();
            return new Course(highest - lowest, (n * tx - t * x) / (n * tt - t * t));
        }
    }

    private static Finding finding(MeasuredPlate plate, int row, Course course) {
        String unit = row < 3 ? "N" : "N·m";
        return new Finding(
                "plate-drift",
                Severity.WARNING,
                plate.where(),
                String.format(
                        Locale.ROOT,
                        "the level of %s (lab axes) moves by %.1f %s between stretches in which the plate is empty, limit %.0f %s, %.2f %s a"
                                + " second along its line",
                        NAMES.get(row),
                        course.range(),
                        unit,
                        row < 3 ? FORCE : MOMENT,
                        unit,
                        course.perSecond(),
                        unit),
                "One level is taken off the whole trial, so loads are off by up to this much, and the centre of pressure most where"
                        + " the force is small",
                "Zero the plate just before each trial and let its amplifier warm up; for this trial set plateZero to frames just"
                        + " before the contact that matters");
    }
}
