package treadwork.solver.cli;

/** What the program's exit code says. */
final class ExitCode {

    static final int DONE = 0;

    /** Some trials could not be computed; the rest are written. */
    static final int PARTLY = 1;

    /** The command, the study file or the input cannot be used; nothing was written. */
    static final int UNUSABLE = 2;

    /** A fault in the program itself. */
    static final int FAULT = 70;

    private ExitCode() {}
}
