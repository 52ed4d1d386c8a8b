package treadwork.solver.cli;

import java.io.PrintWriter;
import treadwork.solver.run.TrialOutcome;

/** Says on standard error how far a run has come: a bar on a terminal, a line a trial elsewhere. */
final class Progress {

    private static final int BAR_WIDTH = 30;

    /** How progress is shown. */
    enum Style {
        NONE,
        LINES,
        BAR
    }

    private final PrintWriter err;
    private final int trials;
    private final Style style;
    private int ended;

    Progress(PrintWriter err, int trials, Style style) {
        this.err = err;
        this.trials = trials;
        this.style = style;
    }

    /** Takes note of a trial that has ended; may be called from any thread. */
    synchronized void ended(TrialOutcome outcome) {
        ended++;
        switch (style) {
            case NONE -> {}
            case LINES -> err.println("[" + ended + "/" + trials + "] " + outcome.name() + ": " + words(outcome));
            case BAR -> {
                int full = BAR_WIDTH * ended / trials;
                err.print("\r" + "█".repeat(full) + "░".repeat(BAR_WIDTH - full) + " " + ended + " of " + trials
                        + " trials");
                err.flush();
            }
        }
    }

    /** Ends the bar's line. */
    synchronized void close() {
        if (style == Style.BAR && ended > 0) {
            err.println();
        }
    }

    static String words(TrialOutcome outcome) {
        return switch (outcome.status()) {
            case COMPUTED -> "computed";
            case UP_TO_DATE -> "up to date";
            case FAILED -> "could not be computed";
        };
    }
}
