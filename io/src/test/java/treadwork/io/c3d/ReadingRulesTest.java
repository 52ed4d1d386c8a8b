package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/** How single statements of a file are understood; expected values follow from what was put into the file. */
class ReadingRulesTest {

    @Test
    void anAnalogValueIsStoredLessOffsetTimesBothScales() {
        Capture capture = read(new FileBuilder());

        assertEquals((30 - 4) * 5 * 0.5, capture.analog().get(3).values().at(0), "first sample");
        assertEquals((30 + 7 - 4) * 5 * 0.5, capture.analog().get(3).values().at(7), "eighth sample");
    }

    @ParameterizedTest
    @CsvSource({
        "UNSIGNED, -32750, 40000, 7214",
        "UNSIGNED, -32750, 100, -32686",
        "SIGNED, -32750, 100, 32850",
        "SIGNED, 0, 40000, -25536"
    })
    void unsignedAnalogValuesHaveUnsignedOffsets(String format, int offset, int stored, double value) {
        byte[] file = new FileBuilder()
                .integerStorage()
                .text("ANALOG", "FORMAT", format)
                .integers("ANALOG", "OFFSET", offset, 0, 0, 0, 0, 0, 0, 0)
                .real("ANALOG", "GEN_SCALE", 1)
                .reals("ANALOG", "SCALE", 1.0, 1.0, 1.0, 1.0, 1.0, 1.0, 1.0, 1.0)
                .build();
        int firstAnalog = 512 * ((file[16] & 0xFF) - 1) + 2 * 4 * FileBuilder.POINTS;
        ByteBuffer.wrap(file).order(ByteOrder.LITTLE_ENDIAN).putShort(firstAnalog, (short) stored);

        Capture capture = C3dReader.read(FileBuilder.NAME, file, ReadOptions.DEFAULT);

        assertEquals(value, capture.analog().get(0).values().at(0));
        assertEquals(
                "little-endian, 16-bit integer" + (format.equals("UNSIGNED") ? ", unsigned analog" : ""),
                capture.storage());
    }

    @ParameterizedTest
    @CsvSource({"5, 6, 7, -1", "NaN, 6, 7, 0", "5, 6, Infinity, 0", "5, 6, 7, NaN"})
    void aSampleThatIsInvalidOrNoNumberIsAGap(float x, float y, float z, float residual) {
        Capture capture = read(new FileBuilder().sample(4, x, y, z, residual));

        assertTrue(capture.points().get(0).positions().isGap(4));
        assertEquals(1, Shared.gaps(capture));
        assertEquals(List.of(), capture.findings());
    }

    @ParameterizedTest
    @CsvSource({"0, 0, 0.001, 0", "5, 6, 7, 0", "5, 6, 7, 2.5"})
    void aSampleThatIsValidIsNoGap(float x, float y, float z, float residual) {
        Capture capture = read(new FileBuilder().sample(4, x, y, z, residual));

        assertFalse(capture.points().get(0).positions().isGap(4));
        assertEquals(x * 1e-3, capture.points().get(0).positions().x(4), 1e-12);
    }

    @ParameterizedTest
    @CsvSource({
        "mm, MM",
        "'mm  ', MM",
        "MM, MM",
        "cm, CM",
        "m, M",
        "mete, M",
        "met, M",
        "metres, M",
        "Meters, M",
        "metre, M",
        "mill, MM",
        "millimeter, MM",
        "cent, CM",
        "centimetres, CM"
    })
    void unitsAreKnownBySymbolAndByTheBeginningOfTheirName(String text, LengthUnit unit) {
        Capture capture = read(new FileBuilder().text("POINT", "UNITS", text));

        assertEquals(unit, capture.pointUnit());
        assertEquals(100 * unit.metres(), capture.points().get(0).positions().x(0), 1e-12);
    }

    @Test
    void aUnitMayBeStatedForEveryPoint() {
        Capture capture = read(new FileBuilder()
                .with("POINT", "UNITS", writer -> writer.texts("UNITS", List.of("mm", "", "mm", "deg"))));

        assertEquals(LengthUnit.MM, capture.pointUnit());
    }

    @Test
    void eventTimesAreMinutesAndSecondsFromFrameOneOfTheRecording() {
        Capture capture = read(new FileBuilder()
                .word(4, 7001)
                .word(5, 7010)
                .integer("EVENT", "USED", 2)
                .with("EVENT", "LABELS", writer -> writer.texts("LABELS", List.of("Foot Off", "Foot Strike")))
                .with("EVENT", "CONTEXTS", writer -> writer.texts("CONTEXTS", List.of("Right", "Left")))
                .with("EVENT", "TIMES", writer -> writer.pairs("TIMES", List.of(1.0, 10.0625, 1.0, 10.03125))));

        assertEquals(
                List.of("Foot Strike/Left/0.03125", "Foot Off/Right/0.06250"),
                capture.events().stream()
                        .map(event ->
                                String.format(Locale.ROOT, "%s/%s/%.5f", event.label(), event.context(), event.timeS()))
                        .toList());
    }

    @Test
    void eventsOutsideTheRecordingAreLeftOut() {
        Capture capture = read(new FileBuilder()
                .integer("EVENT", "USED", 2)
                .with("EVENT", "TIMES", writer -> writer.pairs("TIMES", List.of(0.0, 0.05, 1.0, 0.05))));

        assertEquals(1, capture.events().size());
        Finding finding = Shared.finding(capture, "event-outside");
        assertEquals("odd.c3d, events", finding.where());
        assertEquals("1 of 2 lie outside the recording", finding.figure());
    }

    @ParameterizedTest
    @CsvSource({"0, 0, none", "1, 1, none", "1, 0, none", "0, 5, 1 to 5", "1, 8, 1 to 8", "3, 4, 3 to 4"})
    void onlyARealRangeOfFramesZeroesThePlates(int first, int last, String range) {
        Capture capture = read(new FileBuilder().integers("FORCE_PLATFORM", "ZERO", first, last));

        assertEquals(
                range,
                capture.plateZero()
                        .map(zero -> zero.first() + " to " + zero.last())
                        .orElse("none"));
        assertEquals(List.of(), capture.findings());
    }

    @Test
    void anUnloadedRangeThatTheFileDoesNotHoldIsLeftAside() {
        Capture capture = read(new FileBuilder().integers("FORCE_PLATFORM", "ZERO", 0, 11));

        assertEquals(Optional.<FrameRange>empty(), capture.plateZero());
        Finding finding = Shared.finding(capture, "plate-zero-outside");
        assertEquals("odd.c3d, parameter FORCE_PLATFORM:ZERO", finding.where());
        assertEquals("unloaded in frames 1 to 11, the file holds 1 to 10", finding.figure());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "S1:HEEL, S1:TOE; HEEL, TOE",
                "S1:HEEL, S2:TOE; S1:HEEL, S2:TOE",
                "S1:HEEL, TOE; S1:HEEL, TOE",
                "S1:HEEL, *2; HEEL, *2",
                "S1:HEEL, S1:*2; HEEL, *2",
                "HEEL, HEEL; HEEL, HEEL"
            })
    void aSubjectsPrefixIsTakenOffWhenAllNamedPointsShareIt(String stored, String expected) {
        List<String> labels = List.of(stored.split(", ", 2));

        Capture capture = read(new FileBuilder().with("POINT", "LABELS", writer -> writer.texts("LABELS", labels)));

        assertEquals(
                List.of(expected.split(", ", 2)),
                capture.points().stream().map(PointSeries::label).toList());
    }

    @Test
    void countsMayBeBytesAndOffsetsReals() {
        byte[] used = {4, 4, 'U', 'S', 'E', 'D', 0, 0, 1, 0, 1, 0};

        Capture capture = read(new FileBuilder()
                .integer("EVENT", "USED", 0)
                .reals("ANALOG", "OFFSET", 1.0, 2.0, 3.0, 4.0, 5.0, 6.0, 7.0, 8.0)
                .with("EVENT", "TIMES", writer -> writer.pairs("TIMES", List.of(0.0, 0.05)))
                .without("EVENT", "USED")
                .rawSection(used));

        assertEquals(1, capture.events().size());
        assertEquals((10 - 2) * 3 * 0.5, capture.analog().get(1).values().at(0));
    }

    /**
     * Second case by hand: diagonals (-600, -400, 90) and (600, -400, 0), their cross product (36000, 54000, 480000), its part along the
     * first side of 600 mm: 600 × 36000 / 484367 = 44.594 mm.
     */
    @ParameterizedTest
    @CsvSource({
        "'600,400,0, 0,400,0, 0,0,NaN, 600,0,0', a corner is not a number",
        "'600,400,0, 0,400,0, 0,0,90, 600,0,0', 'the diagonals miss each other by 44.5942 mm; in a plane they meet,"
                + " 5 % of the longest side are allowed'",
        "'600,400,0, 0,400,0, 600,0,0, 0,0,0', 'the corners do not go once round the plate, at corner 3'",
        "'600,400,0, 600,400,0, 0,0,0, 600,0,0', 'sides of 0 to 721.11 mm are no plate; the shortest must be above"
                + " 2 % of the longest'"
    })
    void cornersThatAreNoPlateLeaveTheLastPlateOut(String corners, String figure) {
        String[] numbers = corners.split(",\\s*", 12);
        float[] millimetres = new float[12];
        for (int i = 0; i < 12; i++) {
            millimetres[i] = Float.parseFloat(numbers[i]);
        }

        Capture capture = read(new FileBuilder().corners(millimetres));

        assertFault(capture, "plate-corners", "CORNERS", figure);
    }

    @Test
    void aWarpedPlateWithinASurveysErrorIsKept() {
        Capture capture = read(new FileBuilder().corners(600, 400, 5, 0, 400, -5, 0, 0, 5, 600, 0, -5));

        assertEquals(1, capture.plates().size());
        assertEquals(List.of(), capture.findings());
    }

    @Test
    void aChannelThatTheFileDoesNotHaveLeavesTheLastPlateOut() {
        Capture capture = read(new FileBuilder().integers("FORCE_PLATFORM", "CHANNEL", 1, 2, 3, 4, 5, 9));

        assertFault(capture, "plate-channels", "CHANNEL", "channel 9 is stated, the file has 1 to 8");
    }

    @Test
    void tooFewChannelsLeaveTheLastPlateOut() {
        Capture capture = read(new FileBuilder().integers("FORCE_PLATFORM", "TYPE", 3));

        assertFault(capture, "plate-channels", "CHANNEL", "6 channels are stated, type 3 has 8");
    }

    @Test
    void aTypeFourPlateWithoutItsMatrixIsLeftOut() {
        Capture capture = read(new FileBuilder().integers("FORCE_PLATFORM", "TYPE", 4));

        assertFault(capture, "plate-calibration", "CAL_MATRIX", "36 numbers are needed and not stated");
    }

    @Test
    void zerosBetweenChannelsOnlyPadTheList() {
        Capture capture = read(new FileBuilder()
                .with(
                        "FORCE_PLATFORM",
                        "CHANNEL",
                        writer -> writer.integers("CHANNEL", List.of(0, 3, 4, 5, 6, 7, 8, 0), 8, 1)));

        assertEquals(List.of(2, 3, 4, 5, 6, 7), capture.plates().get(0).channels());
    }

    @Test
    void bytesHaveNoSign() {
        ByteBuffer section = ByteBuffer.wrap(new byte[] {(byte) 200});

        Parameter parameter = new Parameter(Processor.INTEL, section, Parameter.BYTES, new int[0], 0);

        assertEquals(200, parameter.number(0));
    }

    @Test
    void textsKeepToOneLineAndMayBeUtf8OrLatin1() {
        byte[] latin = {'H', (byte) 0xFC, 'f', 't', 'e', '\n', 'x', ' ', 0, 'z'};
        byte[] utf8 = {' ', 'H', (byte) 0xC3, (byte) 0xBC, 'f', 't', 'e', ' '};

        assertEquals("Hüfte x", Texts.of(latin, 0, latin.length));
        assertEquals("Hüfte", Texts.of(utf8, 0, utf8.length));
    }

    private static void assertFault(Capture capture, String code, String parameter, String figure) {
        Finding finding = Shared.finding(capture, code);
        assertEquals("odd.c3d, plate 1, parameter FORCE_PLATFORM:" + parameter, finding.where());
        assertEquals(figure, finding.figure());
        assertEquals(Severity.REFUSES, finding.severity());
        assertEquals(List.of(), capture.plates());
    }

    private static Capture read(FileBuilder builder) {
        return C3dReader.read(FileBuilder.NAME, builder.build(), ReadOptions.DEFAULT);
    }
}
