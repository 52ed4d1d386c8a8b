package treadwork.solver.agreement;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import treadwork.model.capture.Plate;
import treadwork.model.space.Vector3;

/** The same plate described otherwise. */
final class PlateVariants {

    private PlateVariants() {}

    static Plate withCorners(Plate plate, List<Vector3> corners) {
        return new Plate(
                plate.type(), corners, plate.origin(), plate.channels(), plate.calibration(), plate.channelUnit());
    }

    static Plate withChannelsOf(Plate plate, Plate other) {
        return new Plate(
                plate.type(),
                plate.corners(),
                plate.origin(),
                other.channels(),
                other.calibration(),
                other.channelUnit());
    }

    /** The seven other orders in which the corners can be gone round: begun elsewhere, or the other way. */
    static List<Plate> otherCornerOrders(Plate plate) {
        List<Plate> orders = new ArrayList<>();
        List<Vector3> back = new ArrayList<>(plate.corners());
        Collections.reverse(back);
        for (int start = 0; start < Plate.CORNERS; start++) {
            if (start > 0) {
                orders.add(withCorners(plate, begunAt(plate.corners(), start)));
            }
            orders.add(withCorners(plate, begunAt(back, start)));
        }
        return orders;
    }

    private static List<Vector3> begunAt(List<Vector3> corners, int start) {
        List<Vector3> begun = new ArrayList<>(corners);
        Collections.rotate(begun, -start);
        return begun;
    }
}
