package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.abort;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** What cannot be used is refused with a code, a place and a figure; each file is a whole one with one fault. */
class RefusedFilesTest {

    @Test
    void anEmptyFile() {
        Finding finding = refusal(new byte[0]);

        assertFinding(finding, "capture-empty", "odd.c3d", "the file has no bytes");
    }

    @Test
    void aFileOfAnotherKind() {
        Finding finding = refusal("PK and so on".repeat(60).getBytes(StandardCharsets.US_ASCII));

        assertFinding(finding, "capture-not-c3d", "odd.c3d, byte 2", "it is 75, in a C3D file it is 80");
    }

    @Test
    void aFileWithoutTheKey() {
        byte[] file = new FileBuilder().build();
        file[1] = 81;

        assertFinding(refusal(file), "capture-not-c3d", "odd.c3d, byte 2", "it is 81, in a C3D file it is 80");
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1})
    void parametersInsideTheHeader(int block) {
        byte[] file = new FileBuilder().build();
        file[0] = (byte) block;

        assertFinding(
                refusal(file),
                "capture-not-c3d",
                "odd.c3d, byte 1",
                "the parameters would begin at block " + block + ", in a C3D file at block 2 or later");
    }

    @Test
    void aHeaderCutShort() {
        byte[] file = Arrays.copyOf(new FileBuilder().build(), 300);

        assertFinding(
                refusal(file), "capture-cut-short", "odd.c3d, header", "it would end at byte 512, the file has 300");
    }

    @Test
    void parametersBehindTheEndOfTheFile() {
        byte[] file = new FileBuilder().build();
        file[0] = (byte) 200;

        assertFinding(
                refusal(file),
                "capture-cut-short",
                "odd.c3d, parameter section",
                "it would end at byte 101892, the file has " + file.length);
    }

    @Test
    void aProcessorThatTheFormatDoesNotHave() {
        byte[] file = new FileBuilder().build();
        file[515] = 83;

        assertFinding(
                refusal(file),
                "capture-processor-unknown",
                "odd.c3d, byte 4 of the parameter section",
                "the processor is 83, known are 84, 85 and 86");
    }

    @Test
    void framesCutOffBeforeTheFirstIsWhole() {
        byte[] whole = new FileBuilder().build();
        int data = ((whole[16] & 0xFF) - 1) * 512;
        byte[] file = Arrays.copyOf(whole, data + 95);

        assertFinding(
                refusal(file),
                "capture-cut-short",
                "odd.c3d, first frame",
                "it would end at byte " + (data + 96) + ", the file has " + (data + 95));
    }

    @Test
    void framesThatBeginBehindTheEndOfTheFile() {
        byte[] file = new FileBuilder()
                .word(9, 60_000)
                .integer("POINT", "DATA_START", 60_000)
                .build();

        assertFinding(
                refusal(file),
                "capture-data-start",
                "odd.c3d, header word 9",
                "the frames would begin at block 60000, inside the header or behind the end of the file, and"
                        + " POINT:DATA_START states nothing better");
    }

    @Test
    void noFrames() {
        byte[] file = new FileBuilder().word(5, 0).integer("POINT", "FRAMES", 0).build();

        assertFinding(
                refusal(file), "capture-empty", "odd.c3d", "no frame is stated, in the header or in the parameters");
    }

    @Test
    void neitherPointsNorChannels() {
        byte[] file = new FileBuilder().word(2, 0).word(3, 0).build();

        assertFinding(refusal(file), "capture-empty", "odd.c3d", "no point and no analog channel is stated");
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "-50, -50", "NaN, NaN", "Infinity, Infinity"})
    void noRate(float rate, String shown) {
        byte[] file = new FileBuilder().word(11, rate).without("POINT", "RATE").build();

        assertFinding(
                refusal(file),
                "capture-rate",
                "odd.c3d, frame rate",
                "it is " + shown + " Hz, in the header and in POINT:RATE");
    }

    @Test
    void noScale() {
        byte[] file = new FileBuilder()
                .integerStorage()
                .word(7, 0f)
                .without("POINT", "SCALE")
                .build();

        assertFinding(
                refusal(file),
                "capture-scale",
                "odd.c3d, header words 7 and 8",
                "the scale of the positions is 0, and POINT:SCALE states nothing better");
    }

    @Test
    void analogValuesThatCannotBeSharedOut() {
        byte[] file = new FileBuilder().word(10, 3).integer("ANALOG", "USED", 5).build();

        assertFinding(
                refusal(file),
                "capture-analog-count",
                "odd.c3d, header words 3 and 10",
                "16 analog values a frame cannot be shared out over 3 samples a frame");
    }

    @ParameterizedTest
    @ValueSource(strings = {"in", "me", "furlong", "deg"})
    void aUnitThatIsNoLength(String unit) {
        byte[] file = new FileBuilder().text("POINT", "UNITS", unit).build();

        Finding finding = refusal(file);

        assertFinding(
                finding,
                "point-unit-unknown",
                "odd.c3d, parameter POINT:UNITS",
                "the stated unit is \"" + unit + "\", known are mm, cm and m");
        assertEquals("Set lab.pointUnit in the study file to the unit the positions are really in", finding.mend());
    }

    @Test
    void pointsOfDifferentUnits() {
        byte[] file = new FileBuilder()
                .with("POINT", "UNITS", writer -> writer.texts("UNITS", List.of("mm", "m")))
                .build();

        assertFinding(
                refusal(file),
                "point-unit-unknown",
                "odd.c3d, parameter POINT:UNITS",
                "the stated unit is \"mm\", \"m\", known are mm, cm and m");
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 5, 6, 7, 21})
    void aPlateOfAnUnknownType(int type) {
        byte[] file = new FileBuilder()
                .plates(2)
                .integers("FORCE_PLATFORM", "TYPE", 2, type)
                .build();

        Finding finding = refusal(file);

        assertFinding(
                finding,
                "plate-type-unknown",
                "odd.c3d, plate 2, parameter FORCE_PLATFORM:TYPE",
                "the type is " + type + ", known are 1, 2, 3, 4");
        assertTrue(finding.mend().startsWith("Describe the plates in lab.plates of the study file, or convert"));
    }

    @Test
    void aPlateWithoutAType() {
        byte[] file = new FileBuilder()
                .plates(2)
                .integers("FORCE_PLATFORM", "TYPE", 2)
                .build();

        assertFinding(
                refusal(file),
                "plate-type-unknown",
                "odd.c3d, plate 2, parameter FORCE_PLATFORM:TYPE",
                "the type is not stated, known are 1, 2, 3, 4");
    }

    @Test
    void aPlateWithoutCornersBeforeASoundOne() {
        byte[] file = new FileBuilder()
                .plates(2)
                .corners(0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 600, 400, 0, 0, 400, 0, 0, 0, 0, 600, 0, 0)
                .build();

        assertFinding(
                refusal(file),
                "plate-corners",
                "odd.c3d, plate 1, parameter FORCE_PLATFORM:CORNERS",
                "sides of 0 to 0 mm are no plate; the shortest must be above 2 % of the longest");
    }

    @Test
    void thePlatesOfTheFileMayBeLeftAside() {
        byte[] file = new FileBuilder().integers("FORCE_PLATFORM", "TYPE", 21).build();

        Capture capture = C3dReader.read("odd.c3d", file, new ReadOptions(Optional.empty(), false));

        assertEquals(List.of(), capture.plates());
        assertEquals(List.of(), capture.findings());
        assertEquals(8, capture.analog().size());
    }

    @Test
    void aFileThatIsNotThere(@TempDir Path folder) {
        Path file = folder.resolve("none.c3d");

        Finding finding = refusal(() -> C3dReader.read(file, Optional.empty()));

        assertFinding(finding, "capture-unreadable", file.toString(), "the file cannot be read (NoSuchFileException)");
    }

    @Test
    void aFolder(@TempDir Path folder) {
        Finding finding = refusal(() -> C3dReader.read(folder, Optional.empty()));

        assertEquals("capture-unreadable", finding.code());
        assertEquals(folder.toString(), finding.where());
    }

    /** 65535 points × 16 bytes × 65535 frames are 65534 MB, held as they are stored; the file is a hole of that size. */
    @Test
    void aFileLargerThanTheMemory(@TempDir Path folder) throws IOException {
        byte[] opening = new FileBuilder()
                .word(2, 65_535)
                .word(3, 0)
                .word(5, 65_535)
                .withoutGroup("FORCE_PLATFORM")
                .build();
        Path file = folder.resolve("large.c3d");
        Files.write(file, opening);
        long needed = 65_535L * 65_535 * 16;
        try (RandomAccessFile sparse = new RandomAccessFile(file.toFile(), "rw")) {
            sparse.setLength(needed + opening.length);
        } catch (IOException e) {
            abort("no room for a file with a hole here: " + e.getMessage());
        }

        Finding finding = refusal(() -> C3dReader.read(file, Optional.empty()));

        assertEquals("capture-too-large", finding.code());
        assertEquals("large.c3d", finding.where());
        assertTrue(finding.figure().startsWith("its values take 6555"), finding.figure());
    }

    private static void assertFinding(Finding finding, String code, String where, String figure) {
        assertEquals(code, finding.code());
        assertEquals(where, finding.where());
        assertEquals(figure, finding.figure());
        assertEquals(Severity.REFUSES, finding.severity());
    }

    private static Finding refusal(byte[] file) {
        return refusal(() -> C3dReader.read(FileBuilder.NAME, file, ReadOptions.DEFAULT));
    }

    private static Finding refusal(Executable reading) {
        return assertThrows(UnusableInputException.class, reading).finding();
    }
}
