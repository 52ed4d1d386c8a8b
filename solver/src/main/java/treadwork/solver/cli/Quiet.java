package treadwork.solver.cli;

import java.io.PrintWriter;
import picocli.CommandLine.Option;

/** The option that silences progress, and the progress itself. */
final class Quiet {

    @Option(names = "--quiet", description = "Print no progress.")
    boolean on;

    /** @param trials how many will end */
    Progress progress(PrintWriter err, int trials) {
        return new Progress(err, trials, on ? Progress.Style.NONE : shown());
    }

    /** Whether standard error is a terminal is something that only the program's start script can tell. */
    private static Progress.Style shown() {
        return Boolean.getBoolean("treadwork.terminal") ? Progress.Style.BAR : Progress.Style.LINES;
    }
}
