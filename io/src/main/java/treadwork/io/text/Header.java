package treadwork.io.text;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Names and units of the columns.
 *
 * @param names one a column, made of the row of labels and, where there is one, the row of axes
 * @param units one a column, empty where none is stated
 * @param rate  Hz, where a line before the columns states one
 */
record Header(List<String> names, List<String> units, Optional<Double> rate) {

    private static final Pattern AXIS = Pattern.compile("[xyzXYZ]");
    private static final Pattern UNIT =
            Pattern.compile("[\\[(]?(mm|cm|m|n|s|ms|hz|v|mv|n[·.* ]?mm|n[·.* ]?m|-)[\\])]?", Pattern.CASE_INSENSITIVE);
    private static final Pattern RATE = Pattern.compile(
            "(?:rate|frequency|freq)[^0-9]*([0-9]+(?:[.,][0-9]+)?)|([0-9]+(?:[.,][0-9]+)?)\\s*hz",
            Pattern.CASE_INSENSITIVE);

    static Header of(Source source, Dialect dialect) {
        List<List<String>> above = new ArrayList<>();
        StringBuilder preamble = new StringBuilder();
        for (List<String> row : dialect.preamble(source)) {
            if (row.size() >= Math.max(2, dialect.columns() - 2)) {
                above.add(row);
            } else {
                above.clear();
                preamble.append(String.join(" ", row)).append('\n');
            }
        }
        List<String> units = take(above, UNIT, dialect.columns());
        List<String> axes = take(above, AXIS, dialect.columns());
        List<String> labels = above.isEmpty() ? axes : padded(above.get(above.size() - 1), dialect.columns());
        if (labels.stream().allMatch(String::isEmpty)) {
            throw Refusal.of(
                    "text-header",
                    source.file + ", line " + dialect.line(),
                    "the numbers begin without a row of column names above them",
                    "Export the table with its header");
        }
        List<String> names = joined(labels, axes);
        once(source, dialect, names);
        return new Header(names, units, rate(preamble));
    }

    /** The last row if it is of that kind, taken off; else blanks. */
    private static List<String> take(List<List<String>> rows, Pattern kind, int columns) {
        if (rows.size() > 1) {
            List<String> last = rows.get(rows.size() - 1);
            long texts = last.stream().filter(cell -> !cell.isEmpty()).count();
            long such =
                    last.stream().filter(cell -> kind.matcher(cell).matches()).count();
            if (such >= 2 && 3 * such >= 2 * texts) {
                rows.remove(rows.size() - 1);
                return padded(last, columns);
            }
        }
        return padded(List.of(), columns);
    }

    private static List<String> padded(List<String> row, int columns) {
        List<String> cells = new ArrayList<>(row.subList(0, Math.min(row.size(), columns)));
        while (cells.size() < columns) {
            cells.add("");
        }
        return cells;
    }

    /** A label holds for the blank cells to its right: with the axis below it, or for x, y and z in turn. */
    private static List<String> joined(List<String> labels, List<String> axes) {
        List<String> names = new ArrayList<>();
        for (int i = 0; i < labels.size(); i++) {
            int from = i;
            while (from > 0 && i - from < 2 && labels.get(from).isEmpty()) {
                from--;
            }
            boolean spans = from + 2 < labels.size()
                    && labels.get(from + 1).isEmpty()
                    && labels.get(from + 2).isEmpty();
            String label = labels.get(from);
            String axis = axes.get(i);
            if (AXIS.matcher(axis).matches()) {
                names.add(label + "_" + axis);
            } else if (axis.isEmpty() && spans && !label.isEmpty()) {
                names.add(label + "_" + "xyz".charAt(i - from));
            } else {
                names.add(labels.get(i).isEmpty() ? axis : labels.get(i));
            }
        }
        return names;
    }

    private static void once(Source source, Dialect dialect, List<String> names) {
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < names.size(); i++) {
            if (!names.get(i).isEmpty() && !seen.add(names.get(i))) {
                throw Refusal.of(
                        "text-column-twice",
                        source.file + ", above line " + dialect.line() + ", column " + (i + 1),
                        "the column name \"" + names.get(i) + "\" stands twice",
                        "Give each column a name of its own");
            }
        }
    }

    private static Optional<Double> rate(CharSequence preamble) {
        Matcher matcher = RATE.matcher(preamble);
        if (!matcher.find()) {
            return Optional.empty();
        }
        String text = matcher.group(1) == null ? matcher.group(2) : matcher.group(1);
        double rate = Double.parseDouble(text.replace(',', '.'));
        return rate > 0 ? Optional.of(rate) : Optional.empty();
    }

    /** The column that counts time, by its name; -1 for none. */
    int time() {
        for (int i = 0; i < names.size(); i++) {
            if (bare(i).matches("time|t|times|seconds|sec")) {
                return i;
            }
        }
        return -1;
    }

    /** Seconds in one unit of the time column. */
    double timeUnit(int column) {
        boolean milli = units.get(column).matches("[\\[(]?ms[\\])]?")
                || names.get(column).toLowerCase(Locale.ROOT).matches(".*[^a-z]ms[^a-z]*");
        return milli ? 1e-3 : 1;
    }

    boolean counts(int column) {
        return column == time() || bare(column).matches("frame|frames|sample|samples|index|field|#|no\\.?|item");
    }

    /** A name without its unit. */
    private String bare(int column) {
        return names.get(column)
                .toLowerCase(Locale.ROOT)
                .replaceFirst("[ _]?[\\[(]?(?<=[ _\\[(])(s|ms|sec)[\\])]?$", "")
                .replaceFirst("[ _]?number$", "")
                .strip();
    }
}
