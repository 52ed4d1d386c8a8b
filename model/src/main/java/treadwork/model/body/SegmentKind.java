package treadwork.model.body;

import java.util.Locale;

/** A segment whatever its side. */
public enum SegmentKind {
    PELVIS,
    THIGH,
    SHANK,
    FOOT;

    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }
}
