package treadwork.solver.run;

import java.nio.file.Path;
import java.util.Optional;

/**
 * How a study is run.
 *
 * @param results folder that the trials' folders are written into
 * @param only    empty: all trials
 * @param threads trials at a time
 * @param again   compute what is up to date, too
 * @param c3d     write the results as a C3D file, too
 */
public record RunSettings(Path results, Optional<Selection> only, int threads, boolean again, boolean c3d) {

    public RunSettings {
        if (threads < 1) {
            throw new IllegalArgumentException("threads must be at least 1, is " + threads);
        }
    }

    /** Without C3D files. */
    public RunSettings(Path results, Optional<Selection> only, int threads, boolean again) {
        this(results, only, threads, again, false);
    }
}
