package treadwork.solver.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import treadwork.io.study.MarkersDraft;
import treadwork.io.study.StudyDraft;
import treadwork.model.capture.LengthUnit;
import treadwork.solver.run.Drafting;

/** {@code treadwork draft}: a first study file and marker map for a folder of captures. */
@Command(
        name = "draft",
        description = {
            "Write a first study file and marker map for a folder of captures, to complete by hand.",
            "Markers are told by where they are and how they move, whatever they are called."
        },
        mixinStandardHelpOptions = true)
final class DraftCommand implements Callable<Integer> {

    @Parameters(paramLabel = "DIR", description = "Folder of captures, of one subject or with a folder a subject.")
    Path folder;

    @Option(
            names = "--unit",
            paramLabel = "UNIT",
            description = "Unit of the positions, mm, cm or m, in place of what the files say.")
    LengthUnit unit;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        Drafting drafting = Drafting.of(folder, Optional.ofNullable(unit));
        PrintWriter out = spec.commandLine().getOut();
        drafting.draft().subjects().forEach(person -> print(person, out));
        drafting.passedOver().forEach(line -> out.println("Passed over: " + line));
        out.println();
        drafting.written().forEach(file -> out.println("Written: " + file));
        out.println("Check every line, fill in what the comments ask for, then: treadwork compute "
                + folder.resolve("study.json"));
        return ExitCode.DONE;
    }

    private static void print(StudyDraft.Person person, PrintWriter out) {
        out.println("Subject " + person.id());
        out.println("  standing: " + person.staticFile() + ". " + person.staticRemark());
        person.trials()
                .forEach(trial -> out.println(
                        "  " + (trial.isUsed() ? "movement: " : "left out: ") + trial.file() + ". " + trial.remark()));
        out.println("  " + person.massRemark());
        person.markers().remarks().forEach(remark -> out.println("  " + remark));
        person.markers().landmarks().forEach(line -> print(line, out));
        person.markers().clusters().forEach(line -> print(line, out));
        out.println("  neither: " + String.join(", ", person.markers().unmapped()));
    }

    private static void print(MarkersDraft.Line line, PrintWriter out) {
        out.println("  " + (line.isUsed() ? "" : "not used: ") + line.key() + " = " + String.join(", ", line.labels())
                + ". " + line.comment());
    }
}
