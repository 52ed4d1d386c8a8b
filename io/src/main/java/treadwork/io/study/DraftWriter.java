package treadwork.io.study;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.io.file.WholeFile;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** Writes a guessed study with a comment on each guess; what is too unsure stands commented out. */
public final class DraftWriter {

    private static final String STUDY = "study.json";
    private static final String MARKERS = "markers.json";

    private DraftWriter() {}

    /**
     * Writes {@code study.json} and {@code markers.json} (for further maps {@code markers-2.json} and so on).
     *
     * @return the files written
     * @throws UnusableInputException with code {@code draft-exists} if one of them is there; nothing is then written
     */
    public static List<Path> write(StudyDraft draft, Path folder) {
        Map<MarkersDraft, String> names = new LinkedHashMap<>();
        for (StudyDraft.Person person : draft.subjects()) {
            names.computeIfAbsent(
                    person.markers(), map -> names.isEmpty() ? MARKERS : "markers-" + (names.size() + 1) + ".json");
        }
        Map<Path, String> texts = new LinkedHashMap<>();
        names.forEach((markers, name) -> texts.put(folder.resolve(name), DraftText.markers(markers)));
        texts.put(folder.resolve(STUDY), DraftText.study(draft, names));
        texts.keySet().forEach(DraftWriter::requireAbsent);
        writeAll(texts);
        return List.copyOf(texts.keySet());
    }

    /** All or, where one fails, none. */
    private static void writeAll(Map<Path, String> texts) {
        List<Path> written = new ArrayList<>();
        try {
            texts.forEach((file, text) -> {
                WholeFile.write(file, text);
                written.add(file);
            });
        } catch (UnusableInputException e) {
            for (Path file : written) {
                try {
                    Files.deleteIfExists(file);
                } catch (IOException gone) {
                    e.addSuppressed(gone);
                }
            }
            throw e;
        }
    }

    /**
     * For a look before long work.
     *
     * @throws UnusableInputException with code {@code draft-exists} if the study file is there
     */
    public static void requireNoStudy(Path folder) {
        requireAbsent(folder.resolve(STUDY));
        requireAbsent(folder.resolve(MARKERS));
    }

    private static void requireAbsent(Path file) {
        if (Files.exists(file, LinkOption.NOFOLLOW_LINKS)) {
            throw new UnusableInputException(new Finding(
                    "draft-exists",
                    Severity.REFUSES,
                    file.toString(),
                    "the file is there already",
                    "A draft would replace what a person may have written",
                    String.format(Locale.ROOT, "Move or rename %s, then draft again", file.getFileName())));
        }
    }
}
