package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Vector3;

/** Recordings of plates of all four types; expected figures from the READMEs beside them. */
class RecordedPlateTypesTest {

    private static final String FOLDER = "c3d-plate-types/";

    /** The READMEs print whole newtons. */
    private static final double PRINTED_N = 0.5;

    /** Here they print tenths. */
    private static final double PRINTED_TENTH_N = 0.05;

    /** And moments in whole N·mm. */
    private static final double PRINTED_NMM = 0.5;

    /** One in the last printed digit: the README's 38332 is 38331.47 here, on the other side of a half. */
    private static final double LAST_DIGIT_NMM = 1;

    private static final int[] VERTICAL_SENSORS = {4, 5, 6, 7};

    /** Corners and origins are stored as 32-bit reals: 2 m is good to 1.2e-7 m. */
    private static final double REAL_M = 2e-7;

    @Test
    void readsATypeTwoPlateAndLeavesItsMatrixAside() {
        Capture capture = Shared.capture(FOLDER + "TYPE-2.C3D");

        Plate plate = capture.plates().get(0);
        assertEquals(PlateType.FORCE_AND_MOMENT, plate.type());
        assertEquals(true, plate.calibration().isEmpty());
        assertEquals(new FrameRange(1, 10), capture.plateZero().orElseThrow());
        int peak = Shared.peakSample(capture, 0, 2);
        double[] expected = {85.0, 8.2, -398.2, -3602, 32360, 907};
        for (int i = 0; i < 6; i++) {
            double value = Shared.sum(capture, 0, peak, i) - Shared.unloaded(capture, 0, i);
            assertEquals(expected[i], value, i < 3 ? PRINTED_TENTH_N : PRINTED_NMM, "component " + i);
        }
    }

    @Test
    void readsTheMatrixOfATypeFourPlateByColumns() {
        Capture capture = Shared.capture(FOLDER + "TYPE-4.C3D");
        Capture sameTrial = Shared.capture(FOLDER + "TYPE-2.C3D");

        CalibrationMatrix matrix = capture.plates().get(0).calibration().orElseThrow();
        int peak = Shared.peakSample(sameTrial, 0, 2);
        double[] expected = {89.8, 10.0, -390.9, -5557, 38332, 1140};
        for (int row = 0; row < 6; row++) {
            double value = 0;
            for (int i = 0; i < 6; i++) {
                value += matrix.at(row, i) * (Shared.sum(capture, 0, peak, i) - Shared.unloaded(capture, 0, i));
            }
            assertEquals(expected[row], value, row < 3 ? PRINTED_TENTH_N : LAST_DIGIT_NMM, "component " + row);
        }
    }

    @Test
    void keepsTheOriginAsStatedThoughItsSignIsWrong() {
        Vector3 origin = Shared.capture(FOLDER + "TYPE-4.C3D").plates().get(0).origin();

        assertEquals(0, origin.minus(new Vector3(-0.0016, 0.0007, 0.0375)).norm(), REAL_M);
    }

    @Test
    void readsPlatesOfTwoTypesInOneFile() {
        Capture capture = Shared.capture(FOLDER + "TYPE-3.c3d");

        assertEquals(
                List.of(3, 3, 2, 2),
                capture.plates().stream().map(plate -> plate.type().code()).toList());
        assertEquals(List.of(22, 23, 24, 25, 26, 27), capture.plates().get(2).channels());
        assertEquals(724, Shared.peakUp(capture, 0, VERTICAL_SENSORS), PRINTED_N, "plate 1, N");
        assertEquals(657, Shared.peakUp(capture, 1, VERTICAL_SENSORS), PRINTED_N, "plate 2, N");
        assertEquals(727, Shared.peakUp(capture, 2, 2), PRINTED_N, "plate 3, N");
        assertEquals(788, Shared.peakUp(capture, 3, 2), PRINTED_N, "plate 4, N");
    }

    @Test
    void takesInvalidPointsAsGapsThoughTheyKeepTheirCoordinates() {
        Capture capture = Shared.capture(FOLDER + "walk_wands_type3.c3d");

        assertEquals(85, Shared.gaps(capture));
        assertEquals(List.of(), capture.findings());
        assertEquals(656, Shared.peakUp(capture, 0, VERTICAL_SENSORS), PRINTED_N, "plate 1, N");
        Vector3 origin = capture.plates().get(0).origin();
        assertEquals(0, origin.minus(new Vector3(0.12, 0.2, -0.058)).norm(), REAL_M);
    }
}
