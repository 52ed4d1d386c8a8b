package treadwork.solver.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import treadwork.model.body.MassProperties;
import treadwork.model.space.Inertia;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.FilterSettings;
import treadwork.solver.filter.Smoothing;

/**
 * The walking trial of the appendix of D. A. Winter, Biomechanics and Motor Control of Human Movement (4th ed., Wiley
 * 2009), Tables A.1 to A.7: one adult of 56.7 kg, right limb, sagittal plane, from raw markers to joint moments.
 *
 * <p>The book differentiates by two successive central differences, and so does this test; all else is the program's.
 */
class HandbookTrialTest {

    private static final double RATE = 69.95;

    private static final Vector3 GRAVITY = new Vector3(0, -9.81, 0);

    /** The ends of a filtered series depend on how it is extended; the trial was longer than what is printed. */
    private static final int FIRST_SOUND_FRAME = 15;

    private static final int LAST_SOUND_FRAME = 92;

    /** Where the plate is loaded. */
    private static final int STANCE_FROM = 28;

    private static final int STANCE_TO = 69;

    /** The centre of pressure is printed to 1 mm, so that 600 N are 0.3 N·m off; the rest is rounding of the tables. */
    private static final double MOMENT_TOLERANCE = 0.36;

    /** Forces are printed to 0.1 N; the raw coordinates, printed to 0.1 mm, give up to this much in swing. */
    private static final double FORCE_TOLERANCE = 0.34;

    /** In stance the same chain, written independently with scipy, is up to 0.10 N off the listed values, to two decimals. */
    private static final double FORCE_TOLERANCE_IN_STANCE = 0.105;

    /** Mass in kg and moment of inertia in kg·m² that the printed forces and moments imply (least squares over all frames). */
    private static final MassProperties FOOT = mass(0.794, 0.00286);

    private static final MassProperties LEG = mass(2.664, 0.0350);
    private static final MassProperties THIGH = mass(5.670, 0.0535);

    private static Map<String, double[]> raw;
    private static Map<String, double[]> listed;

    @BeforeAll
    static void readTables() throws IOException {
        Path folder = Path.of(System.getProperty("shared", "../shared"), "data", "handbook-walking");
        Assumptions.assumeTrue(Files.isDirectory(folder), "skipped: the handbook's trial is not at " + folder);
        raw = table(folder.resolve("a1-raw-markers-cm.csv"));
        listed = table(folder.resolve("a5-forces-moments.csv"));
    }

    @Test
    void reproducesTheListedForcesAndMomentsFromRawMarkers() {
        List<LoadSeries> loads = loads();

        assertListed("ankle", "foot", loads.get(0));
        assertListed("knee", "leg", loads.get(1));
        assertListed("hip", "thigh", loads.get(2));
    }

    private static void assertListed(String joint, String segment, LoadSeries load) {
        String column = joint + "_%s_on_" + segment + "_%s";
        for (int i = FIRST_SOUND_FRAME - 1; i < LAST_SOUND_FRAME; i++) {
            String where = joint + ", frame " + (i + 1);
            boolean stance = i + 1 >= STANCE_FROM && i + 1 <= STANCE_TO;
            double forceTolerance = stance ? FORCE_TOLERANCE_IN_STANCE : FORCE_TOLERANCE;
            assertEquals(at(column.formatted("rx", "N"), i), load.force().x(i), forceTolerance, where + ", N forward");
            assertEquals(at(column.formatted("ry", "N"), i), load.force().y(i), forceTolerance, where + ", N up");
            assertEquals(
                    at(column.formatted("moment", "Nm"), i), load.moment().z(i), MOMENT_TOLERANCE, where + ", N·m");
        }
    }

    private static double at(String column, int i) {
        return listed.get(column)[i];
    }

    private static List<LoadSeries> loads() {
        VectorSeries metatarsal = marker("metatarsal");
        VectorSeries ankle = marker("ankle");
        VectorSeries knee = marker("knee");
        VectorSeries hip = marker("hip");
        return LimbLoads.of(
                List.of(
                        segment(FOOT, metatarsal, ankle, 0.5),
                        segment(LEG, ankle, knee, 0.433),
                        segment(THIGH, knee, hip, 0.433)),
                List.of(ankle, knee, hip),
                ground(),
                GRAVITY);
    }

    private static VectorSeries marker(String name) {
        double[] x = raw.get(name + "_x_cm").clone();
        double[] y = raw.get(name + "_y_cm").clone();
        for (int i = 0; i < x.length; i++) {
            x[i] /= 100;
            y[i] /= 100;
        }
        FilterSettings filter = new FilterSettings(FilterSettings.Kind.BUTTERWORTH, 5.0, 4);
        return Smoothing.smooth(VectorSeries.of(x, y, new double[x.length]), filter, RATE)
                .series();
    }

    /** A planar segment whose centre of mass lies on the line between its ends, {@code share} of it from the upper one. */
    private static MovingSegment segment(
            MassProperties mass, VectorSeries distal, VectorSeries proximal, double share) {
        int frames = distal.size();
        VectorSeries.Builder centre = new VectorSeries.Builder(frames);
        PoseSeries.Builder pose = new PoseSeries.Builder(frames);
        double[] angle = new double[frames];
        for (int i = 0; i < frames; i++) {
            Vector3 line = distal.at(i).minus(proximal.at(i));
            centre.set(i, proximal.at(i).plus(line.times(share)));
            angle[i] = Math.atan2(-line.y(), -line.x());
            pose.set(i, proximal.at(i), Rotation.about(new Vector3(0, 0, 1), angle[i]));
        }
        VectorSeries centres = centre.build();
        double[] omega = centralDifference(angle);
        return new MovingSegment(
                mass,
                pose.build(),
                aboutZ(omega),
                aboutZ(centralDifference(omega)),
                centres,
                centres.eachComponent(values -> centralDifference(centralDifference(values))));
    }

    private static WrenchSeries ground() {
        double[] fx = listed.get("ground_rx_N");
        double[] fy = listed.get("ground_ry_N");
        double[] cop = listed.get("cop_x_m");
        double[] moment = new double[fx.length];
        for (int i = 0; i < fx.length; i++) {
            moment[i] = cop[i] * fy[i];
        }
        return new WrenchSeries(Vector3.ZERO, VectorSeries.of(fx, fy, new double[fx.length]), aboutZ(moment));
    }

    private static double[] centralDifference(double[] values) {
        double[] result = new double[values.length];
        for (int i = 1; i < values.length - 1; i++) {
            result[i] = (values[i + 1] - values[i - 1]) * RATE / 2;
        }
        return result;
    }

    private static VectorSeries aboutZ(double[] values) {
        return VectorSeries.of(new double[values.length], new double[values.length], values);
    }

    private static MassProperties mass(double kilograms, double inertia) {
        return new MassProperties(kilograms, Vector3.ZERO, Inertia.diagonal(0, 0, inertia));
    }

    private static Map<String, double[]> table(Path file) throws IOException {
        List<String> lines = Files.readAllLines(file);
        String[] names = lines.get(0).split(",", -1);
        Map<String, double[]> columns = new HashMap<>();
        for (int c = 0; c < names.length; c++) {
            double[] values = new double[lines.size() - 1];
            for (int r = 0; r < values.length; r++) {
                values[r] = Double.parseDouble(lines.get(r + 1).split(",", -1)[c]);
            }
            columns.put(names[c], values);
        }
        return columns;
    }
}
