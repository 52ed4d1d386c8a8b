package treadwork.model.study;

import java.util.Locale;

/** How segments are placed on their markers: each on its own, or all at once with the joints kept together. */
public enum PoseMethod {
    SEGMENT_FIT,
    LINKED;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
