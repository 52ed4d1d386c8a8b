package treadwork.solver.proof;

import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;

/**
 * A small rigid motion of a plate about the described centre of its surface, from how it is described to how it is.
 *
 * @param moved  of the centre, lab axes, m
 * @param turned lab axes
 */
record Placement(Vector3 moved, Rotation turned) {

    static final Placement NONE = new Placement(Vector3.ZERO, Rotation.IDENTITY);

    /** After a further small step: three of the place, m, and three of the turn, rad. */
    Placement stepped(double[] step) {
        Vector3 turn = new Vector3(step[3], step[4], step[5]);
        double angle = turn.norm();
        Rotation further = angle > 0 ? Rotation.about(turn.unit(), angle) : Rotation.IDENTITY;
        return new Placement(moved.plus(new Vector3(step[0], step[1], step[2])), further.times(turned));
    }

    /** The turn as a rotation vector, rad. */
    Vector3 turnVector() {
        Vector3 twice = new Vector3(
                turned.columnY().z() - turned.columnZ().y(),
                turned.columnZ().x() - turned.columnX().z(),
                turned.columnX().y() - turned.columnY().x());
        double sine = twice.norm() / 2;
        double cosine =
                (turned.columnX().x() + turned.columnY().y() + turned.columnZ().z() - 1) / 2;
        return sine > 0 ? twice.times(Math.atan2(sine, cosine) / (2 * sine)) : Vector3.ZERO;
    }

    /** Where a point of the plate as described really is. */
    Vector3 of(Vector3 described, Vector3 centre) {
        return centre.plus(moved).plus(turned.times(described.minus(centre)));
    }
}
