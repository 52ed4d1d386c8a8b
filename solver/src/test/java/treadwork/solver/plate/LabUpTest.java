package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;

class LabUpTest {

    /** In every lab, the plate's z pointing into the ground or out of it, and a little out of level. */
    @ParameterizedTest
    @EnumSource(LabAxis.class)
    void isTheNormalOnTheSideOfTheMarkers(LabAxis axis) {
        for (int turn : new int[] {1, -1}) {
            Plate plate = plate(axis.direction(), turn);
            Capture capture = capture(List.of(plate), axis.direction());

            LabUp up = LabUp.find(capture, capture.plates(), Optional.empty());

            assertEquals(Optional.of(axis), up.axis());
            assertEquals(List.of(), up.findings());
        }
    }

    @Test
    void isNotKnownWithoutPlates() {
        Capture capture = capture(List.of(), new Vector3(0, 0, 1));

        LabUp up = LabUp.find(capture, List.of(), Optional.empty());

        assertEquals(Optional.empty(), up.axis());
        assertEquals(List.of("lab-up-unknown"), codes(up));
        assertEquals(Severity.REFUSES, up.findings().get(0).severity());
    }

    @Test
    void isNotKnownWhenNoMarkerIsSeen() {
        Plate plate = plate(new Vector3(0, 0, 1), 1);
        Capture capture = PlateCaptures.of(List.of(plate), List.of(), PlateCaptures.marker(Vector3.GAP));

        LabUp up = LabUp.find(capture, capture.plates(), Optional.empty());

        assertEquals(Optional.empty(), up.axis());
    }

    @Test
    void followsThePersonWithoutPlates() {
        Capture capture = capture(List.of(), new Vector3(0, 0, 1));

        LabUp up = LabUp.find(capture, List.of(), Optional.of(LabAxis.MINUS_Y));

        assertEquals(Optional.of(LabAxis.MINUS_Y), up.axis());
        assertEquals(List.of(), up.findings());
    }

    @Test
    void followsThePersonAgainstThePlatesAndSaysSo() {
        Vector3 z = new Vector3(0, 0, 1);
        Capture capture = capture(List.of(plate(z, 1)), z);

        LabUp up = LabUp.find(capture, capture.plates(), Optional.of(LabAxis.PLUS_Y));

        assertEquals(Optional.of(LabAxis.PLUS_Y), up.axis());
        assertEquals(List.of("lab-up"), codes(up));
    }

    @Test
    void followsMostPlatesAndSaysThatTheyDisagree() {
        Vector3 z = new Vector3(0, 0, 1);
        Plate wall = plate(new Vector3(1, 0, 0), 1);
        List<Plate> plates = List.of(plate(z, 1), wall, plate(z, -1));
        Capture capture = capture(plates, z);

        LabUp up = LabUp.find(capture, plates, Optional.empty());

        assertEquals(Optional.of(LabAxis.PLUS_Z), up.axis());
        assertEquals(List.of("lab-up"), codes(up));
    }

    /** Corners round a middle at (0.4, 0.5, 0.6) m, 3° out of level, plate z along {@code turn} times up. */
    private static Plate plate(Vector3 up, int turn) {
        Vector3 tilted =
                up.plus(new Vector3(up.y(), up.z(), up.x()).times(0.05)).unit();
        Vector3 x = tilted.cross(new Vector3(up.z(), up.x(), up.y())).unit();
        Vector3 y = tilted.cross(x).times(turn);
        Vector3 middle = new Vector3(0.4, 0.5, 0.6);
        List<Vector3> corners = List.of(
                middle.plus(x.times(0.3)).plus(y.times(0.2)),
                middle.plus(x.times(-0.3)).plus(y.times(0.2)),
                middle.plus(x.times(-0.3)).plus(y.times(-0.2)),
                middle.plus(x.times(0.3)).plus(y.times(-0.2)));
        return new Plate(
                PlateType.FORCE_AND_MOMENT,
                corners,
                Vector3.ZERO,
                PlateCaptures.channels(6),
                Optional.empty(),
                LengthUnit.MM);
    }

    /** Three markers above the plate's middle, and one slip below. */
    private static Capture capture(List<Plate> plates, Vector3 up) {
        Vector3 middle = new Vector3(0.4, 0.5, 0.6);
        return PlateCaptures.of(
                plates,
                List.of(),
                PlateCaptures.marker(middle.plus(up.times(0.1))),
                PlateCaptures.marker(middle.plus(up.times(0.9))),
                PlateCaptures.marker(middle.plus(up.times(0.5))),
                PlateCaptures.marker(middle.plus(up.times(-0.02))));
    }

    private static List<String> codes(LabUp up) {
        return up.findings().stream().map(Finding::code).toList();
    }
}
