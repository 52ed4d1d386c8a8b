package treadwork.model.body;

import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;

/**
 * Where in a segment its mass lies, as shares of the length between the two ends that a table names.
 */
public sealed interface MassSpread {

    /**
     * The centre on the line between the ends, and a principal radius of gyration about each of three axes through it.
     *
     * @param centre       from the first end
     * @param sagittal     radius about the axis perpendicular to the other two: fore-aft on thigh and shank, perpendicular
     *                     to the sole on the foot
     * @param transverse   radius about the medio-lateral axis
     * @param longitudinal radius about the line between the ends
     */
    record OnLine(double centre, double sagittal, double transverse, double longitudinal) implements MassSpread {}

    /**
     * As seen from the side only: the ends and the centre have no medio-lateral place, and one radius of gyration holds
     * about every axis across the segment.
     *
     * @param centre  from the first end
     * @param radius  about an axis through the centre across the segment
     * @param density of the segment, kg/m³
     */
    record InSagittalPlane(double centre, double radius, double density) implements MassSpread {}

    /**
     * A full vector and tensor in the table's own axes of the right side: X forward, Y towards the head, Z to the right.
     *
     * @param centre  from the first end
     * @param inertia about the centre, divided by mass × length²
     */
    record InAxes(Vector3 centre, Inertia inertia) implements MassSpread {}
}
