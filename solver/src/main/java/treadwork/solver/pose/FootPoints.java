package treadwork.solver.pose;

import java.util.Optional;
import treadwork.model.body.SegmentKind;
import treadwork.model.space.Vector3;

/**
 * The outline of a foot, in foot axes, m.
 *
 * @param toeTip       where the marker set maps it, that place; else estimated
 * @param toeEstimated whether the toe tip was estimated by {@link #estimatedToeTip}
 */
public record FootPoints(Vector3 heel, Vector3 firstHead, Vector3 fifthHead, Vector3 toeTip, boolean toeEstimated) {

    /**
     * The midpoint of the first and fifth metatarsal heads as a share of the distance from heel to toe tip: mean of about
     * 0.73 (first) and 0.63 (fifth) of foot length, from memory of anthropometric surveys.
     */
    public static final double HEADS_SHARE = 0.68;

    /**
     * The outline of a measured foot.
     *
     * @throws IllegalArgumentException for another segment
     */
    public static FootPoints of(SegmentGeometry foot) {
        if (foot.segment().kind() != SegmentKind.FOOT) {
            throw new IllegalArgumentException(foot.segment().key() + " is no foot");
        }
        Vector3 heel = foot.landmark("heel").orElseThrow();
        Vector3 first = foot.landmark("first_metatarsal_head").orElseThrow();
        Vector3 fifth = foot.landmark("fifth_metatarsal_head").orElseThrow();
        Optional<Vector3> toe = foot.landmark("toe_tip");
        Vector3 tip = toe.orElseGet(() -> estimatedToeTip(heel, first.midpoint(fifth)));
        return new FootPoints(heel, first, fifth, tip, toe.isEmpty());
    }

    /** The toe tip on the line from the heel through the midpoint of the heads, which lies {@link #HEADS_SHARE} of the way. */
    static Vector3 estimatedToeTip(Vector3 heel, Vector3 midHeads) {
        return heel.plus(midHeads.minus(heel).times(1 / HEADS_SHARE));
    }
}
