package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
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
import treadwork.io.study.StudyReader;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.solver.run.Inspection;
import treadwork.solver.run.StudyInspection;

/** {@code treadwork inspect}: what is in capture files, and what is wrong with them. */
@Command(
        name = "inspect",
        description =
                "Show what is in capture files, and what the checks find in them; of a study file, what is in its trials and"
                        + " what does not agree.",
        mixinStandardHelpOptions = true)
final class InspectCommand implements Callable<Integer> {

    @Parameters(
            arity = "1..*",
            paramLabel = "FILE",
            description = "Capture files (C3D, or delimited text), or study files.")
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
        Map<String, Inspection> inspected = new LinkedHashMap<>();
        Map<String, Finding> unusable = new LinkedHashMap<>();
        for (Path file : files) {
            try {
                if (isStudy(file)) {
                    inspectStudy(file, inspected, unusable);
                } else {
                    inspected.put(file.toString(), Inspection.of(read(file)));
                }
            } catch (UnusableInputException refused) {
                unusable.put(file.toString(), refused.finding());
            }
        }
        print(inspected, unusable);
        if (unusable.isEmpty()) {
            return ExitCode.DONE;
        }
        return inspected.isEmpty() ? ExitCode.UNUSABLE : ExitCode.PARTLY;
    }

    private static boolean isStudy(Path file) {
        return file.toString().toLowerCase(Locale.ROOT).endsWith(".json");
    }

    private static void inspectStudy(Path file, Map<String, Inspection> inspected, Map<String, Finding> unusable) {
        StudyInspection.each(StudyReader.read(file), trial -> {
            trial.inspection().ifPresent(inspection -> inspected.put(trial.name(), inspection));
            trial.refusal().ifPresent(refusal -> unusable.put(trial.name(), refusal));
        });
    }

    private Capture read(Path file) {
        return CaptureFiles.read(file, Optional.ofNullable(unit));
    }

    private void print(Map<String, Inspection> inspected, Map<String, Finding> unusable) {
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
