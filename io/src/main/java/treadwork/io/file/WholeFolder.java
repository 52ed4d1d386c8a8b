package treadwork.io.file;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** A folder of files that is written whole or not at all. */
public final class WholeFolder {

    /** What desktops leave in every folder that a person looks into. */
    private static final Set<String> LITTER = Set.of(".DS_Store", "Thumbs.db", "desktop.ini");

    private WholeFolder() {}

    /** Fills a folder. */
    @FunctionalInterface
    public interface Content {

        /** Writes the files into {@code folder}, which is there and empty. */
        void writeInto(Path folder) throws IOException;
    }

    /**
     * Writes the folder {@code target} anew. Until its content is complete the old folder stays as it is; an interrupted
     * run leaves the old one or the new one, and the next run or {@link #recover} clears away what else it left.
     *
     * @param own the names that such a folder may hold: one that holds others is not replaced
     * @throws UnusableInputException with code {@code results-not-writable} if the disk refuses, {@code
     *     results-folder-foreign} if other files stand in {@code target}
     */
    public static void write(Path target, Set<String> own, Content content) {
        Path part = PartName.of(target, PartName.PART);
        Path old = PartName.of(target, PartName.OLD);
        try {
            Files.createDirectories(part.getParent());
            PartName.cleanLeftovers(target);
            refuseForeign(target, own);
            Files.createDirectory(part);
            content.writeInto(part);
            if (Files.exists(target)) {
                Places.move(target, old);
            }
            Places.move(part, target);
            Places.discard(old);
        } catch (IOException e) {
            recover(target);
            throw Places.notWritable(target, e);
        } finally {
            Places.discard(part);
        }
    }

    /** Puts back, or clears away, what interrupted runs left beside {@code target}; does nothing where that fails. */
    public static void recover(Path target) {
        if (!Files.isDirectory(target.toAbsolutePath().getParent())) {
            return;
        }
        try {
            PartName.cleanLeftovers(target);
        } catch (IOException e) {
            // Leftovers do no harm: they are never read, and the next writing names the reason if it fails too.
            return;
        }
    }

    private static void refuseForeign(Path target, Set<String> own) throws IOException {
        if (!Files.isDirectory(target)) {
            return;
        }
        try (Stream<Path> entries = Files.list(target)) {
            List<String> foreign = entries.map(path -> path.getFileName().toString())
                    .filter(name -> !own.contains(name) && !LITTER.contains(name))
                    .sorted()
                    .toList();
            if (!foreign.isEmpty()) {
                throw new UnusableInputException(new Finding(
                        "results-folder-foreign",
                        Severity.REFUSES,
                        target.toString(),
                        "the folder holds \"" + foreign.get(0) + "\", which this program did not write",
                        "Writing the results anew would delete it",
                        "Move it elsewhere, or choose another folder for the results"));
            }
        }
    }
}
