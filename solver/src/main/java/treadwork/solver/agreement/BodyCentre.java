package treadwork.solver.agreement;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.filter.Derivatives;
import treadwork.solver.filter.RunEnds;
import treadwork.solver.pose.SegmentMotion;
import treadwork.solver.pose.StandingBody;

/**
 * How the whole body's centre of mass is accelerated, as far as legs and pelvis tell: the legs' masses move with their
 * segments, all the rest with the middle of the hips. Of walking adults whose trunk was not marked this gives the sum of the
 * ground reactions to 40 to 65 N, root mean square, of 80 kg (measured on open recordings).
 *
 * @param massKg       of the body with all that it wears
 * @param acceleration lab axes, m/s²; a gap where a segment is not known, and where the filter has made it up
 */
record BodyCentre(double massKg, VectorSeries acceleration) {

    /** Empty unless both legs and the pelvis are known. */
    static Optional<BodyCentre> of(Scene scene) {
        Optional<Vector3> hips = hips(scene.body());
        if (hips.isEmpty() || !scene.motions().keySet().containsAll(List.of(Segment.values()))) {
            return Optional.empty();
        }
        SegmentMotion pelvis = scene.motions().get(Segment.PELVIS);
        double massKg = scene.massKg();
        double legs = 0;
        Sum sum = new Sum(scene.capture().frames());
        for (Map.Entry<Segment, MassProperties> part : scene.masses().entrySet()) {
            SegmentMotion motion = scene.motions().get(part.getKey());
            legs += part.getValue().mass();
            sum.add(
                    motion.pose().toLab(part.getValue().centre()),
                    part.getValue().mass() / massKg);
        }
        sum.add(pelvis.pose().toLab(hips.orElseThrow()), 1 - legs / massKg);
        VectorSeries acceleration = Derivatives.of(sum.series(), pelvis.rate()).second();
        return Optional.of(new BodyCentre(massKg, RunEnds.blank(acceleration, scene.endFrames())));
    }

    private static Optional<Vector3> hips(StandingBody body) {
        Vector3 right = body.joints().get(new Joint(Side.RIGHT, JointKind.HIP));
        Vector3 left = body.joints().get(new Joint(Side.LEFT, JointKind.HIP));
        return right == null || left == null ? Optional.empty() : Optional.of(right.midpoint(left));
    }

    /** A weighted sum of courses. */
    private static final class Sum {

        private final double[] x;
        private final double[] y;
        private final double[] z;

        Sum(int size) {
            x = new double[size];
            y = new double[size];
            z = new double[size];
        }

        void add(VectorSeries course, double weight) {
            for (int i = 0; i < x.length; i++) {
                x[i] += weight * course.x(i);
                y[i] += weight * course.y(i);
                z[i] += weight * course.z(i);
            }
        }

        VectorSeries series() {
            return VectorSeries.of(x, y, z);
        }
    }
}
