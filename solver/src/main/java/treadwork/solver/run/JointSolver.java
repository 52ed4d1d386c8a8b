package treadwork.solver.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Gravity;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.LabAxis;
import treadwork.solver.anthropometry.WeighedSegment;
import treadwork.solver.dynamics.LimbLoads;
import treadwork.solver.dynamics.LoadSeries;
import treadwork.solver.dynamics.MovingSegment;
import treadwork.solver.filter.Derivatives;
import treadwork.solver.filter.RunEnds;
import treadwork.solver.pose.SegmentMotion;
import treadwork.solver.pose.StandingBody;

/** Strings the recursion along every limb of which the foot is tracked, as far up as segments are known. */
record JointSolver(StandingBody body, TrackedBody tracked, Map<Segment, WeighedSegment> masses, LabAxis up) {

    /**
     * Loads of every joint that can be solved, right before left, from ankle to hip.
     *
     * @param ground what the ground does to each foot
     */
    List<SolvedJoint> solve(Map<Side, WrenchSeries> ground) {
        List<SolvedJoint> solved = new ArrayList<>();
        for (Side side : Side.values()) {
            if (ground.containsKey(side)) {
                solved.addAll(limb(joints(side), ground.get(side)));
            }
        }
        return solved;
    }

    private List<Joint> joints(Side side) {
        List<Joint> joints = new ArrayList<>();
        for (JointKind kind : JointKind.values()) {
            Joint joint = new Joint(side, kind);
            if (!body.joints().containsKey(joint)) {
                break;
            }
            joints.add(joint);
        }
        return joints;
    }

    private List<SolvedJoint> limb(List<Joint> joints, WrenchSeries ground) {
        List<MovingSegment> segments = new ArrayList<>();
        List<VectorSeries> centres = new ArrayList<>();
        for (Joint joint : joints) {
            segments.add(moving(joint.distal()));
            centres.add(tracked.motions()
                    .get(joint.proximal())
                    .pose()
                    .toLab(body.joints().get(joint)));
        }
        List<LoadSeries> loads =
                LimbLoads.of(segments, centres, ground, up.direction().times(-Gravity.ACCELERATION));
        List<SolvedJoint> solved = new ArrayList<>();
        for (int k = 0; k < joints.size(); k++) {
            Joint joint = joints.get(k);
            solved.add(new SolvedJoint(
                    joint,
                    tracked.motions().get(joint.proximal()),
                    tracked.motions().get(joint.distal()),
                    loads.get(k)));
        }
        return solved;
    }

    private MovingSegment moving(Segment segment) {
        SegmentMotion motion = tracked.motions().get(segment);
        WeighedSegment weighed = masses.get(segment);
        Derivatives centre = motion.derivatives(weighed.mass().centre());
        return new MovingSegment(
                weighed.mass(),
                motion.pose(),
                motion.angularVelocity(),
                motion.angularAcceleration(),
                motion.pose().toLab(weighed.mass().centre()),
                RunEnds.blank(centre.second(), tracked.endFrames().get(segment)));
    }
}
