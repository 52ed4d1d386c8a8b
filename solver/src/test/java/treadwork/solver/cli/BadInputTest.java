package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.C3dWriter;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** Every kind of input that cannot be used: exit code 2, one line that says what, where and what mends it, nothing written. */
class BadInputTest {

    @TempDir
    Path folder;

    /** What is wrong, how the study file is spoilt, and words of the message. */
    static Stream<Arguments> spoiltStudies() {
        return Stream.of(
                spoilt("a key nobody knows", "\"massKg\"", "\"masKg\"", "masKg", "line", "massKg"),
                spoilt("a mass of zero", "\"massKg\": 70", "\"massKg\": 0", "massKg", "line"),
                spoilt("a negative mass", "\"massKg\": 70", "\"massKg\": -70", "massKg", "line"),
                spoilt("a path that leaves the folder", "\"S01/walk-1.c3d\"", "\"../walk-1.c3d\"", "../walk-1.c3d"),
                spoilt("a capture that is not there", "\"S01/walk-1.c3d\"", "\"S01/walk-7.c3d\"", "walk-7.c3d"),
                spoilt("no JSON", "{", "", "line 2, column"),
                spoilt("a text in place of a number", "\"massKg\": 70", "\"massKg\": \"70 kg\"", "massKg", "70 kg"),
                spoilt("a pose not offered", "\"segment-fit\"", "\"linked\"", "linked", "segment-fit"),
                spoilt(
                        "a hip centre not offered",
                        "\"hipCentre\": \"marker\"",
                        "\"hipCentre\": \"functional\"",
                        "functional"),
                spoilt("draws not offered", "\"draws\": 0", "\"draws\": 100", "draws"),
                spoilt("a cut-off above half the rate", "\"cutoffHz\": 6", "\"cutoffHz\": 400", "400"),
                spoilt("a moment convention unknown", "\"internal\"", "\"interior\"", "interior", "internal"));
    }

    private static Arguments spoilt(String what, String old, String other, String... words) {
        UnaryOperator<SmallStudy> spoiling = study -> study.replace(old, other);
        return Arguments.of(what, spoiling, words);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("spoiltStudies")
    void aSpoiltStudyFileIsRefused(String what, UnaryOperator<SmallStudy> spoiling, String[] words) {
        SmallStudy study = spoiling.apply(SmallStudy.write(folder, 1));

        Program run = Program.run("compute", "--quiet", study.file());

        assertRefused(run, study, words);
    }

    /** What is wrong with the marker map, and words of the message. */
    static Stream<Arguments> spoiltMarkerSets() {
        return Stream.of(
                Arguments.of("a label missing", "right heel", "right hell", new String[] {"right hell", "right heel"}),
                Arguments.of(
                        "a label twice in a cluster",
                        "\"right shank 1\", \"right shank 2\", \"right shank 3\", \"right shank 4\"",
                        "\"right heel\", \"right heel\", \"right heel\"",
                        new String[] {"right heel"}),
                Arguments.of(
                        "a landmark nobody knows", "\"right_heel\"", "\"right_heal\"", new String[] {"right_heal"}));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("spoiltMarkerSets")
    void aSpoiltMarkerSetIsRefused(String what, String old, String other, String[] words) {
        SmallStudy study = SmallStudy.write(folder, 1);
        study.edit(folder.resolve("markers.json"), text -> text.replace(old, other));

        Program run = Program.run("compute", "--quiet", study.file());

        assertRefused(run, study, words);
    }

    /** What is wrong, what is done to the bytes of the walking capture, and words of the message. */
    static Stream<Arguments> spoiltCaptures() {
        UnaryOperator<byte[]> cut = bytes -> Arrays.copyOf(bytes, 700);
        UnaryOperator<byte[]> text = bytes -> "frame,x,y,z\n1,0,0,0\n".getBytes(StandardCharsets.UTF_8);
        UnaryOperator<byte[]> empty = bytes -> new byte[0];
        UnaryOperator<byte[]> unknownPlate = bytes -> withPlateType(bytes, 9);
        UnaryOperator<byte[]> noFrames = BadInputTest::withoutFrames;
        return Stream.of(
                Arguments.of("a truncated file", cut, "walk-1.c3d"),
                Arguments.of("another kind of file", text, "walk-1.c3d"),
                Arguments.of("an empty file", empty, "walk-1.c3d"),
                Arguments.of("a plate type nobody knows", unknownPlate, "the type is 9"),
                Arguments.of("no frames", noFrames, "walk-1.c3d"));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("spoiltCaptures")
    void aSpoiltCaptureIsRefused(String what, UnaryOperator<byte[]> spoiling, String word) throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);
        Files.write(study.walking(1), spoiling.apply(Files.readAllBytes(study.walking(1))));

        Program run = Program.run("compute", "--quiet", study.file());

        assertRefused(run, study, word);
    }

    /** The parameter TYPE: its name, the offset to the next record, two bytes a number, one dimension of seven. */
    private static byte[] withPlateType(byte[] bytes, int type) {
        byte[] spoilt = bytes.clone();
        for (int i = 0; i + 10 < spoilt.length; i++) {
            boolean name = spoilt[i] == 'T' && spoilt[i + 1] == 'Y' && spoilt[i + 2] == 'P' && spoilt[i + 3] == 'E';
            if (name && spoilt[i + 6] == 2 && spoilt[i + 7] == 1) {
                spoilt[i + 9] = (byte) type;
                return spoilt;
            }
        }
        throw new IllegalStateException("no plate type in the file");
    }

    /** What comes before the first frame, whose block the header's ninth word names. */
    private static byte[] withoutFrames(byte[] bytes) {
        int firstBlock = (bytes[16] & 0xff) + 256 * (bytes[17] & 0xff);
        return Arrays.copyOf(bytes, (firstBlock - 1) * 512);
    }

    @Test
    void aClusterOnOneLineIsRefused() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);
        Capture standing = C3dReader.read(study.standing(), Optional.empty());
        List<PointSeries> points = new ArrayList<>();
        for (PointSeries point : standing.points()) {
            boolean shank = point.label().startsWith("right shank");
            Vector3 place = new Vector3(0.1 * points.size(), 0.2, 0.3);
            VectorSeries onALine = VectorSeries.constant(place, standing.frames());
            points.add(new PointSeries(point.label(), "", shank ? onALine : point.positions()));
        }
        C3dWriter.write(with(standing, points), C3dEncoding.DEFAULT, study.standing());

        Program run = Program.run("compute", "--quiet", study.file());

        assertRefused(run, study, "cluster-line", "right_shank", "right shank 1");
    }

    private static Capture with(Capture capture, List<PointSeries> points) {
        return new Capture(
                capture.name(),
                capture.firstFrame(),
                capture.frames(),
                capture.pointRate(),
                points,
                capture.samplesPerFrame(),
                capture.analog(),
                capture.plates(),
                capture.plateZero(),
                capture.events(),
                capture.pointUnit(),
                capture.storage(),
                capture.findings());
    }

    @Test
    void aLinkThatLeavesTheFolderIsRefused(@TempDir Path elsewhere) throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);
        Path outside = elsewhere.resolve("walk.c3d");
        Files.move(study.walking(1), outside);
        Files.createSymbolicLink(study.walking(1), outside);

        Program run = Program.run("compute", "--quiet", study.file());

        assertRefused(run, study, "S01/walk-1.c3d");
    }

    @Test
    void aStudyThatIsNoFileIsRefused() {
        Program.run("compute", folder.resolve("none.json")).assertRefused("none.json");
        Program.run("compute", folder).assertRefused(folder.toString());
    }

    @Test
    void aMissingSexIsAskedForWhereTheTableNeedsIt() {
        SmallStudy study = SmallStudy.write(folder, 1).replace("\"sex\": \"female\",", "");
        study.edit(study.file(), text -> text.replaceFirst("(?s)\"segments\": \\{.*?\\n    \\}", "\"segments\": {}"));

        Program run = Program.run("compute", "--quiet", study.file());

        assertRefused(run, study, "sex");
    }

    @Test
    void resultsThatCannotBeWrittenAreRefused() throws IOException {
        SmallStudy study = SmallStudy.write(folder, 1);
        Files.writeString(folder.resolve("results"), "a file stands here");

        Program run = Program.run("compute", "--quiet", study.file());

        assertEquals(ExitCode.UNUSABLE, run.exitCode());
        assertEquals("a file stands here", Files.readString(folder.resolve("results")));
        assertTrue(run.err().contains("results"), run.err());
    }

    @Test
    void commandsAndOptionsThatDoNotExistGetOneOrTwoLines() {
        for (Program run : new Program[] {
            Program.run("comptue"),
            Program.run("compute"),
            Program.run("compute", "--thread", "2", "x"),
            Program.run("compute", "--threads", "0", "x"),
            Program.run("inspect", "--unit", "inch", "x")
        }) {
            assertEquals(ExitCode.UNUSABLE, run.exitCode());
            assertTrue(run.errLines().size() <= 2, run.err());
            assertFalse(run.err().contains("\tat "), run.err());
        }
    }

    private static void assertRefused(Program run, SmallStudy study, String... words) {
        run.assertRefused(words);
        assertFalse(Files.exists(study.results()), "results were written");
    }
}
