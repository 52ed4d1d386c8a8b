package treadwork.solver.proof;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import treadwork.model.body.Gravity;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateLoads;

/** How truly a plate shows known masses, and where it says that they stand. */
public final class WeightsTest {

    /** As for a contact, N. */
    private static final double LEAST_PUSH = 20;

    private WeightsTest() {}

    /** A mass at rest in one of the captures. */
    private record Rest(Capture capture, PlateLoad load, Plateau plateau) {

        double push() {
            return mean(load.raw().force(), plateau).dot(load.surface().normal());
        }
    }

    /**
     * Evaluates captures in which masses rest on a plate, one after the other.
     *
     * @param captures in the order of the masses; each holds one or more of them
     * @param number   of the plate, counted from 1
     * @throws UnusableInputException where the captures do not allow it, or hold more or fewer masses at rest than stated
     */
    public static WeightsResult of(List<Capture> captures, int number, LabAxis up, List<KnownMass> masses) {
        List<Rest> rests = new ArrayList<>();
        List<Finding> findings = new ArrayList<>();
        for (Capture capture : captures) {
            PlateLoads loads = ProvedLoad.resolve(capture, capture.plates(), up);
            PlateLoad load = ProvedLoad.of(loads, number, capture.plates().size(), capture.name());
            findings.addAll(ProvedLoad.findings(loads, number));
            Plateau.find(load.rawPush(), capture.analogRate(), LEAST_PUSH)
                    .forEach(plateau -> rests.add(new Rest(capture, load, plateau)));
        }
        if (rests.size() != masses.size()) {
            throw new UnusableInputException(otherCount(captures, number, masses, rests));
        }
        List<WeightsResult.Row> rows = new ArrayList<>();
        for (int k = 0; k < rests.size(); k++) {
            rows.add(row(rests.get(k), number, up, masses.get(k)));
        }
        return new WeightsResult(number, rows, gain(rows), findings);
    }

    private static Finding otherCount(List<Capture> captures, int number, List<KnownMass> masses, List<Rest> rests) {
        String found = rests.stream()
                .map(rest -> String.format(
                        Locale.ROOT,
                        "%.1f N from %.1f s",
                        rest.push(),
                        rest.plateau.from() / rest.capture.analogRate()))
                .collect(Collectors.joining(", "));
        return new Finding(
                "weights-count",
                Severity.REFUSES,
                captures.stream().map(Capture::name).collect(Collectors.joining(", ")) + ", plate " + number,
                masses.size() + " masses are stated, " + rests.size() + " loads rest on the plate for 1 s or more"
                        + (found.isEmpty() ? "" : ": " + found),
                "Which load is which mass cannot be told",
                "State the masses in the order in which they were put on, and leave each alone for 3 s");
    }

    private static double gain(List<WeightsResult.Row> rows) {
        double products = 0;
        double squares = 0;
        for (WeightsResult.Row row : rows) {
            products += row.shown() * row.expected();
            squares += row.expected() * row.expected();
        }
        return products / squares;
    }

    private static WeightsResult.Row row(Rest rest, int number, LabAxis up, KnownMass mass) {
        Vector3 force = mean(rest.load.raw().force(), rest.plateau);
        Vector3 moment = mean(rest.load.raw().moment(), rest.plateau);
        double shown = force.dot(up.direction());
        double shear = force.minus(up.direction().times(shown)).norm();
        Plate plate = rest.capture.plates().get(number - 1);
        Rotation labFromPlate = axes(plate);
        Optional<Vector3> off = mass.place()
                .map(place -> labFromPlate.transposeTimes(
                        centreOfPressure(rest.load, force, moment).minus(standing(place, rest, plate))));
        return new WeightsResult.Row(
                mass,
                mass.massKg() * Gravity.ACCELERATION,
                shown,
                scatter(rest, up.direction(), shown),
                shear,
                off.map(v -> OptionalDouble.of(v.x())).orElse(OptionalDouble.empty()),
                off.map(v -> OptionalDouble.of(v.y())).orElse(OptionalDouble.empty()));
    }

    private static Vector3 centreOfPressure(PlateLoad load, Vector3 force, Vector3 moment) {
        Vector3 n = load.surface().normal();
        return load.surface().point().plus(n.cross(moment).times(1 / n.dot(force)));
    }

    /** Where the mass stands, lab axes, m. */
    private static Vector3 standing(KnownMass.Place place, Rest rest, Plate plate) {
        if (place instanceof KnownMass.OnPlate on) {
            return plate.centre().plus(axes(plate).times(new Vector3(on.x(), on.y(), 0)));
        }
        String label = ((KnownMass.BelowMarker) place).label();
        VectorSeries marker = RodCourse.marker(rest.capture, label);
        int perFrame = rest.capture.samplesPerFrame();
        Plateau frames = new Plateau(rest.plateau.from() / perFrame, rest.plateau.end() / perFrame);
        Vector3 top = mean(marker, frames);
        if (top.isGap()) {
            throw new UnusableInputException(unseen(rest, label));
        }
        double height = rest.load.surface().heightOf(top);
        return top.minus(rest.load.surface().normal().times(height));
    }

    private static Finding unseen(Rest rest, String label) {
        return new Finding(
                "label-never-seen",
                Severity.REFUSES,
                rest.capture.name() + ", marker \"" + label + "\"",
                String.format(Locale.ROOT, "it is not seen while the load of %.1f N rests on the plate", rest.push()),
                "Where that mass stands is not known",
                "Give the place on the plate with --at instead");
    }

    private static Rotation axes(Plate plate) {
        Vector3 right = plate.corners().get(0).midpoint(plate.corners().get(3));
        Vector3 left = plate.corners().get(1).midpoint(plate.corners().get(2));
        Vector3 front = plate.corners().get(0).midpoint(plate.corners().get(1));
        Vector3 back = plate.corners().get(2).midpoint(plate.corners().get(3));
        Vector3 x = right.minus(left).unit();
        Vector3 z = x.cross(front.minus(back)).unit();
        return Rotation.ofColumns(x, z.cross(x), z);
    }

    private static double scatter(Rest rest, Vector3 up, double mean) {
        double squares = 0;
        for (int i = rest.plateau.from(); i < rest.plateau.end(); i++) {
            double off = rest.load.raw().force().at(i).dot(up) - mean;
            squares += off * off;
        }
        return Math.sqrt(squares / (rest.plateau.end() - rest.plateau.from()));
    }

    /** Over the known ones. */
    private static Vector3 mean(VectorSeries series, Plateau plateau) {
        Vector3 sum = Vector3.ZERO;
        int known = 0;
        for (int i = plateau.from(); i < plateau.end(); i++) {
            if (!series.isGap(i)) {
                sum = sum.plus(series.at(i));
                known++;
            }
        }
        return sum.times(1.0 / known);
    }
}
