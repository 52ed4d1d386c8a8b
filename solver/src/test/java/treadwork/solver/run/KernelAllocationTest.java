package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.Optional;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.space.Inertia;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.ResultSettings;
import treadwork.solver.dynamics.Convention;
import treadwork.solver.dynamics.LimbLoads;
import treadwork.solver.dynamics.LoadSeries;
import treadwork.solver.dynamics.MovingSegment;
import treadwork.solver.dynamics.NewtonEuler;
import treadwork.solver.pose.JointAngles;
import treadwork.solver.pose.JointAxes;
import treadwork.solver.pose.SegmentMotion;

/**
 * Work a frame that allocates costs more in collecting garbage than in reckoning. The kernels that have no such test of
 * their own are run on n and on 2 n frames: what the second run allocates more must be its longer result arrays.
 */
class KernelAllocationTest {

    private static final int FRAMES = 4000;

    /** Until the compiler has come to the kernel; it takes some tens on an idle machine. */
    private static final int MOST_ROUNDS = 1000;

    private static final Joint KNEE = new Joint(Side.RIGHT, JointKind.KNEE);

    /** Bytes of one component of one frame. */
    private static final int NUMBER = 8;

    /** Bytes a frame that an object header or a rounded array length may add, over 4000 frames. */
    private static final int SLACK = 1;

    @Test
    void newtonEulerAllocatesOnlySpinRatesForcesAndMoments() {
        assertBytesAFrame(
                3 * 3,
                moving -> NewtonEuler.proximal(
                        moving.segment, moving.load, moving.segment.centre(), new Vector3(0, 0, -9.81)));
    }

    @Test
    void powerAllocatesOnlyItself() {
        assertBytesAFrame(
                1,
                moving -> LimbLoads.power(
                        moving.load.moment(), moving.segment.angularVelocity(), moving.segment.angularAcceleration()));
    }

    @Test
    void jointAnglesAllocateOnlyThemselves() {
        assertBytesAFrame(3, moving -> JointAngles.of(KNEE, moving.motion.pose(), moving.distal.pose()));
    }

    @Test
    void jointAxesAllocateOnlyThemselves() {
        assertBytesAFrame(3, moving -> JointAxes.of(KNEE, moving.motion.pose(), moving.distal.pose(), 1));
    }

    /** Angles, three axes, moments and forces of three numbers each; the power once and once more for its scale. */
    @Test
    void aConventionAllocatesOnlyAxesAndResults() {
        Convention convention = Convention.of(ResultSettings.DEFAULT, 70, Optional.empty());

        assertBytesAFrame(6 * 3 + 2, moving -> convention.express(KNEE, moving.motion, moving.distal, moving.load));
    }

    @Test
    void aPointOfASegmentAllocatesOnlyItsCourse() {
        Vector3 point = new Vector3(0.03, -0.2, 0.01);

        assertBytesAFrame(3, moving -> moving.motion.pose().toLab(point));
    }

    private static void assertBytesAFrame(int numbers, Consumer<Moving> kernel) {
        Moving some = Moving.of(FRAMES);
        Moving twice = Moving.of(2 * FRAMES);
        double bound = numbers * NUMBER + SLACK;
        double least = Double.POSITIVE_INFINITY;

        for (int round = 0; round < MOST_ROUNDS && !(least <= bound); round++) {
            long more = allocatedBy(() -> kernel.accept(twice)) - allocatedBy(() -> kernel.accept(some));
            least = Math.min(least, (double) more / FRAMES);
        }

        assertTrue(least <= bound, least + " bytes a frame, of which " + numbers * NUMBER + " are results");
    }

    private static long allocatedBy(Runnable work) {
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getCurrentThreadAllocatedBytes();
        work.run();
        return threads.getCurrentThreadAllocatedBytes() - before;
    }

    /** Two swinging segments and a load between them. */
    private record Moving(MovingSegment segment, SegmentMotion motion, SegmentMotion distal, LoadSeries load) {

        static Moving of(int frames) {
            PoseSeries above = swinging(frames, 0.002);
            PoseSeries below = swinging(frames, 0.003);
            VectorSeries wave = above.axisX();
            MassProperties mass = new MassProperties(3, new Vector3(0.01, -0.2, 0), Inertia.diagonal(0.04, 0.01, 0.05));
            return new Moving(
                    new MovingSegment(mass, above, wave, below.axisY(), above.origin(), below.axisZ()),
                    motion(above),
                    motion(below),
                    new LoadSeries(above.origin(), wave, below.axisX()));
        }

        private static SegmentMotion motion(PoseSeries pose) {
            ScalarSeries none = ScalarSeries.gaps(pose.size());
            return new SegmentMotion(Segment.RIGHT_SHANK, pose, 200, pose.axisX(), pose.axisY(), none, Double.NaN);
        }

        private static PoseSeries swinging(int frames, double turnAFrame) {
            Vector3 axis = new Vector3(0.3, 0.5, 0.9).unit();
            PoseSeries.Builder poses = new PoseSeries.Builder(frames);
            for (int i = 0; i < frames; i++) {
                double swing = Math.sin(turnAFrame * i);
                poses.set(i, new Vector3(0.01 * i, swing, 0.9), Rotation.about(axis, swing));
            }
            return poses.build();
        }
    }
}
