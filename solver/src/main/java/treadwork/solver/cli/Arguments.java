package treadwork.solver.cli;

import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** Bounds of arguments. */
final class Arguments {

    private Arguments() {}

    /** Refuses a value below {@code least}; one that is not given is fine. */
    static void requireAtLeast(int least, Integer value, String option, CommandSpec spec) {
        if (value != null && value < least) {
            throw new ParameterException(spec.commandLine(), option + " must be at least " + least + ", is " + value);
        }
    }
}
