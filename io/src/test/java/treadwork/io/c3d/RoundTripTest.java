package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** What is written is read again; expected values are those that were written. */
class RoundTripTest {

    /** A 32-bit real is right to 2^-24 of its value: of 2 m, and of plates some 4 m away. */
    private static final double REAL = Math.pow(2, -24);

    /** The writer's integer scale: the largest value in 32000 steps; each is right to half a step and rounding. */
    private static final double HALF_STEP = 0.5001 / 32_000;

    static Stream<C3dEncoding> encodings() {
        List<C3dEncoding> all = new ArrayList<>();
        for (Processor processor : Processor.values()) {
            for (C3dEncoding.Storage storage : C3dEncoding.Storage.values()) {
                all.add(new C3dEncoding(processor, storage, false));
                all.add(new C3dEncoding(processor, storage, true));
            }
        }
        return all.stream();
    }

    @ParameterizedTest
    @MethodSource("encodings")
    void positionsComeBackWithTheirGaps(C3dEncoding encoding) {
        Capture written = new CaptureFixture().capture();

        Capture read = again(written, encoding);

        double largest = 1.9;
        double allowed = encoding.real() ? REAL * largest : HALF_STEP * largest;
        for (int p = 0; p < written.points().size(); p++) {
            VectorSeries before = written.points().get(p).positions();
            VectorSeries after = read.points().get(p).positions();
            for (int i = 0; i < written.frames(); i++) {
                assertEquals(before.isGap(i), after.isGap(i), "gap at " + i);
                if (!before.isGap(i)) {
                    assertEquals(before.x(i), after.x(i), allowed, "x, m");
                    assertEquals(before.y(i), after.y(i), allowed, "y, m");
                    assertEquals(before.z(i), after.z(i), allowed, "z, m");
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("encodings")
    void analogValuesComeBack(C3dEncoding encoding) {
        Capture written = new CaptureFixture().capture();

        Capture read = again(written, encoding);

        assertEquals(written.samplesPerFrame(), read.samplesPerFrame());
        for (int c = 0; c < written.analog().size(); c++) {
            double[] before = written.analog().get(c).values().toArray();
            double[] after = read.analog().get(c).values().toArray();
            double largest = 31.7 * (c + 1) + 2.5 * c;
            assertArrayEquals(before, after, (encoding.real() ? REAL : HALF_STEP) * largest);
            assertEquals(written.analog().get(c).label(), read.analog().get(c).label());
            assertEquals(written.analog().get(c).unit(), read.analog().get(c).unit());
        }
    }

    @ParameterizedTest
    @MethodSource("encodings")
    void platesOfAllTypesComeBack(C3dEncoding encoding) {
        Capture written = new CaptureFixture().capture();

        Capture read = again(written, encoding);

        assertEquals(4, read.plates().size());
        for (int i = 0; i < 4; i++) {
            Plate before = written.plates().get(i);
            Plate after = read.plates().get(i);
            assertEquals(before.type(), after.type());
            assertEquals(before.channels(), after.channels());
            assertEquals(before.calibration(), after.calibration());
            assertEquals(before.channelUnit(), after.channelUnit());
            assertEquals(0, before.origin().minus(after.origin()).norm(), REAL);
            for (int corner = 0; corner < 4; corner++) {
                assertEquals(
                        0,
                        before.corners()
                                .get(corner)
                                .minus(after.corners().get(corner))
                                .norm(),
                        4 * REAL);
            }
        }
        assertEquals(written.plateZero(), read.plateZero());
    }

    @ParameterizedTest
    @MethodSource("encodings")
    void framesNamesAndEventsComeBackWithoutAFinding(C3dEncoding encoding) {
        Capture written = new CaptureFixture().capture();

        Capture read = again(written, encoding);

        assertEquals(List.of(), read.findings());
        assertEquals(written.range(), read.range());
        assertEquals(120, read.pointRate());
        assertEquals(360, read.analogRate());
        assertEquals(names(written), names(read));
        assertEquals(3, read.events().size());
        for (int i = 0; i < 3; i++) {
            CaptureEvent before = written.events().get(i);
            CaptureEvent after = read.events().get(i);
            assertEquals(before.label() + "/" + before.context(), after.label() + "/" + after.context());
            assertEquals(before.timeS(), after.timeS(), REAL, "s");
        }
    }

    @ParameterizedTest
    @EnumSource(Processor.class)
    void realsReadAndWrittenAgainAreTheSameToTheBit(Processor processor) {
        Capture once = again(new CaptureFixture().capture(), C3dEncoding.DEFAULT);

        Capture twice = again(once, new C3dEncoding(processor, C3dEncoding.Storage.REAL, false));

        for (int p = 0; p < once.points().size(); p++) {
            VectorSeries before = once.points().get(p).positions();
            VectorSeries after = twice.points().get(p).positions();
            assertArrayEquals(before.componentX().toArray(), after.componentX().toArray());
            assertArrayEquals(before.componentY().toArray(), after.componentY().toArray());
            assertArrayEquals(before.componentZ().toArray(), after.componentZ().toArray());
        }
        for (int c = 0; c < once.analog().size(); c++) {
            assertArrayEquals(
                    once.analog().get(c).values().toArray(),
                    twice.analog().get(c).values().toArray());
        }
        assertEquals(once.plates(), twice.plates());
        assertEquals(once.events(), twice.events());
    }

    @ParameterizedTest
    @EnumSource(LengthUnit.class)
    void lengthsAreWrittenInTheCapturesOwnUnit(LengthUnit unit) {
        CaptureFixture fixture = new CaptureFixture();
        fixture.unit = unit;
        fixture.plates = CaptureFixture.platesOfAllTypes(unit);

        Capture read = again(fixture.capture(), C3dEncoding.DEFAULT);

        assertEquals(unit, read.pointUnit());
        Vector3 expected = CaptureFixture.position(1, 0);
        assertEquals(0, read.points().get(1).positions().at(0).minus(expected).norm(), 3 * REAL);
        assertEquals(-0.0413, read.plates().get(0).origin().z(), REAL);
    }

    @ParameterizedTest
    @EnumSource(Processor.class)
    void moreThan255PointsKeepTheirLabels(Processor processor) {
        CaptureFixture fixture = new CaptureFixture();
        fixture.points = 600;

        Capture read = again(fixture.capture(), new C3dEncoding(processor, C3dEncoding.Storage.INTEGER, false));

        assertEquals(names(fixture.capture()), names(read));
        assertEquals("P599", read.points().get(599).label());
        assertEquals("point número 598", read.points().get(598).description());
    }

    @ParameterizedTest
    @EnumSource(Processor.class)
    void moreThan65535FramesKeepTheirNumbers(Processor processor) {
        CaptureFixture fixture = new CaptureFixture();
        fixture.frames = 70_000;
        fixture.points = 1;
        fixture.samples = 0;
        fixture.plates = List.of();
        fixture.zero = Optional.empty();

        Capture read = again(fixture.capture(), new C3dEncoding(processor, C3dEncoding.Storage.INTEGER, false));

        assertEquals(List.of(), read.findings());
        assertEquals(fixture.capture().range(), read.range());
        VectorSeries positions = read.points().get(0).positions();
        double largest = CaptureFixture.position(0, 69_999).x();
        double error =
                positions.at(69_999).minus(CaptureFixture.position(0, 69_999)).norm();
        assertTrue(error < 2 * HALF_STEP * largest, error + " m at the last frame");
    }

    @Test
    void aFirstFrameBeyond65535IsKept() {
        CaptureFixture fixture = new CaptureFixture();
        fixture.firstFrame = 200_000;
        fixture.zero = Optional.empty();

        Capture read = again(fixture.capture(), C3dEncoding.DEFAULT);

        assertEquals(200_000, read.firstFrame());
        assertEquals(40, read.frames());
    }

    @ParameterizedTest
    @EnumSource(C3dEncoding.Storage.class)
    void aPointInTheLabsOriginIsNoGap(C3dEncoding.Storage storage) {
        VectorSeries still = VectorSeries.constant(Vector3.ZERO, 4);
        VectorSeries far = VectorSeries.constant(new Vector3(1, 2, 3), 4);
        List<PointSeries> points = List.of(new PointSeries("A", "", still), new PointSeries("B", "", far));
        Capture capture = new Capture(
                "origin.c3d",
                1,
                4,
                100,
                points,
                0,
                List.of(),
                List.of(),
                Optional.empty(),
                List.of(),
                LengthUnit.MM,
                "",
                List.of());

        Capture read = again(capture, new C3dEncoding(Processor.INTEL, storage, false));

        assertEquals(0, Shared.gaps(read));
        double moved = read.points().get(0).positions().at(0).norm();
        assertTrue(moved <= 2 * HALF_STEP * 3, "moved by " + moved + " m, allowed is one step");
    }

    @Test
    void aFileAppearsWholeAndReplacesTheOldOne(@TempDir Path folder) throws IOException {
        Capture capture = new CaptureFixture().capture();
        Path file = folder.resolve("walk.c3d");
        Files.writeString(file, "old");

        C3dWriter.write(capture, C3dEncoding.DEFAULT, file);

        assertArrayEquals(C3dWriter.bytes(capture, C3dEncoding.DEFAULT), Files.readAllBytes(file));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(List.of(file), files.toList());
        }
        assertEquals("walk.c3d", C3dReader.read(file, ReadOptions.DEFAULT).name());
    }

    @Test
    void aGapInAnIntegerChannelIsRefused() {
        CaptureFixture fixture = new CaptureFixture();
        Capture whole = fixture.capture();
        Capture gapped = again(whole, C3dEncoding.DEFAULT);
        double[] values = gapped.analog().get(0).values().toArray();
        values[7] = Double.NaN;
        Capture capture = withChannel(gapped, values);

        IllegalArgumentException refusal = assertThrows(
                IllegalArgumentException.class,
                () -> C3dWriter.bytes(capture, new C3dEncoding(Processor.INTEL, C3dEncoding.Storage.INTEGER, false)));

        assertEquals("channel C0 has a gap at sample 7, which an integer cannot hold", refusal.getMessage());
    }

    @ParameterizedTest
    @EnumSource(Processor.class)
    void aGapInARealChannelComesBackAsAGap(Processor processor) {
        Capture whole = new CaptureFixture().capture();
        double[] values = whole.analog().get(0).values().toArray();
        values[7] = Double.NaN;

        Capture read = again(withChannel(whole, values), new C3dEncoding(processor, C3dEncoding.Storage.REAL, false));

        assertTrue(Double.isNaN(read.analog().get(0).values().at(7)));
        assertEquals(values[8], read.analog().get(0).values().at(8), REAL * 34);
    }

    private static Capture withChannel(Capture capture, double[] values) {
        List<AnalogChannel> channels = new ArrayList<>(capture.analog());
        channels.set(0, new AnalogChannel("C0", "N", ScalarSeries.of(values)));
        return new Capture(
                capture.name(),
                capture.firstFrame(),
                capture.frames(),
                capture.pointRate(),
                capture.points(),
                capture.samplesPerFrame(),
                channels,
                capture.plates(),
                capture.plateZero(),
                capture.events(),
                capture.pointUnit(),
                capture.storage(),
                List.of());
    }

    private static Capture again(Capture capture, C3dEncoding encoding) {
        return C3dReader.read(capture.name(), C3dWriter.bytes(capture, encoding), ReadOptions.DEFAULT);
    }

    private static List<String> names(Capture capture) {
        return capture.points().stream()
                .map(point -> point.label() + "/" + point.description())
                .toList();
    }
}
