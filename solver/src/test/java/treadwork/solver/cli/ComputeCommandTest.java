package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.fixtures.demo.DemoStudy;
import treadwork.io.c3d.C3dReader;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;

class ComputeCommandTest {

    private static final List<String> RESULT_FILES = List.of("contacts.csv", "loads.csv", "trial.json");

    @TempDir
    Path folder;

    @Test
    void writesThreeFilesATrialAndChangesNoInput() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 2);
        Map<String, byte[]> before = contents(folder);

        Program run = Program.run("compute", study.file());

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        for (String trial : List.of("walk-1", "walk-2")) {
            assertEquals(RESULT_FILES, names(study.results().resolve("S01").resolve(trial)));
        }
        Map<String, byte[]> after = contents(folder);
        before.forEach((name, bytes) -> assertArrayEquals(bytes, after.get(name), name));
    }

    @Test
    void aCaptureWithTheResultsIsWrittenWhereThatIsAskedFor() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);
        Program.run("compute", "--quiet", study.file());
        Path file = study.results().resolve("S01/walk-1/results.c3d");
        byte[] input = Files.readAllBytes(study.walking(1));

        Program run = Program.run("compute", "--c3d", study.file());

        assertTrue(run.err().contains("S01/walk-1: computed"), run.err());
        assertTrue(Program.run("compute", "--c3d", study.file()).err().contains("S01/walk-1: up to date"));
        assertArrayEquals(input, Files.readAllBytes(study.walking(1)));
        Capture measured = C3dReader.read(study.walking(1), Optional.empty());
        Capture written = C3dReader.read(file, Optional.empty());
        assertEquals(
                measured.points().stream().map(PointSeries::label).toList(),
                written.points().stream().map(PointSeries::label).toList());
        assertEquals(measured.plates(), written.plates());
        assertTrue(
                written.findings().stream().anyMatch(finding -> finding.code().equals("points-computed")),
                written.findings().toString());
    }

    @Test
    void resultsGoToStandardOutputAndProgressToStandardError() {
        SmallStudy study = SmallStudy.write(folder, 2);

        Program run = Program.run("compute", study.file());

        assertTrue(run.out().contains("S01/walk-1") && run.out().contains("plantar-"), run.out());
        assertTrue(run.err().contains("[2/2] S01/walk-"), run.err());
        assertFalse(
                Program.run("compute", "--quiet", "--again", study.file()).err().contains("[1/2]"));
    }

    @Test
    void oneBadTrialKeepsNoOtherFromBeingComputed() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 2);
        Files.writeString(study.walking(1), "no capture");

        Program run = Program.run("compute", "--quiet", study.file());

        assertEquals(ExitCode.PARTLY, run.exitCode());
        assertFalse(Files.exists(study.results().resolve("S01/walk-1")));
        assertEquals(RESULT_FILES, names(study.results().resolve("S01/walk-2")));
        assertTrue(run.err().contains("walk-1.c3d"), run.err());
    }

    @Test
    void aRunTakesUpWhereItStopped() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 2);
        Program.run("compute", "--quiet", study.file());
        Path done = study.results().resolve("S01/walk-2/trial.json");
        Object written = Files.getLastModifiedTime(done);
        delete(study.results().resolve("S01/walk-1"));

        Program run = Program.run("compute", study.file());

        assertTrue(run.err().contains("S01/walk-1: computed"), run.err());
        assertTrue(run.err().contains("S01/walk-2: up to date"), run.err());
        assertEquals(written, Files.getLastModifiedTime(done));
    }

    @Test
    void aChangedSettingOrInputComputesAgain() {
        SmallStudy study = SmallStudy.write(folder, 1);
        Program.run("compute", "--quiet", study.file());
        study.replace("\"cutoffHz\": 6", "\"cutoffHz\": 8");

        Program run = Program.run("compute", study.file());

        assertTrue(run.err().contains("S01/walk-1: computed"), run.err());
    }

    @Test
    void whatIsUpToDateIsComputedAgainWhereThatIsAskedFor() {
        SmallStudy study = SmallStudy.write(folder, 1);
        Program.run("compute", "--quiet", study.file());

        assertTrue(Program.run("compute", study.file()).err().contains("S01/walk-1: up to date"));
        assertTrue(Program.run("compute", "--again", study.file()).err().contains("S01/walk-1: computed"));
    }

    @Test
    void onlyOneTrialIsComputedWhereOneIsNamed() {
        SmallStudy study = SmallStudy.write(folder, 2);

        Program run = Program.run("compute", "--quiet", "--only", "S01/walk-2", study.file());

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        assertFalse(Files.exists(study.results().resolve("S01/walk-1")));
        assertTrue(Files.exists(study.results().resolve("S01/walk-2")));
    }

    @Test
    void aNameThatTheStudyDoesNotHaveIsRefusedWithThoseItHas() {
        SmallStudy study = SmallStudy.write(folder, 1);

        Program.run("compute", "--only", "S07", study.file()).assertRefused("S07", "S01/walk-1");
    }

    @Test
    void resultsAreTheSameOnAnyNumberOfThreads() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 3);

        Program.run("compute", "--quiet", "--threads", "1", "--out", folder.resolve("one"), study.file());
        Program.run("compute", "--quiet", "--threads", "3", "--out", folder.resolve("three"), study.file());

        Map<String, byte[]> one = contents(folder.resolve("one"));
        Map<String, byte[]> three = contents(folder.resolve("three"));
        assertEquals(9, one.size(), "files");
        one.forEach((name, bytes) -> assertArrayEquals(bytes, three.get(name), name));
    }

    @Test
    void theOutcomeIsOneJsonDocument() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);

        Program run = Program.run("compute", "--quiet", "--json", study.file());

        JsonNode outcome = new ObjectMapper().readTree(run.out());
        assertEquals("S01/walk-1", outcome.at("/trials/0/trial").asText());
        assertEquals("computed", outcome.at("/trials/0/status").asText());
        assertTrue(
                outcome.at("/trials/0/peaks/right/ankle_plantarflexion_moment_Nm_per_kg")
                                .asDouble()
                        > 0.5,
                run.out());
    }

    /** What an interrupted run left beside the results is cleared away; what stood there whole still does. */
    @Test
    void leftoversOfAnInterruptedRunDisappear() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);
        Program.run("compute", "--quiet", study.file());
        Path half = study.results().resolve("S01/.walk-1." + endedProcess() + ".part");
        Files.createDirectory(half);
        Files.writeString(half.resolve("loads.csv"), "frame,time_s");

        Program.run("compute", "--quiet", study.file());

        assertEquals(List.of("walk-1"), names(study.results().resolve("S01")));
        assertEquals(RESULT_FILES, names(study.results().resolve("S01/walk-1")));
    }

    @Test
    void theDemoIsWrittenComputedAndNearTheTruth() throws IOException {
        Path demo = folder.resolve("demo");

        Program run = Program.run("demo", "--quiet", demo);

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        assertTrue(run.out().contains(DemoStudy.TITLE), run.out());
        for (String path : List.of("study.json", "exact/S02/walk-02.csv", "results/S02/walk-02/loads.csv")) {
            assertTrue(Files.isRegularFile(demo.resolve(path)), path);
        }
        assertTrue(run.err().contains("plate-origin (mended): walk-02.c3d, plate 3"), run.err());
        List<Double> errors = percentagesOff(run.out());
        assertEquals(6, errors.size(), run.out());
        errors.forEach(error -> assertTrue(Math.abs(error) < 10, error + " % off the truth"));
    }

    /** The last column of the table that holds what was found against the truth; skin motion of 2 mm is worth up to 6 %. */
    private static List<Double> percentagesOff(String out) {
        Matcher rows =
                Pattern.compile("(?m)^S0\\d/walk-\\d\\d.* ([+-]\\d+\\.\\d)$").matcher(out);
        return rows.results().map(row -> Double.parseDouble(row.group(1))).toList();
    }

    @Test
    void inspectShowsThePlantedMistakeAndNoOther() throws IOException {
        Path demo = folder.resolve("demo");
        Program.run("demo", "--quiet", demo);

        Program mistaken = Program.run("inspect", demo.resolve(DemoStudy.MISTAKEN_FILE));
        Program sound = Program.run("inspect", demo.resolve("S01/walk-01.c3d"));
        Program json = Program.run("inspect", "--json", demo.resolve(DemoStudy.MISTAKEN_FILE));

        assertTrue(mistaken.out().contains("warning plate-origin"), mistaken.out());
        assertTrue(mistaken.out().contains("plate " + DemoStudy.MISTAKEN_PLATE + ":"), mistaken.out());
        assertFalse(sound.out().contains("warning"), sound.out());
        JsonNode findings = new ObjectMapper().readTree(json.out()).at("/files/0/findings");
        assertEquals("plate-origin", findings.get(0).get("code").asText(), json.out());
    }

    @Test
    void theDemoWritesIntoNoFolderThatIsNotItsOwn() throws IOException {
        Files.writeString(folder.resolve("thesis.txt"), "mine");

        Program run = Program.run("demo", folder);

        run.assertRefused(folder.toString());
        assertEquals(List.of("thesis.txt"), names(folder));
    }

    @Test
    void theDemoMayBeWrittenAgain() {
        assertEquals(ExitCode.DONE, Program.run("demo", "--quiet", folder).exitCode());
        assertEquals(ExitCode.DONE, Program.run("demo", "--quiet", folder).exitCode());
    }

    @Test
    void helpVersionSchemaAndCompletionGoToStandardOutput() throws IOException {
        assertTrue(Program.run("--help").out().contains("compute"));
        assertTrue(Program.run("--version").out().startsWith("treadwork "));
        assertTrue(new ObjectMapper()
                .readTree(Program.run("schema").out())
                .at("/properties/subjects")
                .isObject());
        assertTrue(Program.run("completion").out().contains("_complete_treadwork"));
        assertNotEquals(ExitCode.FAULT, Program.run("view").exitCode());
    }

    /** The number of a process that ran and is over. */
    private static long endedProcess() throws IOException {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(), "--version")
                .redirectErrorStream(true)
                .start();
        process.getInputStream().readAllBytes();
        process.onExit().join();
        return process.pid();
    }

    private static List<String> names(Path of) throws IOException {
        try (Stream<Path> entries = Files.list(of)) {
            return entries.map(entry -> entry.getFileName().toString()).sorted().toList();
        }
    }

    /** All files below a folder, by their names relative to it. */
    private static Map<String, byte[]> contents(Path of) throws IOException {
        Map<String, byte[]> contents = new TreeMap<>();
        try (Stream<Path> files = Files.walk(of)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                contents.put(of.relativize(file).toString(), Files.readAllBytes(file));
            }
        }
        return contents;
    }

    private static void delete(Path of) throws IOException {
        try (Stream<Path> files = Files.walk(of)) {
            files.sorted((a, b) -> b.compareTo(a)).forEach(file -> {
                try {
                    Files.delete(file);
                } catch (IOException undeleted) {
                    throw new UncheckedIOException(undeleted);
                }
            });
        }
    }
}
