package treadwork.solver.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import treadwork.fixtures.demo.DemoStudy;
import treadwork.io.study.StudyDocument;
import treadwork.io.study.StudyReader;
import treadwork.model.body.Side;
import treadwork.solver.run.DemoFiles;
import treadwork.solver.run.RunSettings;
import treadwork.solver.run.StudyRun;
import treadwork.solver.run.TrialOutcome;

/** {@code treadwork demo}: the built-in study, written, computed and held against its exact solution. */
@Command(
        name = "demo",
        description = {
            "Write the built-in demo study, compute it, and print its summary.",
            "",
            "The study is invented: an ankle brace, off and on, worn by two invented subjects whose loads are known exactly."
        },
        mixinStandardHelpOptions = true)
final class DemoCommand implements Callable<Integer> {

    @Parameters(
            arity = "0..1",
            paramLabel = "DIR",
            defaultValue = "treadwork-demo",
            description = "Folder to write into, new or empty (default: ${DEFAULT-VALUE}).")
    Path folder;

    @Mixin
    Quiet quiet;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        DemoFiles demo = DemoFiles.write(folder);
        StudyDocument document = StudyReader.read(demo.studyFile());
        RunSettings settings = new RunSettings(
                document.folder().resolve("results"),
                Optional.empty(),
                Runtime.getRuntime().availableProcessors(),
                true);
        Progress progress = quiet.progress(spec.commandLine().getErr(), StudyRun.count(document, settings));
        List<TrialOutcome> outcomes = StudyRun.run(document, settings, progress::ended);
        progress.close();

        PrintWriter out = spec.commandLine().getOut();
        out.println(DemoStudy.TITLE);
        out.println();
        out.print(OutcomeTable.of(outcomes));
        out.println();
        out.print(againstTheTruth(outcomes, demo));
        out.println();
        out.println("Study      " + demo.studyFile());
        out.println("Results    " + folder.resolve("results"));
        out.println("Exact      " + folder.resolve("exact") + ", the true loads in the same columns");
        out.println("One file holds a planted mistake. See what shows it:");
        out.println("           treadwork inspect " + folder.resolve(DemoStudy.MISTAKEN_FILE));
        out.flush();
        FindingLines.print(document.findings(), outcomes, spec.commandLine().getErr());
        return ComputeCommand.exitCode(outcomes);
    }

    private static String againstTheTruth(List<TrialOutcome> outcomes, DemoFiles demo) {
        TextTable table = new TextTable().words().words().numbers(3);
        table.row("right ankle, plantarflexor moment", "condition", "found", "true", "off by");
        table.row("", "", "N·m/kg", "N·m/kg", "%");
        for (TrialOutcome outcome : outcomes) {
            double exact = demo.exactPlantarflexors().get(outcome.name());
            double found = outcome.summary()
                    .map(summary -> summary.sides().get(Side.RIGHT).plantarflexor())
                    .orElse(Double.NaN);
            table.row(
                    outcome.name(),
                    outcome.condition(),
                    OutcomeTable.number("%.3f", found),
                    String.format(Locale.ROOT, "%.3f", exact),
                    OutcomeTable.number("%+.1f", 100 * (found / exact - 1)));
        }
        return table.toString();
    }
}
