package treadwork.solver.plate;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Plate;
import treadwork.model.space.Vector3;

/** Plates as the study file's {@code lab.plates} states them. */
public final class PlatesAsJson {

    private PlatesAsJson() {}

    /** The object to lay over the study file; all plates stand in it, since the array replaces what the captures say. */
    public static String change(List<Plate> plates) {
        return "{ \"lab\": { \"plates\": "
                + plates.stream().map(PlatesAsJson::entry).collect(Collectors.joining(", ", "[", "]")) + " } }";
    }

    /** One plate, lengths to a hundredth of a millimetre. */
    public static String entry(Plate plate) {
        String corners = plate.corners().stream().map(PlatesAsJson::vector).collect(Collectors.joining(", "));
        String channels = plate.channels().stream()
                .map(place -> String.valueOf(place + 1))
                .collect(Collectors.joining(", "));
        return "{ \"type\": " + plate.type().code() + ", \"cornersM\": [" + corners + "], \"originM\": "
                + vector(plate.origin()) + ", \"channels\": [" + channels + "], \"channelUnit\": \""
                + plate.channelUnit().symbol() + "\""
                + plate.calibration()
                        .map(matrix -> ", \"calibration\": " + rows(matrix))
                        .orElse("") + " }";
    }

    private static String rows(CalibrationMatrix matrix) {
        return IntStream.range(0, CalibrationMatrix.SIZE)
                .mapToObj(row -> IntStream.range(0, CalibrationMatrix.SIZE)
                        .mapToObj(column -> Double.toString(matrix.at(row, column)))
                        .collect(Collectors.joining(", ", "[", "]")))
                .collect(Collectors.joining(", ", "[", "]"));
    }

    private static String vector(Vector3 v) {
        return String.format(Locale.ROOT, "[%.5f, %.5f, %.5f]", v.x() + 0.0, v.y() + 0.0, v.z() + 0.0);
    }
}
