package treadwork.solver.proof;

import java.util.List;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.LabAxis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateLoads;

/** The loads of a plate that is proved: zeroed, not filtered. */
final class ProvedLoad {

    private static final Processing UNFILTERED = new Processing(
            FilterSettings.NONE,
            FilterSettings.NONE,
            Processing.DEFAULT.longestGapS(),
            Processing.DEFAULT.contactThresholdN(),
            new PlateZero.Auto());

    private ProvedLoad() {}

    static PlateLoads resolve(Capture capture, List<Plate> plates, LabAxis up) {
        return PlateLoads.resolve(capture, plates, up, UNFILTERED);
    }

    static PlateLoad of(PlateLoads loads, int number, int count, String file) {
        if (number < 1 || number > count) {
            throw new UnusableInputException(new Finding(
                    "plate-number",
                    Severity.REFUSES,
                    file,
                    "plate " + number + " is asked for, it has " + count,
                    "There is no such plate to prove",
                    "Give another number with --plate, counted from 1"));
        }
        return loads.plates().stream()
                .filter(load -> load.number() == number)
                .findFirst()
                .orElseThrow(() -> new UnusableInputException(unusable(loads, number, file)));
    }

    private static Finding unusable(PlateLoads loads, int number, String file) {
        return findings(loads, number).stream()
                .filter(finding -> finding.severity() == Severity.REFUSES)
                .findFirst()
                .orElseGet(() -> new Finding(
                        "plate-dead",
                        Severity.REFUSES,
                        file + ", plate " + number,
                        "its signals are not in the file",
                        "There is nothing to prove",
                        "Record the plate's channels too"));
    }

    /** Those that concern this plate; sizes of forces are a matter of people, not of rods and masses. */
    static List<Finding> findings(PlateLoads loads, int number) {
        return loads.findings().stream()
                .filter(finding -> finding.where().endsWith("plate " + number)
                        || finding.where().contains("plate " + number + ","))
                .filter(finding -> !finding.code().equals("unit-mismatch"))
                .toList();
    }
}
