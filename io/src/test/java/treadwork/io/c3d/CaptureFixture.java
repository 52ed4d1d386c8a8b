package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** A small invented capture with something of everything, whose parts a test can replace. */
final class CaptureFixture {

    static final int CHANNELS = 26;

    int firstFrame = 33;
    int frames = 40;
    int points = 5;
    int samples = 3;
    double rate = 120;
    LengthUnit unit = LengthUnit.MM;
    List<Plate> plates;
    Optional<FrameRange> zero = Optional.of(new FrameRange(35, 44));

    CaptureFixture() {
        plates = platesOfAllTypes(unit);
    }

    Capture capture() {
        return new Capture(
                "invented.c3d",
                firstFrame,
                frames,
                rate,
                pointSeries(),
                samples,
                channels(),
                plates,
                zero,
                List.of(
                        new CaptureEvent("Foot Strike", "Left", 0.05),
                        new CaptureEvent("Foot Off", "Right", 0.25),
                        new CaptureEvent("", "Général", 0.3)),
                unit,
                "in memory",
                List.of());
    }

    private List<PointSeries> pointSeries() {
        List<PointSeries> series = new ArrayList<>();
        for (int p = 0; p < points; p++) {
            VectorSeries.Builder course = new VectorSeries.Builder(frames);
            for (int i = 0; i < frames; i++) {
                boolean gap = (i + p) % 7 == 3;
                course.set(i, gap ? Vector3.GAP : position(p, i));
            }
            series.add(new PointSeries("P" + p, p % 2 == 0 ? "point número " + p : "", course.build()));
        }
        return series;
    }

    /** Metres, of both signs and all sizes up to two. */
    static Vector3 position(int point, int frame) {
        return new Vector3(
                0.0137 * frame - 0.31 * (point % 6), 1.9 * Math.sin(0.1 * frame + point), 0.9 + 0.01 * (point % 90));
    }

    private List<AnalogChannel> channels() {
        List<AnalogChannel> channels = new ArrayList<>();
        for (int c = 0; c < (samples == 0 ? 0 : CHANNELS); c++) {
            double[] values = new double[frames * samples];
            for (int i = 0; i < values.length; i++) {
                values[i] = (c + 1) * 31.7 * Math.cos(0.07 * i + c) - 2.5 * c;
            }
            channels.add(new AnalogChannel("C" + c, c % 2 == 0 ? "N" : "Nmm", ScalarSeries.of(values)));
        }
        return channels;
    }

    /** One plate of each type; channels neither in order nor next to each other. */
    static List<Plate> platesOfAllTypes(LengthUnit unit) {
        return List.of(
                plate(PlateType.FORCE_AND_CENTRE_OF_PRESSURE, List.of(0, 1, 2, 3, 4, 5), unit),
                plate(PlateType.FORCE_AND_MOMENT, List.of(12, 13, 14, 6, 7, 8), unit),
                plate(PlateType.FOUR_SENSORS, List.of(9, 10, 11, 15, 16, 17, 18, 19), unit),
                plate(PlateType.CALIBRATED, List.of(25, 24, 23, 22, 21, 20), unit));
    }

    private static Plate plate(PlateType type, List<Integer> channels, LengthUnit unit) {
        double at = 0.7 * type.code();
        List<Vector3> corners = List.of(
                new Vector3(at + 0.4, 0.611, -0.0021),
                new Vector3(at + 0.4, 0.012, -0.0013),
                new Vector3(at, 0.013, -0.0017),
                new Vector3(at, 0.609, -0.0019));
        double[] matrix = new double[36];
        for (int i = 0; i < matrix.length; i++) {
            matrix[i] = i % 7 == 0 ? 100 + i : 0.25 * i - 3;
        }
        return new Plate(
                type,
                corners,
                new Vector3(0.001 * type.code(), -0.002, -0.0413),
                channels,
                type == PlateType.CALIBRATED ? Optional.of(CalibrationMatrix.ofRows(matrix)) : Optional.empty(),
                unit);
    }
}
