package treadwork.io.c3d;

import static treadwork.model.finding.Severity.REFUSES;

import java.io.IOException;
import java.util.List;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;

/** Why a file cannot be used: every such message stands here. */
final class Refusals {

    private static final String RENEW = "Export or copy the file again from where it was recorded";
    private static final String OWN_PLATES =
            "Describe the plates in lab.plates of the study file, or export the file again"
                    + " with a right description";

    private Refusals() {}

    static UnusableInputException unreadable(String file, IOException cause) {
        String reason = cause.getMessage() == null || cause.getMessage().equals(file)
                ? cause.getClass().getSimpleName()
                : cause.getClass().getSimpleName() + ", " + cause.getMessage();
        return new UnusableInputException(
                new Finding(
                        "capture-unreadable",
                        REFUSES,
                        file,
                        "the file cannot be read (" + reason + ")",
                        "Nothing can be computed from it",
                        "Check its path and the right to read it"),
                cause);
    }

    static UnusableInputException notC3d(String file, int key) {
        return new UnusableInputException(new Finding(
                "capture-not-c3d",
                REFUSES,
                file + ", byte 2",
                "it is " + key + ", in a C3D file it is " + Header.KEY,
                "This is not a C3D file, or its beginning is damaged",
                "Give the capture as a C3D file"));
    }

    static UnusableInputException parameterBlock(String file, int block) {
        return new UnusableInputException(new Finding(
                "capture-not-c3d",
                REFUSES,
                file + ", byte 1",
                "the parameters would begin at block " + block + ", in a C3D file at block 2 or later",
                "This is not a C3D file, or its beginning is damaged",
                "Give the capture as a C3D file"));
    }

    static UnusableInputException cutShort(String file, String what, long needed, long size) {
        return new UnusableInputException(new Finding(
                "capture-cut-short",
                REFUSES,
                file + ", " + what,
                "it would end at byte " + needed + ", the file has " + size,
                "The file is cut short before any frame is whole",
                RENEW));
    }

    static UnusableInputException processor(String file, int code) {
        return new UnusableInputException(new Finding(
                "capture-processor-unknown",
                REFUSES,
                file + ", byte 4 of the parameter section",
                "the processor is " + code + ", known are 84, 85 and 86",
                "How the file holds its numbers is not known",
                RENEW));
    }

    static UnusableInputException empty(String file, String figure) {
        return new UnusableInputException(new Finding(
                "capture-empty",
                REFUSES,
                file,
                figure,
                "There is nothing to compute from",
                "Record or export the trial again"));
    }

    static UnusableInputException rate(String file, double rate) {
        return new UnusableInputException(new Finding(
                "capture-rate",
                REFUSES,
                file + ", frame rate",
                "it is " + Notices.number(rate) + " Hz, in the header and in POINT:RATE",
                "Without a rate there are no velocities and no forces of inertia",
                "Write the true rate into the file with the program that made it"));
    }

    static UnusableInputException scale(String file, double scale) {
        return new UnusableInputException(new Finding(
                "capture-scale",
                REFUSES,
                file + ", header words 7 and 8",
                "the scale of the positions is " + Notices.number(scale) + ", and POINT:SCALE states nothing better",
                "What a stored position is worth is not known",
                RENEW));
    }

    static UnusableInputException analogCount(String file, int values, int samples) {
        return new UnusableInputException(new Finding(
                "capture-analog-count",
                REFUSES,
                file + ", header words 3 and 10",
                values + " analog values a frame cannot be shared out over " + samples + " samples a frame",
                "Which channel a value belongs to is not known",
                RENEW));
    }

    static UnusableInputException dataStart(String file, int block) {
        return new UnusableInputException(new Finding(
                "capture-data-start",
                REFUSES,
                file + ", header word 9",
                "the frames would begin at block " + block + ", inside the header or behind the end of the file, and"
                        + " POINT:DATA_START states nothing better",
                "Where the frames begin is not known",
                RENEW));
    }

    static UnusableInputException tooLarge(String file, double neededMb, double freeMb) {
        return new UnusableInputException(new Finding(
                "capture-too-large",
                REFUSES,
                file,
                "its values take " + Notices.number(Math.ceil(neededMb)) + " MB of memory, the program may use "
                        + Notices.number(Math.floor(freeMb)),
                "It cannot be held in memory",
                "Give Java more memory (-Xmx), or cut the recording to the frames that are needed"));
    }

    static UnusableInputException pointUnit(String file, List<String> stated) {
        String figure = stated.isEmpty()
                ? "no unit is stated, known are mm, cm and m"
                : "the stated unit is \"" + String.join("\", \"", stated) + "\", known are mm, cm and m";
        return new UnusableInputException(new Finding(
                "point-unit-unknown",
                REFUSES,
                file + ", parameter POINT:UNITS",
                figure,
                "Without it every length, and so every moment, is off by an unknown factor",
                "Set lab.pointUnit in the study file to the unit the positions are really in"));
    }

    static UnusableInputException plateType(String file, int plate, String type) {
        StringBuilder known = new StringBuilder();
        for (PlateType each : PlateType.values()) {
            known.append(known.isEmpty() ? "" : ", ").append(each.code());
        }
        return new UnusableInputException(new Finding(
                "plate-type-unknown",
                REFUSES,
                file + ", plate " + plate + ", parameter FORCE_PLATFORM:TYPE",
                "the type is " + type + ", known are " + known,
                "What the plate's channels mean is not known",
                "Describe the plates in lab.plates of the study file, or convert the file to one of these types"));
    }

    /** A plate that cannot be used and cannot be left out either, since the plates behind it would change their numbers. */
    static UnusableInputException plate(PlateFault fault) {
        return new UnusableInputException(plateFinding(fault));
    }

    /** What is wrong with a plate that is left out. */
    static Finding plateFinding(PlateFault fault) {
        return new Finding(
                fault.code(),
                REFUSES,
                fault.file() + ", plate " + fault.plate() + ", parameter FORCE_PLATFORM:" + fault.parameter(),
                fault.figure(),
                "The loads on this plate cannot be known",
                OWN_PLATES);
    }
}
