package treadwork.solver.dynamics;

import treadwork.model.body.MassProperties;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * A rigid segment in motion; all series in lab axes.
 *
 * @param mass                in the segment's own axes, from its origin
 * @param pose                of the segment
 * @param angularVelocity     rad/s
 * @param angularAcceleration rad/s²
 * @param centre              of mass, m
 * @param acceleration        of the centre of mass, m/s²
 */
public record MovingSegment(
        MassProperties mass,
        PoseSeries pose,
        VectorSeries angularVelocity,
        VectorSeries angularAcceleration,
        VectorSeries centre,
        VectorSeries acceleration) {

    public int size() {
        return pose.size();
    }

    /**
     * How fast the angular momentum about the centre of mass changes, lab axes, N·m, a frame.
     *
     * <p>With everything turned into segment axes, where the tensor I stands still: dH/dt = R (I α + ω × I ω).
     */
    VectorSeries spinRates() {
        VectorSeries.Builder rates = new VectorSeries.Builder(size());
        for (int i = 0; i < size(); i++) {
            Rotation labFromSegment = pose.rotation(i);
            Vector3 omega = labFromSegment.transposeTimes(angularVelocity.at(i));
            Vector3 alpha = labFromSegment.transposeTimes(angularAcceleration.at(i));
            Vector3 change =
                    mass.inertia().times(alpha).plus(omega.cross(mass.inertia().times(omega)));
            rates.set(i, labFromSegment.times(change));
        }
        return rates.build();
    }
}
