package treadwork.io.result;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.StringWriter;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.load.JointLoads;
import treadwork.model.load.TrialResult;
import treadwork.model.space.ScalarSeries;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.Normalisation;
import treadwork.model.study.ResultSettings;

/** Names of columns are those of results.md; values are by construction of {@link Results}. */
class LoadsCsvTest {

    private static final ResultSettings PLAIN = ResultSettings.DEFAULT;

    @Test
    void columnsOfAJointAreAnglesMomentsForcesAndPower() {
        assertEquals(
                List.of(
                        "frame",
                        "time_s",
                        "right_ankle_dorsiflexion_angle_deg",
                        "right_ankle_inversion_angle_deg",
                        "right_ankle_internal_rotation_angle_deg",
                        "right_ankle_dorsiflexion_moment_Nm",
                        "right_ankle_inversion_moment_Nm",
                        "right_ankle_internal_rotation_moment_Nm",
                        "right_ankle_force_x_N",
                        "right_ankle_force_y_N",
                        "right_ankle_force_z_N",
                        "right_ankle_power_W",
                        "right_support"),
                LoadsCsv.columns(Results.rightAnkle(1), PLAIN));
    }

    @Test
    void columnsGoRightBeforeLeftAndFromTheAnkleUp() {
        List<String> joints = LoadsCsv.columns(Results.bothLimbs(1), PLAIN).stream()
                .filter(name -> name.endsWith("_power_W") || name.endsWith("_support"))
                .toList();

        assertEquals(
                List.of(
                        "right_ankle_power_W",
                        "right_knee_power_W",
                        "right_hip_power_W",
                        "right_support",
                        "left_ankle_power_W",
                        "left_knee_power_W",
                        "left_hip_power_W",
                        "left_support"),
                joints);
    }

    @ParameterizedTest
    @EnumSource(names = {"PROXIMAL", "DISTAL", "LAB"})
    void inOtherAxesMomentsAreNamedByAxis(MomentAxes axes) {
        List<String> columns = LoadsCsv.columns(Results.rightAnkle(1), Results.settings(axes, Normalisation.NONE));

        assertEquals(
                List.of("right_ankle_moment_x_Nm", "right_ankle_moment_y_Nm", "right_ankle_moment_z_Nm"),
                columns.subList(5, 8));
        assertEquals("right_ankle_dorsiflexion_angle_deg", columns.get(2));
    }

    @ParameterizedTest
    @CsvSource({
        "NONE, Nm, N, W",
        "MASS, Nm_per_kg, N_per_kg, W_per_kg",
        "MASS_HEIGHT, Nm_per_kg_m, N_per_kg_m, W_per_kg_m",
        "WEIGHT_HEIGHT_PERCENT, percent_BWHt, percent_BW, W_per_kg",
    })
    void unitsFollowTheNormalisation(Normalisation by, String moment, String force, String power) {
        List<String> named = LoadsCsv.columns(Results.rightAnkle(1), Results.settings(MomentAxes.JOINT, by));
        List<String> byAxis = LoadsCsv.columns(Results.rightAnkle(1), Results.settings(MomentAxes.LAB, by));

        assertEquals("right_ankle_inversion_moment_" + moment, named.get(6));
        assertEquals("right_ankle_moment_y_" + moment, byAxis.get(6));
        assertEquals("right_ankle_force_z_" + force, named.get(10));
        assertEquals("right_ankle_power_" + power, named.get(11));
    }

    @Test
    void everyValueStandsUnderItsName() throws IOException {
        List<List<String>> rows = rows(Results.bothLimbs(2));

        List<String> header = rows.get(0);
        for (Side side : Side.values()) {
            for (JointKind kind : JointKind.values()) {
                Joint joint = new Joint(side, kind);
                for (int axis = 0; axis < 3; axis++) {
                    String direction = joint.key() + "_" + kind.directions().get(axis);
                    assertCell(
                            rows,
                            header.indexOf(direction + "_angle_deg"),
                            Math.toDegrees(Results.value(joint, 0, axis, 1)));
                    assertCell(rows, header.indexOf(direction + "_moment_Nm"), Results.value(joint, 1, axis, 1));
                    assertCell(
                            rows,
                            header.indexOf(joint.key() + "_force_" + "xyz".charAt(axis) + "_N"),
                            Results.value(joint, 2, axis, 1));
                }
                assertCell(rows, header.indexOf(joint.key() + "_power_W"), Results.value(joint, 3, 0, 1));
            }
        }
        assertEquals("plate", rows.get(2).get(header.indexOf("right_support")));
        assertEquals("unmeasured", rows.get(2).get(header.indexOf("left_support")));
    }

    @Test
    void framesAreTheFilesOwnAndTimeStartsAtTheFirst() throws IOException {
        List<List<String>> rows = rows(Results.bothLimbs(4));

        assertEquals(List.of("101", "0"), rows.get(1).subList(0, 2));
        assertEquals(List.of("104", "0.015"), rows.get(4).subList(0, 2));
    }

    @Test
    void whatIsNotKnownIsAnEmptyCell() throws IOException {
        List<List<String>> rows = rows(Results.bothLimbs(3));

        List<String> gap = rows.get(3);
        int left = rows.get(0).indexOf("left_ankle_dorsiflexion_angle_deg");
        assertEquals(
                List.of(""), gap.subList(left, left + 30).stream().distinct().toList());
        assertEquals("unmeasured", gap.get(left + 30));
        assertTrue(gap.subList(0, left).stream().noneMatch(String::isEmpty));
    }

    @Test
    void everyRowHasEveryColumnAndEndsInCrLf() throws IOException {
        String text = text(Results.bothLimbs(50));

        String[] lines = text.split("\r\n", -1);
        assertEquals(52, lines.length);
        assertEquals("", lines[51]);
        for (int i = 0; i < 51; i++) {
            assertEquals(64, lines[i].split(",", -1).length, "row " + i);
        }
        assertTrue(text.replace("\r\n", "").chars().noneMatch(c -> c == '\r' || c == '\n' || c == '"'));
    }

    /** Rows longer than what is held at once, so that the pieces that are handed on must join without seam. */
    @Test
    void aLongTableReadsBack() throws IOException {
        int frames = 700;
        Random random = new Random(3);
        double[] powers = random.doubles(frames, -500, 500).toArray();
        TrialResult plain = Results.rightAnkle(frames);
        TrialResult result = new TrialResult(
                plain.firstFrame(),
                frames,
                plain.pointRate(),
                plain.up(),
                List.of(new JointLoads(
                        plain.joints().get(0).joint(),
                        plain.joints().get(0).angles(),
                        plain.joints().get(0).moment(),
                        plain.joints().get(0).force(),
                        ScalarSeries.of(powers))),
                plain.support(),
                List.of(),
                List.of(),
                List.of());

        List<List<String>> rows = rows(result);

        double[] read = rows.subList(1, frames + 1).stream()
                .mapToDouble(row -> Double.parseDouble(row.get(11)))
                .toArray();
        for (int i = 0; i < frames; i++) {
            assertEquals(powers[i], read[i], 1e-9 * Math.abs(powers[i]), "frame " + i + ", seed 3");
        }
    }

    private static void assertCell(List<List<String>> rows, int column, double expected) {
        double read = Double.parseDouble(rows.get(2).get(column));
        assertEquals(expected, read, 1e-9 * Math.abs(expected), rows.get(0).get(column));
    }

    private static List<List<String>> rows(TrialResult result) throws IOException {
        return Arrays.stream(text(result).split("\r\n"))
                .map(line -> List.of(line.split(",", -1)))
                .toList();
    }

    private static String text(TrialResult result) throws IOException {
        StringWriter writer = new StringWriter();
        LoadsCsv.write(result, PLAIN, writer);
        return writer.toString();
    }
}
