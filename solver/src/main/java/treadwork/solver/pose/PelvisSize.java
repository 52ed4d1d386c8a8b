package treadwork.solver.pose;

import treadwork.model.space.Vector3;

/**
 * The two distances of the pelvis that hip regressions use.
 *
 * @param width between the ASISs, m
 * @param depth from the midpoint of the ASISs to that of the PSISs, or to the sacrum, m
 */
public record PelvisSize(double width, double depth) {

    static PelvisSize of(Vector3 rightAsis, Vector3 leftAsis, Vector3 midPsis) {
        return new PelvisSize(
                rightAsis.minus(leftAsis).norm(),
                rightAsis.midpoint(leftAsis).minus(midPsis).norm());
    }
}
