package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Axes;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.Wrench;
import treadwork.model.study.LabAxis;

/**
 * A plate somewhere in a lab, and the reaction that its channels hold.
 *
 * @param reversed whether the channels hold the force on the plate
 * @param lost     whether the origin's sign was lost
 */
record SyntheticPlate(Plate plate, LabAxis up, Wrench reaction, List<Double> channels, boolean reversed, boolean lost) {

    private static final List<LabAxis> UPS = List.of(LabAxis.values());

    /** Plate z down, the plate turned by any angle about the vertical; one lab in six for each upward axis. */
    static SyntheticPlate random(PlateType type, Random random) {
        LabAxis up = UPS.get(random.nextInt(UPS.size()));
        Rotation labFromPlate = labFromPlate(up, random.nextDouble() * 2 * Math.PI);
        Vector3 centre = vector(random, 2);
        Wrench inPlate = load(random);
        Vector3 origin =
                type == PlateType.FOUR_SENSORS ? new Vector3(0.12, 0.21, -0.047) : new Vector3(0.003, -0.005, -0.041);
        boolean reversed = random.nextBoolean();
        boolean lost = type != PlateType.FORCE_AND_CENTRE_OF_PRESSURE && random.nextBoolean();
        RealMatrix calibration = calibration(random);
        Plate plate = new Plate(
                type,
                corners(labFromPlate, centre),
                lost ? withSignLost(type, origin) : origin,
                PlateCaptures.channels(type.channels()),
                type == PlateType.CALIBRATED ? Optional.of(asRows(calibration)) : Optional.empty(),
                LengthUnit.MM);
        Wrench reaction = new Wrench(
                Axes.LAB,
                centre.plus(labFromPlate.times(inPlate.point())),
                labFromPlate.times(inPlate.force()),
                labFromPlate.times(inPlate.moment()));
        List<Double> channels = channels(type, reversed ? opposite(inPlate) : inPlate, origin, calibration);
        return new SyntheticPlate(plate, up, reaction, channels, reversed, lost);
    }

    private static Rotation labFromPlate(LabAxis up, double turn) {
        Vector3 z = up.direction().negated();
        Vector3 level = new Vector3(z.y(), z.z(), z.x());
        Vector3 x = Rotation.about(z, turn).times(level);
        return Rotation.ofColumns(x, z.cross(x), z);
    }

    /** Up to 1200 N on the foot, at its centre of pressure. */
    private static Wrench load(Random random) {
        Vector3 shear = vector(random, 150);
        Vector3 place = vector(random, 0.2);
        return new Wrench(
                new Axes("plate"),
                new Vector3(place.x(), place.y(), 0),
                new Vector3(shear.x(), shear.y(), -300 - 900 * random.nextDouble()),
                new Vector3(0, 0, vector(random, 8).z()));
    }

    private static Vector3 withSignLost(PlateType type, Vector3 origin) {
        return type == PlateType.FOUR_SENSORS ? new Vector3(origin.x(), origin.y(), -origin.z()) : origin.negated();
    }

    Capture capture() {
        return PlateCaptures.following(List.of(plate), channels, PlateCaptures::steppedOn);
    }

    List<String> expectedCodes() {
        List<String> codes = new ArrayList<>();
        if (lost) {
            codes.add("plate-origin");
        }
        if (reversed) {
            codes.add("plate-sign");
        }
        return codes;
    }

    private static Wrench opposite(Wrench load) {
        return new Wrench(
                load.axes(), load.point(), load.force().negated(), load.moment().negated());
    }

    private static List<Vector3> corners(Rotation labFromPlate, Vector3 centre) {
        return List.of(
                centre.plus(labFromPlate.times(new Vector3(0.25, 0.3, 0))),
                centre.plus(labFromPlate.times(new Vector3(-0.25, 0.3, 0))),
                centre.plus(labFromPlate.times(new Vector3(-0.25, -0.3, 0))),
                centre.plus(labFromPlate.times(new Vector3(0.25, -0.3, 0))));
    }

    /** The formulas of the plate types turned round; lengths in mm, as a file holds them. */
    private static List<Double> channels(PlateType type, Wrench load, Vector3 origin, RealMatrix calibration) {
        Vector3 f = load.force();
        if (type == PlateType.FORCE_AND_CENTRE_OF_PRESSURE) {
            return List.of(
                    f.x(),
                    f.y(),
                    f.z(),
                    load.point().x() * 1e3,
                    load.point().y() * 1e3,
                    load.moment().z() * 1e3);
        }
        boolean four = type == PlateType.FOUR_SENSORS;
        Vector3 sensors = four ? new Vector3(0, 0, -origin.z()) : origin.negated();
        Vector3 m = load.about(sensors).moment();
        if (four) {
            return fourSensors(f, m, origin.x(), origin.y());
        }
        double[] six = {f.x(), f.y(), f.z(), m.x() * 1e3, m.y() * 1e3, m.z() * 1e3};
        return type == PlateType.CALIBRATED
                ? volts(calibration, six)
                : Arrays.stream(six).boxed().toList();
    }

    /** One of the many ways to share six components among eight signals: unequal parts, and a twist that adds nothing. */
    private static List<Double> fourSensors(Vector3 f, Vector3 m, double a, double b) {
        double y14 = 0.3 * f.y();
        double y23 = 0.7 * f.y();
        double rest = (m.z() - a * (y14 - y23)) / b;
        double twist = 17;
        double z = f.z() / 4;
        double x = m.x() / (4 * b);
        double y = m.y() / (4 * a);
        return List.of(
                (f.x() - rest) / 2,
                (f.x() + rest) / 2,
                y14,
                y23,
                z + x - y + twist,
                z + x + y - twist,
                z - x + y + twist,
                z - x - y - twist);
    }

    private static Vector3 vector(Random random, double size) {
        return new Vector3(
                (2 * random.nextDouble() - 1) * size,
                (2 * random.nextDouble() - 1) * size,
                (2 * random.nextDouble() - 1) * size);
    }

    static List<Double> volts(RealMatrix calibration, double... components) {
        double[] volts = new LUDecomposition(calibration)
                .getSolver()
                .solve(new ArrayRealVector(components))
                .toArray();
        return Arrays.stream(volts).boxed().toList();
    }

    static RealMatrix calibration(Random random) {
        RealMatrix matrix = new Array2DRowRealMatrix(6, 6);
        for (int i = 0; i < 6; i++) {
            for (int j = 0; j < 6; j++) {
                matrix.setEntry(i, j, random.nextGaussian() * 0.3 + (i == j ? 2 + i : 0));
            }
        }
        return matrix;
    }

    static CalibrationMatrix asRows(RealMatrix matrix) {
        double[] rows = new double[36];
        for (int i = 0; i < 36; i++) {
            rows[i] = matrix.getEntry(i / 6, i % 6);
        }
        return CalibrationMatrix.ofRows(rows);
    }
}
