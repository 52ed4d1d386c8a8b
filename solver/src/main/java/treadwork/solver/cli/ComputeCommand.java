package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import treadwork.io.study.StudyDocument;
import treadwork.io.study.StudyReader;
import treadwork.solver.run.RunSettings;
import treadwork.solver.run.Selection;
import treadwork.solver.run.StudyRun;
import treadwork.solver.run.TrialOutcome;

/** {@code treadwork compute}: the loads of all trials of a study. */
@Command(
        name = "compute",
        description = {
            "Compute the joint loads of every trial of a study.",
            "",
            "Writes loads.csv, contacts.csv and trial.json for each trial. Inputs are never changed; a trial's results are"
                    + " written whole or not at all."
        },
        mixinStandardHelpOptions = true)
final class ComputeCommand implements Callable<Integer> {

    @Parameters(paramLabel = "STUDY", description = "The study file.")
    Path study;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            description = "Folder for the results (default: results, beside the study file).")
    Path out;

    @Option(
            names = "--only",
            paramLabel = "SUBJECT[/TRIAL]",
            description = "Compute this subject or trial alone.",
            converter = SelectionConverter.class)
    Selection only;

    @Option(
            names = "--threads",
            paramLabel = "N",
            description = "Trials computed at a time (default: as many as the machine has processors).")
    Integer threads;

    @Option(names = "--again", description = "Compute trials whose results are up to date, too.")
    boolean again;

    @Option(
            names = "--c3d",
            description = "Write results.c3d for each trial, too: the capture with the results as further points.")
    boolean c3d;

    @Option(names = "--json", description = "Print the outcome as one JSON document.")
    boolean json;

    @Mixin
    Quiet quiet;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        Arguments.requireAtLeast(1, threads, "--threads", spec);
        StudyDocument document = StudyReader.read(study);
        RunSettings settings = new RunSettings(
                out == null ? document.folder().resolve("results") : out,
                Optional.ofNullable(only),
                threads == null ? Runtime.getRuntime().availableProcessors() : threads,
                again,
                c3d);
        Progress progress = quiet.progress(spec.commandLine().getErr(), StudyRun.count(document, settings));
        List<TrialOutcome> outcomes = StudyRun.run(document, settings, progress::ended);
        progress.close();
        if (json) {
            spec.commandLine()
                    .getOut()
                    .println(OutcomeJson.of(document, outcomes).stripTrailing());
        } else {
            spec.commandLine().getOut().print(OutcomeTable.of(outcomes));
            spec.commandLine().getOut().flush();
        }
        FindingLines.print(document.findings(), outcomes, spec.commandLine().getErr());
        return exitCode(outcomes);
    }

    /** Nothing written counts as unusable; some trials missing as partly done. */
    static int exitCode(List<TrialOutcome> outcomes) {
        long failed = outcomes.stream()
                .filter(outcome -> outcome.status() == TrialOutcome.Status.FAILED)
                .count();
        if (failed == 0) {
            return ExitCode.DONE;
        }
        return failed == outcomes.size() ? ExitCode.UNUSABLE : ExitCode.PARTLY;
    }
}
