package treadwork.model.body;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** A point of the body that is found by touch, or a joint centre that a marker is placed for. */
public enum Landmark {
    RIGHT_ASIS,
    LEFT_ASIS,
    RIGHT_PSIS,
    LEFT_PSIS,
    /** In place of both PSISs. */
    SACRUM,
    RIGHT_HIP_CENTRE,
    LEFT_HIP_CENTRE,
    RIGHT_LATERAL_EPICONDYLE,
    LEFT_LATERAL_EPICONDYLE,
    RIGHT_MEDIAL_EPICONDYLE,
    LEFT_MEDIAL_EPICONDYLE,
    RIGHT_LATERAL_MALLEOLUS,
    LEFT_LATERAL_MALLEOLUS,
    RIGHT_MEDIAL_MALLEOLUS,
    LEFT_MEDIAL_MALLEOLUS,
    RIGHT_HEEL,
    LEFT_HEEL,
    RIGHT_FIRST_METATARSAL_HEAD,
    LEFT_FIRST_METATARSAL_HEAD,
    RIGHT_SECOND_METATARSAL_HEAD,
    LEFT_SECOND_METATARSAL_HEAD,
    RIGHT_FIFTH_METATARSAL_HEAD,
    LEFT_FIFTH_METATARSAL_HEAD,
    RIGHT_TOE_TIP,
    LEFT_TOE_TIP;

    /** The name in study files, for example {@code right_asis}. */
    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The landmark of that name on one side: {@code of(LEFT, "heel")} is {@link #LEFT_HEEL}. */
    public static Landmark of(Side side, String name) {
        return valueOf(side.name() + "_" + name.toUpperCase(Locale.ROOT));
    }

    public static Optional<Landmark> ofKey(String key) {
        return Arrays.stream(values()).filter(mark -> mark.key().equals(key)).findFirst();
    }
}
