package treadwork.io.text;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** The bytes of a text file and its name for messages. */
public final class TextFile {

    private final String name;
    private final byte[] bytes;

    private TextFile(String name, byte[] bytes) {
        this.name = name;
        this.bytes = bytes;
    }

    /** Text that is already in memory. */
    public static TextFile of(String name, byte[] bytes) {
        return new TextFile(name, bytes.clone());
    }

    /** @throws treadwork.model.finding.UnusableInputException if the file cannot be read, or is too large for one */
    public static TextFile of(Path path) {
        try {
            if (Files.size(path) > 1L << 29) {
                throw Refusal.of(
                        "text-large", path.toString(), "it has more than 512 MB", "Export a shorter recording");
            }
            return new TextFile(String.valueOf(path.getFileName()), Files.readAllBytes(path));
        } catch (IOException e) {
            throw Refusal.of(
                    "file-unreadable",
                    path.toString(),
                    "the file cannot be read (" + e.getMessage() + ")",
                    "Check the path, and that you may read it",
                    e);
        }
    }

    String name() {
        return name;
    }

    /** Not a copy. */
    byte[] bytes() {
        return bytes;
    }
}
