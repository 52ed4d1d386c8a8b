package treadwork.io.text;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.study.LabSettings;

/** Reads captures that are delimited text, the plates in the same file or in one of their own. */
public final class TextReader {

    private final LabSettings lab;
    private final Table table;
    private final Notes notes;

    private TextReader(TextFile points, LabSettings lab) {
        this.lab = lab;
        this.table = Table.of(points.name(), points.bytes());
        this.notes = new Notes(points.name());
    }

    /**
     * Reads a capture.
     *
     * @param plates the plates' own file, where there is one
     * @param lab    unit, rates and channels by the user's word; else the file's, else by what stands in it
     * @throws treadwork.model.finding.UnusableInputException if it cannot be used
     */
    public static Capture read(TextFile points, Optional<TextFile> plates, LabSettings lab) {
        return new TextReader(points, lab).capture(plates);
    }

    /**
     * Reads a capture of which the markers alone are wanted: whatever has an x, a y and a z is one.
     *
     * @throws treadwork.model.finding.UnusableInputException if it cannot be used
     */
    public static Capture markers(TextFile points, LabSettings lab) {
        TextReader reader = new TextReader(points, lab);
        double rate = Rate.of(reader.table, lab.text().pointRateHz(), reader.notes.findings());
        Markers markers = Markers.of(reader.table, reader.channelNames(), true, lab.pointUnit(), reader.notes);
        return reader.capture(rate, markers, reader.table.rows(), 0, List.of());
    }

    private Capture capture(Optional<TextFile> plates) {
        double rate = Rate.of(table, lab.text().pointRateHz(), notes.findings());
        boolean settled = !lab.text().channels().isEmpty() || plates.isPresent();
        Markers markers = Markers.of(table, channelNames(), settled, lab.pointUnit(), notes);
        Table analog = plates.map(file -> Table.of(file.name(), file.bytes())).orElse(table);
        int perFrame = analog == table ? 1 : perFrame(analog, rate);
        int frames = frames(analog, perFrame);
        Channels channels = new Channels(analog);
        List<String> names = lab.text().channels().isEmpty()
                ? channels.guessed(analog == table ? Optional.of(markers) : Optional.empty(), notes)
                : channels.named(lab.text().channels());
        return capture(rate, markers, frames, perFrame, channels.of(names, frames * perFrame));
    }

    private Capture capture(double rate, Markers markers, int frames, int perFrame, List<AnalogChannel> channels) {
        return new Capture(
                table.source.file,
                1,
                frames,
                rate,
                markers.points(frames),
                channels.isEmpty() ? 0 : perFrame,
                channels,
                List.of(),
                Optional.empty(),
                List.of(),
                markers.unit(),
                table.dialect.words(),
                notes.findings());
    }

    /** What a person names as channels, in the list of them or as those of a plate. */
    private Set<String> channelNames() {
        Set<String> names = new HashSet<>(lab.text().channels());
        lab.namedPlates().forEach(plate -> names.addAll(plate.channels()));
        return names;
    }

    private int frames(Table analog, int perFrame) {
        int frames = Math.min(table.rows(), analog.rows() / perFrame);
        if (frames == 0) {
            throw Refusal.of("text-length", analog.source.file, "it holds no whole frame", "Name the right file");
        }
        if (frames < table.rows() || frames * perFrame < analog.rows()) {
            notes.mended(
                    "text-length",
                    table.rows() + " rows of markers and " + analog.rows() + " of plates, " + perFrame + " a frame",
                    "The first " + frames + " frames are kept");
        }
        return frames;
    }

    private int perFrame(Table analog, double rate) {
        double plateRate = Rate.of(analog, lab.text().plateRateHz(), notes.findings());
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
}
