package treadwork.io.text;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.VectorSeries;

/** The columns of a table that are markers, and their positions. */
final class Markers {

    private final Table table;
    private final Notes notes;
    private final LengthUnit unit;
    private final Map<String, Integer> columns;

    private Markers(Table table, Notes notes, LengthUnit unit, Map<String, Integer> columns) {
        this.table = table;
        this.notes = notes;
        this.unit = unit;
        this.columns = columns;
    }

    /**
     * Finds them.
     *
     * @param channels columns that a person names as channels
     * @param all      whether every other triple is a marker, whatever its label looks like
     */
    static Markers of(Table table, Set<String> channels, boolean all, Optional<LengthUnit> stated, Notes notes) {
        Map<String, Integer> triples = Triples.of(table.header, channels);
        Map<String, Integer> sure = new LinkedHashMap<>(triples);
        sure.keySet().removeIf(label -> !all && Triples.isLikePlate(label));
        Map<String, Integer> known = sure.isEmpty() ? triples : sure;
        if (known.isEmpty()) {
            throw none(table);
        }
        LengthUnit unit = PointUnit.of(table, known.values(), stated, notes);
        Map<String, Integer> columns = all ? triples : carried(table, triples, known, unit);
        if (columns.isEmpty()) {
            throw none(table);
        }
        List<String> moved = columns.keySet().stream()
                .filter(label -> !sure.containsKey(label))
                .toList();
        if (!moved.isEmpty()) {
            notes.guessed(
                    "text-markers",
                    Notes.listed(moved) + " could be plate channels by their names",
                    "They keep their distance from other markers while they move, so they are taken as markers");
        }
        return new Markers(table, notes, unit, columns);
    }

    private static Map<String, Integer> carried(
            Table table, Map<String, Integer> triples, Map<String, Integer> known, LengthUnit unit) {
        Carried carried = new Carried(table, unit.metres());
        Map<String, Integer> columns = new LinkedHashMap<>(triples);
        columns.entrySet()
                .removeIf(triple -> Triples.isLikePlate(triple.getKey())
                        && known.values().stream()
                                .filter(other -> !other.equals(triple.getValue()))
                                .noneMatch(other -> carried.along(triple.getValue(), other)));
        return columns;
    }

    private static RuntimeException none(Table table) {
        return Refusal.of(
                "text-markers",
                table.source.file,
                "no three neighbouring columns are named as the x, y and z of one marker, as in A_x, A_y, A_z",
                "Name the columns so");
    }

    LengthUnit unit() {
        return unit;
    }

    boolean hold(int column) {
        return columns.containsValue(column) || columns.containsValue(column - 1) || columns.containsValue(column - 2);
    }

    /** The first rows of each, exact zeros as gaps. */
    List<PointSeries> points(int frames) {
        List<PointSeries> points = new ArrayList<>();
        long zeros = 0;
        for (Map.Entry<String, Integer> marker : columns.entrySet()) {
            VectorSeries.Builder positions = new VectorSeries.Builder(frames);
            for (int i = 0; i < frames; i++) {
                double x = table.column(marker.getValue())[i];
                double y = table.column(marker.getValue() + 1)[i];
                double z = table.column(marker.getValue() + 2)[i];
                boolean zero = x == 0 && y == 0 && z == 0;
                zeros += zero ? 1 : 0;
                double metres = zero ? Double.NaN : unit.metres();
                positions.set(i, x * metres, y * metres, z * metres);
            }
            points.add(new PointSeries(marker.getKey(), "", positions.build()));
        }
        if (zeros > 0) {
            notes.mended("marker-zero", zeros + " samples are exactly (0, 0, 0)", "They are taken as missing");
        }
        return points;
    }
}
