package treadwork.io.study;

import java.util.Locale;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/**
 * Where in a JSON file a value or key stands.
 *
 * @param file   as the person named it
 * @param line   counted from 1
 * @param column counted from 1
 * @param path   for example {@code subjects[0].massKg}; empty for the whole document
 */
record Place(String file, int line, int column, String path) {

    /** The place in words, for {@link Finding#where()}. */
    String words() {
        String spot = String.format(Locale.ROOT, "%s, line %d, column %d", file, line, column);
        return path.isEmpty() ? spot : spot + ", " + path;
    }

    UnusableInputException unusable(String code, String figure, String meaning, String mend) {
        return new UnusableInputException(new Finding(code, Severity.REFUSES, words(), figure, meaning, mend));
    }

    Finding warning(String code, String figure, String meaning, String mend) {
        return new Finding(code, Severity.WARNING, words(), figure, meaning, mend);
    }

    /**
     * A JSON pointer as a person writes a path: {@code /subjects/0/massKg} as {@code subjects[0].massKg}. No key that
     * the schema knows is all digits, so digits are a place in a list.
     */
    static String pathOf(String pointer) {
        StringBuilder path = new StringBuilder();
        for (String token : pointer.split("/", -1)) {
            if (token.isEmpty()) {
                continue;
            }
            if (token.chars().allMatch(c -> c >= '0' && c <= '9')) {
                path.append('[').append(token).append(']');
            } else {
                path.append(path.length() == 0 ? "" : ".").append(unescaped(token));
            }
        }
        return path.toString();
    }

    static String unescaped(String token) {
        return token.replace("~1", "/").replace("~0", "~");
    }
}
