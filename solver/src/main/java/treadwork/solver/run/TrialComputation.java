package treadwork.solver.run;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.JointLoads;
import treadwork.model.load.SegmentSheet;
import treadwork.model.load.TrialResult;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;
import treadwork.solver.anthropometry.WeighedSegment;
import treadwork.solver.dynamics.Convention;
import treadwork.solver.plausible.RangeCheck;
import treadwork.solver.pose.StandingBody;

/** The main job in memory: from a standing and a movement capture to the loads of every frame. */
public final class TrialComputation {

    private static final WeighedSegment NOT_WEIGHED = new WeighedSegment(
            new MassProperties(
                    Double.NaN,
                    Vector3.GAP,
                    new Inertia(Double.NaN, Double.NaN, Double.NaN, Double.NaN, Double.NaN, Double.NaN)),
            "not weighed: the recursion from the feet ends at the hips");

    private TrialComputation() {}

    /**
     * Computes one trial.
     *
     * @throws UnusableInputException where the captures or the settings do not allow it; the finding says why
     */
    public static ComputedTrial compute(TrialInput input) {
        Offered.check(input.trial());
        Capture movement = input.movement();

        Measured measured = Measured.of(input);
        List<SolvedJoint> joints = new JointSolver(
                        measured.body(), measured.tracked(), measured.masses(), measured.up())
                .solve(measured.contacts().loads());

        TrialSummary summary = TrialSummary.of(joints, input.subject().massKg());
        TrialResult result = new TrialResult(
                movement.firstFrame(),
                movement.frames(),
                movement.pointRate(),
                measured.up(),
                loads(joints, input),
                measured.contacts().support(),
                measured.contacts().contacts(),
                sheets(measured.body(), measured.tracked(), measured.masses()),
                Stream.concat(measured.findings().stream(), ranges(summary, measured, movement).stream())
                        .toList());
        return new ComputedTrial(
                Cropping.to(input.trial().frames(), result, movement.name()),
                joints.stream()
                        .collect(Collectors.toMap(
                                SolvedJoint::joint, solved -> solved.load().point())),
                summary);
    }

    private static List<Finding> ranges(TrialSummary summary, Measured measured, Capture movement) {
        List<RangeCheck.Peaks> sides = summary.sides().entrySet().stream()
                .map(entry -> {
                    TrialSummary.Peaks peaks = entry.getValue();
                    return new RangeCheck.Peaks(
                            entry.getKey(),
                            peaks.plantarflexor(),
                            peaks.kneeExtensor(),
                            peaks.hipExtensor(),
                            peaks.hipAbductor(),
                            peaks.anklePower());
                })
                .toList();
        return RangeCheck.of(movement.name(), measured.isWithoutFlight() ? measured.speed() : Double.NaN, sides);
    }

    private static List<JointLoads> loads(List<SolvedJoint> joints, TrialInput input) {
        Convention convention = Convention.of(
                input.trial().results(),
                input.subject().massKg(),
                input.subject().heightM());
        return joints.stream()
                .map(solved -> convention.express(solved.joint(), solved.proximal(), solved.distal(), solved.load()))
                .toList();
    }

    private static List<SegmentSheet> sheets(
            StandingBody body, TrackedBody tracked, Map<Segment, WeighedSegment> masses) {
        return body.segments().values().stream()
                .map(geometry -> {
                    WeighedSegment weighed = masses.getOrDefault(geometry.segment(), NOT_WEIGHED);
                    boolean thigh = geometry.segment().kind() == SegmentKind.THIGH;
                    return new SegmentSheet(
                            geometry.segment(),
                            weighed.mass(),
                            geometry.length(),
                            weighed.source() + (thigh ? "; hip centre: " + body.hipCentre() : ""),
                            tracked.motions().get(geometry.segment()).fitRms());
                })
                .toList();
    }
}
