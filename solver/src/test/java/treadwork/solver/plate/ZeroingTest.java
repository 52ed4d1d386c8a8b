package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.PlateZero;

/** All plates here have their z down and hold the force on the foot, so that a push up is a negative third channel. */
class ZeroingTest {

    /** Corners for which plate x is lab +Y, y is lab +X and z is lab -Z; the middle is at (0.8, 0.2, 0). */
    private static final List<Vector3> CORNERS =
            List.of(new Vector3(1.1, 0.4, 0), new Vector3(1.1, 0, 0), new Vector3(0.5, 0, 0), new Vector3(0.5, 0.4, 0));

    private static final List<Double> LOAD = List.of(40.0, -60.0, -700.0, 9000.0, -14000.0, 3000.0);
    private static final List<Double> OFFSET = List.of(4.0, -7.0, 25.0, 600.0, -900.0, 150.0);

    private static final PointSeries FAR_AWAY = PlateCaptures.marker(new Vector3(3, 2, 1));
    private static final PointSeries ON_THE_PLATE = PlateCaptures.marker(new Vector3(0.8, 0.2, 0.07));

    private static final int LOADED = 300;
    private static final int EMPTY = 100;

    /** Rounding: sums of values up to 2e4 N·mm. */
    private static final double ROUNDING = 1e-10;

    @Test
    void takesEachChannelsUnloadedLevelOffWhereverInTheTrialItIs() {
        assertLevelIsTakenOff(i -> i >= 200 ? 1 : 0);
        assertLevelIsTakenOff(i -> i < 440 ? 1 : 0);
        assertLevelIsTakenOff(i -> i < 200 || i >= 260 ? 1 : 0);
    }

    private static void assertLevelIsTakenOff(IntToDoubleFunction course) {
        Capture exact = capture(course, List.of(0.0, 0.0, 0.0, 0.0, 0.0, 0.0), FAR_AWAY);
        Capture shifted = capture(course, OFFSET, FAR_AWAY);

        PlateLoad expected = resolve(exact, new PlateZero.Auto()).plates().get(0);
        PlateLoads found = resolve(shifted, new PlateZero.Auto());

        assertSame(expected, found.plates().get(0));
        assertEquals(List.of("plate-zero"), codes(found));
        assertTrue(found.findings().get(0).mended());
        assertTrue(
                found.findings().get(0).figure().contains("25.0 N"),
                found.findings().get(0).figure());
    }

    /** A flight of a jump between two loads that differ, under noise of 1 N: the level is known to 1 N / √n, n = 50 or more. */
    @Test
    void findsTheLevelOfAFlightUnderNoise() {
        Random random = new Random(7);
        ScalarSeries normal = PlateCaptures.series(i -> {
            double load = i < 150 ? -400 - 2.0 * i : i < 300 ? 0 : -900 + i;
            return load - 19.4 + random.nextGaussian();
        });
        Capture capture = PlateCaptures.of(List.of(plate(PlateType.FORCE_AND_MOMENT)), others(normal), ON_THE_PLATE);

        PlateLoad load = resolve(capture, new PlateZero.Auto()).plates().get(0);

        double mean = 0;
        for (int i = 150; i < 300; i++) {
            mean += load.rawPush().at(i) / 150;
        }
        assertEquals(0, mean, 3 / Math.sqrt(50), "push in flight, N, within three standard errors");
    }

    @Test
    void leavesAPlateAsItIsThatSomebodyStandsOnThroughout() {
        Random random = new Random(3);
        Capture capture = PlateCaptures.of(
                List.of(plate(PlateType.FORCE_AND_MOMENT)),
                others(PlateCaptures.series(i -> -578 + random.nextGaussian())),
                ON_THE_PLATE);

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(578, loads.plates().get(0).rawPush().at(LOADED), 5, "N; noise of 1 N");
        assertEquals(List.of("plate-zero"), codes(loads));
        assertFalse(loads.findings().get(0).mended());
    }

    /** A slow sway is quiet where it turns round; that is not an empty plate. */
    @Test
    void doesNotTakeTheLeastLoadOfASwayForAnEmptyPlate() {
        Capture capture = PlateCaptures.of(
                List.of(plate(PlateType.FORCE_AND_MOMENT)),
                others(PlateCaptures.series(i -> -350 + 100 * Math.sin(2 * Math.PI * i / 450.0))),
                ON_THE_PLATE);

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(350, loads.plates().get(0).rawPush().at(0), ROUNDING, "N");
        assertFalse(loads.findings().get(0).mended());
    }

    @Test
    void takesOffASteadyLevelOfAPlateThatNobodyIsNear() {
        Random random = new Random(5);
        Capture capture = PlateCaptures.of(
                List.of(plate(PlateType.FORCE_AND_MOMENT)),
                others(PlateCaptures.series(i -> -46 + random.nextGaussian())),
                FAR_AWAY);

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(0, loads.plates().get(0).rawPush().at(LOADED), 5, "N; noise of 1 N");
        assertTrue(loads.findings().get(0).mended());
    }

    /** The centre of pressure that the plate gives is no load: 60 mm stay 60 mm, whatever the empty plate shows. */
    @Test
    void doesNotZeroACentreOfPressure() {
        List<Double> load = List.of(5.0, -8.0, -700.0, 60.0, -35.0, 2.0);
        List<ScalarSeries> signals = new ArrayList<>();
        for (int j = 0; j < 6; j++) {
            double loaded = load.get(j);
            boolean place = j == 3 || j == 4;
            signals.add(PlateCaptures.series(i -> i < 200 ? (place ? 111 : 12) : loaded + (place ? 0 : 12)));
        }
        Plate plate = plate(PlateType.FORCE_AND_CENTRE_OF_PRESSURE);
        Capture capture = PlateCaptures.of(List.of(plate), signals, FAR_AWAY);

        PlateLoad found = resolve(capture, new PlateZero.Auto()).plates().get(0);

        Vector3 cop = found.centreOfPressure(LOADED, 20).orElseThrow().point();
        assertEquals(0, cop.minus(new Vector3(0.8 - 0.035, 0.2 + 0.060, 0)).norm(), ROUNDING, "m");
        assertEquals(700, found.rawPush().at(LOADED), ROUNDING, "N");
    }

    @Test
    void leavesTheChannelsAsTheyAreWhenAskedTo() {
        Capture capture = capture(PlateCaptures::steppedOn, OFFSET, FAR_AWAY);

        PlateLoads loads = resolve(capture, new PlateZero.None());

        assertEquals(-25, loads.plates().get(0).rawPush().at(EMPTY), ROUNDING, "N");
        assertEquals(675, loads.plates().get(0).rawPush().at(LOADED), ROUNDING, "N");
        assertEquals(List.of("plate-zero"), codes(loads));
        assertEquals(Severity.WARNING, loads.findings().get(0).severity());
        assertEquals(
                "{ \"processing\": { \"plateZero\": \"auto\" } }",
                loads.findings().get(0).proposal().orElseThrow().json());
    }

    /** A plate not zeroed shows 212 N the wrong way for most of the trial; its loads still point up. */
    @Test
    void doesNotMistakeAnOffsetForAReversedPlate() {
        Capture capture = PlateCaptures.of(
                List.of(plate(PlateType.FORCE_AND_MOMENT)),
                others(PlateCaptures.series(i -> i > 400 && i < 480 ? -500 : 212)),
                FAR_AWAY);

        PlateLoads loads = resolve(capture, new PlateZero.None());

        assertEquals(500, loads.plates().get(0).rawPush().at(450), ROUNDING, "N");
        assertEquals(List.of("plate-zero"), codes(loads));
    }

    @Test
    void takesTheLevelFromTheFramesThatTheFileNames() {
        Capture capture = withZeroRange(Optional.of(new FrameRange(11, 30)));

        PlateLoads loads = resolve(capture, new PlateZero.File());

        assertEquals(700, loads.plates().get(0).rawPush().at(LOADED), ROUNDING, "N");
        assertTrue(loads.findings().get(0).mended());
    }

    @Test
    void saysThatAFileNamesNoFrames() {
        PlateLoads loads = resolve(withZeroRange(Optional.empty()), new PlateZero.File());

        assertEquals(675, loads.plates().get(0).rawPush().at(LOADED), ROUNDING, "left as it is, N");
        assertEquals(Severity.WARNING, loads.findings().get(0).severity());
        assertTrue(loads.findings().get(0).figure().contains("names no frames"));
    }

    @Test
    void saysThatStatedFramesAreNotInTheCapture() {
        PlateLoads loads = resolve(withZeroRange(Optional.empty()), new PlateZero.Frames(new FrameRange(500, 600)));

        assertEquals(675, loads.plates().get(0).rawPush().at(LOADED), ROUNDING, "left as it is, N");
        assertTrue(
                loads.findings().get(0).figure().contains("11 to 110"),
                loads.findings().get(0).figure());
    }

    /** Frames 81 to 90 are samples 350 to 399: the plate is loaded there. */
    @Test
    void warnsWhenThePlateIsLoadedInTheStatedFrames() {
        PlateLoads loads = resolve(withZeroRange(Optional.empty()), new PlateZero.Frames(new FrameRange(81, 90)));

        Finding finding = loads.findings().get(0);
        assertEquals("plate-zero", finding.code());
        assertEquals(Severity.WARNING, finding.severity());
        assertTrue(finding.figure().contains("700.0 N off"), finding.figure());
    }

    private static void assertSame(PlateLoad expected, PlateLoad found) {
        for (int i = 0; i < PlateCaptures.SAMPLES; i++) {
            Vector3 force = expected.raw().at(i).force().minus(found.raw().at(i).force());
            Vector3 moment =
                    expected.raw().at(i).moment().minus(found.raw().at(i).moment());
            assertEquals(0, force.norm(), ROUNDING, "force of sample " + i + ", N");
            assertEquals(0, moment.norm(), ROUNDING, "moment of sample " + i + ", N·m");
        }
    }

    private static Capture capture(IntToDoubleFunction course, List<Double> offset, PointSeries marker) {
        List<ScalarSeries> signals = new ArrayList<>();
        for (int j = 0; j < 6; j++) {
            double load = LOAD.get(j);
            double level = offset.get(j);
            signals.add(PlateCaptures.series(i -> load * course.applyAsDouble(i) + level));
        }
        return PlateCaptures.of(List.of(plate(PlateType.FORCE_AND_MOMENT)), signals, marker);
    }

    private static Capture withZeroRange(Optional<FrameRange> range) {
        Capture capture = capture(PlateCaptures::steppedOn, OFFSET, FAR_AWAY);
        List<ScalarSeries> signals =
                capture.analog().stream().map(channel -> channel.values()).toList();
        return PlateCaptures.withZeroRange(capture.plates(), signals, range, FAR_AWAY);
    }

    /** The third channel, and five that show a little of it. */
    private static List<ScalarSeries> others(ScalarSeries normal) {
        List<ScalarSeries> signals = new ArrayList<>();
        for (int j = 0; j < 6; j++) {
            double share = j == 2 ? 1 : 0.1;
            signals.add(PlateCaptures.series(i -> share * normal.at(i)));
        }
        return signals;
    }

    private static Plate plate(PlateType type) {
        return new Plate(
                type,
                CORNERS,
                new Vector3(-0.0015, 0.002, -0.04),
                PlateCaptures.channels(6),
                Optional.empty(),
                LengthUnit.MM);
    }

    private static PlateLoads resolve(Capture capture, PlateZero rule) {
        return PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Z, PlateCaptures.zeroedBy(rule));
    }

    private static List<String> codes(PlateLoads loads) {
        return loads.findings().stream().map(Finding::code).toList();
    }
}
