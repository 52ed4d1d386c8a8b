package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.Vector3;

/** Fills the parameter section of a capture: groups POINT, ANALOG, FORCE_PLATFORM, TRIAL and EVENT, and that of computed points. */
final class SectionWriter {

    private static final int MINUTE_S = 60;

    private final Capture capture;
    private final C3dEncoding encoding;
    private final WriteScaling scaling;
    private final Optional<ComputedPoints> computed;

    SectionWriter(Capture capture, C3dEncoding encoding, WriteScaling scaling, Optional<ComputedPoints> computed) {
        this.capture = capture;
        this.encoding = encoding;
        this.scaling = scaling;
        this.computed = computed;
    }

    /** The whole section, its length a number of blocks. */
    byte[] section() {
        int blocks = records(0).blocks();
        return records(C3dWriter.PARAMETER_BLOCK + blocks).section();
    }

    private ParameterWriter records(int dataBlock) {
        ParameterWriter records = new ParameterWriter(encoding.processor());
        points(records, dataBlock);
        analog(records);
        plates(records);
        trial(records);
        events(records);
        computed.ifPresent(points -> computed(records, points));
        return records;
    }

    private void points(ParameterWriter records, int dataBlock) {
        List<PointSeries> points = capture.points();
        records.group("POINT");
        records.integer("USED", points.size());
        records.integer("FRAMES", Math.min(capture.frames(), Header.FULL));
        records.integer("DATA_START", dataBlock);
        records.real("SCALE", scaling.pointStep());
        records.real("RATE", capture.pointRate());
        records.text("UNITS", capture.pointUnit().symbol());
        records.texts("LABELS", points.stream().map(PointSeries::label).toList());
        records.texts(
                "DESCRIPTIONS", points.stream().map(PointSeries::description).toList());
    }

    private void analog(ParameterWriter records) {
        List<AnalogChannel> channels = capture.analog();
        records.group("ANALOG");
        records.integer("USED", channels.size());
        records.real("RATE", capture.analogRate());
        records.real("GEN_SCALE", 1);
        records.text("FORMAT", encoding.unsignedAnalog() && !encoding.real() ? "UNSIGNED" : "SIGNED");
        records.texts("LABELS", channels.stream().map(AnalogChannel::label).toList());
        records.texts("UNITS", channels.stream().map(AnalogChannel::unit).toList());
        records.reals("SCALE", scaling.analogSteps());
        records.integers("OFFSET", Collections.nCopies(channels.size(), scaling.analogOffset()));
    }

    private void plates(ParameterWriter records) {
        List<Plate> plates = capture.plates();
        if (plates.isEmpty() && capture.plateZero().isEmpty()) {
            return;
        }
        records.group("FORCE_PLATFORM");
        records.integer("USED", plates.size());
        records.integers("ZERO", capture.plateZero().map(SectionWriter::zero).orElse(List.of(0, 0)), 2);
        if (plates.isEmpty()) {
            return;
        }
        records.integers(
                "TYPE", plates.stream().map(plate -> plate.type().code()).toList());
        List<Double> corners = new ArrayList<>();
        List<Double> origins = new ArrayList<>();
        for (Plate plate : plates) {
            requireUnit(plate);
            plate.corners().forEach(corner -> addUnits(corners, corner));
            addUnits(origins, plate.origin());
        }
        records.reals("CORNERS", corners, 3, Plate.CORNERS, plates.size());
        records.reals("ORIGIN", origins, 3, plates.size());
        channels(records, plates);
        calibrations(records, plates);
    }

    /** Six rows of channels, or eight for all plates if one needs them, counted from 1. */
    private static void channels(ParameterWriter records, List<Plate> plates) {
        int rows = plates.stream().mapToInt(plate -> plate.channels().size()).reduce(0, Math::max);
        List<Integer> channels = new ArrayList<>();
        for (Plate plate : plates) {
            plate.channels().forEach(channel -> channels.add(channel + 1));
            channels.addAll(Collections.nCopies(rows - plate.channels().size(), 0));
        }
        records.integers("CHANNEL", channels, rows, plates.size());
    }

    private static void calibrations(ParameterWriter records, List<Plate> plates) {
        if (plates.stream().noneMatch(plate -> plate.type() == PlateType.CALIBRATED)) {
            return;
        }
        int size = CalibrationMatrix.SIZE;
        List<Double> byColumns = new ArrayList<>();
        for (Plate plate : plates) {
            for (int i = 0; i < size * size; i++) {
                int row = i % size;
                int column = i / size;
                byColumns.add(plate.calibration()
                        .map(matrix -> matrix.at(row, column))
                        .orElse(0.0));
            }
        }
        records.reals("CAL_MATRIX", byColumns, size, size, plates.size());
    }

    private void trial(ParameterWriter records) {
        int last = capture.range().last();
        if (last <= Header.FULL) {
            return;
        }
        records.group("TRIAL");
        records.integers("ACTUAL_START_FIELD", words(capture.firstFrame()), 2);
        records.integers("ACTUAL_END_FIELD", words(last), 2);
        records.real("CAMERA_RATE", capture.pointRate());
    }

    private void events(ParameterWriter records) {
        List<CaptureEvent> events = capture.events();
        if (events.isEmpty()) {
            return;
        }
        double before = (capture.firstFrame() - 1) / capture.pointRate();
        List<Double> times = new ArrayList<>();
        for (CaptureEvent event : events) {
            double time = event.timeS() + before;
            double minutes = Math.max(Math.floor(time / MINUTE_S), 0);
            times.add(minutes);
            times.add(time - minutes * MINUTE_S);
        }
        records.group("EVENT");
        records.integer("USED", events.size());
        records.texts("CONTEXTS", events.stream().map(CaptureEvent::context).toList());
        records.texts("LABELS", events.stream().map(CaptureEvent::label).toList());
        records.pairs("TIMES", times);
    }

    private static void computed(ParameterWriter records, ComputedPoints computed) {
        records.group(ComputedPoints.GROUP);
        records.text("VERSION", computed.version());
        records.texts(
                ComputedPoints.LABELS,
                computed.points().stream().map(ComputedPoint::label).toList());
        records.texts(
                "UNITS", computed.points().stream().map(ComputedPoint::unit).toList());
        records.texts("SETTINGS", computed.settings());
    }

    private void requireUnit(Plate plate) {
        if (plate.channelUnit() != capture.pointUnit()) {
            throw new IllegalArgumentException("a plate's channels are in "
                    + plate.channelUnit().symbol() + ", the file can state only one unit, "
                    + capture.pointUnit().symbol());
        }
    }

    private void addUnits(List<Double> numbers, Vector3 metres) {
        Vector3 units = metres.times(1 / capture.pointUnit().metres());
        numbers.addAll(List.of(units.x(), units.y(), units.z()));
    }

    private static List<Integer> zero(FrameRange range) {
        if (range.last() > Header.FULL) {
            throw new IllegalArgumentException(
                    "the unloaded frames end at " + range.last() + ", the file can state 65535 at most");
        }
        return List.of(range.first(), range.last());
    }

    private static List<Integer> words(int number) {
        return List.of(number & Header.FULL, number >>> Short.SIZE);
    }
}
