package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.IntFunction;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** A rigid segment that swings and advances for 1.2 s at 200 Hz, with markers on it, m. */
final class SwingingSegment {

    static final double RATE = 200;
    static final int FRAMES = 240;

    /** 0.1 s. */
    static final int LONGEST = 20;

    /** The last three lie on one line. */
    static final List<Vector3> CLUSTER = List.of(
            new Vector3(0.05, -0.02, 0.06),
            new Vector3(-0.04, 0.08, 0.05),
            new Vector3(0.02, -0.10, 0.04),
            new Vector3(0.02, 0.00, 0.04),
            new Vector3(0.02, 0.12, 0.04));

    /** Some fifty operations on metres. */
    static final double ROUNDING = 1e-14;

    private SwingingSegment() {}

    static void assertSameCourse(VectorSeries expected, VectorSeries actual, double tolerance) {
        for (int i = 0; i < expected.size(); i++) {
            assertEquals(expected.isGap(i), actual.isGap(i), "gap at " + i);
            if (!expected.isGap(i)) {
                assertEquals(0, expected.at(i).minus(actual.at(i)).norm(), tolerance, "distance at " + i + ", m");
            }
        }
    }

    static VectorSeries course(int marker) {
        return rigid(CLUSTER).get(marker);
    }

    static List<VectorSeries> rigid(List<Vector3> cluster) {
        List<VectorSeries> markers = new ArrayList<>();
        for (Vector3 marker : cluster) {
            markers.add(moving(i -> marker));
        }
        return markers;
    }

    /** A marker at a place on the segment that may change from frame to frame. */
    static VectorSeries moving(IntFunction<Vector3> onSegment) {
        VectorSeries.Builder course = new VectorSeries.Builder(FRAMES);
        for (int i = 0; i < FRAMES; i++) {
            course.set(i, place(i, onSegment.apply(i)));
        }
        return course.build();
    }

    /** Where a point of a swinging, advancing segment is. */
    static Vector3 place(int frame, Vector3 marker) {
        double t = frame / RATE;
        Rotation swing = Rotation.about(new Vector3(0.6, 0, 0.8), 0.7 * Math.sin(2 * Math.PI * t));
        Rotation turn = Rotation.about(new Vector3(0, 1, 0), 0.2 * Math.cos(4 * Math.PI * t + 1));
        Vector3 origin = new Vector3(1.3 * t, 0.02 * Math.sin(2 * Math.PI * t), 0.5 + 0.03 * Math.sin(4 * Math.PI * t));
        return swing.times(turn).times(marker).plus(origin);
    }

    static Vector3 gaussian(Random random) {
        return new Vector3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
    }

    static VectorSeries withGap(VectorSeries series, int from, int to) {
        VectorSeries.Builder holed = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            holed.set(i, i >= from && i < to ? Vector3.GAP : series.at(i));
        }
        return holed.build();
    }
}
