package treadwork.model.study;

import java.util.Locale;

/** By what moments, forces and powers are divided. */
public enum Normalisation {
    NONE,
    /** Body mass, kg. */
    MASS,
    /** Body mass × height, kg·m. */
    MASS_HEIGHT,
    /** Per cent of body weight × height, N·m; forces per cent of body weight. */
    WEIGHT_HEIGHT_PERCENT;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
