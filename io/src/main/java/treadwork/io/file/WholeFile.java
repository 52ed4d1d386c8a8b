package treadwork.io.file;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import treadwork.model.finding.UnusableInputException;

/** A single file that is written whole or not at all. */
public final class WholeFile {

    private WholeFile() {}

    /**
     * Writes {@code text} as UTF-8, making folders as needed; a file that stands there is replaced at once, or stays as
     * it is if anything fails.
     *
     * @throws UnusableInputException with code {@code results-not-writable}
     */
    public static void write(Path target, String text) {
        write(target, text.getBytes(StandardCharsets.UTF_8));
    }

    /** As the other, for bytes. */
    public static void write(Path target, byte[] bytes) {
        Path part = PartName.of(target, PartName.PART);
        try {
            Files.createDirectories(part.getParent());
            PartName.cleanLeftovers(target);
            Files.write(part, bytes);
            Places.move(part, target);
        } catch (IOException e) {
            throw Places.notWritable(target, e);
        } finally {
            Places.discard(part);
        }
    }
}
