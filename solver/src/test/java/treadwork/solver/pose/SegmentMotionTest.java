package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.body.Segment;
import treadwork.model.space.Pose;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.filter.Derivatives;

class SegmentMotionTest {

    private static final double RATE = 200;
    private static final int FRAMES = 200;
    private static final Segment SEGMENT = Segment.LEFT_SHANK;
    private static final List<Vector3> CLUSTER = StandingModel.clusterInSegment(SEGMENT);
    private static final SegmentGeometry GEOMETRY =
            new SegmentGeometry(SEGMENT, new Pose(Vector3.ZERO, Rotation.IDENTITY), CLUSTER, Map.of(), 0.4);

    /**
     * Exact values by automatic differentiation of a smooth rotation and path. The spline's own error is
     * largest beside the two frames at either end, which are left out: measured on these seeds, at most 1e-7 rad/s and
     * 3e-5 rad/s² at speeds of up to 10 rad/s; the bounds allow five times that.
     */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void givesTheExactTurningOfASmoothMotion(long seed) {
        SmoothMotion motion = SmoothMotion.random(new Random(seed));

        SegmentMotion found = SegmentMotion.of(GEOMETRY, markers(motion, FRAMES), RATE);

        double velocity = 0;
        double acceleration = 0;
        for (int i = 2; i < FRAMES - 2; i++) {
            SmoothMotion.State exact = motion.at(i / RATE);
            velocity = Math.max(
                    velocity,
                    exact.angularVelocity().minus(found.angularVelocity().at(i)).norm());
            acceleration = Math.max(
                    acceleration,
                    exact.angularAcceleration()
                            .minus(found.angularAcceleration().at(i))
                            .norm());
            assertEquals(0, exact.origin().minus(found.pose().origin().at(i)).norm(), 1e-13);
            assertEquals(
                    0,
                    exact.labFromBody()
                            .columnX()
                            .minus(found.pose().axisX().at(i))
                            .norm(),
                    1e-12);
        }
        assertTrue(velocity < 5e-7, "rad/s: " + velocity + ", seed " + seed);
        assertTrue(acceleration < 2e-4, "rad/s²: " + acceleration + ", seed " + seed);
    }

    /** Exact values as above, of a point off the origin. */
    @Test
    void givesVelocityAndAccelerationOfAPointOfTheSegment() {
        SmoothMotion motion = SmoothMotion.random(new Random(7));
        Vector3 point = new Vector3(0.03, -0.18, 0.02);

        Derivatives found =
                SegmentMotion.of(GEOMETRY, markers(motion, FRAMES), RATE).derivatives(point);

        double worst = 0;
        for (int i = 2; i < FRAMES - 2; i++) {
            SmoothMotion.State exact = motion.at(i / RATE);
            Vector3 arm = exact.labFromBody().times(point);
            Vector3 spin = exact.angularVelocity();
            Vector3 velocity = exact.velocity().plus(spin.cross(arm));
            assertEquals(0, velocity.minus(found.first().at(i)).norm(), 1e-7, "m/s, frame " + i);
            Vector3 acceleration = exact.acceleration()
                    .plus(exact.angularAcceleration().cross(arm))
                    .plus(spin.cross(spin.cross(arm)));
            worst = Math.max(worst, acceleration.minus(found.second().at(i)).norm());
        }
        assertTrue(worst < 5e-6, "m/s²: " + worst);
    }

    /** By construction: three whole turns at a steady 9 rad/s about a slanting axis pass through every attitude there is. */
    @Test
    void knowsNoSingularAttitude() {
        Vector3 axis = new Vector3(0.48, -0.6, 0.64);
        List<List<Vector3>> places = new ArrayList<>();
        for (int i = 0; i < 420; i++) {
            Rotation turn = Rotation.about(axis, 9 * i / RATE);
            places.add(CLUSTER.stream().map(turn::times).toList());
        }

        SegmentMotion found = SegmentMotion.of(GEOMETRY, series(places), RATE);

        for (int i = 2; i < 418; i++) {
            assertEquals(0, axis.times(9).minus(found.angularVelocity().at(i)).norm(), 1e-6, "frame " + i);
        }
    }

    @Test
    void leavesFramesWithoutThreeMarkersBlankAndKeepsTheRest() {
        SmoothMotion motion = SmoothMotion.random(new Random(8));
        List<VectorSeries> markers = new ArrayList<>(markers(motion, FRAMES));
        markers.set(1, blanked(markers.get(1), 80, 82));
        markers.set(2, blanked(markers.get(2), 81, 120));

        SegmentMotion found = SegmentMotion.of(GEOMETRY, markers, RATE);

        for (int i = 0; i < FRAMES; i++) {
            boolean unknown = i == 81 || i == 82;
            assertEquals(unknown, found.pose().isGap(i), "pose, frame " + i);
            assertEquals(unknown, found.angularVelocity().isGap(i), "velocity, frame " + i);
            assertEquals(unknown, found.angularAcceleration().isGap(i), "acceleration, frame " + i);
            assertEquals(unknown, Double.isNaN(found.residuals().at(i)), "residual, frame " + i);
        }
        assertFalse(Double.isNaN(found.fitRms()));
    }

    /** By symmetry: corners of a square moved up and down by turns leave the best fit where it is, each 2 mm off. */
    @Test
    void reportsHowFarTheMarkersLieFromTheFit() {
        List<Vector3> square = List.of(
                new Vector3(0.1, 0.1, 0),
                new Vector3(-0.1, 0.1, 0),
                new Vector3(-0.1, -0.1, 0),
                new Vector3(0.1, -0.1, 0));
        List<Vector3> bent = new ArrayList<>();
        for (int m = 0; m < 4; m++) {
            bent.add(square.get(m).plus(new Vector3(1, 2, 3 + (m % 2 == 0 ? 0.002 : -0.002))));
        }
        List<List<Vector3>> places = new ArrayList<>();
        for (int i = 0; i < 10; i++) {
            places.add(i < 5 ? bent : square);
        }
        SegmentGeometry geometry = new SegmentGeometry(SEGMENT, GEOMETRY.standing(), square, Map.of(), 0.4);

        SegmentMotion found = SegmentMotion.of(geometry, series(places), RATE);

        assertEquals(0.002, found.residuals().at(3), 1e-14);
        assertEquals(0, found.residuals().at(7), 1e-14);
        assertEquals(0.002 / Math.sqrt(2), found.fitRms(), 1e-14);
    }

    /** Gaps everywhere: nothing is known, and nothing is made up. */
    @Test
    void knowsNoResidualWhereNothingIsSeen() {
        List<VectorSeries> unseen =
                CLUSTER.stream().map(p -> VectorSeries.gaps(20)).toList();

        SegmentMotion found = SegmentMotion.of(GEOMETRY, unseen, RATE);

        assertTrue(Double.isNaN(found.fitRms()));
        assertTrue(found.angularVelocity().isGap(10));
    }

    /**
     * Nothing is left behind a frame but the nineteen numbers of the result and what three differentiations take. Bytes a
     * frame are those of 2n less those of n frames, over n; the least of many rounds, since the compiler comes to its
     * best code in its own time. A single vector a frame would be 40 bytes more.
     */
    @Test
    void allocatesNothingAFrameBeyondItsResult() {
        List<VectorSeries> few = markers(SmoothMotion.random(new Random(9)), 2000);
        List<VectorSeries> many = markers(SmoothMotion.random(new Random(9)), 4000);
        double bound = 19 * 8 + 8;
        double whole = Double.POSITIVE_INFINITY;
        double derivatives = Double.POSITIVE_INFINITY;

        for (int round = 0; round < 400 && !(round > 20 && whole - 3 * derivatives < bound); round++) {
            whole = Math.min(whole, bytesAFrame(SegmentMotionTest::move, few, many));
            derivatives = Math.min(derivatives, bytesAFrame(SegmentMotionTest::differentiate, few, many));
        }

        assertTrue(whole - 3 * derivatives < bound, "bytes a frame: " + whole + ", differentiation: " + derivatives);
    }

    private static void move(List<VectorSeries> markers) {
        SegmentMotion.of(GEOMETRY, markers, RATE);
    }

    private static void differentiate(List<VectorSeries> markers) {
        Derivatives.of(markers.get(0), RATE);
    }

    private static double bytesAFrame(
            Consumer<List<VectorSeries>> work, List<VectorSeries> few, List<VectorSeries> many) {
        long ofMany = bytes(() -> work.accept(many));
        long ofFew = bytes(() -> work.accept(few));
        return (ofMany - ofFew) / (double) (many.get(0).size() - few.get(0).size());
    }

    private static long bytes(Runnable work) {
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getCurrentThreadAllocatedBytes();
        work.run();
        return threads.getCurrentThreadAllocatedBytes() - before;
    }

    private static List<VectorSeries> markers(SmoothMotion motion, int frames) {
        List<List<Vector3>> places = new ArrayList<>();
        for (int i = 0; i < frames; i++) {
            SmoothMotion.State state = motion.at(i / RATE);
            Pose pose = new Pose(state.origin(), state.labFromBody());
            places.add(CLUSTER.stream().map(pose::toLab).toList());
        }
        return series(places);
    }

    private static List<VectorSeries> series(List<List<Vector3>> places) {
        List<VectorSeries> markers = new ArrayList<>();
        for (int m = 0; m < places.get(0).size(); m++) {
            VectorSeries.Builder marker = new VectorSeries.Builder(places.size());
            for (int i = 0; i < places.size(); i++) {
                marker.set(i, places.get(i).get(m));
            }
            markers.add(marker.build());
        }
        return markers;
    }

    private static VectorSeries blanked(VectorSeries series, int from, int to) {
        return series.eachComponent(values -> {
            for (int i = from; i <= to; i++) {
                values[i] = Double.NaN;
            }
            return values;
        });
    }
}
