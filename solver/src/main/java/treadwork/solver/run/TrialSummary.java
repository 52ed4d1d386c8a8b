package treadwork.solver.run;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.load.JointLoads;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.Normalisation;
import treadwork.model.study.ResultSettings;
import treadwork.solver.dynamics.Convention;

/**
 * The greatest loads of each side over all frames whose loads are known, whatever convention the results are written in:
 * net internal moments about the joint axes, N·m/kg, and powers, W/kg. NaN where no frame is known.
 */
public record TrialSummary(Map<Side, Peaks> sides) {

    private static final ResultSettings PER_KILOGRAM =
            new ResultSettings(MomentConvention.INTERNAL, MomentAxes.JOINT, Normalisation.MASS, 0, 0);

    /**
     * @param plantarflexor greatest moment in that direction, so the opposite of the least dorsiflexion moment
     * @param kneeExtensor  likewise
     * @param hipExtensor   likewise
     * @param hipAbductor   likewise
     * @param anklePower    greatest generated
     * @param knownShare    frames with a known ankle load, of all
     */
    public record Peaks(
            double plantarflexor,
            double kneeExtensor,
            double hipExtensor,
            double hipAbductor,
            double anklePower,
            double knownShare) {}

    static TrialSummary of(List<SolvedJoint> joints, double massKg) {
        Convention convention = Convention.of(PER_KILOGRAM, massKg, Optional.empty());
        Map<Side, Map<JointKind, JointLoads>> loads = new EnumMap<>(Side.class);
        for (SolvedJoint solved : joints) {
            JointLoads expressed =
                    convention.express(solved.joint(), solved.proximal(), solved.distal(), solved.load());
            loads.computeIfAbsent(solved.joint().side(), side -> new EnumMap<>(JointKind.class))
                    .put(solved.joint().kind(), expressed);
        }
        Map<Side, Peaks> sides = new EnumMap<>(Side.class);
        loads.forEach((side, limb) -> sides.put(side, peaks(limb)));
        return new TrialSummary(sides);
    }

    private static Peaks peaks(Map<JointKind, JointLoads> limb) {
        return new Peaks(
                greatest(limb.get(JointKind.ANKLE), moment(0)),
                greatest(limb.get(JointKind.KNEE), moment(0)),
                greatest(limb.get(JointKind.HIP), moment(0)),
                greatest(limb.get(JointKind.HIP), moment(1)),
                greatest(limb.get(JointKind.ANKLE), (joint, i) -> joint.power().at(i)),
                knownShare(limb.get(JointKind.ANKLE)));
    }

    /** One quantity of a joint in one frame. */
    private interface Quantity {
        double at(JointLoads joint, int frame);
    }

    /** The moment against the named direction about axis {@code k}. */
    private static Quantity moment(int k) {
        ToDoubleFunction<Vector3> component = k == 0 ? v -> -v.x() : v -> -v.y();
        return (joint, i) -> component.applyAsDouble(joint.moment().at(i));
    }

    private static double greatest(JointLoads joint, Quantity quantity) {
        double greatest = Double.NaN;
        for (int i = 0; joint != null && i < joint.power().size(); i++) {
            double value = quantity.at(joint, i);
            greatest = value > greatest || Double.isNaN(greatest) ? value : greatest;
        }
        return greatest;
    }

    private static double knownShare(JointLoads ankle) {
        VectorSeries moment = ankle.moment();
        int known = 0;
        for (int i = 0; i < moment.size(); i++) {
            known += moment.isGap(i) ? 0 : 1;
        }
        return (double) known / moment.size();
    }
}
