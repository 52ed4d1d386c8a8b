package treadwork.solver.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import picocli.CommandLine;
import treadwork.model.finding.UnusableInputException;

/** Turns whatever went wrong into one message and an exit code. */
final class Faults {

    private Faults() {}

    /** A command line that cannot be understood: one line, and where help is. */
    static int ofArguments(CommandLine.ParameterException fault, String[] arguments) {
        CommandLine command = fault.getCommandLine();
        PrintWriter err = command.getErr();
        err.println("treadwork: " + firstLine(fault.getMessage()));
        if (!CommandLine.UnmatchedArgumentException.printSuggestions(fault, err)) {
            err.println("Try \"" + command.getCommandSpec().qualifiedName() + " --help\".");
        }
        return ExitCode.UNUSABLE;
    }

    /** A command that failed while it ran. */
    static int ofExecution(Exception fault, CommandLine command, boolean trace) {
        PrintWriter err = command.getErr();
        if (trace) {
            fault.printStackTrace(err);
        }
        if (fault instanceof UnusableInputException unusable) {
            err.println("treadwork: " + unusable.finding().line());
            return ExitCode.UNUSABLE;
        }
        err.println("treadwork: a fault in the program: " + fault + ". " + logged(fault)
                + " Your files are as they were; please report it with that log.");
        return ExitCode.FAULT;
    }

    private static String logged(Exception fault) {
        StringWriter text = new StringWriter();
        fault.printStackTrace(new PrintWriter(text));
        try {
            Path log = Files.createTempFile("treadwork-fault-", ".log");
            Files.writeString(log, text.toString());
            return "The log is " + log + ".";
        } catch (IOException unwritable) {
            return "No log could be written (" + unwritable.getMessage() + "); run again with --trace to see it.";
        }
    }

    private static String firstLine(String message) {
        return message == null
                ? "the command line cannot be understood"
                : message.lines().findFirst().orElse("");
    }
}
