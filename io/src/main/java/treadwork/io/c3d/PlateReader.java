package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Vector3;

/**
 * The force plates that a file describes.
 *
 * <p>A plate is known by its number, so one that cannot be used is left out only when none behind it would change its number; else
 * the file is refused.
 */
final class PlateReader {

    private static final String GROUP = "FORCE_PLATFORM";
    private static final int COORDINATES = 3;
    private static final int CORNER_NUMBERS = COORDINATES * Plate.CORNERS;
    private static final int MATRIX_NUMBERS = CalibrationMatrix.SIZE * CalibrationMatrix.SIZE;

    private final Parameters parameters;
    private final AnalogLayout analog;
    private final LengthUnit unit;
    private final Reading reading;

    PlateReader(Parameters parameters, AnalogLayout analog, LengthUnit unit, Reading reading) {
        this.parameters = parameters;
        this.analog = analog;
        this.unit = unit;
        this.reading = reading;
    }

    /** All plates that can be used, in the file's order and with the file's numbers. */
    List<Plate> read() {
        if (!parameters.groups().contains(GROUP)) {
            noteSimilarName();
            return List.of();
        }
        int used = parameters.count(GROUP + ":USED").orElse(0);
        if (used < 1) {
            reading.note(Notices.noPlates(reading.file(), "it states that no plate is used"));
            return List.of();
        }
        if (analog.channels() == 0) {
            reading.note(Notices.noPlates(reading.file(), "plates are declared, but there are no analog data"));
            return List.of();
        }
        List<Plate> plates = new ArrayList<>();
        List<PlateFault> faults = new ArrayList<>();
        for (int i = 0; i < used; i++) {
            PlateType type = type(i);
            Optional<PlateFault> fault = fault(i, type);
            if (fault.isPresent()) {
                faults.add(fault.get());
            } else if (faults.isEmpty()) {
                plates.add(plate(i, type));
            } else {
                throw Refusals.plate(faults.get(0));
            }
        }
        faults.forEach(fault -> reading.note(Refusals.plateFinding(fault)));
        return plates;
    }

    private void noteSimilarName() {
        parameters.groups().stream()
                .filter(name -> name.startsWith("FORCE") && name.contains("PLAT"))
                .findFirst()
                .ifPresent(name -> reading.note(Notices.plateGroup(reading.file(), name)));
    }

    private PlateType type(int plate) {
        double[] stated = slice("TYPE", plate, 1);
        if (stated.length == 0) {
            throw Refusals.plateType(reading.file(), plate + 1, "not stated");
        }
        double code = stated[0];
        Optional<PlateType> type = code == Math.rint(code) ? PlateType.ofCode((int) code) : Optional.empty();
        return type.orElseThrow(() -> Refusals.plateType(reading.file(), plate + 1, Notices.number(code)));
    }

    private Optional<PlateFault> fault(int plate, PlateType type) {
        double[] corners = slice("CORNERS", plate, CORNER_NUMBERS);
        if (corners.length == 0) {
            return fault(plate, "CORNERS", "plate-corners", "the four corners are not stated");
        }
        Optional<String> shape = CornerShape.fault(corners(corners));
        if (shape.isPresent()) {
            return fault(plate, "CORNERS", "plate-corners", shape.get());
        }
        if (origin(plate).isGap()) {
            return fault(plate, "ORIGIN", "plate-origin", "it is not a number");
        }
        if (type == PlateType.CALIBRATED && !finite(slice("CAL_MATRIX", plate, MATRIX_NUMBERS))) {
            return fault(plate, "CAL_MATRIX", "plate-calibration", "36 numbers are needed and not stated");
        }
        return channelFault(plate, type).flatMap(figure -> fault(plate, "CHANNEL", "plate-channels", figure));
    }

    private Optional<String> channelFault(int plate, PlateType type) {
        List<Integer> channels = channels(plate);
        if (channels.size() < type.channels()) {
            return Optional.of(
                    channels.size() + " channels are stated, type " + type.code() + " has " + type.channels());
        }
        for (int channel : channels.subList(0, type.channels())) {
            if (channel < 1 || channel > analog.channels()) {
                return Optional.of("channel " + channel + " is stated, the file has 1 to " + analog.channels());
            }
        }
        return Optional.empty();
    }

    private Optional<PlateFault> fault(int plate, String parameter, String code, String figure) {
        return Optional.of(new PlateFault(reading.file(), plate + 1, parameter, code, figure));
    }

    private Plate plate(int plate, PlateType type) {
        if (slice("ORIGIN", plate, COORDINATES).length == 0) {
            reading.note(Notices.plateOrigin(reading.file(), plate + 1));
        }
        List<Integer> channels = channels(plate).subList(0, type.channels()).stream()
                .map(channel -> channel - 1)
                .toList();
        Optional<CalibrationMatrix> calibration = type == PlateType.CALIBRATED
                ? Optional.of(matrix(slice("CAL_MATRIX", plate, MATRIX_NUMBERS)))
                : Optional.empty();
        return new Plate(
                type, corners(slice("CORNERS", plate, CORNER_NUMBERS)), origin(plate), channels, calibration, unit);
    }

    /** The numbers of one plate in a list that holds {@code size} for each; none where the list is too short. */
    private double[] slice(String name, int plate, int size) {
        Optional<Parameter> all = parameters.find(GROUP + ":" + name);
        if (all.isEmpty() || all.get().numbers() < (plate + 1) * size) {
            return new double[0];
        }
        double[] own = new double[size];
        for (int i = 0; i < size; i++) {
            own[i] = all.get().number(plate * size + i);
        }
        return own;
    }

    /** Channels of one plate, counted from 1; zeros only pad the list. */
    private List<Integer> channels(int plate) {
        int rows = parameters
                .find(GROUP + ":CHANNEL")
                .map(each -> each.dimension(0))
                .orElse(0);
        List<Integer> channels = new ArrayList<>();
        for (double channel : slice("CHANNEL", plate, rows)) {
            if (channel != 0) {
                channels.add((int) channel);
            }
        }
        return channels;
    }

    private List<Vector3> corners(double[] numbers) {
        List<Vector3> corners = new ArrayList<>();
        for (int i = 0; i < CORNER_NUMBERS; i += COORDINATES) {
            corners.add(metres(numbers, i));
        }
        return corners;
    }

    /** As stated; the sign is a matter for the checks. */
    private Vector3 origin(int plate) {
        double[] numbers = slice("ORIGIN", plate, COORDINATES);
        if (numbers.length == 0) {
            return Vector3.ZERO;
        }
        return finite(numbers) ? metres(numbers, 0) : Vector3.GAP;
    }

    private Vector3 metres(double[] numbers, int from) {
        return new Vector3(numbers[from], numbers[from + 1], numbers[from + 2]).times(unit.metres());
    }

    /** The first dimension, fastest in the file, is the row. */
    private static CalibrationMatrix matrix(double[] byColumns) {
        double[] byRows = new double[MATRIX_NUMBERS];
        for (int i = 0; i < MATRIX_NUMBERS; i++) {
            byRows[i % CalibrationMatrix.SIZE * CalibrationMatrix.SIZE + i / CalibrationMatrix.SIZE] = byColumns[i];
        }
        return CalibrationMatrix.ofRows(byRows);
    }

    private static boolean finite(double[] numbers) {
        boolean finite = numbers.length > 0;
        for (double number : numbers) {
            finite &= Double.isFinite(number);
        }
        return finite;
    }
}
