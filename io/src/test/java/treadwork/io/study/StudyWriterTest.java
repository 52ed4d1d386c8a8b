package treadwork.io.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.model.capture.LengthUnit;
import treadwork.model.study.LabAxis;
import treadwork.model.study.LabSettings;
import treadwork.model.study.NamedPlate;
import treadwork.model.study.Study;
import treadwork.model.study.Subject;
import treadwork.model.study.TextSettings;
import treadwork.model.study.Trial;

class StudyWriterTest {

    private static final String FIRST_TRIAL = "\"condition\": \"brace off\"";

    private static final String NAMED_PLATES = "\"text\": { \"pointRateHz\": 150, \"plateRateHz\": 450, "
            + "\"channels\": [\"u\", \"v\"] }, \"plates\": [ { \"type\": 1, \"axes\": \"lab\", "
            + "\"cornersM\": [[0.4,0.6,0],[0,0.6,0],[0,0,0],[0.4,0,0]], "
            + "\"channels\": [\"a\",\"b\",\"c\",\"d\",\"e\",\"f\",\"g\"] } ]";

    @TempDir
    Path folder;

    @Test
    void aStudyReadsBackAsItWasWritten() throws IOException {
        Study study = new StudyFolder(folder).read().study();

        StudyWriter.write(study, folder.resolve("again.json"));

        assertEquals(study, StudyReader.read(folder.resolve("again.json")).study());
    }

    /** Everything that one trial can have for itself, and plates in place of the file's. */
    @Test
    void whatDiffersBetweenTrialsReadsBackToo() throws IOException {
        Study study = new StudyFolder(folder)
                .with(
                        FIRST_TRIAL,
                        FIRST_TRIAL + ", \"frames\": [10, 400], "
                                + "\"processing\": { \"plateZero\": [1, 50], \"plateFilter\": { \"kind\": \"none\" } }, "
                                + "\"markerSet\": { \"clusters\": { \"right_thigh\": [\"A\", \"B\", \"C\"] } }, "
                                + "\"body\": { \"segments\": { \"right_shank\": { \"massKg\": 3.1, \"comM\": [0, -0.18, 0.01], "
                                + "\"inertiaKgm2\": [0.04, 0.005, 0.041, 0.001, -0.002, 0.0005] } } }, "
                                + "\"contacts\": [{ \"plate\": 1, \"foot\": \"left\", \"frames\": [20, 90] }]")
                .with(
                        "\"up\": \"+z\"",
                        "\"pointUnit\": \"mm\", \"plates\": [ { \"type\": 2, "
                                + "\"cornersM\": [[0.4,0.6,0],[0,0.6,0],[0,0,0],[0.4,0,0]], \"originM\": [0.001,0.002,-0.04], "
                                + "\"channels\": [7,8,9,10,11,12], \"channelUnit\": \"m\" } ]")
                .read()
                .study();

        StudyWriter.write(study, folder.resolve("again.json"));

        assertEquals(study, StudyReader.read(folder.resolve("again.json")).study());
    }

    @Test
    void namedPlatesAndTextSettingsReadBack() throws IOException {
        Study study = new StudyFolder(folder)
                .with(FIRST_TRIAL, FIRST_TRIAL + ", \"plateFile\": \"S01/standing.c3d\"")
                .with("\"up\": \"+z\"", NAMED_PLATES)
                .read()
                .study();

        StudyWriter.write(study, folder.resolve("again.json"));

        assertEquals(study, StudyReader.read(folder.resolve("again.json")).study());
    }

    @Test
    void namedPlatesAndTextSettingsAreReadAsTheyStand() throws IOException {
        Trial trial = new StudyFolder(folder)
                .with(FIRST_TRIAL, FIRST_TRIAL + ", \"plateFile\": \"S01/standing.c3d\"")
                .with("\"up\": \"+z\"", NAMED_PLATES)
                .read()
                .study()
                .subjects()
                .get(0)
                .trials()
                .get(0);

        assertEquals(Optional.of("S01/standing.c3d"), trial.plateFile());
        assertEquals(
                new TextSettings(Optional.of(150.0), Optional.of(450.0), List.of("u", "v")),
                trial.lab().text());
        NamedPlate plate = trial.lab().namedPlates().get(0);
        assertTrue(plate.labAxes());
        assertEquals(List.of("a", "b", "c", "d", "e", "f", "g"), plate.channels());
        assertEquals(LengthUnit.MM, plate.channelUnit());
        assertEquals(List.of(), trial.lab().plates().stream().toList());
    }

    @Test
    void theTextIsThatOfAPerson() throws IOException {
        Study study = new StudyFolder(folder).read().study();

        StudyWriter.write(study, folder.resolve("again.json"));

        String text = Files.readString(folder.resolve("again.json"));
        assertTrue(
                text.startsWith(
                        "{\n  \"treadwork\": 1,\n  \"title\": \"two conditions\",\n  \"markerSet\": \"markers.json\",\n"),
                text);
        assertTrue(text.contains("\"contactThresholdN\": 20,"), text);
        assertTrue(text.contains("\"comM\": [ 0.02, -0.2, 0 ]"), text);
        assertTrue(text.endsWith("}\n"), text);
        assertTrue(Files.readString(folder.resolve("markers.json")).contains("\"right_asis\": \"RA\""));
    }

    @Test
    void twoLaboratoriesInOneStudyAreRefused() throws IOException {
        Study study = new StudyFolder(folder).read().study();
        Subject subject = study.subjects().get(0);
        Trial t = subject.trials().get(0);
        LabSettings other = new LabSettings(Optional.of(LabAxis.PLUS_Y), Optional.empty(), Optional.empty());
        Trial elsewhere = new Trial(
                t.file(),
                t.condition(),
                t.markerSet(),
                other,
                t.body(),
                t.processing(),
                t.results(),
                t.contacts(),
                t.frames(),
                t.orthoses());
        Subject both = new Subject(
                subject.id(),
                subject.massKg(),
                subject.heightM(),
                subject.sex(),
                subject.staticFile(),
                subject.markerSet(),
                List.of(elsewhere, subject.trials().get(1)));

        assertThrows(
                IllegalArgumentException.class,
                () -> StudyWriter.write(new Study("", List.of(both)), folder.resolve("again.json")));
    }
}
