package treadwork.model.study;

import java.util.Locale;

/** A published table of segment masses, centres and moments of inertia. */
public enum InertiaTable {
    DE_LEVA_1996,
    DUMAS_2007,
    WINTER_DEMPSTER;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
