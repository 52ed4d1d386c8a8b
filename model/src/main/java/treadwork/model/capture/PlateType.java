package treadwork.model.capture;

import java.util.Arrays;
import java.util.Optional;

/** The plate types of the C3D format whose channels are described well enough to be used. */
public enum PlateType {
    /** Three forces, the centre of pressure from the plate's centre, and the free moment. */
    FORCE_AND_CENTRE_OF_PRESSURE(1, 6),
    /** Three forces and three moments about the plate's sensor origin. */
    FORCE_AND_MOMENT(2, 6),
    /** Eight forces of four sensors: x12, x34, y14, y23, z1, z2, z3, z4. */
    FOUR_SENSORS(3, 8),
    /** As {@link #FORCE_AND_MOMENT} after a 6×6 calibration matrix. */
    CALIBRATED(4, 6);

    private final int code;
    private final int channels;

    PlateType(int code, int channels) {
        this.code = code;
        this.channels = channels;
    }

    /** The format's number for this type. */
    public int code() {
        return code;
    }

    /** How many analog channels such a plate has. */
    public int channels() {
        return channels;
    }

    public static Optional<PlateType> ofCode(int code) {
        return Arrays.stream(values()).filter(type -> type.code == code).findFirst();
    }
}
