package treadwork.io.text;

import java.util.Collection;
import java.util.Optional;
import treadwork.model.capture.LengthUnit;

/** The unit of the positions: by the user's word, by the units row, else by their size. */
final class PointUnit {

    /** No room is as large in metres, nor any as small in millimetres as ten times that. */
    private static final double ROOM = 30;

    private PointUnit() {}

    /** @param columns the first of each marker */
    static LengthUnit of(Table table, Collection<Integer> columns, Optional<LengthUnit> stated, Notes notes) {
        String units = table.header.units().get(columns.iterator().next()).replaceAll("[\\[\\]()]", "");
        Optional<LengthUnit> known = stated.or(() -> LengthUnit.ofSymbol(units));
        if (known.isPresent()) {
            return known.get();
        }
        double largest = largest(table, columns);
        if (largest < 10 * ROOM && largest > ROOM) {
            throw Refusal.of(
                    "point-unit-unknown",
                    table.source.file,
                    "no unit of length is stated, and the largest coordinate, " + largest + ", fits several",
                    "Set lab.pointUnit in the study file");
        }
        LengthUnit assumed = largest <= ROOM ? LengthUnit.M : LengthUnit.MM;
        notes.guessed(
                "text-unit",
                "no unit of length is stated, the largest coordinate is " + largest,
                "Positions are taken as " + assumed.symbol());
        return assumed;
    }

    private static double largest(Table table, Collection<Integer> columns) {
        double largest = 0;
        for (int column : columns) {
            for (int k = 0; k < 3; k++) {
                for (double value : table.column(column + k)) {
                    largest = Math.abs(value) > largest ? Math.abs(value) : largest;
                }
            }
        }
        return largest;
    }
}
