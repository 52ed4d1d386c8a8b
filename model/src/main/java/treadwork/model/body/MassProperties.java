package treadwork.model.body;

import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;

/**
 * What a rigid segment, or a thing fixed to it, weighs and how that is spread.
 *
 * @param mass    kg
 * @param centre  of mass, from the segment's origin in segment axes, m
 * @param inertia about the centre of mass, segment axes, kg·m²
 */
public record MassProperties(double mass, Vector3 centre, Inertia inertia) {

    /** Both bodies as one rigid body (parallel axes). */
    public MassProperties plus(MassProperties other) {
        double total = mass + other.mass;
        Vector3 common = centre.times(mass / total).plus(other.centre.times(other.mass / total));
        Inertia moved = inertia.plus(Inertia.ofPointMass(mass, centre.minus(common)))
                .plus(other.inertia)
                .plus(Inertia.ofPointMass(other.mass, other.centre.minus(common)));
        return new MassProperties(total, common, moved);
    }
}
