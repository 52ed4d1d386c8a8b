package treadwork.io.capture;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Plate;
import treadwork.model.space.Rotation;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.NamedPlate;

/**
 * A plate that is stated in lab axes, brought to a plate of type 1: F' = Rᵀ F, P' = Rᵀ (P - C), T' = ±T, where R has the
 * plate's axes as columns and C is the middle of its corners. T is stated about the positive lab axis that is nearest to
 * the plate's normal, so the sign is minus where the plate's z points the other way. A centre of pressure that is off the
 * surface slides along the force to it, which changes no load: P' - s F' has the same P' × F'.
 */
final class LabPlate {

    private static final List<String> NAMES = List.of("Fx", "Fy", "Fz", "Px", "Py", "Tz");

    /** Below it the line of a force is not known well enough to slide along it, N. */
    private static final double FAINT = 5;

    private final Rotation labFromPlate;
    private final Vector3 centre;
    private final double unit;
    private final double sign;
    private final List<AnalogChannel> stated;

    private LabPlate(NamedPlate plate, List<AnalogChannel> stated) {
        List<Vector3> corners = plate.corners();
        Vector3 along =
                corners.get(0).plus(corners.get(3)).minus(corners.get(1)).minus(corners.get(2));
        Vector3 across =
                corners.get(0).plus(corners.get(1)).minus(corners.get(2)).minus(corners.get(3));
        Vector3 x = along.unit();
        Vector3 z = x.cross(across).unit();
        this.labFromPlate = Rotation.ofColumns(x, z.cross(x), z);
        this.centre = corners.stream().reduce(Vector3.ZERO, Vector3::plus).times(1.0 / Plate.CORNERS);
        this.unit = plate.channelUnit().metres();
        Vector3 about = LabAxis.nearest(z).direction();
        this.sign = about.x() + about.y() + about.z();
        this.stated = stated;
    }

    /** @param stated the seven channels, in the order of {@link NamedPlate#channels} */
    static LabPlate of(NamedPlate plate, List<AnalogChannel> stated) {
        return new LabPlate(plate, stated);
    }

    /** The six channels of type 1. */
    List<AnalogChannel> channels() {
        int size = stated.get(0).values().size();
        double[][] made = new double[NAMES.size()][size];
        for (int i = 0; i < size; i++) {
            Vector3 force = labFromPlate.transposeTimes(vector(0, i));
            Vector3 place = onSurface(labFromPlate.transposeTimes(vector(3, i).minus(centre.times(1 / unit))), force);
            made[0][i] = force.x();
            made[1][i] = force.y();
            made[2][i] = force.z();
            made[3][i] = place.x();
            made[4][i] = place.y();
            made[5][i] = sign * stated.get(6).values().at(i);
        }
        List<AnalogChannel> channels = new ArrayList<>();
        for (int j = 0; j < made.length; j++) {
            AnalogChannel like = stated.get(j < 3 ? 0 : j < 5 ? 3 : 6);
            channels.add(new AnalogChannel(
                    NAMES.get(j) + " of " + stated.get(0).label(), like.unit(), ScalarSeries.of(made[j])));
        }
        return channels;
    }

    private static Vector3 onSurface(Vector3 place, Vector3 force) {
        return Math.abs(force.z()) >= FAINT ? place.minus(force.times(place.z() / force.z())) : place;
    }

    private Vector3 vector(int first, int i) {
        return new Vector3(
                stated.get(first).values().at(i),
                stated.get(first + 1).values().at(i),
                stated.get(first + 2).values().at(i));
    }
}
