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
        this.columns = new double[dialect.columns()][16];
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

    /** The file's line of a row, if no line between the rows is blank. */
    int line(int row) {
        return dialect.line() + row;
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
        for (int i = 0; i < columns.length; i++) {
            columns[i] = Arrays.copyOf(columns[i], rows);
        }
    }

    private void row(Numbers numbers, int start, int end, int line) {
        if (rows == columns[0].length) {
            for (int i = 0; i < columns.length; i++) {
                columns[i] = Arrays.copyOf(columns[i], rows * 2);
            }
        }
        byte[] bytes = source.bytes;
        byte delimiter = (byte) dialect.delimiter();
        int cell = 0;
        int from = start;
        for (int at = start; at <= end; at++) {
            if (at < end && bytes[at] != delimiter) {
                continue;
            }
            if (cell < columns.length) {
                columns[cell][rows] = numbers.parse(from, at);
                if (!numbers.valid()) {
                    throw cell(line, cell, from, at);
                }
            } else if (at > from) {
                throw ragged(line, cell + 1);
            }
            cell++;
            from = at + 1;
        }
        if (cell < columns.length - 1
                || (cell == columns.length - 1 && !header.names().get(cell).isEmpty())) {
            throw ragged(line, cell);
        }
        if (cell == columns.length - 1) {
            columns[cell][rows] = Double.NaN;
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
