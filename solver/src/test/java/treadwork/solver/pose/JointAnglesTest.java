package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import java.util.function.DoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

class JointAnglesTest {

    /** Rounding of angles of a few rad: some fifty operations, each good to 1e-16 of them. */
    private static final double ROUNDING = 1e-14;

    private static final Vector3 X = new Vector3(1, 0, 0);
    private static final Vector3 Y = new Vector3(0, 1, 0);
    private static final Vector3 Z = new Vector3(0, 0, 1);
    private static final Joint HIP = new Joint(Side.RIGHT, JointKind.HIP);
    private static final Joint KNEE = new Joint(Side.RIGHT, JointKind.KNEE);
    private static final Joint LEFT_ANKLE = new Joint(Side.LEFT, JointKind.ANKLE);
    private static final Rotation SOMEHOW = Rotation.about(new Vector3(0.48, -0.6, 0.64), 1.9);

    /** By construction: R = Rz(a) Rx(b) Ry(g), the proximal segment turned somehow in the lab. */
    @Test
    void givesBackTheAnglesThatTheJointWasTurnedBy() {
        Rotation distal = SOMEHOW.times(joint(0.4, -0.2, 0.3));

        VectorSeries angles = JointAngles.of(HIP, series(SOMEHOW), series(distal));

        assertEquals(0.4, angles.x(0), ROUNDING);
        assertEquals(-0.2, angles.y(0), ROUNDING);
        assertEquals(0.3, angles.z(0), ROUNDING);
    }

    /** Named directions: on the right, knee flexion is left-handed about e1, all else right-handed; left swaps e2 and e3. */
    @ParameterizedTest
    @CsvSource({
        "RIGHT,HIP,1,1,1", "RIGHT,KNEE,-1,1,1", "RIGHT,ANKLE,1,1,1",
        "LEFT,HIP,1,-1,-1", "LEFT,KNEE,-1,-1,-1", "LEFT,ANKLE,1,-1,-1"
    })
    void namesAnglesByTheirPositiveDirection(Side side, JointKind kind, int first, int second, int third) {
        VectorSeries angles =
                JointAngles.of(new Joint(side, kind), series(SOMEHOW), series(SOMEHOW.times(joint(0.4, -0.2, 0.3))));

        assertEquals(first * 0.4, angles.x(0), ROUNDING);
        assertEquals(second * -0.2, angles.y(0), ROUNDING);
        assertEquals(third * 0.3, angles.z(0), ROUNDING);
    }

    /** Anatomy: in upright stance (lab X forward, Y up, Z right) the shank swung backward is a flexed knee. */
    @Test
    void callsAShankSwungBackwardAFlexedKnee() {
        Rotation shank = Rotation.about(Z, -0.7);

        VectorSeries angles = JointAngles.of(KNEE, series(Rotation.IDENTITY), series(shank));

        assertTrue(shank.times(Y.negated()).x() < 0, "its lower end points backward");
        assertEquals(0.7, angles.x(0), ROUNDING);
    }

    /** Anatomy: a left thigh whose lower end swings to the subject's right, across the midline, is adducted. */
    @Test
    void callsALeftThighSwungToTheRightAdducted() {
        Rotation thigh = Rotation.about(X, -0.2);

        VectorSeries angles =
                JointAngles.of(new Joint(Side.LEFT, JointKind.HIP), series(Rotation.IDENTITY), series(thigh));

        assertTrue(thigh.times(Y.negated()).z() > 0, "its lower end points to the right");
        assertEquals(0.2, angles.y(0), ROUNDING);
    }

    /** Anatomy: a left foot whose toes turn to the subject's right is rotated internally. */
    @Test
    void callsALeftFootTurnedToTheRightRotatedInternally() {
        Rotation foot = Rotation.about(Y, -0.2);

        VectorSeries angles = JointAngles.of(LEFT_ANKLE, series(Rotation.IDENTITY), series(foot));

        assertTrue(foot.times(X).z() > 0, "its toes point to the right");
        assertEquals(0.2, angles.z(0), ROUNDING);
    }

    /** By construction: the first and third angle run through a turn and a half. */
    @Test
    void runsOnPastHalfATurn() {
        DoubleFunction<Rotation> turning = t -> SOMEHOW.times(joint(3 * Math.PI * t, 0.3, -3 * Math.PI * t));

        VectorSeries angles = JointAngles.of(HIP, series(SOMEHOW, 31), turned(turning, 31));

        for (int i = 0; i < 31; i++) {
            assertEquals(3 * Math.PI * i / 30, angles.x(i), 10 * ROUNDING);
            assertEquals(-3 * Math.PI * i / 30, angles.z(i), 10 * ROUNDING);
        }
    }

    @Test
    void beginsAnewWithinHalfATurnAfterAGap() {
        PoseSeries.Builder distal = new PoseSeries.Builder(3);
        distal.set(0, Vector3.ZERO, joint(3, 0, 0));
        distal.set(1, Vector3.ZERO, Rotation.GAP);
        distal.set(2, Vector3.ZERO, joint(3.5, 0, 0));

        VectorSeries angles = JointAngles.of(HIP, series(Rotation.IDENTITY, 3), distal.build());

        assertTrue(angles.isGap(1));
        assertEquals(3.5 - 2 * Math.PI, angles.x(2), ROUNDING);
    }

    @Test
    void leavesAFrameBlankInWhichTheFirstAndThirdAxisAreOne() {
        Rotation locked = joint(0.3, Math.PI / 2, 0.2);

        VectorSeries angles = JointAngles.of(HIP, series(Rotation.IDENTITY), series(locked));
        VectorSeries floating = JointAxes.of(HIP, series(Rotation.IDENTITY), series(locked), 1);

        assertTrue(angles.isGap(0));
        assertTrue(floating.isGap(0));
    }

    @Test
    void notesTheFrameThatComesNearestToTheLock() {
        VectorSeries angles =
                VectorSeries.of(new double[5], new double[] {0, 1.31, -1.4, Double.NaN, 1}, new double[5]);

        Finding finding = JointAngles.lockNote(LEFT_ANKLE, angles, 101).orElseThrow();

        assertEquals("angle-lock", finding.code());
        assertEquals("left_ankle, frame 103", finding.where());
        assertEquals("the inversion angle reaches -80.2°, beyond 75°", finding.figure());
    }

    @Test
    void notesNothingBelowTheLimit() {
        VectorSeries angles = VectorSeries.of(new double[] {3}, new double[] {1.30}, new double[] {3});

        assertTrue(JointAngles.lockNote(HIP, angles, 1).isEmpty());
    }

    /**
     * Closed form: with a = 0.4, b = -0.2, g = 0.3 and M = (10, 20, -50) in the proximal segment the projections on e1, e2,
     * e3 are p1 = Mz, p2 = Mx cos a + My sin a, p3 = M · (-sin a cos b, cos a cos b, sin b).
     */
    @Test
    void givesTheWorkedProjections() {
        Rotation distal = SOMEHOW.times(joint(0.4, -0.2, 0.3));
        Vector3 moment = SOMEHOW.times(new Vector3(10, 20, -50));

        double[] projections = new double[3];
        for (int axis = 0; axis < 3; axis++) {
            projections[axis] = JointAxes.of(HIP, series(SOMEHOW), series(distal), axis)
                    .at(0)
                    .dot(moment);
        }

        double rounded = 0.0005;
        assertEquals(-50, projections[0], rounded);
        assertEquals(16.999, projections[1], rounded);
        assertEquals(24.171, projections[2], rounded);
    }

    /**
     * Power: the sum of moment projection times angle rate is M·(ω_d - ω_p), for every joint and side. Rates are central
     * differences of the angles; ω follows from the rotations by central differences too. With h = 1e-5 s and third
     * derivatives of order 1 the truncation is 1e-10 and the rounding 1e-16 / 1e-5 = 1e-11, times moments of up to 100 N·m.
     */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void conservesPower(long seed) {
        Random random = new Random(seed);
        double h = 1e-5;
        Rotation[] p = new Rotation[3];
        Rotation[] d = new Rotation[3];
        Vector3 tilt = randomVector(random);
        Vector3 rate = randomVector(random);
        double[] start = {random.nextGaussian(), 0.5 * random.nextGaussian(), random.nextGaussian()};
        double[] speed = {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()};
        for (int k = 0; k < 3; k++) {
            double t = (k - 1) * h;
            p[k] = Rotation.about(rate.unit(), rate.norm() * t).times(Rotation.about(tilt.unit(), tilt.norm()));
            d[k] = p[k].times(joint(start[0] + speed[0] * t, start[1] + speed[1] * t, start[2] + speed[2] * t));
        }
        Vector3 relative = spin(d, h).minus(spin(p, h));
        Vector3 moment = randomVector(random).times(50);
        PoseSeries proximal = series(List.of(p));
        PoseSeries distal = series(List.of(d));
        for (Side side : Side.values()) {
            for (JointKind kind : JointKind.values()) {
                Joint joint = new Joint(side, kind);
                VectorSeries angles = JointAngles.of(joint, proximal, distal);
                Vector3 rates = angles.at(2).minus(angles.at(0)).times(1 / (2 * h));

                Vector3 projections = new Vector3(
                        JointAxes.of(joint, proximal, distal, 0).at(1).dot(moment),
                        JointAxes.of(joint, proximal, distal, 1).at(1).dot(moment),
                        JointAxes.of(joint, proximal, distal, 2).at(1).dot(moment));

                assertEquals(moment.dot(relative), projections.dot(rates), 1e-7, joint.key() + ", seed " + seed);
            }
        }
    }

    /** Mirroring body and lab in the plane Z = 0 swaps the sides and leaves every named angle as it is. */
    @Test
    void givesAMirroredJointTheSameNamedAngles() {
        Rotation proximal = Rotation.about(new Vector3(0.6, 0, 0.8), 0.4);
        Rotation distal = proximal.times(joint(0.4, -0.2, 0.3));

        for (JointKind kind : JointKind.values()) {
            VectorSeries right = JointAngles.of(new Joint(Side.RIGHT, kind), series(proximal), series(distal));
            VectorSeries left =
                    JointAngles.of(new Joint(Side.LEFT, kind), series(mirrored(proximal)), series(mirrored(distal)));

            assertEquals(0, right.at(0).minus(left.at(0)).norm(), ROUNDING, kind.key());
        }
    }

    @Test
    void carriesAGapOfEitherSegment() {
        PoseSeries gap = series(Rotation.GAP);

        assertTrue(JointAngles.of(HIP, gap, series(SOMEHOW)).isGap(0));
        assertTrue(JointAngles.of(HIP, series(SOMEHOW), gap).isGap(0));
        assertTrue(JointAxes.of(HIP, series(SOMEHOW), gap, 0).isGap(0));
        assertTrue(JointAxes.of(HIP, gap, series(SOMEHOW), 2).isGap(0));
    }

    private static Vector3 spin(Rotation[] r, double h) {
        Rotation step = r[2].times(r[0].transpose());
        Vector3 twiceSine = new Vector3(step.zy() - step.yz(), step.xz() - step.zx(), step.yx() - step.xy());
        return twiceSine.times(1 / (4 * h));
    }

    private static Rotation joint(double a, double b, double g) {
        return Rotation.about(Z, a).times(Rotation.about(X, b)).times(Rotation.about(Y, g));
    }

    /** In the mirror each column's Z component swaps, and the segment's own Z is turned to the right again. */
    private static Rotation mirrored(Rotation r) {
        return new Rotation(r.xx(), r.xy(), -r.xz(), r.yx(), r.yy(), -r.yz(), -r.zx(), -r.zy(), r.zz());
    }

    private static Vector3 randomVector(Random random) {
        return new Vector3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
    }

    private static PoseSeries series(Rotation rotation) {
        return series(List.of(rotation));
    }

    private static PoseSeries series(Rotation rotation, int size) {
        return turned(t -> rotation, size);
    }

    private static PoseSeries series(List<Rotation> rotations) {
        PoseSeries.Builder poses = new PoseSeries.Builder(rotations.size());
        for (int i = 0; i < rotations.size(); i++) {
            poses.set(i, Vector3.ZERO, rotations.get(i));
        }
        return poses.build();
    }

    /** The rotations at times 0 to 1. */
    private static PoseSeries turned(DoubleFunction<Rotation> rotation, int size) {
        PoseSeries.Builder poses = new PoseSeries.Builder(size);
        for (int i = 0; i < size; i++) {
            Rotation own = rotation.apply(size > 1 ? i / (size - 1.0) : 0);
            poses.set(i, Vector3.ZERO, own);
        }
        return poses.build();
    }
}
