package treadwork.model.load;

import java.util.Locale;

/** What a foot stands on in a frame, as far as loads are concerned. */
public enum Support {
    /** All that this foot stands on is measured. */
    PLATE,
    /** No contact. */
    AIR,
    /** On ground that no plate measures, or sharing a plate: no loads can be known. */
    UNMEASURED;

    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }
}
