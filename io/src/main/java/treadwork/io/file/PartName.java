package treadwork.io.file;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Names under which something stands beside its place while it is written or replaced: {@code .name.PROCESS.part} for
 * the new, {@code .name.PROCESS.old} for the old. The number of the process tells what an interrupted run left behind
 * from what another run is writing just now.
 */
final class PartName {

    static final String PART = ".part";
    static final String OLD = ".old";

    private PartName() {}

    static Path of(Path target, String ending) {
        return of(target, ending, ProcessHandle.current().pid());
    }

    static Path of(Path target, String ending, long process) {
        Path whole = target.toAbsolutePath();
        return whole.resolveSibling("." + whole.getFileName() + "." + process + ending);
    }

    /**
     * Removes what interrupted runs left beside {@code target}; an old state that a run had put aside without putting
     * the new one in its place goes back there.
     */
    static void cleanLeftovers(Path target) throws IOException {
        Path whole = target.toAbsolutePath();
        String start = "." + whole.getFileName() + ".";
        try (DirectoryStream<Path> beside =
                Files.newDirectoryStream(whole.getParent(), path -> isLeftover(path, start))) {
            for (Path leftover : beside) {
                if (leftover.toString().endsWith(OLD) && !Files.exists(whole)) {
                    Places.move(leftover, whole);
                }
                Places.delete(leftover);
            }
        }
    }

    private static boolean isLeftover(Path path, String start) {
        String name = path.getFileName().toString();
        if (!name.startsWith(start) || !(name.endsWith(PART) || name.endsWith(OLD))) {
            return false;
        }
        String middle = name.substring(start.length(), name.lastIndexOf('.'));
        return middle.matches("[0-9]{1,18}") && isOver(Long.parseLong(middle));
    }

    private static boolean isOver(long process) {
        return process == ProcessHandle.current().pid()
                || ProcessHandle.of(process).isEmpty();
    }
}
