package treadwork.model.study;

import java.util.Locale;

/** The medio-lateral landmarks that turn the shank about its long axis. */
public enum ShankAxis {
    MALLEOLI,
    EPICONDYLES;

    /** The name in study files. */
    public String key() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
