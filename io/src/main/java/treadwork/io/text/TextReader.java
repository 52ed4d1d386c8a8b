package treadwork.io.text;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.TextSettings;

/** Reads captures that are delimited text, the plates in the same file or in one of their own. */
public final class TextReader {

    private final TextFile points;
    private final Optional<LengthUnit> unit;
    private final TextSettings settings;
    private final List<Finding> findings = new ArrayList<>();
    private final Table table;

    private TextReader(TextFile points, Optional<LengthUnit> unit, TextSettings settings) {
        this.points = points;
        this.unit = unit;
        this.settings = settings;
        this.table = Table.of(points.name(), points.bytes());
    }

    /**
     * Reads a capture.
     *
     * @param plates the plates' own file, where there is one
     * @param unit   of the positions by the user's word; else the file's, else mm by their size
     * @throws treadwork.model.finding.UnusableInputException if it cannot be used
     */
    public static Capture read(
            TextFile points, Optional<TextFile> plates, Optional<LengthUnit> unit, TextSettings settings) {
        return new TextReader(points, unit, settings).capture(plates);
    }

    private Capture capture(Optional<TextFile> plates) {
        double rate = Rate.of(table, settings.pointRateHz(), findings);
        Map<String, Integer> markers = Triples.of(table.header, Set.copyOf(settings.channels()));
        if (markers.isEmpty()) {
            throw Refusal.of(
                    "text-markers",
                    points.name(),
                    "no three neighbouring columns are named as the x, y and z of one marker, as in A_x, A_y, A_z",
                    "Name the columns so");
        }
        LengthUnit length = unit(markers);
        List<PointSeries> series = new ArrayList<>();
        long zeros = 0;
        for (Map.Entry<String, Integer> marker : markers.entrySet()) {
            zeros += zeros(marker.getValue());
            series.add(new PointSeries(marker.getKey(), "", positions(marker.getValue(), length.metres())));
        }
        if (zeros > 0) {
            note("marker-zero", zeros + " samples are exactly (0, 0, 0)", "They are taken as missing", true);
        }
        Table analog = plates.map(file -> Table.of(file.name(), file.bytes())).orElse(table);
        int perFrame = analog == table ? 1 : perFrame(analog, rate);
        int frames = Math.min(table.rows(), analog.rows() / perFrame);
        if (frames < table.rows() || frames * perFrame < analog.rows()) {
            note(
                    "text-length",
                    table.rows() + " rows of markers and " + analog.rows() + " of plates, " + perFrame + " a frame",
                    "The first " + frames + " frames are kept",
                    true);
        }
        if (frames == 0) {
            throw Refusal.of("text-length", analog.source.file, "it holds no whole frame", "Name the right file");
        }
        List<AnalogChannel> channels = channels(analog, frames * perFrame);
        int cut = frames;
        List<PointSeries> kept = frames == table.rows()
                ? series
                : series.stream()
                        .map(each -> new PointSeries(
                                each.label(), "", each.positions().every(0, 1, cut)))
                        .toList();
        return new Capture(
                points.name(),
                1,
                frames,
                rate,
                kept,
                channels.isEmpty() ? 0 : perFrame,
                channels,
                List.of(),
                Optional.empty(),
                List.of(),
                length,
                table.dialect.words(),
                findings);
    }

    private int perFrame(Table analog, double rate) {
        double plateRate = Rate.of(analog, settings.plateRateHz(), findings);
        double ratio = plateRate / rate;
        long whole = Math.round(ratio);
        if (whole < 1 || Math.abs(ratio - whole) > 0.001 * whole || whole > 100_000) {
            throw Refusal.of(
                    "text-rate",
                    analog.source.file,
                    "the plates have " + plateRate + " rows a second, the markers " + rate
                            + ", which is no whole number of samples a frame",
                    "State the true rates in lab.text of the study file");
        }
        return (int) whole;
    }

    private void note(String code, String figure, String meaning, boolean mended) {
        findings.add(new Finding(
                code, Severity.NOTE, points.name(), figure, meaning, "Nothing to do if that is right", mended));
    }

    /** By the user's word, by the units row, else mm where the largest coordinate is beyond 30, which no room has in metres. */
    private LengthUnit unit(Map<String, Integer> markers) {
        int first = markers.values().iterator().next();
        String stated = table.header.units().get(first).replaceAll("[\\[\\]()]", "");
        Optional<LengthUnit> known = unit.or(() -> LengthUnit.ofSymbol(stated));
        if (known.isPresent()) {
            return known.get();
        }
        double largest = 0;
        for (int column : markers.values()) {
            for (int i = 0; i < 3; i++) {
                largest = Math.max(
                        largest,
                        Arrays.stream(table.column(column + i))
                                .map(Math::abs)
                                .filter(v -> !Double.isNaN(v))
                                .max()
                                .orElse(0));
            }
        }
        if (largest < 300 && largest > 30) {
            throw Refusal.of(
                    "point-unit-unknown",
                    points.name(),
                    "no unit of length is stated, and the largest coordinate, " + largest + ", fits several",
                    "Set lab.pointUnit in the study file");
        }
        LengthUnit assumed = largest <= 30 ? LengthUnit.M : LengthUnit.MM;
        note(
                "text-unit",
                "no unit of length is stated, the largest coordinate is " + largest,
                "Positions are taken as " + assumed.symbol(),
                false);
        return assumed;
    }

    private boolean zero(int column, int row) {
        return table.column(column)[row] == 0
                && table.column(column + 1)[row] == 0
                && table.column(column + 2)[row] == 0;
    }

    private long zeros(int column) {
        long zeros = 0;
        for (int i = 0; i < table.rows(); i++) {
            zeros += zero(column, i) ? 1 : 0;
        }
        return zeros;
    }

    private VectorSeries positions(int column, double metres) {
        VectorSeries.Builder positions = new VectorSeries.Builder(table.rows());
        for (int i = 0; i < table.rows(); i++) {
            double scale = zero(column, i) ? Double.NaN : metres;
            positions.set(
                    i,
                    table.column(column)[i] * scale,
                    table.column(column + 1)[i] * scale,
                    table.column(column + 2)[i] * scale);
        }
        return positions.build();
    }

    private List<AnalogChannel> channels(Table analog, int samples) {
        List<String> names = analog.header.names();
        List<AnalogChannel> channels = new ArrayList<>();
        for (String name : settings.channels().isEmpty() ? others(analog) : settings.channels()) {
            int column = names.indexOf(name.strip());
            if (column < 0) {
                throw Refusal.of(
                        "text-column-unknown",
                        analog.source.file,
                        "it has no column \"" + name + "\"" + NearestName.hint(name, names),
                        "Correct lab.text.channels in the study file");
            }
            channels.add(new AnalogChannel(
                    name.strip(),
                    analog.header.units().get(column),
                    ScalarSeries.of(Arrays.copyOf(analog.column(column), samples))));
        }
        return channels;
    }

    private static List<String> others(Table analog) {
        Set<Integer> taken = new HashSet<>();
        for (int column : Triples.of(analog.header, Set.of()).values()) {
            taken.addAll(List.of(column, column + 1, column + 2));
        }
        List<String> names = new ArrayList<>();
        for (int i = 0; i < analog.header.names().size(); i++) {
            if (!taken.contains(i)
                    && !analog.header.counts(i)
                    && !analog.header.names().get(i).isEmpty()) {
                names.add(analog.header.names().get(i));
            }
        }
        return names;
    }
}
