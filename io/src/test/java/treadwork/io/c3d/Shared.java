package treadwork.io.c3d;

import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.space.VectorSeries;

/** The shared recordings, and what the tests of this package ask of a capture. */
final class Shared {

    private Shared() {}

    /** A recording's path; where the recordings are absent the test is skipped. */
    static Path recording(String name) {
        Path data = Path.of(System.getProperty("shared", "../shared"), "data");
        assumeTrue(Files.isDirectory(data), "the shared recordings are not here: " + data);
        return data.resolve(name);
    }

    static Capture capture(String name) {
        return C3dReader.read(recording(name), Optional.empty());
    }

    static Capture capture(String name, LengthUnit unit) {
        return C3dReader.read(recording(name), Optional.of(unit));
    }

    static List<String> codes(Capture capture) {
        return capture.findings().stream().map(Finding::code).toList();
    }

    static Finding finding(Capture capture, String code) {
        return capture.findings().stream()
                .filter(each -> each.code().equals(code))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no finding " + code + " in " + codes(capture)));
    }

    /** Missing samples of all points. */
    static int gaps(Capture capture) {
        return capture.points().stream()
                .mapToInt(point -> gaps(capture, point.positions()))
                .sum();
    }

    static int gaps(Capture capture, VectorSeries positions) {
        int gaps = 0;
        for (int i = 0; i < capture.frames(); i++) {
            gaps += positions.isGap(i) ? 1 : 0;
        }
        return gaps;
    }

    /** Sum of some of a plate's channels, given by their place in the plate, at one sample. */
    static double sum(Capture capture, int plate, int sample, int... places) {
        double sum = 0;
        for (int place : places) {
            int channel = capture.plates().get(plate).channels().get(place);
            sum += capture.analog().get(channel).values().at(sample);
        }
        return sum;
    }

    /**
     * Largest up force on a plate with z down that stores the force on the body, N: minus the sum of these channels, from which the
     * mean over the frames that the file calls unloaded is taken off, as the READMEs of the recordings do.
     */
    static double peakUp(Capture capture, int plate, int... places) {
        int peak = peakSample(capture, plate, places);
        return unloaded(capture, plate, places) - sum(capture, plate, peak, places);
    }

    static int peakSample(Capture capture, int plate, int... places) {
        int peak = 0;
        for (int i = 1; i < capture.frames() * capture.samplesPerFrame(); i++) {
            if (sum(capture, plate, i, places) < sum(capture, plate, peak, places)) {
                peak = i;
            }
        }
        return peak;
    }

    /** Mean sum of these channels over the frames that the file calls unloaded; 0 where it names none. */
    static double unloaded(Capture capture, int plate, int... places) {
        if (capture.plateZero().isEmpty()) {
            return 0;
        }
        FrameRange zero = capture.plateZero().get();
        int from = (zero.first() - capture.firstFrame()) * capture.samplesPerFrame();
        int count = zero.count() * capture.samplesPerFrame();
        double sum = 0;
        for (int i = from; i < from + count; i++) {
            sum += sum(capture, plate, i, places);
        }
        return sum / count;
    }
}
