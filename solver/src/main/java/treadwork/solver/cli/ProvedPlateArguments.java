package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import picocli.CommandLine.TypeConversionException;
import treadwork.io.capture.CaptureFiles;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.LabAxis;
import treadwork.solver.plate.LabUp;

/** What every proof of a plate needs to be told. */
final class ProvedPlateArguments {

    @Option(
            names = "--plate",
            paramLabel = "N",
            defaultValue = "1",
            description = "Number of the plate, counted from 1 (default: ${DEFAULT-VALUE}).")
    int plate;

    @Option(
            names = "--up",
            paramLabel = "AXIS",
            converter = AxisConverter.class,
            description = "Lab axis that points up, for example +z, where plates and markers do not show it.")
    LabAxis up;

    @Option(
            names = "--unit",
            paramLabel = "UNIT",
            description = "Unit of the positions, mm, cm or m, in place of what the file says.")
    LengthUnit unit;

    @Option(names = "--json", description = "Print one JSON document.")
    boolean json;

    Capture read(Path file) {
        return CaptureFiles.read(file, Optional.ofNullable(unit));
    }

    LabAxis up(Capture capture) {
        LabUp found = LabUp.find(capture, capture.plates(), Optional.ofNullable(up));
        return found.axis().orElseThrow(() -> new UnusableInputException(last(found.findings())));
    }

    private static Finding last(List<Finding> findings) {
        return findings.get(findings.size() - 1);
    }

    /** Reads what follows {@code --up}. */
    static final class AxisConverter implements ITypeConverter<LabAxis> {

        @Override
        public LabAxis convert(String text) {
            return LabAxis.ofKey(text)
                    .orElseThrow(() -> new TypeConversionException(
                            "an axis is one of +x, -x, +y, -y, +z, -z, not \"" + text + "\""));
        }
    }
}
