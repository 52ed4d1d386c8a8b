package treadwork.io.text;

import java.util.Arrays;

/** The numbers of a text file, column by column; NaN where a cell is empty. */
final class Table {

    final Source source;
    final Dialect dialect;
    final Header header;
    private final double[][] columns;
    private int rows;

    private Table(Source source) {
        this.source = source;
        this.dialect = Dialect.of(source);
        this.header = Header.of(source, dialect);
        this.columns = new double[dialect.columns()][mostRows()];
        fill();
    }

    static Table of(String file, byte[] bytes) {
        return new Table(Source.of(file, bytes));
    }

    int rows() {
        return rows;
    }

    /** Not a copy. */
    double[] column(int column) {
        return columns[column];
    }

    /** The file's line of a row, counted again since lines between the rows may be blank. */
    int line(int row) {
        int line = dialect.line();
        int at = dialect.data();
        for (int left = row; at < source.bytes.length; line++) {
            if (source.endOfLine(at) > at && left-- == 0) {
                return line;
            }
            at = source.nextLine(at);
        }
        return line;
    }

    /** No more rows than lines, and none with fewer bytes than delimiters: so memory is allotted once, and not in vain. */
    private int mostRows() {
        int bytes = source.bytes.length - dialect.data();
        int shortest = Math.max(1, dialect.columns() - 1);
        return Math.min(source.lines - dialect.line() + 1, bytes / shortest + 1);
    }

    private void fill() {
        Numbers numbers = new Numbers(source.bytes, dialect.decimal());
        int line = dialect.line();
        for (int at = dialect.data(); at < source.bytes.length; line++) {
            int end = source.endOfLine(at);
            if (end > at) {
                row(numbers, at, end, line);
            }
            at = source.nextLine(at);
        }
        for (int i = 0; i < columns.length && rows < columns[i].length; i++) {
            columns[i] = Arrays.copyOf(columns[i], rows);
        }
    }

    private void row(Numbers numbers, int start, int end, int line) {
        byte delimiter = (byte) dialect.delimiter();
        int cell = 0;
        int from = start;
        while (from <= end) {
            double value = numbers.plain(from, end, delimiter);
            int at = numbers.next();
            if (at < 0) {
                at = source.endOfCell(from, end, delimiter);
                value = numbers.parse(from, at);
                if (!numbers.valid() && cell < columns.length) {
                    throw cell(line, cell, from, at);
                }
            }
            if (cell < columns.length) {
                columns[cell][rows] = value;
            } else if (at > from) {
                throw ragged(line, cell + 1);
            }
            cell++;
            from = at + 1;
        }
        endOfRow(cell, line);
    }

    /** A last column without a name may be missing. */
    private void endOfRow(int cells, int line) {
        int last = columns.length - 1;
        if (cells < last || (cells == last && !header.names().get(last).isEmpty())) {
            throw ragged(line, cells);
        }
        if (cells == last) {
            columns[last][rows] = Double.NaN;
        }
        rows++;
    }

    private RuntimeException ragged(int line, int cells) {
        return Refusal.of(
                "text-ragged",
                source.file + ", line " + line,
                "the row has " + cells + (cells > columns.length ? " cells or more" : " cells")
                        + ", the first row of numbers has " + columns.length,
                "Export the table again, or take the line out if it is a remark");
    }

    private RuntimeException cell(int line, int cell, int from, int to) {
        String text = source.text(from, Math.min(to, from + 40)).replaceAll("\\p{Cntrl}", "?");
        boolean sign = text.indexOf(dialect.decimal() == '.' ? ',' : '.') >= 0;
        return Refusal.of(
                "text-cell",
                source.file + ", line " + line + ", column " + (cell + 1) + " \""
                        + header.names().get(cell) + "\"",
                "\"" + text + "\" is not a number"
                        + (sign
                                ? " with the decimal " + (dialect.decimal() == '.' ? "point" : "comma")
                                        + " that the file begins with"
                                : ""),
                sign ? "Use one decimal sign throughout" : "Leave the cell empty where nothing was measured");
    }
}
