package treadwork.io.text;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Which columns are markers: three neighbours whose names differ in an ending x, y, z alone. */
final class Triples {

    private static final Pattern NAME = Pattern.compile("(.*?\\S)[ _.:-]*([xyzXYZ])");

    /** Trade words for what plates measure, which are no markers though they have three components. */
    private static final Pattern PLATE =
            Pattern.compile("(f|force|m|moment|t|torque|cop|grf)[ _.]*[0-9]*", Pattern.CASE_INSENSITIVE);

    private Triples() {}

    /** The first column of each marker, in the file's order. */
    static Map<String, Integer> of(Header header, Set<String> channels) {
        Map<String, Integer> markers = new LinkedHashMap<>();
        for (int i = 0; i + 2 < header.names().size(); i++) {
            Matcher x = NAME.matcher(header.names().get(i));
            if (!x.matches()
                    || !x.group(2).equalsIgnoreCase("x")
                    || channels.contains(header.names().get(i))) {
                continue;
            }
            String label = x.group(1);
            boolean measured = PLATE.matcher(label).matches();
            if (!measured && is(header, i + 1, label, "y") && is(header, i + 2, label, "z")) {
                markers.put(label, i);
            }
        }
        return markers;
    }

    private static boolean is(Header header, int column, String label, String axis) {
        Matcher name = NAME.matcher(header.names().get(column));
        return name.matches() && name.group(1).equals(label) && name.group(2).equalsIgnoreCase(axis);
    }
}
