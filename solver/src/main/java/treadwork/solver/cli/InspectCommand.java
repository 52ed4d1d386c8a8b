package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.file.JsonText;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.solver.run.Inspection;

/** {@code treadwork inspect}: what is in capture files, and what is wrong with them. */
@Command(
        name = "inspect",
        description = "Show what is in capture files, and what the checks find in them.",
        mixinStandardHelpOptions = true)
final class InspectCommand implements Callable<Integer> {

    @Parameters(arity = "1..*", paramLabel = "FILE", description = "Capture files (C3D, or delimited text).")
    List<Path> files;

    @Option(names = "--json", description = "Print one JSON document.")
    boolean json;

    @Option(
            names = "--unit",
            paramLabel = "UNIT",
            description = "Unit of the positions, mm, cm or m, in place of what the file says.")
    LengthUnit unit;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        Map<Path, Inspection> inspected = new LinkedHashMap<>();
        Map<Path, Finding> unusable = new LinkedHashMap<>();
        for (Path file : files) {
            try {
                inspected.put(file, Inspection.of(read(file)));
            } catch (UnusableInputException refused) {
                unusable.put(file, refused.finding());
            }
        }
        print(inspected, unusable);
        if (unusable.isEmpty()) {
            return ExitCode.DONE;
        }
        return inspected.isEmpty() ? ExitCode.UNUSABLE : ExitCode.PARTLY;
    }

    private Capture read(Path file) {
        return CaptureFiles.read(file, Optional.ofNullable(unit));
    }

    private void print(Map<Path, Inspection> inspected, Map<Path, Finding> unusable) {
        if (json) {
            spec.commandLine()
                    .getOut()
                    .println(JsonText.of(InspectionJson.of(inspected, unusable)).stripTrailing());
        } else {
            inspected.forEach(
                    (file, inspection) -> spec.commandLine().getOut().println(InspectionText.of(file, inspection)));
        }
        unusable.values().forEach(finding -> spec.commandLine().getErr().println("treadwork: " + line(finding)));
    }

    /** Here the unit can be given on the command line, too. */
    private static String line(Finding finding) {
        return finding.code().equals("point-unit-unknown") ? finding.line() + " Here: --unit mm." : finding.line();
    }
}
