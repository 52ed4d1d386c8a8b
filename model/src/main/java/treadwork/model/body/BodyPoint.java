package treadwork.model.body;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** A point from or to which an inertia table measures a segment. */
public enum BodyPoint {
    HIP_CENTRE,
    KNEE_CENTRE,
    ANKLE_CENTRE,
    GREATER_TROCHANTER,
    FEMORAL_CONDYLES,
    MEDIAL_MALLEOLUS,
    LATERAL_MALLEOLUS,
    HEEL,
    TOE_TIP,
    SECOND_METATARSAL_HEAD,
    /** Midway between the first and the fifth. */
    MID_METATARSAL_HEADS;

    /** The name in table files, for example {@code hip_centre}. */
    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The name in a sentence, for example "hip centre". */
    public String words() {
        return key().replace('_', ' ');
    }

    public static Optional<BodyPoint> ofKey(String key) {
        return Arrays.stream(values()).filter(point -> point.key().equals(key)).findFirst();
    }
}
