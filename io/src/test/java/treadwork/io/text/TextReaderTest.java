package treadwork.io.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.LabSettings;
import treadwork.model.study.TextSettings;

/** Small invented texts; every expected position is what stands in the text, in metres. */
class TextReaderTest {

    private static final String PLAIN = "time,A_x,A_y,A_z,Fz1\n0,1000.5,2,3,7\n0.01,1001.5,2,3,8\n0.02,0,0,0,9\n";

    @ParameterizedTest
    @CsvSource({"'\t',.", "'\t',','", ";,.", ";,','", "',',."})
    void everyDelimiterAndDecimalSignGiveTheSameCapture(char delimiter, char decimal) {
        String text = PLAIN.replace('.', '!').replace(',', delimiter).replace('!', decimal);

        Capture capture = read(text);

        assertPlain(capture);
    }

    @ParameterizedTest
    @ValueSource(strings = {"\r\n", "\r"})
    void lineEndsDoNotMatter(String end) {
        assertPlain(read(PLAIN.replace("\n", end)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"UTF-8", "UTF-16LE", "UTF-16BE"})
    void aByteOrderMarkTellsTheEncoding(String charset) {
        byte[] bytes = ("\uFEFF" + PLAIN).getBytes(Charset.forName(charset));

        assertPlain(read(bytes, TextSettings.DEFAULT));
    }

    @Test
    void lettersThatAreNotUtf8AreLatin1() {
        String text = PLAIN.replace("A_", "Hüfte_");

        Capture capture = read(text.getBytes(StandardCharsets.ISO_8859_1), TextSettings.DEFAULT);

        assertEquals("Hüfte", capture.points().get(0).label());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "time,A.X,A.Y,A.Z,Fz1\n",
                "time,A x,A y,A z,Fz1\n",
                "time,A:X,A:Y,A:Z,Fz1\n",
                "time,Ax,Ay,Az,Fz1\n",
                "time,A,,,Fz1\n",
                "time,A,,,Fz1\n,x,y,z,\n",
                "time,\"A_x\",\"A_y\",\"A_z\",Fz1\n(s),(mm),(mm),(mm),(N)\n",
                "a remark\nrecorded by day\n\ntime,A,,,Fz1\n,x,y,z,\ns,mm,mm,mm,N\n"
            })
    void everyFormOfHeaderGivesTheSameCapture(String header) {
        assertPlain(read(header + PLAIN.substring(PLAIN.indexOf('\n') + 1)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "NaN", "NA", "-"})
    void aMissingCellIsAGap(String missing) {
        Capture capture = read(PLAIN.replace("1001.5", missing));

        assertTrue(capture.points().get(0).positions().isGap(1));
    }

    @Test
    void roundedTimesGiveTheWholeRate() {
        StringBuilder text = new StringBuilder("time\tA_x\tA_y\tA_z\n");
        for (int i = 0; i < 251; i++) {
            text.append(Math.round(i * 1000 / 150.0) / 1000.0).append("\t1500\t2\t3\n");
        }

        Capture capture = read(text.toString());

        assertEquals(150, capture.pointRate());
    }

    @Test
    void aQuotedCellMayHoldTheDelimiter() {
        assertPlain(
                read(
                        "time,A_x,A_y,A_z,Fz1\n\"0\",\"1000,5\",\"2\",\"3\",\"7\"\n\"0,01\",\"1001,5\",2,3,8\n\"0,02\",0,0,0,9\n"));
    }

    @Test
    void lettersAfterManyNumbersTellTheEncodingToo() {
        StringBuilder text = new StringBuilder("time,A_x,A_y,A_z,Fz1\n");
        for (int i = 0; i < 10_000; i++) {
            text.append(i / 100.0).append(",1500,2,3,7\n");
        }
        byte[] bytes = text.append("100,1500,2,3,\u00e9").toString().getBytes(StandardCharsets.ISO_8859_1);

        UnusableInputException refused =
                assertThrows(UnusableInputException.class, () -> read(bytes, TextSettings.DEFAULT));

        assertTrue(
                refused.finding().line().contains("line 10002, column 5 \"Fz1\": \"\u00e9\""),
                refused.finding().line());
    }

    @Test
    void aStatedRateGoesBeforeACountOfRows() {
        String text = "rate: 120 Hz\nTime,A_x,A_y,A_z\n1,1500,2,3\n2,1500,2,3\n3,1500,2,3\n";

        assertEquals(120, read(text).pointRate());
    }

    /** A label that could be a moment's, at 100 mm from another marker, over 1 m. */
    @Test
    void aMarkerThatIsCarriedAlongIsNoChannelWhateverItsLabel() {
        Capture capture = read(walk("M1", 100, 0));

        assertEquals(
                List.of("A", "M1"),
                capture.points().stream().map(point -> point.label()).toList());
        assertEquals(0, capture.samplesPerFrame());
        assertTrue(codes(capture).contains("text-markers"));
    }

    @Test
    void aForceThatLooksLikeAPositionIsAChannel() {
        Capture capture = read(walk("F1", 0, 700));

        assertEquals(1, capture.points().size());
        assertEquals("F1_x", capture.analog().get(0).label());
        assertTrue(codes(capture).contains("text-channels"));
    }

    @Test
    void whereTheChannelsAreNamedEveryOtherTripleIsAMarker() {
        TextSettings settings = new TextSettings(Optional.empty(), Optional.empty(), List.of("A_x"));

        Capture capture = read(bytes(walk("F1", 0, 700)), settings);

        assertEquals("F1", capture.points().get(0).label());
    }

    @Test
    void ofAStandingCaptureEveryTripleIsAMarker() {
        Capture capture = TextReader.markers(TextFile.of("s.csv", bytes(walk("T1", 0, 0))), LabSettings.DEFAULT);

        assertEquals(2, capture.points().size());
        assertEquals(0, capture.analog().size());
    }

    /** A marker that goes 1 m, and three columns that keep an offset from it or pulse on their own, both in mm. */
    private static String walk(String label, double offset, double pulse) {
        StringBuilder text = new StringBuilder("time,A_x,A_y,A_z,L_x,L_y,L_z\n".replace("L", label));
        for (int i = 0; i < 101; i++) {
            double x = 500 + 10 * i;
            double own = pulse > 0 ? 20 : x + offset;
            text.append(i / 100.0 + "," + x + ",2,900," + own + ",30," + (880 - pulse * Math.sin(i / 32.0)) + "\n");
        }
        return text.toString();
    }

    @Test
    void namedChannelsStandInTheirOrder() {
        TextSettings settings = new TextSettings(Optional.empty(), Optional.empty(), List.of("b", "a"));

        Capture capture = read(bytes("time,A_x,A_y,A_z,a,b\n0,1500,2,3,10,20\n0.1,1500,2,3,11,21\n"), settings);

        assertEquals("b", capture.analog().get(0).label());
        assertEquals(21, capture.analog().get(0).values().at(1));
    }

    @Test
    void aPlateFileIsTrimmedToWholeFrames() {
        StringBuilder plates = new StringBuilder("time;Fz\n");
        for (int i = 0; i < 8; i++) {
            plates.append(i / 400.0).append(';').append(i).append('\n');
        }

        Capture capture = TextReader.read(
                TextFile.of("points.csv", bytes(PLAIN)),
                Optional.of(TextFile.of("plates.csv", bytes(plates.toString()))),
                lab(TextSettings.DEFAULT));

        assertEquals(2, capture.frames());
        assertEquals(4, capture.samplesPerFrame());
        assertEquals(7, capture.analog().get(0).values().at(7));
        assertTrue(codes(capture).contains("text-length"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "text-empty | `` | bad.csv",
                "text-layout | `no numbers here` | first 200 lines",
                "text-ragged | `t,A_x,A_y,A_z#0,1,2,3#1,1,2` | line 3",
                "text-ragged | `t,A_x,A_y,A_z#0,1,2,3#1,1,2,3,4` | line 3",
                "text-cell | `t,A_x,A_y,A_z#0,1,2,3#1,1,two,3` | line 3, column 3 \"A_y\"",
                "text-cell | `t;A_x;A_y;A_z#0;1,5;2;3#1;1,5;2,5;3#2;1.5;2;3` | line 4, column 2",
                "text-time-uneven | `t,A_x,A_y,A_z#0,1,2,3#0.1,1,2,3#0.2,1,2,3#0.4,1,2,3` | line 5",
                "text-time-uneven | `t,A_x,A_y,A_z#0,1,2,3##0.1,1,2,3##0.2,1,2,3#0.4,1,2,3` | line 7",
                "text-ragged | `t,A_x,A_y,A_z#0,1,2,3##1,1,2` | line 4",
                "text-rate | `time,A_x,A_y,A_z#1,1,2,3#2,1,2,3#3,1,2,3` | only counts the rows",
                "text-rate | `A_x,A_y,A_z#1,2,3#1,2,3` | neither a time column",
                "text-column-twice | `t,A_x,A_x,A_z#0,1,2,3#1,1,2,3` | column 3",
                "text-markers | `t,a,b,c#0,1,2,3#0.1,1,2,3` | A_x",
                "text-header | `0,1,2,3#0.1,1,2,3` | line 1"
            })
    void badInputIsRefusedInOneLineThatSaysWhere(String code, String text, String words) {
        UnusableInputException refused =
                assertThrows(UnusableInputException.class, () -> read(text.replace('#', '\n')));

        assertEquals(code, refused.finding().code());
        assertTrue(refused.finding().line().contains(words), refused.finding().line());
    }

    @Test
    void aNulByteAndASpreadsheetAreRefused() {
        assertEquals("text-binary", refusal(bytes(PLAIN + "\0")));
        assertEquals("text-binary", refusal(bytes("PK\3\4rest")));
    }

    @Test
    void numbersAreRoundedAsTheJdkRoundsThem() {
        Random random = new Random(7);

        for (int i = 0; i < 200_000; i++) {
            double value = i % 2 == 0 ? random.nextGaussian() * 1000 : Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(value)) {
                String text =
                        i % 3 == 0 ? String.format(java.util.Locale.ROOT, "%.5f", random.nextGaussian()) : value + "";
                Numbers numbers = new Numbers(bytes(text), '.');

                assertEquals(Double.parseDouble(text), numbers.parse(0, text.length()), text);
                double plain = numbers.plain(0, text.length(), (byte) ',');
                assertEquals(numbers.next() < 0 ? Double.NaN : Double.parseDouble(text), plain, text);
            }
        }
    }

    @Test
    void damagedTextIsReadOrRefusedAndNeverElse() {
        Random random = new Random(11);
        String signs = "\t;,.\n\"0-exN \u00e9\r";

        for (int i = 0; i < 20_000; i++) {
            StringBuilder text = new StringBuilder(PLAIN);
            for (int edits = 1 + random.nextInt(6); edits > 0; edits--) {
                int at = random.nextInt(text.length());
                text.replace(at, at + random.nextInt(3), "" + signs.charAt(random.nextInt(signs.length())));
            }
            readOrRefused(text.toString());
        }
    }

    private static void readOrRefused(String text) {
        try {
            assertTrue(read(text).frames() > 0, text);
        } catch (UnusableInputException refused) {
            assertTrue(
                    refused.finding().line().lines().count() == 1,
                    refused.finding().line());
        }
    }

    private static void assertPlain(Capture capture) {
        assertEquals(1, capture.points().size());
        assertEquals("A", capture.points().get(0).label());
        assertEquals(100, capture.pointRate());
        assertEquals(1.0015, capture.points().get(0).positions().x(1), 1e-15);
        assertEquals(0.003, capture.points().get(0).positions().z(0), 1e-15);
        assertTrue(capture.points().get(0).positions().isGap(2));
        assertTrue(codes(capture).contains("marker-zero"));
        assertEquals("Fz1", capture.analog().get(0).label());
        assertEquals(9, capture.analog().get(0).values().at(2));
    }

    private static String refusal(byte[] bytes) {
        return assertThrows(UnusableInputException.class, () -> read(bytes, TextSettings.DEFAULT))
                .finding()
                .code();
    }

    private static List<String> codes(Capture capture) {
        return capture.findings().stream().map(Finding::code).toList();
    }

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    private static Capture read(String text) {
        return read(bytes(text), TextSettings.DEFAULT);
    }

    private static Capture read(byte[] bytes, TextSettings settings) {
        return TextReader.read(TextFile.of("bad.csv", bytes), Optional.empty(), lab(settings));
    }

    private static LabSettings lab(TextSettings settings) {
        return new LabSettings(Optional.empty(), Optional.empty(), Optional.empty(), settings, List.of());
    }
}
