package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import java.util.stream.IntStream;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;

/** Whole captures about one plate whose channels a test chooses. */
final class PlateCaptures {

    static final int FIRST_FRAME = 11;
    static final int SAMPLES_PER_FRAME = 5;
    static final double POINT_RATE = 200;

    /** Half a second at 1000 Hz. */
    static final int FRAMES = 100;

    static final int SAMPLES = FRAMES * SAMPLES_PER_FRAME;

    static final Processing UNFILTERED =
            new Processing(FilterSettings.NONE, FilterSettings.NONE, 0.1, 20, new PlateZero.Auto());

    private PlateCaptures() {}

    static Processing zeroedBy(PlateZero rule) {
        return new Processing(FilterSettings.NONE, FilterSettings.NONE, 0.1, 20, rule);
    }

    /** A channel a value of the list, each times what {@code course} gives for the sample. */
    static Capture following(List<Plate> plates, List<Double> values, IntToDoubleFunction course) {
        List<ScalarSeries> signals = new ArrayList<>();
        for (double value : values) {
            signals.add(series(i -> value * course.applyAsDouble(i)));
        }
        return of(plates, signals, marker(new Vector3(0.8, 0.2, 1)));
    }

    static ScalarSeries series(IntToDoubleFunction course) {
        return ScalarSeries.of(IntStream.range(0, SAMPLES).mapToDouble(course).toArray());
    }

    /** A marker that stays where it is. */
    static PointSeries marker(Vector3 place) {
        return new PointSeries("KNEE", "", VectorSeries.constant(place, FRAMES));
    }

    static Capture of(List<Plate> plates, List<ScalarSeries> signals, PointSeries... points) {
        return withZeroRange(plates, signals, Optional.empty(), points);
    }

    static Capture withZeroRange(
            List<Plate> plates, List<ScalarSeries> signals, Optional<FrameRange> zero, PointSeries... points) {
        List<AnalogChannel> analog = signals.stream()
                .map(signal -> new AnalogChannel("F", "N", signal))
                .toList();
        return new Capture(
                "trial.c3d",
                FIRST_FRAME,
                FRAMES,
                POINT_RATE,
                List.of(points),
                SAMPLES_PER_FRAME,
                analog,
                plates,
                zero,
                List.of(),
                LengthUnit.MM,
                "made by the test",
                List.of());
    }

    /** Nothing in the first 0.2 s, all from there on. */
    static double steppedOn(int sample) {
        return sample < 200 ? 0 : 1;
    }

    static List<Integer> channels(int count) {
        return IntStream.range(0, count).boxed().toList();
    }
}
