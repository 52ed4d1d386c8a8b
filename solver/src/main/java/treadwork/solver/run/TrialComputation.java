package treadwork.solver.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.JointLoads;
import treadwork.model.load.SegmentSheet;
import treadwork.model.load.TrialResult;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;
import treadwork.solver.anthropometry.BodyMass;
import treadwork.solver.anthropometry.BodyMasses;
import treadwork.solver.anthropometry.WeighedSegment;
import treadwork.solver.contact.ContactSettings;
import treadwork.solver.contact.Contacts;
import treadwork.solver.contact.FootOutline;
import treadwork.solver.dynamics.Convention;
import treadwork.solver.plate.LabUp;
import treadwork.solver.plate.PlateLoads;
import treadwork.solver.pose.FootPoints;
import treadwork.solver.pose.SegmentMotion;
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
        Trial trial = input.trial();
        Capture movement = input.movement();
        Offered.check(trial);

        LabUp up = LabUp.find(movement, plates(movement, trial), trial.lab().up());
        LabAxis axis = up.axis().orElseThrow(() -> new UnusableInputException(last(up.findings())));
        StandingBody body =
                StandingBody.measure(input.standing(), input.subject().markerSet(), trial.body());
        TrackedBody tracked = TrackedBody.track(movement, trial, body);
        PlateLoads plates = PlateLoads.resolve(movement, plates(movement, trial), axis, trial.processing());
        ContactSettings rules = new ContactSettings(axis, trial.processing().contactThresholdN(), trial.contacts());
        Contacts contacts = Contacts.find(movement, plates.plates(), feet(body, tracked), rules);
        Map<Segment, WeighedSegment> masses = masses(input, body);
        List<SolvedJoint> joints = new JointSolver(body, tracked, masses, axis).solve(contacts.loads());

        TrialResult result = new TrialResult(
                movement.firstFrame(),
                movement.frames(),
                movement.pointRate(),
                axis,
                loads(joints, input),
                contacts.support(),
                contacts.contacts(),
                sheets(body, tracked, masses),
                together(List.of(
                        movement.findings(),
                        up.findings(),
                        body.findings(),
                        tracked.findings(),
                        plates.findings(),
                        contacts.findings())));
        return new ComputedTrial(
                Cropping.to(trial.frames(), result, movement.name()),
                joints.stream()
                        .collect(Collectors.toMap(
                                SolvedJoint::joint, solved -> solved.load().point())),
                TrialSummary.of(joints, input.subject().massKg()));
    }

    private static List<Finding> together(List<List<Finding>> findings) {
        return findings.stream().flatMap(List::stream).toList();
    }

    private static Finding last(List<Finding> findings) {
        return findings.get(findings.size() - 1);
    }

    private static List<Plate> plates(Capture movement, Trial trial) {
        return trial.lab().plates().orElse(movement.plates());
    }

    private static List<FootOutline> feet(StandingBody body, TrackedBody tracked) {
        List<FootOutline> feet = new ArrayList<>();
        for (Side side : Side.values()) {
            SegmentMotion foot = tracked.motions().get(Segment.of(SegmentKind.FOOT, side));
            if (foot != null) {
                FootPoints points = FootPoints.of(body.segments().get(foot.segment()));
                feet.add(new FootOutline(
                        side,
                        foot.pose().toLab(points.heel()),
                        foot.pose().toLab(points.fifthHead()),
                        foot.pose().toLab(points.toeTip()),
                        foot.pose().toLab(points.firstHead())));
            }
        }
        return feet;
    }

    private static Map<Segment, WeighedSegment> masses(TrialInput input, StandingBody body) {
        Subject subject = input.subject();
        Trial trial = input.trial();
        Map<Segment, WeighedSegment> bare = BodyMasses.of(
                body,
                new BodyMass(subject.id(), subject.massKg(), subject.sex()),
                input.table(),
                trial.body().overrides());
        return BodyMasses.wearing(bare, trial.orthoses());
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
