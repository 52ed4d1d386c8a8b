package treadwork.model.study;

import java.util.Locale;

/** The axes in which moments and forces are given. */
public enum MomentAxes {
    JOINT,
    PROXIMAL,
    DISTAL,
    LAB;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
