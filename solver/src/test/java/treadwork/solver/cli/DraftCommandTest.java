package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.study.StudyReader;
import treadwork.model.study.Subject;

/** From a folder of captures to a study that can be completed and computed. */
class DraftCommandTest {

    private static final Walk WALK = Walk.of(WalkerSettings.DEFAULT.with(Gait.DEFAULT.withDurationS(2)));

    @TempDir
    Path folder;

    @Test
    void draftsAStudyThatReadsAtOnce() throws IOException {
        writeCaptures();

        Program program = Program.run("draft", folder);

        assertEquals(ExitCode.DONE, program.exitCode(), program.err());
        Subject subject = StudyReader.read(folder.resolve("study.json"))
                .study()
                .subjects()
                .get(0);
        assertEquals(WALK.markerSet().landmarks(), subject.markerSet().landmarks());
        assertEquals(WALK.massKg(), subject.massKg(), 0.1);
        assertEquals("standing.c3d", subject.staticFile());
        assertEquals("walk.c3d", subject.trials().get(0).file());
        assertTrue(program.out().contains("right_heel = right heel. 99 % sure"), program.out());
    }

    @Test
    void computesLoadsFromTheDraftOnceSexIsFilledIn() throws IOException {
        writeCaptures();
        Program.run("draft", folder);
        Path study = folder.resolve("study.json");
        Files.writeString(study, Files.readString(study).replace("// \"sex\"", "\"sex\""));

        Program program = Program.run("compute", study, "--quiet");

        assertEquals(ExitCode.DONE, program.exitCode(), program.err());
        List<Path> loads;
        try (var files = Files.walk(folder.resolve("results"))) {
            loads = files.filter(file -> file.toString().endsWith("loads.csv")).toList();
        }
        assertEquals(1, loads.size());
        assertTrue(Files.readAllLines(loads.get(0)).size() > WALK.walking().frames(), "a row a frame, and the head");
    }

    @Test
    void replacesNoFile() throws IOException {
        writeCaptures();
        Files.writeString(folder.resolve("markers.json"), "mine");

        Program program = Program.run("draft", folder);

        program.assertRefused("markers.json", "there already");
        assertEquals("mine", Files.readString(folder.resolve("markers.json")));
        assertTrue(Files.notExists(folder.resolve("study.json")));
    }

    @Test
    void refusesAFolderInWhichNobodyStands() throws IOException {
        C3dWriter.write(WALK.walking(), C3dEncoding.DEFAULT, folder.resolve("walk.c3d"));

        Program program = Program.run("draft", folder);

        program.assertRefused("no capture keeps still");
    }

    @Test
    void mapsAnOpenRecordingAsItsPlainNamesSay() throws IOException {
        Path data = Path.of(System.getProperty("shared", "../shared"), "data", "walk-static-a");
        Assumptions.assumeTrue(Files.isDirectory(data), "the open recordings are not here");
        for (String name : List.of("Standing_Hybrid_1.c3d", "Walking_Hybrid_1_1.c3d", "Walking_Hybrid_1_3.c3d")) {
            Files.copy(data.resolve(name), folder.resolve(name));
        }

        Program program = Program.run("draft", folder);

        assertEquals(ExitCode.DONE, program.exitCode(), program.err());
        for (String side : List.of("right", "left")) {
            String letter = side.substring(0, 1).toUpperCase(java.util.Locale.ROOT);
            for (String pair : List.of(
                    "asis = #_ASIS.",
                    "lateral_epicondyle = #_KNEE_LAT.",
                    "medial_epicondyle = #_KNEE_MED.",
                    "lateral_malleolus = #_ANKLE_LAT.",
                    "medial_malleolus = #_ANKLE_MED.",
                    "heel = #_HEEL.",
                    "first_metatarsal_head = #_MT_1.",
                    "fifth_metatarsal_head = #_MT_5.")) {
                String line = "  " + side + "_" + pair.replace("#", letter);
                assertTrue(program.out().contains(line), line + " is not in:\n" + program.out());
            }
        }
        assertTrue(program.out().contains("  sacrum = SACRUM."), program.out());
    }

    private void writeCaptures() throws IOException {
        C3dWriter.write(WALK.standing(), C3dEncoding.DEFAULT, folder.resolve("standing.c3d"));
        C3dWriter.write(WALK.walking(), C3dEncoding.DEFAULT, folder.resolve("walk.c3d"));
    }
}
