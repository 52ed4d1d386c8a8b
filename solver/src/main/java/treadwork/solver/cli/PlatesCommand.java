package treadwork.solver.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** {@code treadwork plates}: proofs of force plates. */
@Command(
        name = "plates",
        description = "Prove force plates: where they stand with a rod, what they show with known masses.",
        synopsisSubcommandLabel = "(rod | weights)",
        mixinStandardHelpOptions = true,
        subcommands = {PlatesRodCommand.class, PlatesWeightsCommand.class})
final class PlatesCommand implements Callable<Integer> {

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        throw new ParameterException(spec.commandLine(), "say which proof: plates rod, or plates weights");
    }
}
