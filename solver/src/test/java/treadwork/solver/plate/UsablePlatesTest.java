package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.PlateZero;

/** Plates that cannot be used, or say nothing; as elsewhere they have their z down and hold the force on the foot. */
class UsablePlatesTest {

    /** Corners for which plate x is lab +Y, y is lab +X and z is lab -Z; the middle is at (0.8, 0.2, 0). */
    private static final List<Vector3> CORNERS =
            List.of(new Vector3(1.1, 0.4, 0), new Vector3(1.1, 0, 0), new Vector3(0.5, 0, 0), new Vector3(0.5, 0.4, 0));

    private static final List<Double> LOAD = List.of(40.0, -60.0, -700.0, 9000.0, -14000.0, 3000.0);

    private static final PointSeries FAR_AWAY = PlateCaptures.marker(new Vector3(3, 2, 1));

    private static final int LOADED = 300;

    /** Rounding: sums of values up to 2e4 N·mm. */
    private static final double ROUNDING = 1e-10;

    @Test
    void namesAPlateWhoseChannelsNeverChange() {
        Capture capture = PlateCaptures.following(List.of(plate(PlateType.FORCE_AND_MOMENT)), LOAD, i -> 0);

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(0, loads.plates().get(0).rawPush().at(LOADED));
        assertEquals(List.of("plate-dead"), codes(loads));
    }

    @Test
    void namesAPlateWhoseChannelsAreNotInTheFile() {
        Plate plate = new Plate(
                PlateType.FORCE_AND_MOMENT,
                CORNERS,
                Vector3.ZERO,
                List.of(0, 1, 2, 3, 4, 6),
                Optional.empty(),
                LengthUnit.MM);
        Capture capture = PlateCaptures.following(List.of(plate), LOAD, PlateCaptures::steppedOn);

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(List.of(), loads.plates());
        assertEquals(List.of("plate-dead"), codes(loads));
    }

    @Test
    void refusesCornersThatSpanNoFloor() {
        List<Vector3> standing = CORNERS.stream()
                .map(corner -> new Vector3(corner.x(), 0, corner.y()))
                .toList();
        List<Vector3> none = List.of(Vector3.ZERO, Vector3.ZERO, Vector3.ZERO, Vector3.ZERO);
        List<Vector3> bent = List.of(
                CORNERS.get(0), CORNERS.get(1), CORNERS.get(2), CORNERS.get(3).plus(new Vector3(0, 0, 0.2)));

        for (List<Vector3> corners : List.of(standing, none, bent)) {
            Plate plate = new Plate(
                    PlateType.FORCE_AND_MOMENT,
                    corners,
                    Vector3.ZERO,
                    PlateCaptures.channels(6),
                    Optional.empty(),
                    LengthUnit.MM);
            Capture capture = PlateCaptures.following(List.of(plate), LOAD, PlateCaptures::steppedOn);

            PlateLoads loads = resolve(capture, new PlateZero.Auto());

            assertEquals(List.of(), loads.plates());
            assertEquals(List.of("plate-corners"), codes(loads));
        }
    }

    /** 30 ms are no contact: what is seen then does not say which way the plate's channels point. */
    @Test
    void doesNotTurnAPlateForAKnock() {
        Capture capture = PlateCaptures.of(
                List.of(plate(PlateType.FORCE_AND_MOMENT)),
                others(PlateCaptures.series(i -> i >= 300 && i < 330 ? 200 : 0)),
                FAR_AWAY);

        PlateLoads loads = resolve(capture, new PlateZero.Auto());

        assertEquals(-200, loads.plates().get(0).rawPush().at(310), ROUNDING, "N");
        assertEquals(List.of(), codes(loads));
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
