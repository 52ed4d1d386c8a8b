package treadwork.model.body;

import java.util.Locale;

/** The sex whose column of an inertia table applies. */
public enum Sex {
    FEMALE,
    MALE;

    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }
}
