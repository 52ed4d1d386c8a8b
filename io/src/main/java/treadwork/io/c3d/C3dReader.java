package treadwork.io.c3d;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.UnusableInputException;

/**
 * Reads capture files in the C3D format: three processor families, integers and reals, and the oddities of real files.
 *
 * <p>Positions, plate corners and origins become metres, analog values (stored - offset) × scale. A sample that is flagged invalid,
 * or that is exactly (0, 0, 0), is a gap. Memory is bounded by the size of the file.
 */
public final class C3dReader {

    /** Frames a second, Hz, beyond which a stated rate is a fault in the file: no camera that sees markers is near it. */
    private static final double FASTEST = 1e6;

    /** Two statements of one rate or scale that differ by less are the same but for rounding to a 32-bit real. */
    private static final double ROUNDING = 1e-4;

    private final Opening opening;
    private final ByteBuffer firstBlock;
    private final Layout layout;
    private final ReadOptions options;
    private final Reading reading;

    private C3dReader(Bytes bytes, ReadOptions options, Reading reading) throws IOException {
        this.options = options;
        this.reading = reading;
        this.opening = Opening.read(bytes, reading);
        byte[] block = new byte[Header.BLOCK];
        bytes.at(0, Header.BLOCK).get(block);
        this.firstBlock = ByteBuffer.wrap(block).order(opening.processor().order());
        this.layout = Layout.of(opening, bytes.size(), reading);
    }

    /**
     * Reads a file with the plates that it describes.
     *
     * @param unit the unit of length by the user's word, which then replaces the file's
     * @throws UnusableInputException if it cannot be used
     */
    public static Capture read(Path file, Optional<LengthUnit> unit) {
        return read(file, new ReadOptions(unit, true));
    }

    /**
     * Reads a file.
     *
     * @throws UnusableInputException if it cannot be used
     */
    public static Capture read(Path file, ReadOptions options) {
        Path last = file.getFileName();
        String name = (last == null ? file : last).toString();
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.READ)) {
            return read(name, new Bytes.OfFile(channel), options);
        } catch (IOException e) {
            throw Refusals.unreadable(file.toString(), e);
        }
    }

    /**
     * Reads the bytes of a file.
     *
     * @param name of the file, for messages and for {@link Capture#name()}
     * @throws UnusableInputException if they cannot be used
     */
    public static Capture read(String name, byte[] bytes, ReadOptions options) {
        try {
            return read(name, new Bytes.Held(bytes), options);
        } catch (IOException e) {
            throw Refusals.unreadable(name, e);
        }
    }

    private static Capture read(String name, Bytes bytes, ReadOptions options) throws IOException {
        return new C3dReader(bytes, options, new Reading(name)).capture(bytes);
    }

    private Capture capture(Bytes bytes) throws IOException {
        Parameters parameters = opening.parameters();
        FrameSpan span = layout.span();
        double rate = rate(parameters);
        LengthUnit unit = PointUnit.of(parameters, options.unit(), reading);
        AnalogScaling scaling = AnalogScaling.of(parameters, layout.analog().channels(), reading);
        List<Plate> plates =
                options.filePlates() ? new PlateReader(parameters, layout.analog(), unit, reading).read() : List.of();
        double metres = scale(parameters) * unit.metres();
        Frames frames = FrameReader.read(bytes, layout, reading);
        List<CaptureEvent> events = EventReader.read(opening, firstBlock, span, rate, reading);
        String storage = layout.storage() + (scaling.unsigned() ? ", unsigned analog" : "");
        List<PointSeries> points = points(frames, metres);
        Optional<FrameRange> zero = plateZero(parameters);
        return new Capture(
                reading.file(),
                span.first(),
                span.count(),
                rate,
                points,
                layout.analog().samples(),
                channels(frames, scaling),
                plates,
                zero,
                events,
                unit,
                storage,
                reading.findings());
    }

    /** Those that were measured: what this program computed and wrote beside them are no markers. */
    private List<PointSeries> points(Frames frames, double metres) {
        Parameters parameters = opening.parameters();
        int count = layout.points();
        List<String> labels = Labels.withoutSubject(Labels.of(parameters, "POINT:LABELS", count));
        List<String> subjects = Labels.subjects(labels);
        if (subjects.size() > 1) {
            reading.note(Notices.subjects(reading.file(), subjects));
        }
        List<String> descriptions = Labels.of(parameters, "POINT:DESCRIPTIONS", count);
        Set<String> computed =
                Set.copyOf(parameters.texts(ComputedPoints.GROUP + ":" + ComputedPoints.LABELS, layout.points()));
        List<PointSeries> points = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            String label = labels.get(i);
            if (label.isEmpty() || !computed.contains(label)) {
                int point = i;
                points.add(PointSeries.recorded(label, descriptions.get(i), () -> frames.positions(point, metres)));
            }
        }
        if (points.size() < count) {
            reading.note(Notices.computedPoints(reading.file(), count - points.size()));
        }
        return RepeatedLabels.resolve(points, reading);
    }

    private List<AnalogChannel> channels(Frames frames, AnalogScaling scaling) {
        int count = layout.analog().channels();
        List<String> labels = Labels.of(opening.parameters(), "ANALOG:LABELS", count);
        List<String> units = Labels.of(opening.parameters(), "ANALOG:UNITS", count);
        List<AnalogChannel> channels = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            int channel = i;
            channels.add(AnalogChannel.recorded(labels.get(i), units.get(i), () -> frames.channel(channel, scaling)));
        }
        return channels;
    }

    /** POINT:RATE, else the header's. The analog rate follows from the samples per frame, whatever is stated. */
    private double rate(Parameters parameters) {
        double header = opening.header().rate();
        double stated = parameters.number("POINT:RATE").orElse(header);
        double rate = stated > 0 ? stated : header;
        if (!(rate > 0 && rate <= FASTEST)) {
            throw Refusals.rate(reading.file(), rate);
        }
        if (header > 0 && differ(header, rate)) {
            reading.note(Notices.rate(reading.file(), "POINT:RATE", rate, header));
        }
        double analog = parameters.number("ANALOG:RATE").orElse(0);
        double expected = rate * layout.analog().samples();
        if (analog > 0 && expected > 0 && differ(analog, expected)) {
            reading.note(Notices.rate(reading.file(), "ANALOG:RATE", analog, expected));
        }
        return rate;
    }

    /** What a stored coordinate is worth in the file's unit of length. */
    private double scale(Parameters parameters) {
        if (layout.real()) {
            return 1;
        }
        double scale = Layout.scale(opening.header(), parameters);
        double stated = parameters.number("POINT:SCALE").orElse(scale);
        if (differ(stated, scale)) {
            reading.note(Notices.pointScale(reading.file(), stated, scale));
        }
        return scale;
    }

    private static boolean differ(double one, double other) {
        return !(Math.abs(one - other) <= ROUNDING * Math.abs(other));
    }

    /** A range of several frames that the recording holds; frame 0 means from the first on. */
    private Optional<FrameRange> plateZero(Parameters parameters) {
        double[] stated = parameters.numbers("FORCE_PLATFORM:ZERO", 2);
        if (stated.length < 2) {
            return Optional.empty();
        }
        int first = Math.max((int) stated[0] & 0xFFFF, 1);
        int last = (int) stated[1] & 0xFFFF;
        if (last <= first) {
            return Optional.empty();
        }
        FrameRange zero = new FrameRange(first, last);
        FrameSpan span = layout.span();
        FrameRange held = new FrameRange(span.first(), span.first() + span.count() - 1);
        if (!held.contains(first) || !held.contains(last)) {
            reading.note(Notices.plateZero(reading.file(), zero, held));
            return Optional.empty();
        }
        return Optional.of(zero);
    }
}
