package treadwork.solver.plate;

import java.util.Optional;
import treadwork.model.space.Plane;
import treadwork.model.space.Vector3;
import treadwork.model.space.Wrench;

/**
 * Where on a plate its load acts, and what moment is left there.
 *
 * @param point      on the surface, in the axes of the load, m
 * @param freeMoment about the surface's normal, N·m
 */
public record CentreOfPressure(Vector3 point, double freeMoment) {

    /**
     * Centre of pressure of the load on a flat plate.
     *
     * <p>Let M be the moment about the surface's point O. The ground pushes but does not pull, so at the centre of
     * pressure P only a moment along the normal n is left: M = (P - O) × F + T n. As (P - O)·n = 0, n × M = (P - O)(n·F),
     * hence P = O + n × M / (n·F) and T = n·(M - (P - O) × F). Statics only, exact.
     *
     * @param reaction  what the ground does to the foot, any axes
     * @param surface   the plate's top, same axes, normal towards the foot
     * @param threshold least normal force, N, at which a foot counts as standing on the plate; above zero
     * @return empty when n·F is below {@code threshold} or anything is not a number: there is no contact to place
     * @throws IllegalArgumentException if {@code threshold} is not above zero
     */
    public static Optional<CentreOfPressure> of(Wrench reaction, Plane surface, double threshold) {
        if (!(threshold > 0)) {
            throw new IllegalArgumentException("contact threshold must be above 0 N, is " + threshold + " N");
        }
        Vector3 normal = surface.normal();
        double push = normal.dot(reaction.force());
        if (!(push >= threshold)) {
            return Optional.empty();
        }
        Vector3 moment = reaction.about(surface.point()).moment();
        Vector3 arm = normal.cross(moment).times(1 / push);
        double freeMoment = normal.dot(moment.minus(arm.cross(reaction.force())));
        if (arm.isGap() || Double.isNaN(freeMoment)) {
            return Optional.empty();
        }
        return Optional.of(new CentreOfPressure(surface.point().plus(arm), freeMoment));
    }
}
