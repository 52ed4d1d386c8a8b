package treadwork.solver.plate;

import java.util.BitSet;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/** Whether a plate's forces or moments are out by a power of ten. */
final class PlateUnits {

    /** What a plate shows for nine tenths of a step is above what people can, and below what a child of 13 kg does, N. */
    private static final double MOST = 4000;

    private static final double LEAST = 130;

    /** Of a step, s; shorter is a knock or a hop. */
    private static final double STEP_S = 0.3;

    /** The centre of pressure of a foot that rolls over the plate travels at least this far, and no foot is longer, m. */
    private static final double SHORTEST_WAY = 0.05;

    private static final double LONGEST_WAY = 0.45;

    /** A centre of pressure that keeps this close to the middle comes from moments that are as good as none, m. */
    private static final double COLLAPSED = 0.03;

    /** A foot this far inside the edge is on the plate with most of it, m. */
    private static final double INSIDE = 0.05;

    private static final double[] SMALLER = {0.1, 0.01, 0.001};

    private PlateUnits() {}

    static Optional<Finding> of(MeasuredPlate plate, PlateAxes axes) {
        double greatest = plate.greatestPush();
        BitSet above = plate.pushedHarder(greatest / 2);
        Stretch step = Stretch.longest(plate.pushedHarder(greatest / 10));
        if (!(step.length() >= STEP_S * plate.rate())) {
            return Optional.empty();
        }
        above.clear(0, step.from());
        above.clear(step.end(), plate.size());
        double usual =
                Medians.share(above.stream().mapToDouble(plate.push()::at).toArray(), 0.9);
        if (usual > MOST) {
            return Optional.of(forces(plate, usual, Math.pow(10, -Math.ceil(Math.log10(usual / MOST)))));
        }
        WayOnPlate way = WayOnPlate.of(plate, axes, above, 1);
        if (usual < LEAST) {
            double factor = Math.pow(10, Math.ceil(Math.log10(LEAST / usual)));
            if (isWholeFoot(way) || isWholeFoot(WayOnPlate.of(plate, axes, above, 1 / factor))) {
                return Optional.of(forces(plate, usual, factor));
            }
        }
        return moments(plate, axes, above, way);
    }

    private static Optional<Finding> moments(MeasuredPlate plate, PlateAxes axes, BitSet samples, WayOnPlate way) {
        if (way.share() < 0.5) {
            for (double factor : SMALLER) {
                WayOnPlate other = WayOnPlate.of(plate, axes, samples, factor);
                if (isStep(other)) {
                    return Optional.of(moments(plate, way, other, factor));
                }
            }
        }
        if (way.length() < COLLAPSED && way.offset() < COLLAPSED) {
            WayOnPlate other = WayOnPlate.of(plate, axes, samples, 1000);
            if (isStep(other)) {
                return Optional.of(moments(plate, way, other, 1000));
            }
        }
        return Optional.empty();
    }

    /** A foot that only touches the plate has its centre of pressure near the edge. */
    private static boolean isWholeFoot(WayOnPlate way) {
        return isStep(way) && way.length() >= 2 * SHORTEST_WAY && way.inset() > INSIDE;
    }

    private static boolean isStep(WayOnPlate way) {
        return way.share() >= 0.95 && way.length() >= SHORTEST_WAY && way.length() <= LONGEST_WAY;
    }

    private static Finding forces(MeasuredPlate plate, double usual, double factor) {
        return new Finding(
                "unit-mismatch",
                Severity.WARNING,
                plate.where(),
                String.format(
                        Locale.ROOT,
                        "through a step the plate pushes with up to %.4g N, limits %.0f and %.0f N; %s times as much would be a person's",
                        usual,
                        LEAST,
                        MOST,
                        factor(factor)),
                "If the forces are not in newtons, all joint loads are out by that factor",
                "Check the channels' scale against a person standing on the plate, and record or export again with the right one");
    }

    private static Finding moments(MeasuredPlate plate, WayOnPlate stated, WayOnPlate other, double factor) {
        Finding finding = new Finding(
                "unit-mismatch",
                Severity.WARNING,
                plate.where(),
                String.format(
                        Locale.ROOT,
                        "through a step the centre of pressure is on the plate in %.0f %% of the samples and travels %.3g m, limits %.2f to"
                                + " %.2f m; with moments %s times as large it is in %.0f %% and travels %.2f m",
                        100 * stated.share(),
                        stated.length(),
                        SHORTEST_WAY,
                        LONGEST_WAY,
                        factor(factor),
                        100 * other.share(),
                        other.length()),
                "The moments seem to be in another unit than stated, so the reaction acts in the wrong place at every joint",
                "Set the plate's channelUnit in lab.plates of the study file to the unit that the moments are really in");
        return other(plate.plate(), factor)
                .map(unit -> finding.proposing(PlateChange.of(plate, withUnit(plate.plate(), unit))))
                .orElse(finding);
    }

    /** The unit that makes moments so many times as large. */
    private static Optional<LengthUnit> other(Plate plate, double factor) {
        for (LengthUnit unit : LengthUnit.values()) {
            if (Math.abs(unit.metres() / (plate.channelUnit().metres() * factor) - 1) < 1e-6) {
                return Optional.of(unit);
            }
        }
        return Optional.empty();
    }

    private static Plate withUnit(Plate plate, LengthUnit unit) {
        return new Plate(plate.type(), plate.corners(), plate.origin(), plate.channels(), plate.calibration(), unit);
    }

    private static String factor(double factor) {
        return factor < 1 ? "1/" + Math.round(1 / factor) : String.valueOf(Math.round(factor));
    }
}
