package treadwork.solver.plate;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Assumptions;
import treadwork.io.c3d.C3dReader;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.VectorSeries;

/** Open recordings, where they are at hand. */
public final class Recordings {

    private Recordings() {}

    public static Capture read(String path) {
        return read(path, Optional.empty());
    }

    public static Capture read(String path, Optional<LengthUnit> unit) {
        Path file = Path.of(System.getProperty("shared", "../shared"), "data").resolve(path);
        Assumptions.assumeTrue(Files.isRegularFile(file), "no recording " + file);
        return C3dReader.read(file, unit);
    }

    /** The course of the marker of that label; of several, the first. */
    public static VectorSeries course(Capture capture, String label) {
        return capture.points().stream()
                .filter(point -> point.label().equals(label))
                .findFirst()
                .map(PointSeries::positions)
                .orElseThrow();
    }

    /** The course of the point of that description. */
    public static VectorSeries described(Capture capture, String description) {
        return capture.points().stream()
                .filter(point -> point.description().equals(description))
                .findFirst()
                .map(PointSeries::positions)
                .orElseThrow();
    }
}
