package treadwork.io.study;

import java.io.IOException;
import java.nio.file.Path;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** Reads a study file. */
public final class StudyReader {

    private StudyReader() {}

    /**
     * The study with every default filled in; of settings that stand in several places the nearest to the trial holds,
     * key by key. Values that the layout knows are read whether or not this version can compute with them.
     *
     * @throws UnusableInputException naming the first fault with file, line, path, what is wrong and what mends it
     */
    public static StudyDocument read(Path studyFile) {
        LocatedJson document = LocatedJson.parse(studyFile.toString(), JsonFile.bytes(studyFile));
        SchemaCheck.study(document);
        ValueChecks.check(document);
        Path folder = studyFile.toAbsolutePath().normalize().getParent();
        try {
            StudyResolver resolver = new StudyResolver(document, new StudyPaths(folder));
            return new StudyDocument(resolver.study(), studyFile, folder, resolver.findings());
        } catch (IOException e) {
            throw new UnusableInputException(
                    new Finding(
                            "study-file-missing",
                            Severity.REFUSES,
                            folder.toString(),
                            "the folder cannot be read (" + e.getMessage() + ")",
                            "The captures of the study lie in it",
                            "Check that you may read it"),
                    e);
        }
    }
}
