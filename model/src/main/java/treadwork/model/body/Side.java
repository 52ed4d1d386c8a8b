package treadwork.model.body;

import java.util.Locale;

/** A side of the subject's body. */
public enum Side {
    RIGHT,
    LEFT;

    /** +1 on the right, -1 on the left: what a quantity along the subject's right turns by when mirrored. */
    public int sign() {
        return this == RIGHT ? 1 : -1;
    }

    public Side other() {
        return this == RIGHT ? LEFT : RIGHT;
    }

    /** {@code right} or {@code left}. */
    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }
}
