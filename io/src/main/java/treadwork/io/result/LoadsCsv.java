package treadwork.io.result;

import java.io.IOException;
import java.io.Writer;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.load.JointLoads;
import treadwork.model.load.Support;
import treadwork.model.load.TrialResult;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.ResultSettings;

/**
 * {@code loads.csv}: a row a frame; for each solved side and joint, from the ankle up, angles, moments, forces and
 * power, then what the foot stands on.
 */
public final class LoadsCsv {

    private static final double DEGREES = 180 / Math.PI;
    private static final List<String> XYZ = List.of("x", "y", "z");

    private LoadsCsv() {}

    /** A side with what was solved of it. */
    private record Limb(Side side, List<JointLoads> joints, List<Support> support) {}

    /**
     * Writes the table; values that are not known are empty cells. The writer is flushed, not closed.
     *
     * @param result   in the convention and normalisation that {@code settings} name
     */
    public static void write(TrialResult result, ResultSettings settings, Writer writer) throws IOException {
        List<Limb> limbs = limbs(result);
        CsvText csv = new CsvText(writer);
        csv.header(columns(limbs, settings));
        for (int i = 0; i < result.frames(); i++) {
            csv.cell(result.firstFrame() + i);
            csv.cell(result.timeOf(i));
            for (Limb limb : limbs) {
                row(limb, i, csv);
            }
            csv.endRow();
        }
        csv.end();
    }

    /** The names of the columns, in their order. */
    public static List<String> columns(TrialResult result, ResultSettings settings) {
        return columns(limbs(result), settings);
    }

    private static List<String> columns(List<Limb> limbs, ResultSettings settings) {
        List<String> names = new ArrayList<>(List.of("frame", "time_s"));
        for (Limb limb : limbs) {
            limb.joints.forEach(loads -> columns(names, loads, settings));
            names.add(limb.side.key() + "_support");
        }
        return names;
    }

    private static void columns(List<String> names, JointLoads loads, ResultSettings settings) {
        LoadUnits units = LoadUnits.of(settings.normalise());
        String joint = loads.joint().key();
        List<String> directions = loads.joint().kind().directions();
        directions.forEach(direction -> names.add(joint + "_" + direction + "_angle_deg"));
        if (settings.momentAxes() == MomentAxes.JOINT) {
            directions.forEach(direction -> names.add(joint + "_" + direction + "_moment_" + units.moment()));
        } else {
            XYZ.forEach(axis -> names.add(joint + "_moment_" + axis + "_" + units.moment()));
        }
        XYZ.forEach(axis -> names.add(joint + "_force_" + axis + "_" + units.force()));
        names.add(joint + "_power_" + units.power());
    }

    private static void row(Limb limb, int i, CsvText csv) throws IOException {
        for (JointLoads loads : limb.joints) {
            cells(loads.angles(), i, DEGREES, csv);
            cells(loads.moment(), i, 1, csv);
            cells(loads.force(), i, 1, csv);
            csv.cell(loads.power().at(i));
        }
        csv.cell(limb.support.isEmpty() ? "" : limb.support.get(i).key());
    }

    private static void cells(VectorSeries series, int i, double factor, CsvText csv) throws IOException {
        csv.cell(series.x(i) * factor);
        csv.cell(series.y(i) * factor);
        csv.cell(series.z(i) * factor);
    }

    private static List<Limb> limbs(TrialResult result) {
        List<Limb> limbs = new ArrayList<>();
        for (Side side : Side.values()) {
            List<JointLoads> joints = Arrays.stream(JointKind.values())
                    .flatMap(kind -> loads(result, side, kind).stream())
                    .toList();
            List<Support> support = result.support().getOrDefault(side, List.of());
            if (!joints.isEmpty() || !support.isEmpty()) {
                limbs.add(new Limb(side, joints, support));
            }
        }
        return limbs;
    }

    private static Optional<JointLoads> loads(TrialResult result, Side side, JointKind kind) {
        return result.joints().stream()
                .filter(loads -> loads.joint().side() == side && loads.joint().kind() == kind)
                .findFirst();
    }
}
