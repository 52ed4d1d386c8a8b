package treadwork.model.capture;

import java.util.List;
import java.util.Optional;
import treadwork.model.space.Vector3;

/**
 * A force plate as the file, or the study file in its place, describes it.
 *
 * @param type        what its channels mean
 * @param corners     lab axes, m, in the order of the plate's own quadrants: (+x,+y), (-x,+y), (-x,-y), (+x,-y)
 * @param origin      plate axes, m, as stated: from the sensor origin to the centre of the top surface; for {@link
 *                    PlateType#FOUR_SENSORS} half the sensor distances along x and y, and the same third value
 * @param channels    places in {@link Capture#analog()}, counted from 0, in the order of the type
 * @param calibration for {@link PlateType#CALIBRATED}
 * @param channelUnit unit of length in the channels' moments (N × unit) and centre of pressure
 */
public record Plate(
        PlateType type,
        List<Vector3> corners,
        Vector3 origin,
        List<Integer> channels,
        Optional<CalibrationMatrix> calibration,
        LengthUnit channelUnit) {

    public static final int CORNERS = 4;

    public Plate {
        corners = List.copyOf(corners);
        channels = List.copyOf(channels);
        if (corners.size() != CORNERS) {
            throw new IllegalArgumentException("a plate has 4 corners, not " + corners.size());
        }
        if (channels.size() != type.channels()) {
            throw new IllegalArgumentException(
                    "a plate of type " + type.code() + " has " + type.channels() + " channels, not " + channels.size());
        }
        if (calibration.isPresent() != (type == PlateType.CALIBRATED)) {
            throw new IllegalArgumentException("a calibration matrix belongs to type 4, and to no other");
        }
    }

    /** The middle of the top surface, lab axes, m. */
    public Vector3 centre() {
        return corners.stream().reduce(Vector3.ZERO, Vector3::plus).times(1.0 / CORNERS);
    }
}
