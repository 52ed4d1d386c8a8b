package treadwork.io.result;

import java.util.LinkedHashMap;
import java.util.Map;
import treadwork.model.body.JointKind;
import treadwork.model.study.LabAxis;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.Normalisation;
import treadwork.model.study.ResultSettings;

/** In which convention the numbers of a trial are to be read, in words that stand beside them. */
final class ConventionTree {

    private ConventionTree() {}

    static Map<String, Object> of(ResultSettings settings, LabAxis up) {
        LoadUnits units = LoadUnits.of(settings.normalise());
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("labUp", up.key());
        tree.put("segmentAxes", "X forward, Y towards the head, Z to the subject's right, on both sides");
        tree.put(
                "angles",
                "distal segment in the proximal one, Cardan sequence Z-X'-Y'', degrees, about e1, e2, e3: "
                        + "e1 is Z of the proximal segment, e3 is Y of the distal one, e2 is the floating axis");
        tree.put("positive", positive());
        tree.put("momentConvention", settings.momentConvention().key());
        tree.put("moment", moment(settings.momentConvention()));
        tree.put("momentAxes", settings.momentAxes().key());
        tree.put("momentComponents", components(settings.momentAxes()));
        tree.put("force", "net joint force: what the proximal segment does to the distal one");
        tree.put(
                "forceAxes",
                settings.momentAxes() == MomentAxes.JOINT
                        ? "proximal"
                        : settings.momentAxes().key());
        tree.put(
                "power",
                "moment times angular velocity of the distal segment against the proximal one; "
                        + "positive is generation, in either moment convention");
        tree.put("groundReaction", "force of the ground on the foot, lab axes; free moment about the upward normal");
        tree.put("normalisedBy", normalisedBy(settings.normalise()));
        tree.put("momentUnit", units.moment());
        tree.put("forceUnit", units.force());
        tree.put("powerUnit", units.power());
        tree.put("time", "seconds from the capture's first frame");
        return tree;
    }

    private static Map<String, Object> positive() {
        Map<String, Object> tree = new LinkedHashMap<>();
        for (JointKind kind : JointKind.values()) {
            tree.put(kind.key(), kind.directions());
        }
        return tree;
    }

    private static String moment(MomentConvention convention) {
        return switch (convention) {
            case INTERNAL ->
                "net internal joint moment: what the proximal segment does to the distal one, at the joint centre";
            case EXTERNAL ->
                "net external joint moment: the opposite of what the proximal segment does to the distal one, at the joint centre";
        };
    }

    private static String components(MomentAxes axes) {
        return switch (axes) {
            case JOINT -> "projections on e1, e2, e3, each positive in its named direction";
            case PROXIMAL -> "X, Y, Z of the proximal segment";
            case DISTAL -> "X, Y, Z of the distal segment";
            case LAB -> "x, y, z of the capture file's lab axes";
        };
    }

    private static String normalisedBy(Normalisation by) {
        return switch (by) {
            case NONE -> "nothing";
            case MASS -> "body mass, kg";
            case MASS_HEIGHT -> "body mass times height, kg·m";
            case WEIGHT_HEIGHT_PERCENT ->
                "moments: per cent of body weight times height, N·m; forces: per cent of body weight, N; powers: body mass, kg";
        };
    }
}
