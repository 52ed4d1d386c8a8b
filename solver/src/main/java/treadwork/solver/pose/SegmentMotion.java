package treadwork.solver.pose;

import java.util.List;
import treadwork.model.body.Segment;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.filter.Derivatives;

/**
 * How a segment moves. Lab axes, one entry a frame; a frame in which the segment is not fixed by its markers is a gap in all.
 *
 * @param pose                by the least-squares fit of its cluster
 * @param rate                frames a second
 * @param angularVelocity     ω, rad/s
 * @param angularAcceleration α, rad/s²
 * @param residuals           root mean square of the known markers' distances from the fitted cluster, m
 * @param fitRms              the same over all markers of all frames, m; NaN when there are none
 */
public record SegmentMotion(
        Segment segment,
        PoseSeries pose,
        double rate,
        VectorSeries angularVelocity,
        VectorSeries angularAcceleration,
        ScalarSeries residuals,
        double fitRms) {

    /**
     * Fits the segment to its markers and differentiates its axes.
     *
     * <p>With R = (x y z) the axes in lab axes, Ṙ Rᵀ is the skew matrix of ω and R̈ Rᵀ that of α plus the symmetric ω ωᵀ - |ω|²
     * E. So ω = ½ (x × ẋ + y × ẏ + z × ż), and α the same with second derivatives: no angles, so no attitude is singular.
     *
     * @param markers the cluster's, in its order, smoothed, m
     * @param rate    frames a second
     */
    public static SegmentMotion of(SegmentGeometry geometry, List<VectorSeries> markers, double rate) {
        Placed placed = placed(new RigidFit(geometry.cluster()), markers);
        PoseSeries pose = placed.pose;
        Derivatives x = Derivatives.of(pose.axisX(), rate);
        Derivatives y = Derivatives.of(pose.axisY(), rate);
        Derivatives z = Derivatives.of(pose.axisZ(), rate);
        return new SegmentMotion(
                geometry.segment(),
                pose,
                rate,
                turning(pose, List.of(x.first(), y.first(), z.first())),
                turning(pose, List.of(x.second(), y.second(), z.second())),
                placed.residuals,
                placed.rms);
    }

    /** Velocity, m/s, and acceleration, m/s², of a point fixed in the segment, lab axes. */
    public Derivatives derivatives(Vector3 inSegment) {
        return Derivatives.of(pose.toLab(inSegment), rate);
    }

    /** What the fits of all frames gave. */
    private record Placed(PoseSeries pose, ScalarSeries residuals, double rms) {}

    private static Placed placed(RigidFit fit, List<VectorSeries> markers) {
        int frames = markers.get(0).size();
        PoseSeries.Builder poses = new PoseSeries.Builder(frames);
        ScalarSeries.Builder residuals = new ScalarSeries.Builder(frames);
        double squares = 0;
        long known = 0;
        for (int i = 0; i < frames; i++) {
            if (fit.fit(markers, i)) {
                poses.set(i, fit.origin(), fit.labFromSegment());
                residuals.set(i, Math.sqrt(fit.squares() / fit.known()));
                squares += fit.squares();
                known += fit.known();
            } else {
                poses.set(i, Vector3.GAP, Rotation.GAP);
                residuals.set(i, Double.NaN);
            }
        }
        return new Placed(poses.build(), residuals.build(), Math.sqrt(squares / known));
    }

    private static VectorSeries turning(PoseSeries pose, List<VectorSeries> derivatives) {
        VectorSeries dx = derivatives.get(0);
        VectorSeries dy = derivatives.get(1);
        VectorSeries dz = derivatives.get(2);
        VectorSeries.Builder turning = new VectorSeries.Builder(pose.size());
        for (int i = 0; i < pose.size(); i++) {
            turning.set(
                    i,
                    pose.axisX()
                            .at(i)
                            .cross(dx.at(i))
                            .plus(pose.axisY().at(i).cross(dy.at(i)))
                            .plus(pose.axisZ().at(i).cross(dz.at(i)))
                            .times(0.5));
        }
        return turning.build();
    }
}
