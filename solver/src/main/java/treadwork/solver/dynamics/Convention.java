package treadwork.solver.dynamics;

import java.util.List;
import java.util.Optional;
import treadwork.model.body.Joint;
import treadwork.model.load.JointLoads;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.ResultSettings;
import treadwork.solver.pose.JointAngles;
import treadwork.solver.pose.JointAxes;
import treadwork.solver.pose.SegmentMotion;

/**
 * In which axes, sign and scale a joint's loads are handed out.
 *
 * <p>Moments: with {@code joint} axes the projections M · e on the three joint axes, each along its named direction, so
 * that Σ component × angular rate = M · ω; else the x, y, z components. External moments are the negative of internal
 * ones. Forces: what the proximal segment does to the distal one, whichever sign the moments have; {@code joint} means
 * the proximal segment's axes for them. Power never changes sign.
 */
public record Convention(ResultSettings settings, LoadScale scale) {

    public static Convention of(ResultSettings settings, double massKg, Optional<Double> heightM) {
        return new Convention(settings, LoadScale.of(settings.normalise(), massKg, heightM));
    }

    /**
     * @param proximal motion of the joint's proximal segment
     * @param distal   of its distal one
     * @param load     what the proximal segment does to the distal one at the joint centre, lab axes
     */
    public JointLoads express(Joint joint, SegmentMotion proximal, SegmentMotion distal, LoadSeries load) {
        ScalarSeries power = LimbLoads.power(load.moment(), proximal.angularVelocity(), distal.angularVelocity());
        double sign = settings.momentConvention() == MomentConvention.INTERNAL ? 1 : -1;
        return new JointLoads(
                joint,
                JointAngles.of(joint, proximal.pose(), distal.pose()),
                components(load.moment(), momentAxes(joint, proximal, distal), sign * scale.moment()),
                components(load.force(), forceAxes(proximal, distal), scale.force()),
                power.map(values -> scaled(values, scale.power())));
    }

    private List<VectorSeries> momentAxes(Joint joint, SegmentMotion proximal, SegmentMotion distal) {
        return switch (settings.momentAxes()) {
            case JOINT ->
                List.of(
                        JointAxes.of(joint, proximal.pose(), distal.pose(), 0),
                        JointAxes.of(joint, proximal.pose(), distal.pose(), 1),
                        JointAxes.of(joint, proximal.pose(), distal.pose(), 2));
            case PROXIMAL, DISTAL, LAB -> forceAxes(proximal, distal);
        };
    }

    private List<VectorSeries> forceAxes(SegmentMotion proximal, SegmentMotion distal) {
        return switch (settings.momentAxes()) {
            case JOINT, PROXIMAL -> axesOf(proximal.pose());
            case DISTAL -> axesOf(distal.pose());
            case LAB -> labAxes(proximal.pose().size());
        };
    }

    private static List<VectorSeries> axesOf(PoseSeries pose) {
        return List.of(pose.axisX(), pose.axisY(), pose.axisZ());
    }

    private static List<VectorSeries> labAxes(int frames) {
        return List.of(
                VectorSeries.constant(new Vector3(1, 0, 0), frames),
                VectorSeries.constant(new Vector3(0, 1, 0), frames),
                VectorSeries.constant(new Vector3(0, 0, 1), frames));
    }

    /** The projections of each vector on three axes, times {@code factor}. */
    private static VectorSeries components(VectorSeries vectors, List<VectorSeries> axes, double factor) {
        VectorSeries first = axes.get(0);
        VectorSeries second = axes.get(1);
        VectorSeries third = axes.get(2);
        VectorSeries.Builder result = new VectorSeries.Builder(vectors.size());
        for (int i = 0; i < vectors.size(); i++) {
            Vector3 v = vectors.at(i);
            result.set(i, factor * v.dot(first.at(i)), factor * v.dot(second.at(i)), factor * v.dot(third.at(i)));
        }
        return result.build();
    }

    private static double[] scaled(double[] values, double factor) {
        for (int i = 0; i < values.length; i++) {
            values[i] *= factor;
        }
        return values;
    }
}
