package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/** What is odd but readable is read, and said; each file is a whole one with one oddity. */
class OddFilesTest {

    @Test
    void theWholeFileHasNothingOdd() {
        Capture capture = read(new FileBuilder());

        assertEquals(List.of(), capture.findings());
        assertEquals(10, capture.frames());
        assertEquals(1, capture.plates().size());
    }

    @Test
    void fewerFramesThanStated() {
        Capture capture = read(new FileBuilder().word(5, 1149).integer("POINT", "FRAMES", 1149));

        assertFinding(capture, "frames-missing", "odd.c3d", "1149 frames are stated, the file holds 10");
        assertEquals(10, capture.frames());
    }

    @Test
    void countsOfFramesThatDisagreeAreDecidedByTheSizeOfTheFile() {
        Capture capture = read(new FileBuilder().word(5, 200));

        assertFinding(
                capture,
                "frame-count",
                "odd.c3d",
                "the counts of frames disagree (header 200, POINT:FRAMES 10), 10 are read");
        assertEquals(10, capture.frames());
    }

    @Test
    void framesBehindTheStatedOnesAreLeftAside() {
        Capture capture = read(new FileBuilder().frames(30));

        assertEquals(10, capture.frames());
        assertEquals(List.of(), capture.findings());
    }

    @Test
    void aFullCounterIsReplacedByTheSizeOfTheFile() {
        Capture capture = read(new FileBuilder()
                .word(5, 65_535)
                .integer("POINT", "FRAMES", 65_535)
                .frames(66_000));

        assertEquals(66_000, capture.frames());
        assertFinding(
                capture,
                "frame-count",
                "odd.c3d",
                "the counts of frames disagree (header 65535, POINT:FRAMES 65535), 66000 are read");
    }

    @Test
    void aFirstFrameOfZeroIsKept() {
        Capture capture = read(new FileBuilder().word(4, 0).word(5, 9));

        assertEquals(0, capture.firstFrame());
        assertEquals(List.of(), capture.findings());
    }

    @Test
    void anotherCountOfPointsThanTheHeader() {
        Capture capture = read(new FileBuilder().integer("POINT", "USED", 3));

        assertFinding(capture, "point-count", "odd.c3d, parameter POINT:USED", "3 points, in the header 2");
        assertEquals(2, capture.points().size());
    }

    @Test
    void anotherScaleThanTheHeader() {
        Capture capture = read(new FileBuilder().integerStorage().real("POINT", "SCALE", 0.2));

        assertFinding(capture, "point-scale", "odd.c3d, parameter POINT:SCALE", "it is 0.2, in the header 0.5");
        assertEquals(0.05, capture.points().get(0).positions().x(0), 1e-12);
    }

    @Test
    void aScaleInTheParametersOnly() {
        Capture capture = read(new FileBuilder().integerStorage().word(7, 0f).real("POINT", "SCALE", 0.2));

        assertEquals(0.02, capture.points().get(0).positions().x(0), 1e-9, "100 steps of 0.2 mm, as 32-bit real");
    }

    @Test
    void pointParametersInTheHeaderOnly() {
        Capture capture = read(new FileBuilder().without("POINT", "RATE").without("POINT", "FRAMES"));

        assertFinding(
                capture, "point-parameters-missing", "odd.c3d, parameters POINT:FRAMES, POINT:RATE", "not stated");
        assertEquals(100, capture.pointRate());
    }

    @Test
    void noParametersAtAll() {
        FileBuilder builder =
                new FileBuilder().withoutGroup("POINT").withoutGroup("ANALOG").withoutGroup("FORCE_PLATFORM");

        Capture capture =
                C3dReader.read(FileBuilder.NAME, builder.build(), new ReadOptions(Optional.of(LengthUnit.CM), true));

        assertEquals(10, capture.frames());
        assertEquals(1.0, capture.points().get(0).positions().x(0), 1e-12, "100 cm");
        assertEquals("", capture.points().get(0).label());
        assertEquals(
                List.of("point-parameters-missing", "analog-scaling", "analog-scaling", "analog-scaling"),
                Shared.codes(capture));
    }

    @Test
    void anotherRateThanTheHeader() {
        Capture capture = read(new FileBuilder().word(11, 120f).real("ANALOG", "RATE", 200));

        assertFinding(
                capture,
                "point-rate",
                "odd.c3d, parameter POINT:RATE",
                "it is 100 Hz, the header's figures give 120 Hz");
        assertEquals(100, capture.pointRate());
    }

    @Test
    void anotherAnalogRateThanSamplesPerFrame() {
        Capture capture = read(new FileBuilder().real("ANALOG", "RATE", 1020));

        assertFinding(
                capture,
                "analog-rate",
                "odd.c3d, parameter ANALOG:RATE",
                "it is 1020 Hz, the header's figures give 200 Hz");
        assertEquals(200, capture.analogRate());
    }

    @Test
    void anotherCountOfChannelsThanTheHeader() {
        Capture capture = read(new FileBuilder().integer("ANALOG", "USED", 7));

        assertFinding(capture, "analog-count", "odd.c3d, parameter ANALOG:USED", "7 channels, by the header 8");
        assertEquals(8, capture.analog().size());
    }

    @Test
    void samplesPerFrameMissingInTheHeader() {
        Capture capture = read(new FileBuilder().word(10, 0));

        assertEquals(8, capture.analog().size());
        assertEquals(2, capture.samplesPerFrame());
    }

    @ParameterizedTest
    @CsvSource({"OFFSET, 0, 8", "SCALE, 0, 8", "GEN_SCALE, 0, 1"})
    void aMissingAnalogScaling(String parameter, int stated, int needed) {
        Capture capture = read(new FileBuilder().without("ANALOG", parameter));

        assertFinding(
                capture,
                "analog-scaling",
                "odd.c3d, parameter ANALOG:" + parameter,
                stated + " are stated for " + needed + " channels");
        double offset = parameter.equals("OFFSET") ? 0 : 3;
        double scale = (parameter.equals("SCALE") ? 1 : 4) * (parameter.equals("GEN_SCALE") ? 1 : 0.5);
        assertEquals((20 - offset) * scale, capture.analog().get(2).values().at(0), "third channel");
    }

    @Test
    void aScalingThatIsTooShort() {
        Capture capture = read(new FileBuilder().reals("ANALOG", "SCALE", 2.0, 3.0));

        assertFinding(capture, "analog-scaling", "odd.c3d, parameter ANALOG:SCALE", "2 are stated for 8 channels");
        assertEquals((10 - 2) * 3 * 0.5, capture.analog().get(1).values().at(0));
        assertEquals((20 - 3) * 1 * 0.5, capture.analog().get(2).values().at(0));
    }

    @Test
    void framesThatTheHeaderDoesNotPlace() {
        Capture capture = read(new FileBuilder().word(9, 0));

        Finding finding = Shared.finding(capture, "data-start");
        assertEquals("odd.c3d, header word 9", finding.where());
        assertTrue(finding.figure().startsWith("block 0 cannot be where the frames begin, block "), finding.figure());
        assertEquals(0.1, capture.points().get(0).positions().x(0), 1e-12);
    }

    @Test
    void aParameterStatedTwiceCountsAsFirstStated() {
        Capture capture = read(new FileBuilder().with("ANALOG", "GEN_SCALE", writer -> {
            writer.real("GEN_SCALE", 0.5);
            writer.real("GEN_SCALE", 7);
        }));

        assertFinding(
                capture,
                "parameter-repeated",
                "odd.c3d, parameters ANALOG:GEN_SCALE",
                "1 are stated twice with different content");
        assertEquals((10 - 2) * 3 * 0.5, capture.analog().get(1).values().at(0));
    }

    @Test
    void aParameterStatedTwiceAlikeIsNothingOdd() {
        Capture capture = read(new FileBuilder().with("ANALOG", "GEN_SCALE", writer -> {
            writer.real("GEN_SCALE", 0.5);
            writer.real("GEN_SCALE", 0.5);
        }));

        assertEquals(List.of(), capture.findings());
    }

    @Test
    void aLastRecordThatPointsBeyondTheSection() {
        byte[] record = {1, 1, 'X', 0x01, 0x3F, 2, 0, 5, 0};

        Capture capture = read(new FileBuilder().rawSection(record));

        assertEquals(List.of(), capture.findings());
    }

    @Test
    void aRecordThatPointsNowhere() {
        byte[] record = {1, -31, 'X', -1, -1, 0};
        int at = sectionLength(new FileBuilder());

        Capture capture = read(new FileBuilder().rawSection(record));

        assertFinding(
                capture,
                "parameter-section",
                "odd.c3d, byte " + at + " of the parameter section",
                "a record there is damaged or reaches beyond the section");
    }

    @Test
    void aRecordWhoseValuesReachBeyondTheSection() {
        byte[] record = {1, 1, 'X', 8, 0, 4, 3, -1, -1, -1};
        int at = sectionLength(new FileBuilder());

        Capture capture = read(new FileBuilder().rawSection(record));

        assertFinding(
                capture,
                "parameter-section",
                "odd.c3d, byte " + at + " of the parameter section",
                "a record there is damaged or reaches beyond the section");
    }

    @Test
    void aParameterWithoutItsGroupIsLeftAside() {
        byte[] record = {5, 77, 'U', 'N', 'I', 'T', 'S', 0, 0, 2, 0, 5, 0};

        Capture capture = read(new FileBuilder().rawSection(record));

        assertEquals(List.of(), capture.findings());
        assertEquals(LengthUnit.MM, capture.pointUnit());
    }

    @Test
    void aMisspeltPlateGroup() {
        Capture capture = read(new FileBuilder().renameGroup("FORCE_PLATFORM", "FORCE_PLATFORMS"));

        assertFinding(
                capture,
                "plate-group-name",
                "odd.c3d, group FORCE_PLATFORMS",
                "there is no group FORCE_PLATFORM; a similar name was found");
        assertEquals(List.of(), capture.plates());
    }

    @Test
    void noPlateInUse() {
        Capture capture = read(new FileBuilder().integer("FORCE_PLATFORM", "USED", 0));

        assertFinding(capture, "plates-none", "odd.c3d, group FORCE_PLATFORM", "it states that no plate is used");
        assertEquals(List.of(), capture.plates());
    }

    @Test
    void platesWithoutAnalogData() {
        Capture capture = read(new FileBuilder().word(3, 0).integer("ANALOG", "USED", 0));

        assertFinding(
                capture,
                "plates-none",
                "odd.c3d, group FORCE_PLATFORM",
                "plates are declared, but there are no analog data");
        assertEquals(List.of(), capture.plates());
    }

    @Test
    void aPlateWithoutAnOrigin() {
        Capture capture = read(new FileBuilder().without("FORCE_PLATFORM", "ORIGIN"));

        assertFinding(
                capture,
                "plate-origin-missing",
                "odd.c3d, plate 1, parameter FORCE_PLATFORM:ORIGIN",
                "not stated; (0, 0, 0) is taken");
    }

    @Test
    void theUsersUnitReplacesTheFiles() {
        Capture capture = C3dReader.read(
                FileBuilder.NAME, new FileBuilder().build(), new ReadOptions(Optional.of(LengthUnit.CM), true));

        assertFinding(
                capture,
                "point-unit-replaced",
                "odd.c3d, parameter POINT:UNITS",
                "the file states \"mm\", the study cm");
        assertEquals(LengthUnit.CM, capture.pointUnit());
        assertEquals(LengthUnit.CM, capture.plates().get(0).channelUnit());
        assertEquals(1.0, capture.points().get(0).positions().x(0), 1e-12, "100 cm");
        assertEquals(6.0, capture.plates().get(0).corners().get(0).x(), 1e-12, "600 cm");
    }

    @Test
    void aPointStoredAsZeroIsAGapAndSaidOnce() {
        Capture capture = read(new FileBuilder().sample(2, 0, 0, 0, 0).sample(5, 0, 0, 0, 3));

        assertFinding(
                capture,
                "marker-zero",
                "odd.c3d",
                "2 samples of 1 markers are exactly (0, 0, 0), though flagged valid");
        assertTrue(Shared.finding(capture, "marker-zero").mended());
        assertEquals(2, Shared.gaps(capture));
    }

    private static int sectionLength(FileBuilder builder) {
        byte[] file = builder.rawSection((byte) 1, (byte) 2, (byte) 3).build();
        int end = 512 * ((file[16] & 0xFF) - 1);
        for (int i = end - 1; i > 0; i--) {
            if (file[i] != 0) {
                return i - 2 - 512;
            }
        }
        throw new AssertionError("no section");
    }

    private static Capture read(FileBuilder builder) {
        return C3dReader.read(FileBuilder.NAME, builder.build(), ReadOptions.DEFAULT);
    }

    private static void assertFinding(Capture capture, String code, String where, String figure) {
        Finding finding = Shared.finding(capture, code);
        assertEquals(where, finding.where());
        assertEquals(figure, finding.figure());
        assertTrue(finding.severity() != Severity.REFUSES, "severity of " + code);
    }
}
