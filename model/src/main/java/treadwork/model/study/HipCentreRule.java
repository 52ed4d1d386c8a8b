package treadwork.model.study;

import java.util.Locale;

/** How the hip joint centre is found. */
public enum HipCentreRule {
    HARRINGTON_2007,
    HARA_2016,
    BELL_1989,
    LEARDINI_1999,
    FUNCTIONAL,
    MARKER;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
