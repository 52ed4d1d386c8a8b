package treadwork.solver.cli;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.concurrent.Callable;
import picocli.AutoComplete;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ScopeType;
import picocli.CommandLine.Spec;

/** The program's entry: {@code treadwork COMMAND ...}. */
@Command(
        name = "treadwork",
        description = {
            "From motion capture and force plates to joint loads that can be defended.",
            "",
            "Results are estimates of net joint loads, not tissue or contact forces. This is not a medical device and"
                    + " gives no diagnosis; clinical use only under a licensed practitioner."
        },
        synopsisSubcommandLabel = "COMMAND",
        footer = {
            "",
            "Start with \"treadwork demo\". Exit codes: 0 all done; 1 some trials could not be computed, the rest are",
            "written; 2 the command, study file or input cannot be used, nothing was written; 70 a fault in the program."
        },
        mixinStandardHelpOptions = true,
        versionProvider = Version.class,
        subcommands = {
            DemoCommand.class,
            InspectCommand.class,
            DraftCommand.class,
            ComputeCommand.class,
            PlatesCommand.class,
            ViewCommand.class,
            SchemaCommand.class
        })
public final class Treadwork implements Callable<Integer> {

    @Option(names = "--trace", scope = ScopeType.INHERIT, description = "Print the stack trace of what went wrong.")
    boolean trace;

    @Spec
    CommandSpec spec;

    /** Runs one command and ends the process with its exit code. */
    public static void main(String[] arguments) {
        System.exit(run(arguments, System.out, System.err));
    }

    /** Runs one command; what it prints is UTF-8. */
    public static int run(String[] arguments, PrintStream out, PrintStream err) {
        Treadwork root = new Treadwork();
        CommandLine program = new CommandLine(root);
        program.addSubcommand("completion", new AutoComplete.GenerateCompletion());
        program.setOut(writer(out));
        program.setErr(writer(err));
        program.setCaseInsensitiveEnumValuesAllowed(true);
        program.setParameterExceptionHandler(Faults::ofArguments);
        program.setExecutionExceptionHandler(
                (fault, command, parsed) -> Faults.ofExecution(fault, command, root.trace));
        return program.execute(arguments);
    }

    /** Without a command: the window where there is one, else the help. */
    @Override
    public Integer call() {
        if (ViewCommand.isOffered()) {
            return ViewCommand.open(spec.commandLine(), null);
        }
        spec.commandLine().usage(spec.commandLine().getOut());
        return ExitCode.DONE;
    }

    private static PrintWriter writer(PrintStream stream) {
        return new PrintWriter(stream, true, StandardCharsets.UTF_8);
    }
}
