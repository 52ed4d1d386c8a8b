package treadwork.solver.run;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.Support;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Orthosis;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;
import treadwork.solver.agreement.Agreement;
import treadwork.solver.agreement.Scene;
import treadwork.solver.anthropometry.BodyMass;
import treadwork.solver.anthropometry.BodyMasses;
import treadwork.solver.anthropometry.WeighedSegment;
import treadwork.solver.contact.ContactSettings;
import treadwork.solver.contact.Contacts;
import treadwork.solver.contact.FootOutline;
import treadwork.solver.marker.Exchanges;
import treadwork.solver.plate.LabUp;
import treadwork.solver.plate.PlateLoads;
import treadwork.solver.plausible.BodyCheck;
import treadwork.solver.plausible.JointGapCheck;
import treadwork.solver.plausible.SettingsCheck;
import treadwork.solver.plausible.StandingStill;
import treadwork.solver.pose.FootPoints;
import treadwork.solver.pose.SegmentMotion;
import treadwork.solver.pose.StandingBody;

/**
 * All that a trial's loads are computed from, measured and checked: the body in motion, what weighs what, and what the ground
 * does to each foot.
 *
 * @param findings of every step so far and of all checks of the steps against each other
 */
record Measured(
        LabAxis up,
        StandingBody body,
        TrackedBody tracked,
        PlateLoads plates,
        Contacts contacts,
        Map<Segment, WeighedSegment> masses,
        List<Finding> findings) {

    Measured {
        masses = Collections.unmodifiableMap(new EnumMap<>(masses));
        findings = List.copyOf(findings);
    }

    /** @throws UnusableInputException where the captures or the settings do not allow it; the finding says why */
    static Measured of(TrialInput input) {
        Trial trial = input.trial();
        Capture movement = Exchanges.applied(input.movement(), trial.exchanged());
        List<Plate> described = trial.lab().plates().orElse(movement.plates());
        LabUp lab = LabUp.find(movement, described, trial.lab().up());
        LabAxis up = lab.axis().orElseThrow(() -> new UnusableInputException(last(lab.findings())));
        StandingBody body =
                StandingBody.measure(input.standing(), input.subject().markerSet(), trial.body());
        TrackedBody tracked = TrackedBody.track(movement, trial, body);
        PlateLoads plates = PlateLoads.resolve(movement, described, up, trial.processing());
        List<FootOutline> feet = feet(body, tracked);
        ContactSettings rules = new ContactSettings(up, trial.processing().contactThresholdN(), trial.contacts());
        Contacts contacts = Contacts.find(movement, plates.plates(), feet, rules);
        Measured unchecked = new Measured(
                up,
                body,
                tracked,
                plates,
                contacts,
                masses(input, body),
                together(List.of(
                        movement.findings(),
                        lab.findings(),
                        body.findings(),
                        tracked.findings(),
                        plates.findings(),
                        contacts.findings())));
        List<Finding> checks = new ArrayList<>(unchecked.plausibility(input, movement));
        checks.addAll(Agreement.check(unchecked.scene(input, movement, described, feet)));
        return unchecked.with(checks);
    }

    private List<Finding> plausibility(TrialInput input, Capture movement) {
        Capture standing = input.standing();
        List<VectorSeries> markers =
                tracked.courses().values().stream().flatMap(List::stream).toList();
        return together(List.of(
                StandingStill.of(standing, input.subject().markerSet()),
                BodyCheck.of(body, standing.name(), standing.pointUnit(), up.direction()),
                SettingsCheck.of(
                        movement, input.trial().processing(), !plates.plates().isEmpty(), markers),
                JointGapCheck.of(movement.name(), body, tracked.motions())));
    }

    /** Whether a foot is on the ground in every frame, as in walking. */
    boolean isWithoutFlight() {
        List<List<Support>> feet = List.copyOf(contacts.support().values());
        for (int i = 0; !feet.isEmpty() && i < feet.get(0).size(); i++) {
            int frame = i;
            if (feet.size() > 1 && feet.stream().allMatch(foot -> foot.get(frame) == Support.AIR)) {
                return false;
            }
        }
        return true;
    }

    /** How fast the pelvis, or a foot where it is not tracked, gets on between the first and last frame that know it, m/s. */
    double speed() {
        SegmentMotion carrier = tracked.motions()
                .getOrDefault(
                        Segment.PELVIS, tracked.motions().values().iterator().next());
        VectorSeries course = carrier.pose().toLab(Vector3.ZERO);
        int first = 0;
        int last = course.size() - 1;
        while (first < last && course.isGap(first)) {
            first++;
        }
        while (last > first && course.isGap(last)) {
            last--;
        }
        return course.at(last).minus(course.at(first)).norm() * carrier.rate() / (last - first);
    }

    private Measured with(List<Finding> more) {
        return new Measured(up, body, tracked, plates, contacts, masses, together(List.of(findings, more)));
    }

    private Scene scene(TrialInput input, Capture movement, List<Plate> described, List<FootOutline> feet) {
        Trial trial = input.trial();
        double worn = trial.orthoses().stream().mapToDouble(Orthosis::massKg).sum();
        Map<Segment, MassProperties> legs = new EnumMap<>(Segment.class);
        masses.forEach((segment, weighed) -> legs.put(segment, weighed.mass()));
        return new Scene(
                movement,
                up.direction(),
                described,
                plates,
                otherwise -> PlateLoads.resolve(movement, otherwise, up, trial.processing()),
                contacts,
                feet,
                body,
                tracked.motions(),
                legs,
                input.subject().massKg() + worn,
                worn,
                trial.processing().plateDelayS(),
                Collections.max(tracked.endFrames().values()));
    }

    private static List<Finding> together(List<List<Finding>> findings) {
        return findings.stream().flatMap(List::stream).toList();
    }

    private static Finding last(List<Finding> findings) {
        return findings.get(findings.size() - 1);
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
}
