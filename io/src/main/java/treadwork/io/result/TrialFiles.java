package treadwork.io.result;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Set;
import treadwork.io.file.JsonText;
import treadwork.io.file.WholeFolder;
import treadwork.io.study.FolderName;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.TrialResult;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** The folder with the results of one trial. */
public final class TrialFiles {

    private static final String LOADS = "loads.csv";
    private static final String CONTACTS = "contacts.csv";
    private static final String TRIAL = "trial.json";
    private static final String CAPTURE = "results.c3d";

    /** What may stand in such a folder; one with anything else in it is somebody's, and is not replaced. */
    private static final Set<String> OWN = Set.of(LOADS, CONTACTS, TRIAL, CAPTURE, "cycles.csv", "summary.csv");

    private TrialFiles() {}

    /** Where a trial's results go: {@code <subject>/<file name without ending>} under {@code results}. */
    public static Path folder(Path results, Subject subject, Trial trial) {
        return results.resolve(subject.id()).resolve(FolderName.ofTrial(trial.file()));
    }

    /**
     * Writes the folder, whole or not at all: what an earlier run wrote there stands until the new files are complete.
     *
     * @throws UnusableInputException with code {@code results-not-writable} if the disk refuses, {@code
     *     results-folder-foreign} if files that are not results stand there
     */
    public static void write(Path trialFolder, TrialRecord record, TrialResult result) {
        write(trialFolder, record, result, Optional.empty());
    }

    /**
     * Writes the folder like {@link #write(Path, TrialRecord, TrialResult)}, with a C3D file of the results in it if there is what
     * it is made from.
     */
    public static void write(
            Path trialFolder, TrialRecord record, TrialResult result, Optional<ResultCapture> capture) {
        WholeFolder.write(trialFolder, OWN, folder -> {
            try (Writer loads = Files.newBufferedWriter(folder.resolve(LOADS), StandardCharsets.UTF_8)) {
                LoadsCsv.write(result, record.trial().results(), loads);
            }
            try (Writer contacts = Files.newBufferedWriter(folder.resolve(CONTACTS), StandardCharsets.UTF_8)) {
                ContactsCsv.write(result, contacts);
            }
            if (capture.isPresent()) {
                ResultsC3d.write(capture.get(), result, record, folder.resolve(CAPTURE));
            }
            Files.writeString(folder.resolve(TRIAL), JsonText.of(TrialTree.of(record, result)));
        });
    }

    /**
     * Whether the folder holds whole results of just these inputs, so that they need not be computed again. What an
     * interrupted run left beside the folder is cleared away first; nothing else is changed.
     *
     * @param key of {@link TrialRecord#key()}
     */
    public static boolean isUpToDate(Path trialFolder, String key) {
        WholeFolder.recover(trialFolder);
        return Files.isRegularFile(trialFolder.resolve(LOADS))
                && Files.isRegularFile(trialFolder.resolve(CONTACTS))
                && key.equals(writtenKey(trialFolder.resolve(TRIAL)));
    }

    /** Whether a C3D file of the results stands in the folder. */
    public static boolean holdsCapture(Path trialFolder) {
        return Files.isRegularFile(trialFolder.resolve(CAPTURE));
    }

    /** The key that stands in a {@code trial.json}; empty where it cannot be read. */
    private static String writtenKey(Path trial) {
        if (!Files.isRegularFile(trial)) {
            return "";
        }
        try (JsonParser parser = new JsonFactory().createParser(trial.toFile())) {
            parser.nextToken();
            while (parser.nextToken() == JsonToken.FIELD_NAME) {
                boolean found = parser.currentName().equals(TrialTree.KEY);
                parser.nextToken();
                if (found) {
                    return parser.getText();
                }
                parser.skipChildren();
            }
            return "";
        } catch (IOException e) {
            return "";
        }
    }
}
