package treadwork.model.study;

import java.util.Arrays;
import java.util.Optional;
import treadwork.model.space.Vector3;

/** A signed axis of the lab. */
public enum LabAxis {
    PLUS_X("+x", new Vector3(1, 0, 0)),
    MINUS_X("-x", new Vector3(-1, 0, 0)),
    PLUS_Y("+y", new Vector3(0, 1, 0)),
    MINUS_Y("-y", new Vector3(0, -1, 0)),
    PLUS_Z("+z", new Vector3(0, 0, 1)),
    MINUS_Z("-z", new Vector3(0, 0, -1));

    private final String key;
    private final Vector3 direction;

    LabAxis(String key, Vector3 direction) {
        this.key = key;
        this.direction = direction;
    }

    /** The name in study files, for example {@code +z}. */
    public String key() {
        return key;
    }

    /** Of length one, lab axes. */
    public Vector3 direction() {
        return direction;
    }

    public static Optional<LabAxis> ofKey(String key) {
        return Arrays.stream(values()).filter(axis -> axis.key.equals(key)).findFirst();
    }

    /** The axis that {@code vector} lies nearest to. */
    public static LabAxis nearest(Vector3 vector) {
        LabAxis best = PLUS_X;
        for (LabAxis axis : values()) {
            if (axis.direction.dot(vector) > best.direction.dot(vector)) {
                best = axis;
            }
        }
        return best;
    }
}
