package treadwork.io.text;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Three neighbouring columns whose names differ in an ending x, y, z alone. */
final class Triples {

    private static final Pattern NAME = Pattern.compile("(.*?\\S)[ _.:-]*([xyzXYZ])");

    /** Trade words for what plates measure, which have three components as a marker has. */
    private static final Pattern PLATE =
            Pattern.compile("(f|force|m|moment|t|torque|cop|grf)[ _.]*[0-9]*", Pattern.CASE_INSENSITIVE);

    private Triples() {}

    /** The first column of each, in the file's order, those left out that a person names as channels. */
    static Map<String, Integer> of(Header header, Set<String> channels) {
        Map<String, Integer> triples = new LinkedHashMap<>();
        for (int i = 0; i + 2 < header.names().size(); i++) {
            Matcher x = NAME.matcher(header.names().get(i));
            boolean first = x.matches()
                    && x.group(2).equalsIgnoreCase("x")
                    && header.names().subList(i, i + 3).stream().noneMatch(channels::contains);
            if (first && is(header, i + 1, x.group(1), "y") && is(header, i + 2, x.group(1), "z")) {
                triples.put(x.group(1), i);
            }
        }
        return triples;
    }

    /** Whether a label may as well be that of a force, a moment or a centre of pressure. */
    static boolean isLikePlate(String label) {
        return PLATE.matcher(label).matches();
    }

    private static boolean is(Header header, int column, String label, String axis) {
        Matcher name = NAME.matcher(header.names().get(column));
        return name.matches() && name.group(1).equals(label) && name.group(2).equalsIgnoreCase(axis);
    }
}
