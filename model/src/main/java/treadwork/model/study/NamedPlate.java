package treadwork.model.study;

import java.util.List;
import java.util.Optional;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Vector3;

/**
 * A force plate whose channels a person gives by their names.
 *
 * @param labAxes     whether force, centre of pressure and free moment are stated along the lab's axes rather than the
 *                    plate's; then the type is {@link PlateType#FORCE_AND_CENTRE_OF_PRESSURE}
 * @param corners     lab axes, m, as in {@link treadwork.model.capture.Plate}
 * @param origin      plate axes, m, as in {@link treadwork.model.capture.Plate}
 * @param channels    labels, in the order of the type; in lab axes the three forces, the three coordinates of the centre
 *                    of pressure, and the free moment about the lab axis that is nearest to the plate's normal
 * @param calibration for {@link PlateType#CALIBRATED}
 * @param channelUnit unit of length in the moments (N × unit) and the centre of pressure
 */
public record NamedPlate(
        PlateType type,
        boolean labAxes,
        List<Vector3> corners,
        Vector3 origin,
        List<String> channels,
        Optional<CalibrationMatrix> calibration,
        LengthUnit channelUnit) {

    /** Of a plate in lab axes. */
    public static final int LAB_CHANNELS = 7;

    public NamedPlate {
        corners = List.copyOf(corners);
        channels = List.copyOf(channels);
        int needed = labAxes ? LAB_CHANNELS : type.channels();
        if (channels.size() != needed) {
            throw new IllegalArgumentException("such a plate has " + needed + " channels, not " + channels.size());
        }
        if (labAxes && type != PlateType.FORCE_AND_CENTRE_OF_PRESSURE) {
            throw new IllegalArgumentException("only a plate of type 1 can be stated in lab axes");
        }
    }
}
