package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.study.HipCentreRule;

class HipCentresTest {

    private static final PelvisSize SIZE = new PelvisSize(0.240, 0.150);
    private static final double LEG = 0.880;

    /** The expected values are rounded to 0.1 mm; a little more for their own rounding. */
    private static final double ROUNDED = 0.0501e-3;

    /** Worked by hand from the published equations for PW = 240, PD = 150, LL = 880 mm, independently of this code. */
    @ParameterizedTest
    @CsvSource({
        "BELL_1989,-52.8,-72.0,86.4",
        "LEARDINI_1999,-46.5,-84.5,91.2",
        "HARRINGTON_2007,-45.9,-80.7,88.3",
        "HARA_2016,-44.4,-77.6,83.7"
    })
    void givesTheWorkedRightHip(HipCentreRule rule, double xMm, double yMm, double zMm) {
        Vector3 hip = HipCentres.inPelvis(rule, SIZE, LEG, Side.RIGHT);

        assertEquals(xMm * 1e-3, hip.x(), ROUNDED);
        assertEquals(yMm * 1e-3, hip.y(), ROUNDED);
        assertEquals(zMm * 1e-3, hip.z(), ROUNDED);
    }

    @ParameterizedTest
    @EnumSource(names = {"BELL_1989", "LEARDINI_1999", "HARRINGTON_2007", "HARA_2016"})
    void mirrorsTheLeftHip(HipCentreRule rule) {
        Vector3 right = HipCentres.inPelvis(rule, SIZE, LEG, Side.RIGHT);

        Vector3 left = HipCentres.inPelvis(rule, SIZE, LEG, Side.LEFT);

        assertEquals(new Vector3(right.x(), right.y(), -right.z()), left);
    }

    @ParameterizedTest
    @EnumSource(names = {"FUNCTIONAL", "MARKER"})
    void isNoRegressionForTheOtherRules(HipCentreRule rule) {
        assertThrows(
                IllegalArgumentException.class, () -> HipCentres.inPelvis(rule, SIZE, LEG, Side.RIGHT), rule.key());
    }

    /** The coefficient of the leg length in the Leardini equations was not read anywhere. */
    @Test
    void saysWhichCoefficientIsFromMemory() {
        String source = HipCentres.source(HipCentreRule.LEARDINI_1999);

        assertTrue(source.contains("0.096 of leg length) from memory"), source);
    }
}
