package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.Optional;

/** The window, offered by the viewer through {@link java.util.ServiceLoader}. */
public interface Window {

    /**
     * Opens the window and returns when it is closed.
     *
     * @param file a study or a capture to open; empty for the empty window
     * @return the program's exit code
     */
    int open(Optional<Path> file);
}
