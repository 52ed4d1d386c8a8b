package treadwork.io.text;

import java.util.ArrayList;
import java.util.List;

/**
 * How a text file is laid out.
 *
 * @param data      where the first row of numbers begins, bytes
 * @param line      its number, counted from 1
 * @param columns   cells in it
 */
record Dialect(char delimiter, char decimal, int data, int line, int columns) {

    /** Lines before the numbers that are looked at. */
    private static final int MOST_LINES = 200;

    /** The dialect under which the most columns of numbers stand below one another. */
    static Dialect of(Source source) {
        Dialect best = null;
        for (char delimiter : new char[] {'\t', ';', ','}) {
            for (char decimal : new char[] {'.', ','}) {
                Dialect found = first(source, delimiter, decimal);
                if (found != null && (best == null || found.isBefore(best))) {
                    best = found;
                }
            }
        }
        if (best == null) {
            throw Refusal.of(
                    "text-layout",
                    source.file,
                    "no rows of numbers parted by tab, semicolon or comma begin in the first " + MOST_LINES + " lines",
                    "Export a C3D file or delimited text, with one decimal sign throughout");
        }
        return best;
    }

    /** More columns, or as many from an earlier line on. */
    private boolean isBefore(Dialect other) {
        return columns > other.columns || (columns == other.columns && line < other.line);
    }

    private static Dialect first(Source source, char delimiter, char decimal) {
        int at = 0;
        for (int line = 1; line <= MOST_LINES && at < source.bytes.length; line++) {
            int next = source.nextLine(at);
            int columns = numeric(source, at, delimiter, decimal);
            if (columns >= 2
                    && (next >= source.bytes.length
                            || mostly(source, next, delimiter, decimal, columns)
                            || source.endOfLine(next) == next)) {
                return new Dialect(delimiter, decimal, at, line, columns);
            }
            at = next;
        }
        return null;
    }

    /** Cells of a line in which all are numbers or gaps and some are numbers; 0 for another line. */
    private static int numeric(Source source, int start, char delimiter, char decimal) {
        Numbers numbers = new Numbers(source.bytes, decimal);
        int end = source.endOfLine(start);
        int cells = 0;
        int known = 0;
        int from = start;
        while (from <= end) {
            int at = source.endOfCell(from, end, (byte) delimiter);
            known += Double.isNaN(numbers.parse(from, at)) ? 0 : 1;
            if (!numbers.valid()) {
                return 0;
            }
            cells++;
            from = at + 1;
        }
        return known > 0 ? cells : 0;
    }

    /** Whether at least half as many numbers stand in a line; a wrong cell in it is then named later. */
    private static boolean mostly(Source source, int start, char delimiter, char decimal, int columns) {
        Numbers numbers = new Numbers(source.bytes, decimal);
        int end = source.endOfLine(start);
        int known = 0;
        int from = start;
        while (from <= end) {
            int at = source.endOfCell(from, end, (byte) delimiter);
            known += Double.isNaN(numbers.parse(from, at)) ? 0 : 1;
            from = at + 1;
        }
        return 2 * known >= columns;
    }

    /** The rows before the numbers, cell by cell, those without text left out. */
    List<List<String>> preamble(Source source) {
        List<List<String>> rows = new ArrayList<>();
        for (int at = 0; at < data; at = source.nextLine(at)) {
            String text = source.text(at, source.endOfLine(at));
            if (!text.isBlank()) {
                rows.add(split(text));
            }
        }
        return rows;
    }

    private List<String> split(String text) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (c == delimiter && !quoted) {
                cells.add(cell.toString().strip());
                cell.setLength(0);
            } else {
                cell.append(c);
            }
        }
        cells.add(cell.toString().strip());
        return cells;
    }

    String words() {
        String name = delimiter == '\t' ? "tab" : delimiter == ';' ? "semicolon" : "comma";
        return "text, " + name + ", decimal " + (decimal == '.' ? "point" : "comma");
    }
}
