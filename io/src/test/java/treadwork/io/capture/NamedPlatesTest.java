package treadwork.io.capture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.fixtures.sample.SmallCapture;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dWriter;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabSettings;
import treadwork.model.study.NamedPlate;
import treadwork.model.study.TextSettings;

/** Expected numbers are those of the text beside them, turned by hand. */
class NamedPlatesTest {

    private static final List<String> LAB = List.of("Fx", "Fy", "Fz", "Px", "Py", "Pz", "T");

    /** Lab y is up; the plate's middle is (1, 0, 2) m, its x is lab x. */
    private static final List<Vector3> Z_UP =
            List.of(corner(1.3, 1.8), corner(0.7, 1.8), corner(0.7, 2.2), corner(1.3, 2.2));

    /** Of the same surface; its x is lab z, and its own z points up too. */
    private static final List<Vector3> TURNED =
            List.of(corner(1.3, 2.2), corner(1.3, 1.8), corner(0.7, 1.8), corner(0.7, 2.2));

    /** Of the same surface; its x is lab x, and its own z points down. */
    private static final List<Vector3> Z_DOWN =
            List.of(corner(1.3, 2.2), corner(0.7, 2.2), corner(0.7, 1.8), corner(1.3, 1.8));

    @TempDir
    Path folder;

    @Test
    void aPlateInLabAxesBecomesOneOfTypeOne() throws IOException {
        Capture capture = read("10,700,-30,1100,0,1950,400", plate(true, Z_UP, LAB));

        assertMade(capture, 10, 30, 700, 100, 50, 400);
    }

    @Test
    void aTurnedPlateTurnsForceAndPlace() throws IOException {
        Capture capture = read("10,700,-30,1100,0,1950,400", plate(true, TURNED, LAB));

        assertMade(capture, -30, 10, 700, -50, 100, 400);
    }

    @Test
    void aPlateThatLooksDownTurnsTheFreeMomentToo() throws IOException {
        Capture capture = read("10,700,-30,1100,0,1950,400", plate(true, Z_DOWN, LAB));

        assertMade(capture, 10, -30, -700, 100, -50, -400);
    }

    /** 70 mm above the surface, force 10 : 700 : -30, so 1 mm back along x and 3 mm forth along lab z. */
    @Test
    void aCentreOfPressureOffTheSurfaceSlidesAlongTheForce() throws IOException {
        Capture capture = read("10,700,-30,1100,70,1950,400", plate(true, Z_UP, LAB));

        assertMade(capture, 10, 30, 700, 99, 47, 400);
    }

    @Test
    void namedChannelsCountWhereTheyStand() throws IOException {
        Capture capture = read("1,2,3,4,5,6,7", plate(false, Z_UP, List.of("T", "Fx", "Fz", "Px", "Py", "Pz")));

        assertEquals(List.of(6, 0, 2, 3, 4, 5), capture.plates().get(0).channels());
        assertEquals(7, capture.analog().size());
    }

    @Test
    void anUnknownChannelIsRefusedWithTheNearestName() {
        List<String> names = List.of("Fx", "Fy", "Fz", "Px", "Py", "Pq");

        Finding refused = refusal(() -> read("1,2,3,4,5,6,7", plate(false, Z_UP, names)));

        assertEquals("plate-channel-unknown", refused.code());
        assertTrue(refused.line().contains("\"Pq\""), refused.line());
    }

    @Test
    void aPlateFileBesideAC3dCaptureIsRefused() throws IOException {
        Path c3d = folder.resolve("walk.c3d");
        C3dWriter.write(SmallCapture.withOnePlate(), C3dEncoding.DEFAULT, c3d);

        Finding refused = refusal(
                () -> CaptureFiles.movement(c3d, Optional.of(folder.resolve("forces.txt")), LabSettings.DEFAULT));

        assertEquals("plate-file-unused", refused.code());
        assertTrue(refused.line().contains("forces.txt"), refused.line());
    }

    @Test
    void aStandingTextNeedsNoChannels() throws IOException {
        Path file = Files.writeString(folder.resolve("s.csv"), "time,A_x,A_y,A_z\n0,1500,2,3\n0.01,1500,2,3\n");

        Capture capture = CaptureFiles.standing(file, lab(plate(true, Z_UP, LAB)));

        assertEquals(1, capture.points().size());
    }

    private static void assertMade(Capture capture, double... expected) {
        List<Integer> channels = capture.plates().get(0).channels();
        for (int j = 0; j < expected.length; j++) {
            // millimetres from corners in metres: rounding alone
            assertEquals(
                    expected[j], capture.analog().get(channels.get(j)).values().at(1), 1e-9, "channel " + (j + 1));
        }
    }

    private Capture read(String plateCells, NamedPlate plate) throws IOException {
        String row = ",1500,2,3," + plateCells + "\n";
        Path file = Files.writeString(
                folder.resolve("walk.csv"), "time,A_x,A_y,A_z,Fx,Fy,Fz,Px,Py,Pz,T\n0" + row + "0.01" + row);
        return CaptureFiles.movement(file, Optional.empty(), lab(plate));
    }

    private static LabSettings lab(NamedPlate plate) {
        return new LabSettings(
                Optional.empty(), Optional.empty(), Optional.empty(), TextSettings.DEFAULT, List.of(plate));
    }

    private static NamedPlate plate(boolean labAxes, List<Vector3> corners, List<String> channels) {
        return new NamedPlate(
                PlateType.FORCE_AND_CENTRE_OF_PRESSURE,
                labAxes,
                corners,
                Vector3.ZERO,
                channels,
                Optional.empty(),
                LengthUnit.MM);
    }

    private static Vector3 corner(double x, double z) {
        return new Vector3(x, 0, z);
    }

    private static Finding refusal(org.junit.jupiter.api.function.Executable reading) {
        return assertThrows(UnusableInputException.class, reading).finding();
    }
}
