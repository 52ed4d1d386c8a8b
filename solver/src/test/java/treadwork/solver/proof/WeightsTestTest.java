package treadwork.solver.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.fixtures.rod.ProvedPlate;
import treadwork.fixtures.rod.WeightsCapture;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;

/** Masses at chosen places, on a plate of a chosen gain. */
class WeightsTestTest {

    private static final List<WeightsCapture.Mass> MASSES = List.of(
            new WeightsCapture.Mass(20, 0, 0),
            new WeightsCapture.Mass(10, 0.2, 0.1),
            new WeightsCapture.Mass(15, -0.2, -0.1));

    /** Rounding of sums over some thousand samples. */
    private static final double EXACT = 1e-9;

    /** 1 N of noise over 1300 samples is 0.03 N in the mean, 0.1 N·m of it 3e-3 N·m, at 98 N 0.03 mm; four times that. */
    private static final double NOISY_FORCE = 0.12;

    private static final double NOISY_PLACE = 0.00015;

    @ParameterizedTest
    @EnumSource(PlateType.class)
    void findsTheGain(PlateType type) {
        WeightsResult result = prove(capture(ProvedPlate.of(type), 1.013), atPlaces());

        assertEquals(1.013, result.gain(), EXACT);
        for (WeightsResult.Row row : result.masses()) {
            assertEquals(0.013, row.error(), EXACT);
            assertEquals(0, row.off().orElseThrow(), EXACT, "m");
            assertEquals(0, row.shear(), EXACT, "N");
        }
        assertFalse(result.isAccepted());
    }

    /** The marker shows where the mass is, the plate's description is 8 mm beside. */
    @Test
    void findsHowFarTheCentreOfPressureIsFromTheMarkerOnTop() {
        ProvedPlate plate = ProvedPlate.of(PlateType.FORCE_AND_MOMENT).withMoved(new Vector3(0.008, 0, 0));
        List<KnownMass> masses = MASSES.stream()
                .map(mass -> new KnownMass(mass.massKg(), Optional.of(new KnownMass.BelowMarker(WeightsCapture.TOP))))
                .toList();

        WeightsResult result = prove(capture(plate, 1), masses);

        for (WeightsResult.Row row : result.masses()) {
            assertEquals(0, row.offX().orElseThrow(), EXACT, "plate x is lab y, m");
            assertEquals(-0.008, row.offY().orElseThrow(), EXACT, "plate y is lab x, m");
        }
    }

    @Test
    void findsThemAtTheNoiseOfAGoodLaboratory() {
        WeightsResult result =
                prove(capture(ProvedPlate.of(PlateType.FORCE_AND_MOMENT).withNoise(1), 1), atPlaces());

        for (WeightsResult.Row row : result.masses()) {
            assertEquals(row.expected(), row.shown(), NOISY_FORCE, "N");
            assertEquals(0, row.off().orElseThrow(), NOISY_PLACE, "m");
        }
        assertTrue(result.isAccepted());
    }

    @Test
    void takesOneCaptureAMass() {
        List<Capture> captures = MASSES.stream()
                .map(mass ->
                        new WeightsCapture(ProvedPlate.of(PlateType.FOUR_SENSORS), List.of(mass), 0.98, 1).capture())
                .toList();

        WeightsResult result = WeightsTest.of(captures, 1, LabAxis.PLUS_Z, atPlaces());

        assertEquals(0.98, result.gain(), EXACT);
    }

    @Test
    void saysWhichLoadsItFoundWhenTheirNumberIsAnother() {
        UnusableInputException refused = assertThrows(
                UnusableInputException.class,
                () -> prove(
                        capture(ProvedPlate.of(PlateType.FORCE_AND_MOMENT), 1),
                        atPlaces().subList(0, 2)));

        assertEquals("weights-count", refused.finding().code());
        assertTrue(
                refused.finding().figure().contains("2 masses are stated, 3 loads"),
                refused.finding().figure());
        assertTrue(
                refused.finding().figure().contains("196.2 N"),
                refused.finding().figure());
    }

    private static List<KnownMass> atPlaces() {
        return MASSES.stream()
                .map(mass -> new KnownMass(mass.massKg(), Optional.of(new KnownMass.OnPlate(mass.x(), mass.y()))))
                .toList();
    }

    private static Capture capture(ProvedPlate plate, double gain) {
        return new WeightsCapture(plate, MASSES, gain, 1).capture();
    }

    private static WeightsResult prove(Capture capture, List<KnownMass> masses) {
        return WeightsTest.of(List.of(capture), 1, LabAxis.PLUS_Z, masses);
    }
}
