package treadwork.solver.draft;

import treadwork.model.space.Vector3;

/**
 * A marker of the standing body.
 *
 * @param at m: x ahead, y up from the floor, z to the body's right of its middle
 */
record Spot(String label, Vector3 at) {

    /** The same seen in a mirror, so that both sides are judged alike. */
    Spot mirrored() {
        return new Spot(label, new Vector3(at.x(), at.y(), -at.z()));
    }
}
