package treadwork.model.study;

import java.util.Locale;

/** Whether a moment is what the proximal segment does to the distal one, or its opposite. */
public enum MomentConvention {
    INTERNAL,
    EXTERNAL;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
