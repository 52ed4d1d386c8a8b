package treadwork.io.result;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.TrialResult;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;

class TrialFilesTest {

    private static final TrialRecord RECORD = Results.record();

    @TempDir
    Path results;

    private Path folder;

    @BeforeEach
    void placeOfTheTrial() {
        folder = TrialFiles.folder(results, RECORD.subject(), RECORD.trial());
    }

    @Test
    void theFolderIsNamedBySubjectAndFile() {
        assertEquals(results.resolve("S01").resolve("walk-01"), folder);
    }

    @Test
    void writesTheThreeFilesAndNothingElse() throws IOException {
        TrialFiles.write(folder, RECORD, Results.bothLimbs(3));

        assertEquals(List.of("contacts.csv", "loads.csv", "trial.json"), names(folder));
        assertEquals(List.of("walk-01"), names(folder.getParent()));
    }

    @Test
    void statesWhatWentInAndInWhichConvention() throws IOException {
        TrialFiles.write(folder, RECORD, Results.bothLimbs(3));

        JsonNode trial = trial();
        assertEquals("0.1.0", trial.at("/programVersion").textValue());
        assertEquals(RECORD.key(), trial.at("/key").textValue());
        assertEquals(72.4, trial.at("/subject/massKg").doubleValue());
        assertTrue(trial.at("/subject/heightM").isNull());
        assertEquals("brace on", trial.at("/trial/condition").textValue());
        assertEquals("sha-of-walk", trial.at("/inputs/0/sha256").textValue());
        assertEquals(6, trial.at("/settings/processing/markerFilter/cutoffHz").intValue());
        assertEquals("[1,400]", trial.at("/settings/frames").toString());
        assertEquals(
                "RH",
                trial.at("/settings/markerSet/static/landmarks/right_heel").textValue());
        assertEquals("internal", trial.at("/conventions/momentConvention").textValue());
        assertEquals("proximal", trial.at("/conventions/forceAxes").textValue());
        assertEquals("+z", trial.at("/conventions/labUp").textValue());
        assertEquals("dorsiflexion", trial.at("/conventions/positive/ankle/0").textValue());
        assertEquals(101, trial.at("/capture/firstFrame").intValue());
    }

    @Test
    void statesSegmentsContactsAndFindings() throws IOException {
        TrialFiles.write(folder, RECORD, Results.bothLimbs(3));

        JsonNode trial = trial();
        assertEquals("pelvis", trial.at("/segments/0/segment").textValue());
        assertEquals(11.5, trial.at("/segments/0/massKg").doubleValue());
        assertEquals("[0.01,-0.02,0.03]", trial.at("/segments/0/comM").toString());
        assertEquals(
                "[0.1,0.2,0.15,0.01,0.02,0.03]",
                trial.at("/segments/0/inertiaKgm2").toString());
        assertTrue(trial.at("/segments/0/lengthM").isNull());
        assertEquals(0.0021, trial.at("/segments/0/fitRmsM").doubleValue());
        assertEquals("from the foot's outline", trial.at("/contacts/0/assigned").textValue());
        assertEquals("[103,104]", trial.at("/contacts/0/frames").toString());
        assertEquals("plate-sign", trial.at("/findings/0/code").textValue());
        assertEquals("warning", trial.at("/findings/0/severity").textValue());
        assertTrue(trial.at("/findings/0/mended").booleanValue());
        assertTrue(trial.at("/events").isEmpty() && trial.at("/events").isArray());
        assertTrue(trial.at("/uncertainty").isNull());
    }

    @Test
    void wholeResultsOfTheSameInputsAreUpToDate() {
        TrialFiles.write(folder, RECORD, Results.bothLimbs(3));

        assertTrue(TrialFiles.isUpToDate(folder, RECORD.key()));
        assertFalse(TrialFiles.isUpToDate(
                folder, Results.record(72.5, "sha-of-walk", Processing.DEFAULT).key()));
        assertFalse(TrialFiles.isUpToDate(results.resolve("S02/none"), RECORD.key()));
    }

    @Test
    void resultsThatLackAFileOrAreDamagedAreNotUpToDate() throws IOException {
        for (String name : List.of("loads.csv", "contacts.csv", "trial.json")) {
            TrialFiles.write(folder, RECORD, Results.bothLimbs(3));
            Files.delete(folder.resolve(name));
            assertFalse(TrialFiles.isUpToDate(folder, RECORD.key()), name);
        }
        TrialFiles.write(folder, RECORD, Results.bothLimbs(3));
        Files.writeString(folder.resolve("trial.json"), "{ \"programVersion\": ");
        assertFalse(TrialFiles.isUpToDate(folder, RECORD.key()));
    }

    @Test
    void theKeyChangesWithWhateverGoesIn() {
        Processing other = new Processing(
                FilterSettings.DEFAULT,
                new FilterSettings(FilterSettings.Kind.BUTTERWORTH, 6.0000001, 4),
                0.1,
                20,
                new PlateZero.Auto());
        TrialRecord newer = new TrialRecord("0.1.1", RECORD.subject(), RECORD.trial(), RECORD.inputs());

        assertEquals(RECORD.key(), Results.record().key());
        assertNotEquals(
                RECORD.key(),
                Results.record(72.4000001, "sha-of-walk", Processing.DEFAULT).key());
        assertNotEquals(
                RECORD.key(),
                Results.record(72.4, "another", Processing.DEFAULT).key());
        assertNotEquals(RECORD.key(), Results.record(72.4, "sha-of-walk", other).key());
        assertNotEquals(RECORD.key(), newer.key());
    }

    @Test
    void anInterruptedRunLeavesTheOldResultsWhole() throws IOException {
        TrialFiles.write(folder, RECORD, Results.bothLimbs(3));
        String before = Files.readString(folder.resolve("loads.csv"));
        TrialResult damaged = damaged();

        assertThrows(RuntimeException.class, () -> TrialFiles.write(folder, RECORD, damaged));

        assertEquals(List.of("walk-01"), names(folder.getParent()));
        assertEquals(before, Files.readString(folder.resolve("loads.csv")));
        assertTrue(TrialFiles.isUpToDate(folder, RECORD.key()));
    }

    @Test
    void aFolderWithOtherFilesIsNotReplaced() throws IOException {
        Files.createDirectories(folder);
        Files.writeString(folder.resolve("walk-01.c3d"), "a capture");

        UnusableInputException thrown = assertThrows(
                UnusableInputException.class, () -> TrialFiles.write(folder, RECORD, Results.bothLimbs(3)));

        assertEquals("results-folder-foreign", thrown.finding().code());
        assertTrue(thrown.finding().figure().contains("\"walk-01.c3d\""));
        assertEquals("a capture", Files.readString(folder.resolve("walk-01.c3d")));
    }

    @Test
    void aPlaceThatCannotBeWrittenIsTold() throws IOException {
        Files.writeString(results.resolve("S01"), "a file in the way");

        UnusableInputException thrown = assertThrows(
                UnusableInputException.class, () -> TrialFiles.write(folder, RECORD, Results.bothLimbs(3)));

        assertEquals("results-not-writable", thrown.finding().code());
        assertEquals(folder.toString(), thrown.finding().where());
        assertTrue(
                thrown.finding().figure().contains("S01 is in the way"),
                thrown.finding().figure());
        assertEquals("a file in the way", Files.readString(results.resolve("S01")));
    }

    /** FIPS 180-4, the example of a one-block message: SHA-256 of "abc". */
    @Test
    void hashesTheBytesOfAFile() throws IOException {
        Path file = Files.writeString(results.resolve("abc"), "abc");

        InputFile input = InputFile.of("S01/abc", file);

        assertEquals("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", input.sha256());
    }

    @Test
    void aCaptureThatCannotBeReadIsTold() {
        UnusableInputException thrown = assertThrows(
                UnusableInputException.class, () -> InputFile.of("S01/none.c3d", results.resolve("none.c3d")));

        assertEquals("input-not-readable", thrown.finding().code());
        assertEquals("S01/none.c3d", thrown.finding().where());
    }

    /** A result that says more frames than it has breaks off in the middle of its first file. */
    private static TrialResult damaged() {
        TrialResult whole = Results.bothLimbs(3);
        return new TrialResult(
                whole.firstFrame(),
                5,
                whole.pointRate(),
                whole.up(),
                whole.joints(),
                whole.support(),
                whole.contacts(),
                whole.segments(),
                whole.findings());
    }

    private JsonNode trial() throws IOException {
        return new ObjectMapper().readTree(folder.resolve("trial.json").toFile());
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.map(path -> path.getFileName().toString()).sorted().toList();
        }
    }
}
