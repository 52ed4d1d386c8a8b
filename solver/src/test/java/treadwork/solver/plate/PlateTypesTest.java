package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.apache.commons.math3.linear.RealMatrix;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.model.space.Wrench;
import treadwork.model.study.LabAxis;

/**
 * From the channels of each plate type to the reaction on the foot.
 *
 * <p>The fixed load is (30, -50, 700) N on the plate, plate axes with z down, 60 and -35 mm from the middle of the surface,
 * with a free moment of 4000 N·mm; its channels follow by statics (moments about the sensor origin by cross product).
 * On corners (1100,400,0) (1100,0,0) (500,0,0) (500,400,0) mm plate x is lab +Y, y is lab +X and z is lab -Z.
 */
class PlateTypesTest {

    private static final List<Vector3> CORNERS =
            List.of(new Vector3(1.1, 0.4, 0), new Vector3(1.1, 0, 0), new Vector3(0.5, 0, 0), new Vector3(0.5, 0.4, 0));

    private static final Vector3 ORIGIN = new Vector3(-0.0015, 0.0020, -0.0400);

    /** Rounding only: sums of values up to 5e4 N·mm, each good to 1e-16 of that, over 300 N at least. */
    private static final double ROUNDING = 1e-11;

    private static final int LOADED = 300;

    @Test
    void readsForcesAndMoments() {
        Plate plate = plate(PlateType.FORCE_AND_MOMENT, ORIGIN, Optional.empty());

        assertFixedLoad(plate, List.of(30.0, -50.0, 700.0, -25100.0, -42150.0, 2065.0));
    }

    @Test
    void readsForcesWithTheirCentreOfPressure() {
        Plate plate = plate(PlateType.FORCE_AND_CENTRE_OF_PRESSURE, new Vector3(0, 0, -0.04), Optional.empty());

        assertFixedLoad(plate, List.of(30.0, -50.0, 700.0, 60.0, -35.0, 4000.0));
    }

    @Test
    void readsFourSensors() {
        Plate plate = plate(PlateType.FOUR_SENSORS, new Vector3(0.12, 0.2, -0.045), Optional.empty());

        assertFixedLoad(plate, List.of(20.0, 10.0, -8.125, -41.875, 231.875, 51.25, 118.125, 298.75));
    }

    /** The calibration is far from symmetric, so that rows taken for columns fail; V = C⁻¹ W by Commons Math. */
    @Test
    void readsVoltagesThroughTheCalibrationMatrix() {
        RealMatrix calibration = SyntheticPlate.calibration(new Random(4));
        Plate plate = plate(PlateType.CALIBRATED, ORIGIN, Optional.of(SyntheticPlate.asRows(calibration)));

        assertFixedLoad(plate, SyntheticPlate.volts(calibration, 30, -50, 700, -25100, -42150, 2065));
    }

    private static void assertFixedLoad(Plate plate, List<Double> channels) {
        Capture capture = PlateCaptures.following(List.of(plate), channels, PlateCaptures::steppedOn);

        PlateLoads loads = PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Z, PlateCaptures.UNFILTERED);

        PlateLoad load = loads.plates().get(0);
        Vector3 force = load.raw().at(LOADED).force();
        CentreOfPressure cop = load.centreOfPressure(LOADED, 20).orElseThrow();
        assertEquals(0, force.minus(new Vector3(50, -30, 700)).norm(), ROUNDING, "force on the foot, N");
        assertEquals(0, cop.point().minus(new Vector3(0.765, 0.260, 0)).norm(), ROUNDING, "centre of pressure, m");
        assertEquals(4.0, cop.freeMoment(), ROUNDING, "free moment on the foot about lab +Z, N·m");
        assertEquals(List.of("plate-sign"), codes(loads), "the channels hold the force on the plate");
    }

    /** By construction, over random loads, plates and labs: channels are made from a chosen reaction and must give it back. */
    @ParameterizedTest
    @EnumSource(PlateType.class)
    void givesBackTheReactionThatItsChannelsWereMadeFrom(PlateType type) {
        long seed = 20261201L + type.code();
        Random random = new Random(seed);
        for (int run = 0; run < 200; run++) {
            SyntheticPlate made = SyntheticPlate.random(type, random);
            Capture capture = made.capture();

            PlateLoads loads = PlateLoads.resolve(capture, capture.plates(), made.up(), PlateCaptures.UNFILTERED);

            Wrench found = loads.plates().get(0).raw().at(LOADED);
            Wrench expected = made.reaction().about(found.point());
            String which = "seed " + seed + ", run " + run;
            assertEquals(0, found.force().minus(expected.force()).norm(), ROUNDING * 10, which + ", force, N");
            assertEquals(0, found.moment().minus(expected.moment()).norm(), ROUNDING * 10, which + ", moment, N·m");
            assertEquals(made.expectedCodes(), codes(loads), which);
        }
    }

    @Test
    void leavesTheMomentBlankWhereFourSensorsHaveNoDistances() {
        Plate plate = plate(PlateType.FOUR_SENSORS, Vector3.ZERO, Optional.empty());
        List<Double> channels = List.of(-20.0, -10.0, 8.0, 42.0, -232.0, -51.0, -118.0, -299.0);
        Capture capture = PlateCaptures.following(List.of(plate), channels, PlateCaptures::steppedOn);

        PlateLoads loads = PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Z, PlateCaptures.UNFILTERED);

        PlateLoad load = loads.plates().get(0);
        assertEquals(700, load.rawPush().at(LOADED), ROUNDING, "the force is known, N");
        assertTrue(load.raw().moment().isGap(LOADED), "the moment is not");
        assertEquals(List.of("plate-origin"), codes(loads));
        assertEquals(Severity.REFUSES, loads.findings().get(0).severity());
    }

    private static List<String> codes(PlateLoads loads) {
        return loads.findings().stream().map(Finding::code).toList();
    }

    private static Plate plate(PlateType type, Vector3 origin, Optional<CalibrationMatrix> calibration) {
        return new Plate(type, CORNERS, origin, PlateCaptures.channels(type.channels()), calibration, LengthUnit.MM);
    }
}
