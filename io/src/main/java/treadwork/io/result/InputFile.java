package treadwork.io.result;

import java.io.IOException;
import java.nio.file.Path;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/**
 * A file that went into a computation.
 *
 * @param file   as the study names it
 * @param sha256 of its bytes, in hexadecimal
 */
public record InputFile(String file, String sha256) {

    /**
     * Reads the file through.
     *
     * @param path where it lies
     * @throws UnusableInputException with code {@code input-not-readable}
     */
    public static InputFile of(String file, Path path) {
        try {
            return new InputFile(file, Sha256.of(path));
        } catch (IOException e) {
            throw new UnusableInputException(
                    new Finding(
                            "input-not-readable",
                            Severity.REFUSES,
                            file,
                            "the file cannot be read (" + e.getMessage() + ")",
                            "Nothing can be computed from it",
                            "Check that it is there and that you may read it"),
                    e);
        }
    }
}
