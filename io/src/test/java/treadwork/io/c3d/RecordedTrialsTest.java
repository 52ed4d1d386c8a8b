package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/** Whole recorded trials; expected figures from the READMEs beside them. */
class RecordedTrialsTest {

    /** The READMEs print whole newtons and whole millimetres. */
    private static final double PRINTED_N = 0.5;

    private static final double PRINTED_TENTH_N = 0.05;
    private static final double PRINTED_MM = 0.5;
    private static final double PRINTED_TENTH_MM = 0.06;

    /** The plates of the first trials are up to 0.2 degrees out of level, and the README turned their forces upright. */
    private static final double LEVEL_N = 1;

    private static final int[] VERTICAL_SENSORS = {4, 5, 6, 7};

    @ParameterizedTest
    @CsvSource({"1, 290, 672, 1029, 976", "3, 337, 626, 1074, 989", "5, 243, 646, 1063, 987"})
    void readsWalkingOverTwoPlates(int trial, int first, int frames, double right, double left) {
        Capture capture = Shared.capture("walk-static-a/Walking_Hybrid_1_" + trial + ".c3d");

        assertEquals(first, capture.firstFrame());
        assertEquals(frames, capture.frames());
        assertEquals(240, capture.pointRate());
        assertEquals(1, capture.samplesPerFrame());
        assertEquals(25, capture.points().size());
        assertEquals(right, Shared.peakUp(capture, 0, VERTICAL_SENSORS), PRINTED_N + LEVEL_N, "plate 1, N");
        assertEquals(left, Shared.peakUp(capture, 1, VERTICAL_SENSORS), PRINTED_N + LEVEL_N, "plate 2, N");
    }

    @Test
    void takesMarkersStoredAsZeroForMissing() {
        Capture capture = Shared.capture("walk-static-a/Walking_Hybrid_1_3.c3d");

        Finding finding = Shared.finding(capture, "marker-zero");
        int gaps = Shared.gaps(capture);
        assertTrue(gaps > 3000 && gaps < 4100, gaps + " samples");
        assertEquals(gaps + " samples of 25 markers are exactly (0, 0, 0), though flagged valid", finding.figure());
        assertEquals(Severity.NOTE, finding.severity());
        assertTrue(finding.mended());
    }

    @Test
    void measuresTheStandingPersonInMetres() {
        Capture capture = Shared.capture("walk-static-a/Standing_Hybrid_1.c3d");

        assertEquals(37, capture.points().size());
        assertEquals(1200, capture.frames());
        assertEquals(0, Shared.gaps(capture));
        assertEquals(0, capture.samplesPerFrame());
        assertEquals(List.of(), capture.plates());
        assertEquals(List.of(), capture.findings());
        assertEquals(229, distance(capture, "R_ASIS", "L_ASIS"), PRINTED_MM, "between the ASISs, mm");
        assertEquals(457, distance(capture, "R_KNEE_LAT", "R_ANKLE_LAT"), PRINTED_MM, "knee to ankle, mm");
        List<Double> cluster = new ArrayList<>();
        for (int i = 1; i <= 4; i++) {
            for (int j = i + 1; j <= 4; j++) {
                cluster.add(distance(capture, "R_THIGH_" + i, "R_THIGH_" + j));
            }
        }
        List<Double> expected = List.of(99.4, 149.0, 109.7, 110.4, 148.1, 100.1);
        for (int i = 0; i < 6; i++) {
            assertEquals(expected.get(i), cluster.get(i), PRINTED_TENTH_MM, "side of the cluster, mm");
        }
    }

    @Test
    void keepsTheOriginAboveTheSurfaceAsStated() {
        Capture capture = Shared.capture("walk-static-a/Walking_Hybrid_1_1.c3d");

        assertEquals(0.048, capture.plates().get(0).origin().z(), 1e-9);
        assertEquals(
                "unloaded in frames 1 to 10, the file holds 290 to 961",
                Shared.finding(capture, "plate-zero-outside").figure());
    }

    @Test
    void readsAStandingTrialThatStatesRateAndFramesInItsHeaderOnly() {
        Capture capture = Shared.capture("walk-static-d/standing.C3D", LengthUnit.MM);

        assertEquals(38, capture.points().size());
        assertEquals(200, capture.frames());
        assertEquals(100, capture.pointRate());
        assertEquals(578.7, -mean(capture, 2), 0.1, "mean up force, N");
        assertEquals(580.2, Shared.peakUp(capture, 0, 2), PRINTED_TENTH_N, "largest up force, N");
        assertEquals("r asis", capture.points().get(1).label());
        assertEquals("r asis", capture.points().get(26).label());
        assertEquals(
                "standing.C3D, parameters POINT:FRAMES, POINT:RATE, POINT:SCALE, POINT:DATA_START",
                Shared.finding(capture, "point-parameters-missing").where());
    }

    @Test
    void readsATypeOnePlate() {
        Capture capture = Shared.capture("walk-static-d/type1.C3D");

        assertEquals(1, capture.plates().get(0).type().code());
        assertEquals(296, capture.frames());
        assertEquals(731, Shared.peakUp(capture, 0, 2), PRINTED_N, "N");
        assertEquals("Right ASIS", capture.points().get(0).description());
        assertEquals(List.of(), capture.findings());
    }

    @Test
    void readsAJumpWithNamedEvents() {
        Capture capture = Shared.capture("jump-c/Sample_Jump2.c3d");

        assertEquals(
                List.of("Start 0.017", "Take-Off 0.692", "Landing 1.183", "End 1.783"),
                capture.events().stream().map(RecordedTrialsTest::words).toList());
        assertEquals(
                List.of(51, 16, 264),
                List.of(capture.points().size(), capture.analog().size(), capture.frames()));
        assertEquals(600, capture.analogRate());
        assertEquals(822, Shared.peakUp(capture, 0, 2), PRINTED_N, "one foot, N");
        assertEquals(884, Shared.peakUp(capture, 1, 2), PRINTED_N, "other foot, N");
        assertEquals(1682, peakOfBoth(capture), PRINTED_N, "both feet, N");
        assertEquals(0, Shared.gaps(capture));
    }

    @Test
    void keepsLabelsThatRepeatAndTheirFullNames() {
        List<PointSeries> points = Shared.capture("jump-c/Sample_Jump2.c3d").points();

        assertEquals("RKNE", points.get(14).label());
        assertEquals("RKNE", points.get(15).label());
        assertEquals("R.Knee", points.get(14).description());
        assertEquals("R.Knee.Medial", points.get(15).description());
    }

    private static String words(CaptureEvent event) {
        return String.format(Locale.ROOT, "%s%s %.3f", event.label(), event.context(), event.timeS());
    }

    private static double peakOfBoth(Capture capture) {
        double peak = 0;
        for (int i = 0; i < capture.frames() * capture.samplesPerFrame(); i++) {
            peak = Math.max(peak, -Shared.sum(capture, 0, i, 2) - Shared.sum(capture, 1, i, 2));
        }
        return peak;
    }

    private static double mean(Capture capture, int place) {
        double sum = 0;
        int samples = capture.frames() * capture.samplesPerFrame();
        for (int i = 0; i < samples; i++) {
            sum += Shared.sum(capture, 0, i, place);
        }
        return sum / samples;
    }

    /** Median distance of two points over all frames, mm. */
    private static double distance(Capture capture, String one, String other) {
        PointSeries a = point(capture, one);
        PointSeries b = point(capture, other);
        double[] distances = new double[capture.frames()];
        for (int i = 0; i < distances.length; i++) {
            distances[i] = a.positions().at(i).minus(b.positions().at(i)).norm() * 1e3;
        }
        Arrays.sort(distances);
        return distances[distances.length / 2];
    }

    private static PointSeries point(Capture capture, String label) {
        return capture.points().stream()
                .filter(point -> point.label().equals(label))
                .findFirst()
                .orElseThrow();
    }
}
