package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/** Labels of points or channels. */
final class Labels {

    /** Begins the label of a point that nobody named. */
    private static final char UNNAMED = '*';

    private Labels() {}

    /** Exactly {@code count} texts of a list; empty where it is shorter. */
    static List<String> of(Parameters parameters, String name, int count) {
        List<String> labels = new ArrayList<>(parameters.texts(name, count));
        while (labels.size() < count) {
            labels.add("");
        }
        return labels;
    }

    /** Takes off a {@code subject:} prefix that all named points share; it names a person, not a place on the body. */
    static List<String> withoutSubject(List<String> labels) {
        String prefix = null;
        for (String label : labels) {
            if (label.isEmpty() || label.charAt(0) == UNNAMED) {
                continue;
            }
            String own = label.substring(0, label.indexOf(':') + 1);
            boolean other = prefix != null && !prefix.equals(own);
            if (own.isEmpty() || other) {
                return labels;
            }
            prefix = own;
        }
        if (prefix == null) {
            return labels;
        }
        String common = prefix;
        return labels.stream()
                .map(label -> label.startsWith(common)
                        ? label.substring(common.length()).strip()
                        : label)
                .toList();
    }

    /** The subjects that named points bear before a colon, where every one bears one. */
    static List<String> subjects(List<String> labels) {
        Set<String> subjects = new TreeSet<>();
        for (String label : labels) {
            if (label.isEmpty() || label.charAt(0) == UNNAMED) {
                continue;
            }
            int colon = label.indexOf(':');
            if (colon < 1) {
                return List.of();
            }
            subjects.add(label.substring(0, colon));
        }
        return List.copyOf(subjects);
    }
}
