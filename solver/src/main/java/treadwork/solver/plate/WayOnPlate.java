package treadwork.solver.plate;

import java.util.BitSet;
import treadwork.model.space.Vector3;

/**
 * Where a step's centre of pressure goes, as a plate would show it with other moments.
 *
 * @param share  of the samples in which it is on the plate
 * @param length of the way between its farthest places along x and y, m
 * @param offset of its middle from the plate's, m
 * @param inset  how far its middle is inside the nearest edge, m; negative beyond it
 */
record WayOnPlate(double share, double length, double offset, double inset) {

    /** Rounded edges and markers on corners, m. */
    private static final double BEYOND = 0.02;

    /**
     * n × M/(n·F) about the middle of the surface, M = k (M' + o × F) - o × F, with M' the load's moment, o from the sensor
     * origin to the surface and k the factor of the moments about the sensor origin.
     */
    static WayOnPlate of(MeasuredPlate plate, PlateAxes axes, BitSet samples, double factor) {
        Vector3 ex = axes.labFromPlate().columnX();
        Vector3 ey = axes.labFromPlate().columnY();
        Vector3 n = axes.labFromPlate().columnZ();
        Vector3 o = axes.labFromPlate().times(plate.origin());
        double halfX = half(plate, 0, 3, ex);
        double halfY = half(plate, 0, 1, ey);
        double[] x = new double[samples.cardinality()];
        double[] y = new double[x.length];
        int on = 0;
        int k = 0;
        for (int i = samples.nextSetBit(0); i >= 0; i = samples.nextSetBit(i + 1)) {
            Vector3 force = plate.load().force().at(i);
            Vector3 step = o.cross(force);
            Vector3 moment =
                    plate.load().moment().at(i).plus(step).times(factor).minus(step);
            Vector3 place = n.cross(moment).times(1 / n.dot(force));
            x[k] = place.dot(ex);
            y[k] = place.dot(ey);
            on += Math.abs(x[k]) <= halfX + BEYOND && Math.abs(y[k]) <= halfY + BEYOND ? 1 : 0;
            k++;
        }
        double length = Math.hypot(
                Medians.share(x, 0.98) - Medians.share(x, 0.02), Medians.share(y, 0.98) - Medians.share(y, 0.02));
        double midX = Math.abs(Medians.of(x));
        double midY = Math.abs(Medians.of(y));
        return new WayOnPlate(
                (double) on / x.length, length, Math.hypot(midX, midY), Math.min(halfX - midX, halfY - midY));
    }

    private static double half(MeasuredPlate plate, int corner, int neighbour, Vector3 along) {
        Vector3 middle = plate.plate()
                .corners()
                .get(corner)
                .midpoint(plate.plate().corners().get(neighbour));
        return Math.abs(middle.minus(plate.plate().centre()).dot(along));
    }
}
