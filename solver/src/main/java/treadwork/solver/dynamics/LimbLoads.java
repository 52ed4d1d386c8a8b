package treadwork.solver.dynamics;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/** The loads of one limb, from the foot upwards. */
public final class LimbLoads {

    private LimbLoads() {}

    /**
     * What the proximal segment does to the distal one at each joint, at the joint centre.
     *
     * @param segments from the foot upwards
     * @param joints   the centre of each segment's proximal joint, m
     * @param ground   what the ground does to the foot
     * @param gravity  the field, m/s², pointing down
     * @return a load a joint, in the order of {@code joints}
     */
    public static List<LoadSeries> of(
            List<MovingSegment> segments, List<VectorSeries> joints, WrenchSeries ground, Vector3 gravity) {
        if (segments.size() != joints.size()) {
            throw new IllegalArgumentException(segments.size() + " segments and " + joints.size() + " joints");
        }
        List<LoadSeries> loads = new ArrayList<>();
        LoadSeries distal = LoadSeries.of(ground);
        for (int k = 0; k < segments.size(); k++) {
            LoadSeries load = NewtonEuler.proximal(segments.get(k), distal, joints.get(k), gravity);
            loads.add(load);
            distal = load.reaction();
        }
        return loads;
    }

    /**
     * Power of the net joint moment, P = M · (ω_distal - ω_proximal), W; positive = generation.
     *
     * @param moment   what the proximal segment does to the distal one, N·m
     * @param proximal angular velocity of the proximal segment, same axes, rad/s
     * @param distal   of the distal one
     */
    public static ScalarSeries power(VectorSeries moment, VectorSeries proximal, VectorSeries distal) {
        ScalarSeries.Builder power = new ScalarSeries.Builder(moment.size());
        for (int i = 0; i < moment.size(); i++) {
            power.set(i, moment.at(i).dot(distal.at(i).minus(proximal.at(i))));
        }
        return power.build();
    }
}
