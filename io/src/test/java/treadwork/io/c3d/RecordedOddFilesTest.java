package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.UnusableInputException;

/** Recordings with real defects; expected outcomes from the README beside them. */
class RecordedOddFilesTest {

    private static final String FOLDER = "c3d-odd-files/";

    /** The README prints whole newtons. */
    private static final double PRINTED_N = 0.5;

    private static final int[] VERTICAL_SENSORS = {4, 5, 6, 7};

    @Test
    void trustsTheHeadersScaleAndNamesTheMisspeltPlateGroup() {
        Capture capture = Shared.capture(FOLDER + "early_sgi_int.c3d");

        assertEquals(
                List.of("analog-scaling", "plate-group-name", "point-scale", "label-ambiguous"), Shared.codes(capture));
        assertEquals(
                "it is 0.0215412, in the header 0.0551136",
                Shared.finding(capture, "point-scale").figure());
        assertEquals(
                "early_sgi_int.c3d, group FORCE_PLATEFORM",
                Shared.finding(capture, "plate-group-name").where());
        assertEquals(
                "0 are stated for 16 channels",
                Shared.finding(capture, "analog-scaling").figure());
        assertEquals(1.46, height(capture.points().get(0)), 0.01, "right shoulder, m");
        assertEquals(LengthUnit.MM, capture.pointUnit());
    }

    @Test
    void readsAroundADamagedParameterSection() {
        Capture capture = Shared.capture(FOLDER + "bad_parameter_section.c3d");

        assertEquals(List.of("parameter-section", "analog-scaling"), Shared.codes(capture));
        assertEquals(389, Shared.peakUp(capture, 0, 2), PRINTED_N, "plate 1, N");
        assertEquals(251, Shared.peakUp(capture, 1, 2), PRINTED_N, "plate 2, N");
        assertEquals(
                List.of("LHS", "RFO", "RHS", "LTO", "LIC", "RTO", "RIC"),
                capture.events().stream().map(CaptureEvent::label).toList());
    }

    @ParameterizedTest
    @ValueSource(strings = {"all_residuals_negative.c3d", "duplicate_labels_metres.c3d"})
    void refusesAFileWithoutAUnit(String name) {
        Path file = Shared.recording(FOLDER + name);

        UnusableInputException refusal =
                assertThrows(UnusableInputException.class, () -> C3dReader.read(file, Optional.empty()));

        assertEquals("point-unit-unknown", refusal.finding().code());
        assertEquals(name + ", parameter POINT:UNITS", refusal.finding().where());
        assertTrue(refusal.finding().mend().startsWith("Set lab.pointUnit in the study file"));
    }

    @Test
    void saysThatNoPointIsValidWhereEveryResidualIsNegative() {
        Capture capture = Shared.capture(FOLDER + "all_residuals_negative.c3d", LengthUnit.M);

        assertEquals(
                "none of 22 points has a valid sample in 34 frames",
                Shared.finding(capture, "points-missing").figure());
        assertEquals(22 * 34, Shared.gaps(capture));
        assertEquals("re. Hüfte", capture.points().get(9).description());
    }

    @Test
    void keepsRepeatedNumericLabels() {
        Capture capture = Shared.capture(FOLDER + "duplicate_labels_metres.c3d", LengthUnit.M);

        List<String> labels = capture.points().stream().map(PointSeries::label).toList();
        assertEquals(29, labels.size());
        assertEquals("20000", labels.get(1));
        assertEquals(10, labels.stream().filter("100000"::equals).count());
    }

    @Test
    void trustsTheHeadersCountOfPoints() {
        Capture capture = Shared.capture(FOLDER + "three_plates_used_mismatch.c3d");

        assertEquals(11, capture.points().size());
        assertEquals(33, capture.firstFrame());
        assertEquals(
                "12 points, in the header 11",
                Shared.finding(capture, "point-count").figure());
        assertEquals(787, Shared.peakUp(capture, 0, VERTICAL_SENSORS), PRINTED_N, "plate 1, N");
        assertEquals(301, Shared.peakUp(capture, 1, VERTICAL_SENSORS), PRINTED_N, "plate 2, N");
        assertEquals(587, Shared.peakUp(capture, 2, VERTICAL_SENSORS), PRINTED_N, "plate 3, N");
    }

    @Test
    void takesTheSubjectOffTheLabels() {
        Capture capture = Shared.capture(FOLDER + "prefixed_labels.c3d");

        List<String> labels = capture.points().stream().map(PointSeries::label).toList();
        assertEquals("LASI", labels.get(0));
        assertEquals(List.of("*16", "*17"), labels.subList(16, 18));
        assertEquals(606, Shared.peakUp(capture, 1, 2), PRINTED_N, "plate 2, N");
    }

    @Test
    void readsATypeThreePlateWithoutSensorDistances() {
        Capture capture = Shared.capture(FOLDER + "type3_zero_origin.c3d");

        assertEquals(65, capture.firstFrame());
        assertEquals(0, capture.plates().get(0).origin().norm());
        assertEquals(587.66, Shared.peakUp(capture, 0, VERTICAL_SENSORS), PRINTED_N, "N");
    }

    @Test
    void readsAUnitThatIsCutShortAndPlatesBehindTheStatedEndOfTheParameters() {
        Capture capture = Shared.capture(FOLDER + "units_cut_short_header_events.c3d");

        assertEquals(LengthUnit.M, capture.pointUnit());
        assertEquals(1, capture.plates().size());
        double largest = 0;
        for (int i = 0; i < capture.frames() * capture.samplesPerFrame(); i++) {
            largest = Math.max(largest, Shared.sum(capture, 0, i, VERTICAL_SENSORS));
        }
        assertEquals(284, largest, PRINTED_N, "N");
        assertEquals(
                List.of("R. I", "R. E", "L. I", "L. E"),
                capture.events().stream().map(CaptureEvent::label).toList());
    }

    /** Mean height, m; z is up in this recording. */
    private static double height(PointSeries point) {
        double sum = 0;
        int seen = 0;
        for (int i = 0; i < point.positions().size(); i++) {
            if (!point.positions().isGap(i)) {
                sum += point.positions().z(i);
                seen++;
            }
        }
        return sum / seen;
    }
}
