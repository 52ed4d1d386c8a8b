package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;

/** One recording in six encodings; expected figures from the README beside it. */
class RecordedEncodingsTest {

    private static final String FOLDER = "c3d-encodings/";

    /** The README: integers and reals differ by one step of the scale, 0.2812 mm, in 59 of 9612 coordinates. */
    private static final double ONE_STEP_M = 0.29e-3;

    private static final int DIFFERENT = 59;

    /** Forces are given to 1 N. */
    private static final double PRINTED_N = 0.5;

    @ParameterizedTest
    @CsvSource({
        "pc_int, 'little-endian, 16-bit integer'",
        "pc_real, 'little-endian, 32-bit real'",
        "dec_int, 'little-endian with DEC reals, 16-bit integer'",
        "dec_real, 'little-endian with DEC reals, 32-bit real'",
        "sgi_int, 'big-endian, 16-bit integer'",
        "sgi_real, 'big-endian, 32-bit real'"
    })
    void holdsTheStatedCountsInEveryEncoding(String name, String storage) {
        Capture capture = Shared.capture(FOLDER + name + ".c3d");

        assertEquals(storage, capture.storage());
        assertEquals(List.of(36, 16, 2), counts(capture));
        assertEquals(89, capture.frames());
        assertEquals(1, capture.firstFrame());
        assertEquals(50, capture.pointRate());
        assertEquals(200, capture.analogRate());
        assertEquals(LengthUnit.MM, capture.pointUnit());
        assertEquals(List.of(), capture.findings());
    }

    @ParameterizedTest
    @ValueSource(strings = {"pc_int", "pc_real", "dec_int", "dec_real", "sgi_int", "sgi_real"})
    void showsTheStatedPeakForces(String name) {
        Capture capture = Shared.capture(FOLDER + name + ".c3d");

        assertEquals(824, Shared.peakUp(capture, 0, 2), PRINTED_N, "plate 1, N");
        assertEquals(843, Shared.peakUp(capture, 1, 2), PRINTED_N, "plate 2, N");
    }

    @ParameterizedTest
    @ValueSource(strings = {"pc_real", "dec_int", "dec_real", "sgi_int", "sgi_real"})
    void analogValuesAreTheSameInAllSix(String name) {
        Capture reference = Shared.capture(FOLDER + "pc_int.c3d");

        Capture capture = Shared.capture(FOLDER + name + ".c3d");

        for (int i = 0; i < 16; i++) {
            AnalogChannel expected = reference.analog().get(i);
            AnalogChannel channel = capture.analog().get(i);
            assertEquals(expected.label(), channel.label());
            for (int sample = 0; sample < 356; sample++) {
                assertEquals(expected.values().at(sample), channel.values().at(sample), channel.label());
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"pc_real, dec_real, 0", "pc_real, sgi_real, 0", "pc_int, sgi_int, 0", "pc_real, dec_int, 0"})
    void pointsAreTheSameWithinAFamily(String one, String other, int different) {
        assertEquals(different, differences(one, other));
    }

    @Test
    void integersAndRealsDifferByAtMostOneStepOfTheScale() {
        assertEquals(DIFFERENT, differences("pc_int", "pc_real"));
    }

    @Test
    void readsTheHeaderEventsInTheOrderOfTheirTimes() {
        List<CaptureEvent> nine = Shared.capture(FOLDER + "sgi_real.c3d").events();
        List<CaptureEvent> eight = Shared.capture(FOLDER + "dec_int.c3d").events();

        assertEquals(
                List.of("RHS", "STRT", "RMS", "LHS", "RTO", "LMS", "STOP", "LTO", "EOF"),
                nine.stream().map(CaptureEvent::label).toList());
        assertEquals(
                List.of("RHS", "STRT", "RMS", "LHS", "RTO", "LMS", "STOP", "LTO"),
                eight.stream().map(CaptureEvent::label).toList());
    }

    /** Coordinates that differ by more than rounding; none may by more than a step. */
    private static int differences(String one, String other) {
        Capture first = Shared.capture(FOLDER + one + ".c3d");
        Capture second = Shared.capture(FOLDER + other + ".c3d");
        int differences = 0;
        for (int i = 0; i < first.points().size(); i++) {
            PointSeries a = first.points().get(i);
            PointSeries b = second.points().get(i);
            for (int frame = 0; frame < first.frames(); frame++) {
                assertEquals(a.positions().isGap(frame), b.positions().isGap(frame), a.label());
                if (!a.positions().isGap(frame)) {
                    differences += differ(a.positions().x(frame), b.positions().x(frame));
                    differences += differ(a.positions().y(frame), b.positions().y(frame));
                    differences += differ(a.positions().z(frame), b.positions().z(frame));
                }
            }
        }
        return differences;
    }

    /** A real holds step × scale to 24 bits: 2 m is good to 1.2e-7 m, while a step is 2.8e-4 m. */
    private static int differ(double a, double b) {
        assertTrue(Math.abs(a - b) < ONE_STEP_M, "differ by " + Math.abs(a - b) + " m");
        return Math.abs(a - b) > 1e-6 ? 1 : 0;
    }

    private static List<Integer> counts(Capture capture) {
        return List.of(
                capture.points().size(),
                capture.analog().size(),
                capture.plates().size());
    }
}
