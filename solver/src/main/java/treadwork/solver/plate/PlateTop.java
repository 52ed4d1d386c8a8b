package treadwork.solver.plate;

import java.util.List;
import treadwork.model.space.Plane;
import treadwork.model.space.Vector3;

/**
 * The surface that one stands on.
 *
 * @param corners lab axes, m, in the plate's own order, so that neighbours share an edge
 * @param surface through the centre, normal up
 */
public record PlateTop(List<Vector3> corners, Plane surface) {

    public PlateTop {
        corners = List.copyOf(corners);
    }

    /** How far the foot of the perpendicular from {@code point} lies beyond the edge, m; 0 on the plate. */
    public double overhang(Vector3 point) {
        Vector3 arm = point.minus(surface.point());
        double alongX = beyond(arm, corners.get(0).midpoint(corners.get(3)));
        double alongY = beyond(arm, corners.get(0).midpoint(corners.get(1)));
        return Math.hypot(alongX, alongY);
    }

    /** How far {@code arm} reaches beyond the middle of an edge, or of the edge across. */
    private double beyond(Vector3 arm, Vector3 middleOfEdge) {
        Vector3 half = middleOfEdge.minus(surface.point());
        double reach = half.norm();
        return Math.max(0, Math.abs(arm.dot(half) / reach) - reach);
    }
}
