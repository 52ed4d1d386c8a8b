package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.fixtures.plate.ChannelSign;
import treadwork.fixtures.plate.PlateDesign;
import treadwork.fixtures.walker.ExactJoint;
import treadwork.fixtures.walker.ExactSegment;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.PlatePlan;
import treadwork.fixtures.walker.TrueContact;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.body.Gravity;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.JointLoads;
import treadwork.model.load.Support;
import treadwork.model.load.TrialResult;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.Normalisation;
import treadwork.model.study.Orthosis;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;
import treadwork.solver.filter.Derivatives;

/** Physics and conventions of the loads of one undisturbed walk. */
class LoadsOfAWalkTest {

    /** What differentiating 200 samples a second leaves of an exact walk; see {@link ExactWalkerTest}. */
    private static final double SHARE_OF_RANGE = 0.003;

    /** Rounding only. */
    private static final double ROUNDING = 1e-9;

    private static final WalkerSettings SETTINGS = WalkerSettings.DEFAULT.with(Gait.DEFAULT.withDurationS(1.8));

    private static Walk walk;
    private static TrialResult plain;

    @BeforeAll
    static void walkOnce() {
        walk = Walk.of(SETTINGS);
        plain = result(walk, ResultSettings.DEFAULT);
    }

    private static TrialResult result(Walk walk, ResultSettings settings) {
        return Walked.of(walk, Walked.UNFILTERED, settings).computed().result();
    }

    private static ResultSettings settings(MomentConvention convention, MomentAxes axes, Normalisation normalise) {
        return new ResultSettings(convention, axes, normalise, 0, 1);
    }

    /** Σ moment about an axis × rate of the angle about it = M · ω: the projections on the joint axes are power-conjugate. */
    @Test
    void momentsTimesAngularRatesArePower() {
        for (JointLoads joint : plain.joints()) {
            VectorSeries rates =
                    Derivatives.of(joint.angles(), plain.pointRate()).first();
            ScalarSeries.Builder power = new ScalarSeries.Builder(plain.frames());
            for (int i = 0; i < plain.frames(); i++) {
                power.set(i, joint.moment().at(i).dot(rates.at(i)));
            }
            Loads.assertShare(joint.joint().key(), joint.power(), power.build(), 1e-3);
        }
    }

    /** The power that both neighbours put into a shank or thigh is the rate of its energy, with the walk's exact motion. */
    @Test
    void thePowerIntoASegmentIsTheRateOfItsEnergy() {
        TrialResult inLab = result(walk, settings(MomentConvention.INTERNAL, MomentAxes.LAB, Normalisation.NONE));
        for (Side side : Side.values()) {
            for (JointKind kind : List.of(JointKind.KNEE, JointKind.HIP)) {
                Joint proximal = new Joint(side, kind);
                Joint distal = new Joint(side, kind == JointKind.HIP ? JointKind.KNEE : JointKind.ANKLE);
                ExactSegment segment = walk.exact().segments().get(proximal.distal());

                ScalarSeries power = difference(flow(inLab, proximal, segment), flow(inLab, distal, segment));

                Loads.assertShare(segment.segment().key(), energyRate(segment), power, SHARE_OF_RANGE);
            }
        }
    }

    /** F · v of the joint centre as a point of the segment + M · ω of the segment, W. */
    private static ScalarSeries flow(TrialResult trial, Joint joint, ExactSegment segment) {
        JointLoads loads = Loads.of(trial, joint);
        ExactJoint exact = walk.exact().joint(joint);
        ScalarSeries.Builder flow = new ScalarSeries.Builder(trial.frames());
        for (int i = 0; i < trial.frames(); i++) {
            Vector3 omega = segment.angularVelocity().at(i);
            Vector3 arm = exact.centre().at(i).minus(segment.centre().at(i));
            Vector3 velocity = segment.centreVelocity().at(i).plus(omega.cross(arm));
            flow.set(i, loads.force().at(i).dot(velocity) + loads.moment().at(i).dot(omega));
        }
        return flow.build();
    }

    /** d/dt (½ m v² + ½ ω · I ω - m g · c) = m v · (a - g) + ω · R I Rᵀ α, since ω · (ω × I ω) = 0. */
    private static ScalarSeries energyRate(ExactSegment segment) {
        Vector3 gravity = walk.exact().gravity();
        ScalarSeries.Builder rate = new ScalarSeries.Builder(segment.pose().size());
        for (int i = 0; i < segment.pose().size(); i++) {
            Vector3 push = segment.centreAcceleration()
                    .at(i)
                    .minus(gravity)
                    .times(segment.mass().mass());
            Vector3 omega = segment.pose()
                    .rotation(i)
                    .transposeTimes(segment.angularVelocity().at(i));
            Vector3 alpha = segment.pose()
                    .rotation(i)
                    .transposeTimes(segment.angularAcceleration().at(i));
            rate.set(
                    i,
                    push.dot(segment.centreVelocity().at(i))
                            + omega.dot(segment.mass().inertia().times(alpha)));
        }
        return rate.build();
    }

    private static ScalarSeries difference(ScalarSeries one, ScalarSeries other) {
        ScalarSeries.Builder difference = new ScalarSeries.Builder(one.size());
        for (int i = 0; i < one.size(); i++) {
            difference.set(i, one.at(i) - other.at(i));
        }
        return difference.build();
    }

    @Test
    void labAxesGiveTheExactVectors() {
        TrialResult inLab = result(walk, settings(MomentConvention.INTERNAL, MomentAxes.LAB, Normalisation.NONE));

        for (JointLoads joint : inLab.joints()) {
            ExactJoint exact = walk.exact().joint(joint.joint());
            String name = joint.joint().key();
            for (int i = 0; i < inLab.frames(); i++) {
                double bound = 0.02 * (50 + exact.momentInLab().at(i).norm());
                double off =
                        exact.momentInLab().at(i).minus(joint.moment().at(i)).norm();
                assertTrue(off < bound, name + " moment is off by " + off + " N·m in frame " + i);
            }
            Loads.assertShare(
                    name, exact.forceInLab().componentX(), joint.force().componentX(), SHARE_OF_RANGE);
            Loads.assertShare(
                    name, exact.forceInLab().componentY(), joint.force().componentY(), SHARE_OF_RANGE);
            Loads.assertShare(
                    name, exact.forceInLab().componentZ(), joint.force().componentZ(), SHARE_OF_RANGE);
        }
    }

    /** The components in a segment's axes are those of the exact vector through the exact pose. */
    @ParameterizedTest
    @EnumSource(
            value = MomentAxes.class,
            names = {"PROXIMAL", "DISTAL"})
    void segmentAxesGiveTheComponentsInThatSegment(MomentAxes axes) {
        TrialResult found = result(walk, settings(MomentConvention.INTERNAL, axes, Normalisation.NONE));

        for (JointLoads joint : found.joints()) {
            Joint name = joint.joint();
            ExactSegment segment =
                    walk.exact().segments().get(axes == MomentAxes.PROXIMAL ? name.proximal() : name.distal());
            VectorSeries.Builder expected = new VectorSeries.Builder(found.frames());
            for (int i = 0; i < found.frames(); i++) {
                expected.set(
                        i,
                        segment.pose()
                                .rotation(i)
                                .transposeTimes(
                                        walk.exact().joint(name).momentInLab().at(i)));
            }
            VectorSeries moment = expected.build();
            Loads.assertShare(name.key(), moment.componentX(), joint.moment().componentX(), SHARE_OF_RANGE);
            Loads.assertShare(name.key(), moment.componentY(), joint.moment().componentY(), SHARE_OF_RANGE);
            Loads.assertShare(name.key(), moment.componentZ(), joint.moment().componentZ(), SHARE_OF_RANGE);
        }
    }

    @Test
    void externalMomentsAreTheOppositeAndNothingElseChanges() {
        TrialResult external = result(walk, settings(MomentConvention.EXTERNAL, MomentAxes.JOINT, Normalisation.NONE));

        for (JointLoads joint : plain.joints()) {
            JointLoads other = Loads.of(external, joint.joint());
            for (int i = 0; i < plain.frames(); i++) {
                assertEquals(joint.moment().at(i).negated(), other.moment().at(i), "moment in frame " + i);
                assertEquals(joint.force().at(i), other.force().at(i), "force in frame " + i);
                assertEquals(joint.power().at(i), other.power().at(i), "power in frame " + i);
            }
        }
    }

    @Test
    void normalisedLoadsAreDividedByWhatTheNameSays() {
        double mass = walk.massKg();
        assertFactors(Normalisation.MASS, 1 / mass, 1 / mass, 1 / mass);
        double height = 1.75;
        assertFactors(Normalisation.MASS_HEIGHT, 1 / (mass * height), 1 / (mass * height), 1 / (mass * height));
        double weight = mass * Gravity.ACCELERATION;
        assertFactors(Normalisation.WEIGHT_HEIGHT_PERCENT, 100 / (weight * height), 100 / weight, 1 / mass);
    }

    private static void assertFactors(Normalisation choice, double moment, double force, double power) {
        Walked walked =
                Walked.of(walk, Walked.UNFILTERED, settings(MomentConvention.INTERNAL, MomentAxes.JOINT, choice));
        Subject tall = new Subject(
                "tall",
                walk.massKg(),
                Optional.of(1.75),
                Optional.empty(),
                "standing.c3d",
                walk.markerSet(),
                List.of(walked.trial()));
        TrialResult scaled = new Walked(walk, tall, walked.trial()).computed().result();
        for (JointLoads joint : plain.joints()) {
            JointLoads other = Loads.of(scaled, joint.joint());
            int i = 100;
            assertEquals(joint.moment().x(i) * moment, other.moment().x(i), ROUNDING, choice + " moment");
            assertEquals(joint.force().y(i) * force, other.force().y(i), ROUNDING, choice + " force");
            assertEquals(joint.power().at(i) * power, other.power().at(i), ROUNDING, choice + " power");
        }
    }

    @Test
    void heightIsAskedForWhereItIsDividedBy() {
        ResultSettings perHeight =
                settings(MomentConvention.INTERNAL, MomentAxes.JOINT, Normalisation.WEIGHT_HEIGHT_PERCENT);

        UnusableInputException refusal = assertThrows(UnusableInputException.class, () -> result(walk, perHeight));

        assertEquals("height-missing", refusal.finding().code());
    }

    @Test
    void framesThatAreNotAskedForAreLeftOut() {
        Walked walked = Walked.of(walk, Walked.UNFILTERED);
        FrameRange range = new FrameRange(101, 220);

        TrialResult cut = new Walked(walk, walked.subject(), cropped(walked.trial(), range))
                .computed()
                .result();

        assertEquals(101, cut.firstFrame());
        assertEquals(120, cut.frames());
        for (JointLoads joint : plain.joints()) {
            JointLoads other = Loads.of(cut, joint.joint());
            for (int i = 0; i < cut.frames(); i++) {
                assertEquals(joint.moment().at(100 + i), other.moment().at(i), "frame " + (101 + i));
            }
        }
        cut.contacts().forEach(contact -> {
            FrameRange frames = contact.contact().frames();
            assertTrue(frames.first() >= 101 && frames.last() <= 220, "contact in " + frames);
            assertEquals(frames.count(), contact.force().size(), "rows of the contact");
            ContactSeries whole = plain.contacts().stream()
                    .filter(other ->
                            other.contact().plate() == contact.contact().plate())
                    .findFirst()
                    .orElseThrow();
            int from = frames.first() - whole.contact().frames().first();
            assertEquals(whole.force().at(from), contact.force().at(0), "force in frame " + frames.first());
        });
    }

    /** Parallel axes: a point mass beside the segment's own. */
    @Test
    void whatIsWornWeighsOnItsSegment() {
        Walked walked = Walked.of(walk, Walked.UNFILTERED);
        Orthosis brace = new Orthosis("brace on", Segment.RIGHT_SHANK, 0.42, new Vector3(0.02, -0.2, 0));

        TrialResult worn = new Walked(walk, walked.subject(), wearing(walked.trial(), brace))
                .computed()
                .result();

        assertEquals(0.42, mass(worn, Segment.RIGHT_SHANK) - mass(plain, Segment.RIGHT_SHANK), ROUNDING, "kg");
        assertEquals(0, mass(worn, Segment.LEFT_SHANK) - mass(plain, Segment.LEFT_SHANK), ROUNDING, "kg");
    }

    private static double mass(TrialResult trial, Segment segment) {
        return trial.segments().stream()
                .filter(sheet -> sheet.segment() == segment)
                .findFirst()
                .orElseThrow()
                .mass()
                .mass();
    }

    private static Trial wearing(Trial trial, Orthosis orthosis) {
        return new Trial(
                trial.file(),
                trial.condition(),
                trial.markerSet(),
                trial.lab(),
                trial.body(),
                trial.processing(),
                trial.results(),
                trial.contacts(),
                trial.frames(),
                List.of(orthosis));
    }

    @Test
    void framesThatWereNotRecordedAreRefused() {
        Walked walked = Walked.of(walk, Walked.UNFILTERED);
        Walked asked = new Walked(walk, walked.subject(), cropped(walked.trial(), new FrameRange(300, 9000)));

        UnusableInputException refusal = assertThrows(UnusableInputException.class, asked::computed);

        assertEquals("frames-outside", refusal.finding().code());
    }

    private static Trial cropped(Trial trial, FrameRange range) {
        return new Trial(
                trial.file(),
                trial.condition(),
                trial.markerSet(),
                trial.lab(),
                trial.body(),
                trial.processing(),
                trial.results(),
                trial.contacts(),
                Optional.of(range),
                trial.orthoses());
    }

    /** The second foothold of the walk has no plate under it. */
    @Test
    void aFootOnNoPlateIsBlankAndTheOtherIsNot() {
        Walk partly = Walk.of(SETTINGS.with(PlatePlan.DEFAULT.withAbsent(Set.of(2))));
        TrueContact unmeasured = partly.exact().contacts().stream()
                .filter(contact -> contact.plate().isEmpty())
                .findFirst()
                .orElseThrow();
        Side side = unmeasured.foot();
        int middle = (unmeasured.frames().first() + unmeasured.frames().last()) / 2 - 1;

        TrialResult found = result(partly, ResultSettings.DEFAULT);

        assertEquals(Support.UNMEASURED, found.support().get(side).get(middle));
        for (JointKind kind : JointKind.values()) {
            JointLoads blank = Loads.of(found, new Joint(side, kind));
            JointLoads known = Loads.of(found, new Joint(side.other(), kind));
            assertTrue(blank.moment().isGap(middle) && blank.force().isGap(middle), kind + " has loads");
            assertTrue(Double.isNaN(blank.power().at(middle)), kind + " has a power");
            assertTrue(!blank.angles().isGap(middle), kind + " has no angles");
            assertTrue(!known.moment().isGap(middle), "the other " + kind + " has no moment");
        }
        assertTrue(
                found.findings().stream().anyMatch(finding -> finding.code().equals("unmeasured-support")),
                "the finding that says why");
    }

    /** A sensor origin stated upside down and channels that hold the load on the plate are put right from the data. */
    @ParameterizedTest
    @EnumSource(
            value = PlateType.class,
            names = {"FORCE_AND_MOMENT", "CALIBRATED"})
    void aLostSignInThePlatesDescriptionChangesNothing(PlateType type) {
        PlateDesign right = PlateDesign.of(type);
        PlateDesign wrong = right.withStatedOrigin(right.origin().negated()).withSign(ChannelSign.ACTION);
        Walk described = Walk.of(SETTINGS.with(PlatePlan.DEFAULT.withDesigns(wrong)));

        TrialResult found = result(described, ResultSettings.DEFAULT);

        Loads.assertSame(plain, found, 1e-7);
        for (String code : List.of("plate-origin", "plate-sign")) {
            assertTrue(
                    found.findings().stream().anyMatch(finding -> finding.code().equals(code) && finding.mended()),
                    code + " is said");
        }
    }

    /** With the usual 6 Hz what is known is known everywhere but at the ends, which the filter would have to make up. */
    @Test
    void theFilterLeavesTheEndsBlank() {
        TrialResult filtered = Walked.of(walk, Processing.DEFAULT).computed().result();
        int ends = 6;

        for (JointLoads joint : filtered.joints()) {
            for (int i = 0; i < filtered.frames(); i++) {
                boolean end = i < ends || i >= filtered.frames() - ends;
                assertEquals(
                        end,
                        joint.moment().isGap(i),
                        String.format(
                                Locale.ROOT, "%s in frame %d", joint.joint().key(), i));
            }
        }
    }
}
