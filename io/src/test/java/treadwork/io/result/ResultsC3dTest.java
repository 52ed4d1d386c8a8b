package treadwork.io.result;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.ReadOptions;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** Frames 99 to 106 were recorded, 101 to 104 computed; every number of {@link Results} is another one. */
class ResultsC3dTest {

    private static final Joint KNEE = new Joint(Side.RIGHT, JointKind.KNEE);
    private static final Joint LEFT_HIP = new Joint(Side.LEFT, JointKind.HIP);
    private static final int FIRST = 99;
    private static final int FRAMES = 8;

    /** Of a 32-bit real: 2^-24 of numbers below 8000. */
    private static final double REAL = 8000 * Math.pow(2, -24);

    @TempDir
    Path folder;

    private Path file;

    @BeforeEach
    void writeResults() throws IOException {
        file = folder.resolve("results.c3d");
        write(capture(List.of(marker("RKNE"), marker("right_knee_power"))));
    }

    private void write(Capture movement) throws IOException {
        VectorSeries centre = VectorSeries.constant(new Vector3(0.25, -0.5, 1.5), FRAMES);
        ResultCapture source = new ResultCapture(movement, Map.of(KNEE, centre));
        ResultsC3d.write(source, Results.bothLimbs(4), Results.record(), file);
    }

    @Test
    void readAgainOnlyMarkersAreThereAndTheFileSaysThatItHoldsMore() {
        Capture read = C3dReader.read(file, Optional.empty());

        assertEquals(
                List.of("RKNE", "right_knee_power"),
                read.points().stream().map(PointSeries::label).toList());
        // 6 joints × (angle, moment, force, power), one joint centre, three of one plate contact.
        Finding finding = read.findings().get(0);
        assertEquals("points-computed", finding.code());
        assertEquals("28 points are results of an earlier computation", finding.figure());
        assertEquals(0.5, read.points().get(0).positions().y(3), 0);
    }

    @Test
    void quantitiesStandAtTheirFramesUnderThePlainNamesOfTheOtherFiles() throws IOException {
        Capture seen = asOthersSeeIt();

        for (int i = 0; i < 4; i++) {
            assertEquals(
                    Results.value(KNEE, 1, 2, i),
                    stored(seen, "right_knee_moment", i + 2).z(),
                    REAL);
            assertEquals(
                    Results.value(KNEE, 2, 1, i),
                    stored(seen, "right_knee_force", i + 2).y(),
                    REAL);
            double power = stored(seen, "right_knee_power_computed", i + 2).x();
            assertEquals(Results.value(KNEE, 3, 0, i), power, REAL);
            double degrees = Math.toDegrees(Results.value(KNEE, 0, 0, i));
            assertEquals(degrees, stored(seen, "right_knee_angle", i + 2).x(), degrees * Math.pow(2, -24));
        }
        assertEquals(700, stored(seen, "plate_2_left_force", 4).z(), REAL);
        assertEquals(-0.25, stored(seen, "plate_2_left_free_moment", 4).x(), REAL);
    }

    @Test
    void placesAreInTheUnitOfTheFile() throws IOException {
        Capture seen = asOthersSeeIt();

        assertEquals(new Vector3(250, -500, 1500), rounded(stored(seen, "right_knee_centre", 0)));
        assertEquals(new Vector3(100, 200, 0), rounded(stored(seen, "plate_2_left_centre_of_pressure", 4)));
    }

    @Test
    void whatIsNotKnownIsAGap() throws IOException {
        Capture seen = asOthersSeeIt();

        assertTrue(point(seen, "right_knee_moment").positions().isGap(1), "before the computed frames");
        assertTrue(point(seen, "right_knee_moment").positions().isGap(6), "behind the computed frames");
        assertTrue(point(seen, LEFT_HIP.key() + "_moment").positions().isGap(4), "a gap of the result");
        assertTrue(point(seen, "plate_2_left_force").positions().isGap(3), "before the contact");
        assertTrue(point(seen, "plate_2_left_centre_of_pressure").positions().isGap(5), "no centre of pressure");
    }

    @Test
    void everyNumberSaysWhatItIs() throws IOException {
        Capture seen = asOthersSeeIt();

        assertEquals(
                "internal moment, flexion, adduction, internal_rotation, joint axes; Nm",
                point(seen, "right_knee_moment").description());
        assertEquals(
                "joint centre, lab axes; mm", point(seen, "right_knee_centre").description());
        for (PointSeries point : seen.points()) {
            assertTrue(point.label().length() <= 127 && point.description().length() <= 127, point.label());
        }
        String bytes = Files.readString(file, StandardCharsets.ISO_8859_1);
        assertTrue(bytes.contains("processing.markerFilter.cutoffHz = 6"), "settings are in the file");
        assertTrue(bytes.contains("convention.momentConvention = internal"), "conventions are in the file");
        assertTrue(bytes.contains("key = " + Results.record().key()), "the key of the inputs is in the file");
    }

    @Test
    void moreThanTheFormatHoldsIsRefusedInOneLine() {
        List<PointSeries> markers =
                new ArrayList<>(Collections.nCopies(1000, marker("A".repeat(120) + " name longer than any is")));

        UnusableInputException refusal = assertThrows(UnusableInputException.class, () -> write(capture(markers)));

        assertEquals("results-c3d", refusal.finding().code());
    }

    /** Read as by a program that does not know the group in which computed points are listed. */
    private Capture asOthersSeeIt() throws IOException {
        String known = Files.readString(file, StandardCharsets.ISO_8859_1);
        byte[] bytes = known.replace("TREADWORK", "STRANGERS").getBytes(StandardCharsets.ISO_8859_1);
        return C3dReader.read("results.c3d", bytes, ReadOptions.DEFAULT);
    }

    private static PointSeries point(Capture capture, String label) {
        return capture.points().stream()
                .filter(each -> each.label().equals(label))
                .findFirst()
                .orElseThrow();
    }

    /** The three numbers as the file holds them: it is in mm, so a reader makes thousandths of them. */
    private static Vector3 stored(Capture capture, String label, int frame) {
        return point(capture, label).positions().at(frame).times(1000);
    }

    private static Vector3 rounded(Vector3 value) {
        return new Vector3(Math.rint(value.x()), Math.rint(value.y()), Math.rint(value.z()));
    }

    private static PointSeries marker(String label) {
        return new PointSeries(label, "", VectorSeries.constant(new Vector3(1, 0.5, 0.25), FRAMES));
    }

    private static Capture capture(List<PointSeries> markers) {
        return new Capture(
                "walk-01.c3d",
                FIRST,
                FRAMES,
                Results.RATE,
                markers,
                0,
                List.of(),
                List.of(),
                Optional.empty(),
                List.of(),
                LengthUnit.MM,
                "",
                List.of());
    }
}
