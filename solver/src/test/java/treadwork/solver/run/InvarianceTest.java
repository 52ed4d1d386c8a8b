package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Figure;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.LabPlan;
import treadwork.fixtures.walker.Labels;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.model.body.Joint;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PointSeries;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.JointLoads;
import treadwork.model.load.TrialResult;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Processing;

/** What must not matter does not: the same noisy walk, seen or described otherwise, has the same loads. */
class InvarianceTest {

    /** Rounding in filters, fits and splines of some hundred frames; a wrong sign or axis is off by the whole range. */
    private static final double ROUNDING = 1e-7;

    /** What 32-bit numbers lose, smoothed at 6 Hz and differentiated twice. */
    private static final double SINGLE_PRECISION = 1e-4;

    private static final WalkerSettings NOISY = WalkerSettings.DEFAULT
            .with(Gait.DEFAULT.withDurationS(1.8))
            .with(Disturbance.NONE.withMarkerNoise(0.0005).withSkinMotion(0.002).withPlateNoise(1));

    private static Walk walk;
    private static TrialResult plain;

    @BeforeAll
    static void walkOnce() {
        walk = Walk.of(NOISY);
        plain = result(walk);
    }

    private static TrialResult result(Walk walk) {
        return Walked.of(walk, Processing.DEFAULT).computed().result();
    }

    @ParameterizedTest
    @EnumSource(LabAxis.class)
    void aTurnedLabChangesNothing(LabAxis up) {
        Random random = new Random(7);
        Rotation newFromOld = turn(up, 2 * Math.PI * random.nextDouble());
        Vector3 shift = new Vector3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());

        TrialResult turned = result(seenFrom(newFromOld, shift));

        assertEquals(up, turned.up());
        Loads.assertSame(plain, turned, ROUNDING);
    }

    /** From the lab of the walk, where z is up, to one with another axis up and any heading. */
    private static Rotation turn(LabAxis up, double heading) {
        Vector3 vertical = up.direction();
        Vector3 level = vertical.x() == 0 ? new Vector3(1, 0, 0) : new Vector3(0, 1, 0);
        Vector3 x = Rotation.about(vertical, heading).times(level);
        return Rotation.ofColumns(x, vertical.cross(x), vertical);
    }

    private static Walk seenFrom(Rotation newFromOld, Vector3 shift) {
        return new Walk(
                moved(walk.standing(), newFromOld, shift),
                moved(walk.walking(), newFromOld, shift),
                walk.markerSet(),
                walk.massKg(),
                walk.body(),
                walk.exact());
    }

    private static Capture moved(Capture capture, Rotation newFromOld, Vector3 shift) {
        List<PointSeries> points = capture.points().stream()
                .map(point -> new PointSeries(
                        point.label(), point.description(), moved(point.positions(), newFromOld, shift)))
                .toList();
        List<Plate> plates = capture.plates().stream()
                .map(plate -> new Plate(
                        plate.type(),
                        plate.corners().stream()
                                .map(corner -> newFromOld.times(corner).plus(shift))
                                .toList(),
                        plate.origin(),
                        plate.channels(),
                        plate.calibration(),
                        plate.channelUnit()))
                .toList();
        return with(capture, capture.firstFrame(), points, plates);
    }

    private static VectorSeries moved(VectorSeries positions, Rotation newFromOld, Vector3 shift) {
        VectorSeries.Builder moved = new VectorSeries.Builder(positions.size());
        for (int i = 0; i < positions.size(); i++) {
            moved.set(i, newFromOld.times(positions.at(i)).plus(shift));
        }
        return moved.build();
    }

    private static Capture with(Capture capture, int firstFrame, List<PointSeries> points, List<Plate> plates) {
        return new Capture(
                capture.name(),
                firstFrame,
                capture.frames(),
                capture.pointRate(),
                points,
                capture.samplesPerFrame(),
                capture.analog(),
                plates,
                capture.plateZero(),
                capture.events(),
                capture.pointUnit(),
                capture.storage(),
                capture.findings());
    }

    /** A mirrored walker's left limb does what the walker's right limb did; only what points to the right turns its sign. */
    @Test
    void mirroredDataSwapSides() {
        Gait brief = Gait.DEFAULT.withDurationS(1.8);
        TrialResult one = result(Walk.of(WalkerSettings.DEFAULT.with(brief)));
        TrialResult mirrored =
                result(Walk.of(WalkerSettings.DEFAULT.with(brief).with(Figure.DEFAULT.withMirrored(true))));

        for (JointLoads joint : one.joints()) {
            JointLoads other = Loads.of(
                    mirrored,
                    new Joint(joint.joint().side().other(), joint.joint().kind()));
            Loads.assertSame(mirror(joint), other, ROUNDING);
        }
    }

    private static JointLoads mirror(JointLoads joint) {
        VectorSeries.Builder force = new VectorSeries.Builder(joint.force().size());
        for (int i = 0; i < joint.force().size(); i++) {
            force.set(i, joint.force().x(i), joint.force().y(i), -joint.force().z(i));
        }
        return new JointLoads(joint.joint(), joint.angles(), joint.moment(), force.build(), joint.power());
    }

    @Test
    void anotherFirstFrameOnlyRelabels() {
        Capture moving = walk.walking();
        Walk shifted = new Walk(
                walk.standing(),
                with(moving, 984, moving.points(), moving.plates()),
                walk.markerSet(),
                walk.massKg(),
                walk.body(),
                walk.exact());

        TrialResult found = result(shifted);

        Loads.assertSame(plain, found, 0);
        assertEquals(984, found.firstFrame());
        for (int k = 0; k < plain.contacts().size(); k++) {
            int before = plain.contacts().get(k).contact().frames().first() - plain.firstFrame();
            assertEquals(before, found.contacts().get(k).contact().frames().first() - 984, "begin of contact " + k);
        }
    }

    @ParameterizedTest
    @EnumSource(LengthUnit.class)
    void theUnitOfTheFileDoesNotMatter(LengthUnit unit) {
        Walk stored = Walk.of(NOISY.with(LabPlan.DEFAULT.withUnit(unit)));

        TrialResult found = Walked.of(stored, Processing.DEFAULT)
                .computedFrom(C3dEncoding.DEFAULT)
                .result();

        Loads.assertSame(plain, found, SINGLE_PRECISION);
    }

    @Test
    void theOrderOfThePlatesDoesNotMatter() {
        Capture moving = walk.walking();
        List<Plate> plates = new ArrayList<>(moving.plates());
        Collections.reverse(plates);
        Walk reordered = new Walk(
                walk.standing(),
                with(moving, moving.firstFrame(), moving.points(), plates),
                walk.markerSet(),
                walk.massKg(),
                walk.body(),
                walk.exact());

        TrialResult found = result(reordered);

        Loads.assertSame(plain, found, ROUNDING);
        for (int k = 0; k < plain.contacts().size(); k++) {
            ContactSeries one = plain.contacts().get(k);
            ContactSeries other = found.contacts().get(k);
            assertEquals(
                    plates.size() + 1 - one.contact().plate(), other.contact().plate(), "contact " + k);
            assertEquals(one.contact().foot(), other.contact().foot(), "contact " + k);
        }
    }

    @Test
    void oneLegAloneHasTheLoadsThatItHasBesideTheOther() {
        Walk right = Walk.of(NOISY.with(Labels.DEFAULT.withMapped(Set.of(Side.RIGHT))));

        TrialResult found = result(right);

        assertEquals(3, found.joints().size(), "joints");
        found.joints().forEach(joint -> Loads.assertSame(Loads.of(plain, joint.joint()), joint, ROUNDING));
        assertEquals(Optional.empty(), Optional.ofNullable(found.support().get(Side.LEFT)));
    }
}
