package treadwork.solver.dynamics;

import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** One step of the recursion: from the load at a segment's distal end to that at its proximal end. */
public final class NewtonEuler {

    private NewtonEuler() {}

    /**
     * What the proximal neighbour does to a segment, at the proximal joint centre P.
     *
     * <p>Newton: F = m (a - g) - F_d. Euler about the centre of mass C: M = dH/dt - M_d - (D - C) × F_d - (P - C) × F,
     * where F_d and M_d, about D, are what the distal neighbour or the ground does to this segment. A gap in any input
     * is a gap here.
     *
     * @param joint   the proximal joint centre P, m
     * @param gravity the field, m/s², pointing down
     */
    public static LoadSeries proximal(MovingSegment segment, LoadSeries distal, VectorSeries joint, Vector3 gravity) {
        int frames = joint.size();
        VectorSeries spinRates = segment.spinRates();
        VectorSeries.Builder forces = new VectorSeries.Builder(frames);
        VectorSeries.Builder moments = new VectorSeries.Builder(frames);
        for (int i = 0; i < frames; i++) {
            Vector3 centre = segment.centre().at(i);
            Vector3 force = segment.acceleration()
                    .at(i)
                    .minus(gravity)
                    .times(segment.mass().mass())
                    .minus(distal.force().at(i));
            forces.set(i, force);
            moments.set(
                    i,
                    spinRates
                            .at(i)
                            .minus(distal.momentAbout(centre, i))
                            .minus(joint.at(i).minus(centre).cross(force)));
        }
        return new LoadSeries(joint, forces.build(), moments.build());
    }
}
