package treadwork.io.study;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** The bytes of a JSON file that a person wrote. */
final class JsonFile {

    /** A study of ten thousand trials has some 3 MB; what is larger is another file, taken by mistake. */
    static final int MOST_BYTES = 8 << 20;

    private JsonFile() {}

    /** @throws UnusableInputException with code {@code study-file-missing}, {@code study-not-json} */
    static byte[] bytes(Path path) {
        if (!Files.exists(path)) {
            throw unusable(path, "study-file-missing", "there is no such file", "Correct the path");
        }
        if (Files.isDirectory(path)) {
            throw unusable(path, "study-file-missing", "this is a folder", "Name the study file in it");
        }
        try (InputStream stream = Files.newInputStream(path)) {
            byte[] bytes = stream.readNBytes(MOST_BYTES + 1);
            if (bytes.length > MOST_BYTES) {
                throw unusable(
                        path,
                        "study-not-json",
                        "the file is larger than " + (MOST_BYTES >> 20) + " MB",
                        "Name the study file, not a capture");
            }
            return bytes;
        } catch (IOException e) {
            throw new UnusableInputException(
                    finding(
                            path,
                            "study-file-missing",
                            "the file cannot be read (" + e.getMessage() + ")",
                            "Check that you may read it"),
                    e);
        }
    }

    private static UnusableInputException unusable(Path path, String code, String figure, String mend) {
        return new UnusableInputException(finding(path, code, figure, mend));
    }

    private static Finding finding(Path path, String code, String figure, String mend) {
        return new Finding(code, Severity.REFUSES, path.toString(), figure, "There is no study to compute", mend);
    }
}
