package treadwork.solver.plate;

import java.util.Locale;
import java.util.Optional;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;

/**
 * The vector from a plate's sensor origin to the centre of its top surface, with the one slip that is common in files
 * mended: the sensors lie below the surface, so the vector's part along the upward normal cannot be negative. Where it
 * is, the sheet gave the vector the other way round: all three values turn, of four sensors only the third, since the
 * first two are distances.
 *
 * @param used    plate axes, m; for four sensors the half distances and the third value
 * @param finding what was wrong with the stated one
 */
record SensorOrigin(Vector3 used, Optional<Finding> finding) {

    /**
     * @param side  +1 where plate z points up, -1 where it points down
     * @param where the file and the plate, for the finding
     */
    static SensorOrigin of(Plate plate, double side, String where) {
        Vector3 stated = plate.origin();
        if (plate.type() == PlateType.FORCE_AND_CENTRE_OF_PRESSURE) {
            return new SensorOrigin(Vector3.ZERO, Optional.empty());
        }
        boolean below = stated.z() * side >= 0;
        if (plate.type() != PlateType.FOUR_SENSORS) {
            return below
                    ? new SensorOrigin(stated, Optional.empty())
                    : new SensorOrigin(stated.negated(), Optional.of(reversed(stated, stated.negated(), where)));
        }
        if (!(stated.x() != 0 && stated.y() != 0 && !stated.isGap())) {
            return new SensorOrigin(Vector3.GAP, Optional.of(noDistances(stated, where)));
        }
        Vector3 used = new Vector3(Math.abs(stated.x()), Math.abs(stated.y()), below ? stated.z() : -stated.z());
        boolean same = used.minus(stated).norm() == 0;
        return new SensorOrigin(used, same ? Optional.empty() : Optional.of(reversed(stated, used, where)));
    }

    private static Finding reversed(Vector3 stated, Vector3 used, String where) {
        return new Finding(
                "plate-origin",
                Severity.WARNING,
                where,
                "the sensor origin is stated as " + inMm(stated)
                        + " mm, which puts the sensors above the surface; used is " + inMm(used) + " mm",
                "With the stated sign the centre of pressure would be off by twice the depth times shear over normal force",
                "Turn the sign of ORIGIN in the plate's description, so that it points from the sensors to the surface",
                true);
    }

    private static Finding noDistances(Vector3 stated, String where) {
        return new Finding(
                "plate-origin",
                Severity.REFUSES,
                where,
                "the half distances of the four sensors are stated as " + inMm(stated) + " mm; both must be above 0",
                "Without them neither moment nor centre of pressure can be known, so a foot on this plate is not measured",
                "Give the plate's origin in lab.plates of the study file, from the maker's sheet");
    }

    private static String inMm(Vector3 v) {
        return String.format(Locale.ROOT, "(%.1f, %.1f, %.1f)", tenths(v.x()), tenths(v.y()), tenths(v.z()));
    }

    /** Millimetres to the digit that is shown, so that no zero has a sign. */
    private static double tenths(double metres) {
        return Math.round(1e4 * metres) / 10.0;
    }
}
