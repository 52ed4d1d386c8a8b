package treadwork.solver.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.fixtures.rod.ProvedPlate;
import treadwork.fixtures.rod.RodPress;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;

/** Plates that are not where their file says; by how much is chosen, so the expected values are exact. */
class RodTestTest {

    private static final Vector3 MOVED = new Vector3(0.012, -0.019, 0.007);
    private static final Vector3 TURNED = new Vector3(0.010, -0.006, 0.035);

    /** Without noise what is left is rounding, and what zeroing takes off: nothing. 1e-6 m and 1e-6 rad are asked for. */
    private static final double EXACT = 1e-6;

    /** Asked of the test at 0.5 mm of marker noise and 1 N of plate noise, m and rad. */
    private static final double PLACE = 1e-3;

    private static final double TURN = Math.toRadians(0.1);

    private static final ProvedPlate WRONG =
            ProvedPlate.of(PlateType.FORCE_AND_MOMENT).withMoved(MOVED).withTurned(TURNED);

    @ParameterizedTest
    @EnumSource(PlateType.class)
    void findsWherePlatesOfAllTypesStandAndHowTheyLie(PlateType type) {
        RodPress press = RodPress.of(ProvedPlate.of(type).withMoved(MOVED).withTurned(TURNED));

        RodResult result = prove(press.capture(), rod(0));

        assertEquals(0, result.movedVector().minus(MOVED).norm(), EXACT, "m");
        assertEquals(0, result.turnedVector().minus(TURNED).norm(), EXACT, "rad");
        assertEquals(RodPress.TIP, result.tip(), EXACT, "m");
        assertEquals(0, result.corrected().distance(), EXACT, "m");
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void findsThemWithinAMillimetreAndATenthOfADegreeAtTheNoiseOfAGoodLaboratory(long seed) {
        RodPress press = RodPress.of(WRONG.withNoise(1)).withMarkerNoise(0.0005).withSeed(seed);

        RodResult result = prove(press.capture(), rod(0));

        assertEquals(0, result.movedVector().minus(MOVED).norm(), PLACE, "m");
        assertEquals(0, result.turnedVector().minus(TURNED).norm(), TURN, "rad");
        assertTrue(result.corrected().isAccepted(), result.corrected().toString());
        assertFalse(result.asFound().isAccepted(), result.asFound().toString());
    }

    /** Of 80 components at most a few lie beyond three of their standard errors, if these mean what they say. */
    @Test
    void statesErrorsThatCoverWhatIsOff() {
        int beyond = 0;
        for (long seed = 1; seed <= 13; seed++) {
            RodResult result = prove(
                    RodPress.of(WRONG.withNoise(1))
                            .withMarkerNoise(0.0005)
                            .withSeed(seed)
                            .capture(),
                    new Rod(RodPress.MARKERS, OptionalDouble.of(RodPress.TIP), 0, Rod.MIDDLE));
            beyond += beyond(result.moved(), MOVED) + beyond(result.turned(), TURNED);
        }

        assertTrue(beyond <= 4, beyond + " of 78");
    }

    private static int beyond(List<RodResult.Component> components, Vector3 truth) {
        double[] three = {truth.x(), truth.y(), truth.z()};
        int beyond = 0;
        for (int k = 0; k < three.length; k++) {
            RodResult.Component component = components.get(k);
            beyond += Math.abs(component.value().orElseThrow() - three[k]) > 3 * component.error() ? 1 : 0;
        }
        return beyond;
    }

    @Test
    void takesTheWeightOfTheRodIntoAccount() {
        RodPress press = RodPress.of(WRONG).withMassKg(1.2);

        RodResult heavy = prove(press.capture(), rod(1.2));
        RodResult neglected = prove(press.capture(), rod(0));

        assertEquals(0, heavy.movedVector().minus(MOVED).norm(), EXACT, "m");
        assertTrue(neglected.corrected().angle()
                > 10 * Math.max(EXACT, heavy.corrected().angle()));
    }

    /** The corners of the plate as it is made, without the displacement of its description. */
    @Test
    void proposesTheCornersThatThePlateReallyHas() {
        RodResult result = prove(RodPress.of(WRONG).capture(), rod(0));

        Plate proposed = result.proposed();
        Vector3 centre = ProvedPlate.STATED_CENTRE.plus(MOVED);
        assertEquals(0, proposed.centre().minus(centre).norm(), EXACT, "m");
        RodResult again = RodTest.of(RodPress.of(WRONG).capture(), List.of(proposed), 1, LabAxis.PLUS_Z, rod(0));
        assertEquals(0, again.movedVector().norm(), EXACT, "m");
        assertEquals(0, again.turnedVector().norm(), EXACT, "rad");
    }

    /** An upright rod has no shear, so its load is the same at any height of the plate. */
    @Test
    void doesNotStateTheHeightThatAnUprightRodDoesNotShow() {
        RodPress press = RodPress.of(WRONG.withNoise(1)).withMarkerNoise(0.0005).withTilt(0);

        RodResult result =
                prove(press.capture(), new Rod(RodPress.MARKERS, OptionalDouble.of(RodPress.TIP), 0, Rod.MIDDLE));

        assertTrue(result.moved().get(2).value().isEmpty(), result.moved().toString());
        assertEquals(MOVED.x(), result.moved().get(0).value().orElseThrow(), PLACE, "m");
        assertEquals(MOVED.y(), result.moved().get(1).value().orElseThrow(), PLACE, "m");
    }

    @Test
    void refusesToFindTheTipOfARodThatIsNotTilted() {
        Capture capture = RodPress.of(WRONG.withNoise(1))
                .withMarkerNoise(0.0005)
                .withTilt(0)
                .capture();

        UnusableInputException refused = assertThrows(UnusableInputException.class, () -> prove(capture, rod(0)));

        assertEquals("rod-tip", refused.finding().code());
    }

    @Test
    void namesTheMarkerThatIsMissing() {
        Capture capture = RodPress.of(WRONG).capture();
        Rod rod = new Rod(List.of("ROD1", "ROD9"), OptionalDouble.empty(), 0, Rod.MIDDLE);

        UnusableInputException refused = assertThrows(UnusableInputException.class, () -> prove(capture, rod));

        assertEquals("label-missing", refused.finding().code());
        assertTrue(refused.finding().where().contains("ROD9"), refused.finding().where());
    }

    @Test
    void refusesAPlateThatTheCaptureDoesNotHave() {
        Capture capture = RodPress.of(WRONG).capture();

        UnusableInputException refused = assertThrows(
                UnusableInputException.class, () -> RodTest.of(capture, capture.plates(), 2, LabAxis.PLUS_Z, rod(0)));

        assertEquals("plate-number", refused.finding().code());
    }

    private static Rod rod(double massKg) {
        return new Rod(RodPress.MARKERS, OptionalDouble.empty(), massKg, RodPress.CENTRE);
    }

    private static RodResult prove(Capture capture, Rod rod) {
        return RodTest.of(capture, capture.plates(), 1, LabAxis.PLUS_Z, rod);
    }
}
