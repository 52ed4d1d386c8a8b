package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;

/**
 * Plates of open recordings. The expected peaks were read from the files by an independent script along the lab's vertical
 * and are stated in whole newtons; plates are out of level by 3 mrad at most, which is 0.005 N of 1000.
 */
class RecordedPlatesTest {

    /** Half of the last digit stated, and the noise of an unloaded level taken from some frames or others, N. */
    private static final double WHOLE_NEWTON = 1.0;

    @ParameterizedTest
    @CsvSource({
        "walk-static-a/Walking_Hybrid_1_1.c3d, 1, 1029",
        "walk-static-a/Walking_Hybrid_1_1.c3d, 2, 976",
        "walk-static-a/Walking_Hybrid_1_3.c3d, 1, 1074",
        "walk-static-a/Walking_Hybrid_1_3.c3d, 2, 989",
        "walk-static-a/Walking_Hybrid_1_5.c3d, 1, 1063",
        "walk-static-a/Walking_Hybrid_1_5.c3d, 2, 987",
        "walk-static-d/type1.C3D, 1, 731",
        "c3d-plate-types/TYPE-2.C3D, 1, 398.2",
        "c3d-plate-types/TYPE-4.C3D, 1, 390.9",
        "c3d-plate-types/TYPE-3.c3d, 1, 724",
        "c3d-plate-types/TYPE-3.c3d, 2, 657",
        "c3d-plate-types/TYPE-3.c3d, 3, 727",
        "c3d-plate-types/TYPE-3.c3d, 4, 788",
        "c3d-plate-types/walk_wands_type3.c3d, 1, 656",
        "c3d-encodings/pc_int.c3d, 1, 824",
        "c3d-encodings/pc_real.c3d, 2, 843",
        "c3d-encodings/dec_int.c3d, 1, 824",
        "c3d-encodings/dec_real.c3d, 2, 843",
        "c3d-encodings/sgi_int.c3d, 1, 824",
        "c3d-encodings/sgi_real.c3d, 2, 843",
        "c3d-odd-files/bad_parameter_section.c3d, 1, 389",
        "c3d-odd-files/three_plates_used_mismatch.c3d, 2, 302",
        "c3d-odd-files/prefixed_labels.c3d, 2, 606"
    })
    void pushUpAsHardAsTheFilesSay(String file, int plate, double peak) {
        PlateLoads loads = resolve(Recordings.read(file), new PlateZero.Auto());

        assertEquals(peak, peak(plate(loads, plate)), WHOLE_NEWTON, file + ", plate " + plate + ", N");
        assertFalse(codes(loads).contains("plate-sign"), "the files hold the force on the body");
    }

    /** The recording's description: at the peak of the plain plate the plain one has (85.0, 8.2, -398.2) N, the other (89.8, 10.0, -390.9) N. */
    @Test
    void differByTheCrosstalkThatAPlainPlateLeavesOut() {
        PlateLoad plain = plate(resolve(Recordings.read("c3d-plate-types/TYPE-2.C3D"), new PlateZero.None()), 1);
        PlateLoad calibrated = plate(resolve(Recordings.read("c3d-plate-types/TYPE-4.C3D"), new PlateZero.None()), 1);
        int at = peakSample(plain);

        double shearOfPlain = shear(plain, at);
        double shearOfCalibrated = shear(calibrated, at);

        assertEquals(Math.hypot(85.0, 8.2), shearOfPlain, 0.5, "N; not zeroed, one decimal, plate 3 mrad out of level");
        assertEquals(Math.hypot(89.8, 10.0), shearOfCalibrated, 0.5, "N; likewise");
        assertEquals(390.9, calibrated.rawPush().at(at), 0.5, "N");
    }

    private static double shear(PlateLoad load, int i) {
        Vector3 force = load.raw().at(i).force();
        Vector3 n = load.surface().normal();
        return force.minus(n.times(force.dot(n))).norm();
    }

    /** 20 to 26 N are left in flight before zeroing, on both plates together. */
    @Test
    void showNothingInTheFlightOfAJumpOnceZeroed() {
        Capture capture = Recordings.read("jump-c/Sample_Jump2.c3d");

        PlateLoads zeroed = resolve(capture, new PlateZero.Auto());
        PlateLoads stored = resolve(capture, new PlateZero.None());

        assertEquals(0, inFlight(zeroed), 0.5, "N; noise of 1 N over 250 samples, a drift of some tenths");
        assertTrue(inFlight(stored) > 20 && inFlight(stored) < 26, inFlight(stored) + " N as stored");
        assertTrue(
                peak(plate(zeroed, 1)) > 800 && peak(plate(zeroed, 2)) > 850, "both plates, not zeroed 822 and 884 N");
    }

    /** Take-off is at 0.692 s and landing at 1.183 s: the flight is frame indices 84 to 140 at 120 Hz. */
    private static double inFlight(PlateLoads loads) {
        return loads.plates().stream()
                .mapToDouble(load -> IntStream.range(88 * 5, 138 * 5)
                        .mapToDouble(load.rawPush()::at)
                        .average()
                        .orElseThrow())
                .sum();
    }

    /** 578.7 N on average, never unloaded. */
    @Test
    void areLeftAsTheyAreUnderSomebodyWhoStandsThroughout() {
        Capture capture = Recordings.read("walk-static-d/standing.C3D", Optional.of(LengthUnit.MM));

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        double mean = IntStream.range(0, 200)
                .mapToDouble(plate(loads, 1).rawPush()::at)
                .average()
                .orElseThrow();
        assertEquals(578.7, mean, 0.1, "N, as stated to one decimal");
        assertEquals(List.of("plate-zero"), codes(loads));
        assertEquals(Severity.NOTE, loads.findings().get(0).severity());
    }

    /** Y is up there; elsewhere Z. */
    @Test
    void tellWhichWayIsUp() {
        assertEquals(Optional.of(LabAxis.PLUS_Y), up(Recordings.read("walk-static-d/type1.C3D")));
        assertEquals(Optional.of(LabAxis.PLUS_Z), up(Recordings.read("jump-c/Sample_Jump2.c3d")));
    }

    @Test
    void refuseAMomentWhereTheSensorDistancesAreZero() {
        Capture capture = Recordings.read("c3d-odd-files/type3_zero_origin.c3d");

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(587, peak(plate(loads, 1)), 2 * WHOLE_NEWTON, "N; 1.4 N of unloaded level taken off");
        assertTrue(plate(loads, 1).raw().moment().isGap(0));
        assertEquals(List.of("plate-origin"), codes(loads));
    }

    private static PlateLoads resolve(Capture capture, PlateZero zero) {
        LabAxis up = up(capture).orElseThrow();
        Processing settings = PlateCaptures.zeroedBy(zero);
        return PlateLoads.resolve(capture, capture.plates(), up, settings);
    }

    private static Optional<LabAxis> up(Capture capture) {
        return LabUp.find(capture, capture.plates(), Optional.empty()).axis();
    }

    private static PlateLoad plate(PlateLoads loads, int number) {
        return loads.plates().stream()
                .filter(load -> load.number() == number)
                .findFirst()
                .orElseThrow();
    }

    private static double peak(PlateLoad load) {
        return load.rawPush().at(peakSample(load));
    }

    private static int peakSample(PlateLoad load) {
        ScalarSeries push = load.rawPush();
        int best = 0;
        for (int i = 0; i < push.size(); i++) {
            best = push.at(i) > push.at(best) ? i : best;
        }
        return best;
    }

    /**
     * What the checks of the channels find in open recordings. Seen by eye: the three plates of one file hold zeros in two of
     * their shear channels; in another, level force x of plate 2 is 4 N before its one contact of 230 N and -3 N after it.
     */
    @ParameterizedTest
    @CsvSource({
        "walk-static-a/Walking_Hybrid_1_1.c3d, ''",
        "walk-static-a/Walking_Hybrid_1_3.c3d, ''",
        "walk-static-a/Walking_Hybrid_1_5.c3d, ''",
        "walk-static-d/type1.C3D, ''",
        "walk-static-d/standing.C3D, ''",
        "jump-c/Sample_Jump2.c3d, ''",
        "c3d-plate-types/TYPE-2.C3D, ''",
        "c3d-plate-types/TYPE-3.c3d, ''",
        "c3d-plate-types/TYPE-4.C3D, ''",
        "c3d-plate-types/walk_wands_type3.c3d, ''",
        "c3d-encodings/pc_int.c3d, ''",
        "c3d-encodings/sgi_real.c3d, ''",
        "c3d-odd-files/prefixed_labels.c3d, ''",
        "c3d-odd-files/bad_parameter_section.c3d, plate-drift",
        "c3d-odd-files/three_plates_used_mismatch.c3d, plate-dead plate-dead plate-dead"
    })
    void areAccusedOfWhatIsTrueAlone(String file, String codes) {
        Capture capture = Recordings.read(file, Optional.of(LengthUnit.MM));
        List<String> checks = List.of("plate-dead", "plate-clipped", "plate-noise", "plate-drift", "unit-mismatch");

        PlateLoads loads =
                PlateLoads.resolve(capture, capture.plates(), up(capture).orElseThrow(), Processing.DEFAULT);

        assertEquals(
                codes,
                String.join(" ", codes(loads).stream().filter(checks::contains).toList()));
    }

    private static List<String> codes(PlateLoads loads) {
        return loads.findings().stream().map(Finding::code).toList();
    }
}
