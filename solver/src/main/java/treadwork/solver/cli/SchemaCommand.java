package treadwork.solver.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import treadwork.io.study.StudySchema;

/** {@code treadwork schema}: the JSON Schema of the study file. */
@Command(name = "schema", description = "Print the JSON Schema of the study file.", mixinStandardHelpOptions = true)
final class SchemaCommand implements Callable<Integer> {

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        spec.commandLine().getOut().println(StudySchema.text().stripTrailing());
        return ExitCode.DONE;
    }
}
