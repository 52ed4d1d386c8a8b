package treadwork.solver.cli;

import java.util.ArrayList;
import java.util.List;

/** A table of plain text whose columns line up: words to the left, numbers to the right. */
final class TextTable {

    private final List<Boolean> numbers = new ArrayList<>();
    private final List<List<String>> rows = new ArrayList<>();

    /** Adds a column of words. */
    TextTable words() {
        numbers.add(false);
        return this;
    }

    /** Adds columns of numbers. */
    TextTable numbers(int count) {
        for (int i = 0; i < count; i++) {
            numbers.add(true);
        }
        return this;
    }

    /** Adds a row; cells that are missing at its end stay empty. */
    TextTable row(String... cells) {
        rows.add(List.of(cells));
        return this;
    }

    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder();
            for (int column = 0; column < row.size(); column++) {
                String cell = row.get(column);
                String blanks = " ".repeat(width(column) - cell.length());
                line.append(column == 0 ? "" : "  ").append(numbers.get(column) ? blanks + cell : cell + blanks);
            }
            text.append(line.toString().stripTrailing()).append(System.lineSeparator());
        }
        return text.toString();
    }

    private int width(int column) {
        return rows.stream()
                .filter(row -> row.size() > column)
                .mapToInt(row -> row.get(column).length())
                .max()
                .orElse(0);
    }
}
