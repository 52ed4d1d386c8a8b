package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.ServiceLoader;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code treadwork view}: the window, where the viewer is on the class path. */
@Command(name = "view", description = "Open the window.", mixinStandardHelpOptions = true)
final class ViewCommand implements Callable<Integer> {

    @Parameters(arity = "0..1", paramLabel = "STUDY or FILE", description = "A study file or a capture file.")
    Path file;

    @Spec
    CommandSpec spec;

    @Override
    public Integer call() {
        return open(spec.commandLine(), file);
    }

    static boolean isOffered() {
        return window().isPresent();
    }

    /** Opens the window, on {@code file} where one is given. */
    static int open(CommandLine command, Path file) {
        Optional<Window> window = window();
        if (window.isEmpty()) {
            command.getErr()
                    .println("treadwork: this version has no window yet. \"treadwork compute STUDY\" writes all numbers"
                            + " as tables.");
            return ExitCode.UNUSABLE;
        }
        return window.get().open(Optional.ofNullable(file));
    }

    private static Optional<Window> window() {
        return ServiceLoader.load(Window.class).findFirst();
    }
}
