package treadwork.solver.proof;

import java.util.List;
import treadwork.model.space.Vector3;

/**
 * How far a plate's load misses the rod.
 *
 * @param distance root mean square distance on the surface between centre of pressure and tip, m
 * @param angle    root mean square angle between force and rod, rad
 * @param moment   root mean square of a component of the moment about the tip, N·m
 * @param across   root mean square of a component of the force across the rod, N
 */
record RodMisfit(double distance, double angle, double moment, double across) {

    /**
     * Means are weighted by the square of the force, so that nothing is divided by a small one: with n the normal, M the
     * moment about the tip and u × F the force across the rod, they are √(Σ |n × M|²/Σ (n·F)²) and √(Σ |u × F|²/Σ |F|²).
     */
    static RodMisfit of(List<RodFrame> frames, PlacementFit.Model model, Placement placement) {
        double level = 0;
        double moments = 0;
        double acrosses = 0;
        double normal = 0;
        double forces = 0;
        for (RodFrame frame : frames) {
            Vector3 force = placement.turned().times(frame.force());
            Vector3 moment = model.momentAboutTip(frame, placement);
            Vector3 across = model.across(frame, placement);
            Vector3 tilt = model.normal().cross(moment);
            level += tilt.dot(tilt);
            moments += moment.dot(moment);
            acrosses += across.dot(across);
            double push = model.normal().dot(force);
            normal += push * push;
            forces += force.dot(force);
        }
        int components = 3 * frames.size();
        return new RodMisfit(
                Math.sqrt(level / normal),
                Math.sqrt(acrosses / forces),
                Math.sqrt(moments / components),
                Math.sqrt(acrosses / components));
    }
}
