package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/** Every open recording, read, written and read again: the expected values are those of the first reading. */
class RecordedRoundTripTest {

    /** The open recordings are 20 C3D files. */
    private static final int RECORDINGS = 20;

    /** A writer's integer step is 1/32000 of the largest value; a value is right to half of it, and a 32-bit scale. */
    private static final double STEP = 0.51 / 32_000;

    /** Half a step of a 32-bit real's 24 bits. */
    private static final double ROUNDING = 1.01 * Math.pow(2, -24);

    /** Event times are written as 32-bit reals: of 16 s, 2^-24 of the value. */
    private static final double EVENT = 1e-6;

    @Test
    void realsAreTheSameToTheBitInEveryByteOrder() throws IOException {
        for (Path recording : recordings()) {
            Capture once = read(recording);
            for (Processor processor : Processor.values()) {
                Capture twice = again(once, new C3dEncoding(processor, C3dEncoding.Storage.REAL, false));

                String at = recording.getFileName() + " " + processor;
                assertSameFrame(once, twice, at);
                for (int p = 0; p < once.points().size(); p++) {
                    assertSame(once.points().get(p), twice.points().get(p), isReal(once), at);
                }
                for (int c = 0; c < once.analog().size(); c++) {
                    ScalarSeries before = once.analog().get(c).values();
                    assertSame(before, twice.analog().get(c).values(), isReal(once), at);
                }
            }
        }
    }

    @Test
    void integersAreRightToOneStepInEveryByteOrder() throws IOException {
        for (Path recording : recordings()) {
            Capture once = read(recording);
            for (Processor processor : Processor.values()) {
                Capture twice = again(once, new C3dEncoding(processor, C3dEncoding.Storage.INTEGER, true));

                String at = recording.getFileName() + " " + processor;
                assertSameFrame(once, twice, at);
                double largest = largest(once);
                for (int p = 0; p < once.points().size(); p++) {
                    VectorSeries before = once.points().get(p).positions();
                    VectorSeries after = twice.points().get(p).positions();
                    assertNear(before, after, STEP * largest, at);
                }
                for (int c = 0; c < once.analog().size(); c++) {
                    assertNear(once.analog().get(c), twice.analog().get(c), at);
                }
            }
        }
    }

    private static void assertSameFrame(Capture once, Capture twice, String at) {
        assertEquals(once.range(), twice.range(), at);
        assertEquals(once.pointRate(), twice.pointRate(), at);
        assertEquals(once.samplesPerFrame(), twice.samplesPerFrame(), at);
        assertEquals(once.pointUnit(), twice.pointUnit(), at);
        assertEquals(once.plates(), twice.plates(), at);
        assertEquals(once.plateZero(), twice.plateZero(), at);
        assertEquals(
                once.points().stream()
                        .map(p -> p.label() + "/" + p.description())
                        .toList(),
                twice.points().stream()
                        .map(p -> p.label() + "/" + p.description())
                        .toList(),
                at);
        assertEquals(
                once.analog().stream().map(c -> c.label() + "/" + c.unit()).toList(),
                twice.analog().stream().map(c -> c.label() + "/" + c.unit()).toList(),
                at);
        assertEquals(once.events().size(), twice.events().size(), at);
        for (int i = 0; i < once.events().size(); i++) {
            CaptureEvent before = once.events().get(i);
            CaptureEvent after = twice.events().get(i);
            assertEquals(before.label() + "/" + before.context(), after.label() + "/" + after.context(), at);
            assertEquals(before.timeS(), after.timeS(), EVENT, at + ", s");
        }
    }

    private static void assertSame(PointSeries before, PointSeries after, boolean real, String at) {
        String where = at + " " + before.label();
        assertSame(before.positions().componentX(), after.positions().componentX(), real, where);
        assertSame(before.positions().componentY(), after.positions().componentY(), real, where);
        assertSame(before.positions().componentZ(), after.positions().componentZ(), real, where);
    }

    /**
     * Reals to the bit; an integer times its scale is a double, of which a 32-bit real keeps 24 bits.
     */
    private static void assertSame(ScalarSeries before, ScalarSeries after, boolean real, String at) {
        double[] expected = before.toArray();
        double[] found = after.toArray();
        if (real) {
            for (int i = 0; i < expected.length; i++) {
                // The VAX format has one zero only, without sign.
                expected[i] += 0.0;
                found[i] += 0.0;
            }
            assertArrayEquals(expected, found, at);
            return;
        }
        for (int i = 0; i < expected.length; i++) {
            double allowed = Double.isNaN(expected[i]) ? 0 : Math.abs(expected[i]) * ROUNDING;
            assertEquals(expected[i], found[i], allowed, at + ", sample " + i);
        }
    }

    private static void assertNear(VectorSeries before, VectorSeries after, double allowed, String at) {
        for (int i = 0; i < before.size(); i++) {
            assertEquals(before.isGap(i), after.isGap(i), at + ", gap in frame " + i);
            if (!before.isGap(i)) {
                double off = before.at(i).minus(after.at(i)).norm();
                assertTrue(off <= Math.sqrt(3) * allowed, at + ": off by " + off + " m, allowed " + allowed);
            }
        }
    }

    private static void assertNear(AnalogChannel before, AnalogChannel after, String at) {
        double largest = 0;
        for (double value : before.values().toArray()) {
            largest = Math.max(largest, Math.abs(value));
        }
        assertArrayEquals(
                before.values().toArray(), after.values().toArray(), STEP * largest, at + " " + before.label());
    }

    private static boolean isReal(Capture capture) {
        return capture.storage().contains("32-bit real");
    }

    private static double largest(Capture capture) {
        double largest = 0;
        for (PointSeries point : capture.points()) {
            for (int i = 0; i < capture.frames(); i++) {
                if (!point.positions().isGap(i)) {
                    double x = Math.abs(point.positions().x(i));
                    double y = Math.abs(point.positions().y(i));
                    double z = Math.abs(point.positions().z(i));
                    largest = Math.max(largest, Math.max(x, Math.max(y, z)));
                }
            }
        }
        return largest;
    }

    private static List<Path> recordings() throws IOException {
        try (Stream<Path> all = Files.walk(Shared.recording(""))) {
            List<Path> found = all.filter(
                            path -> path.toString().toLowerCase(Locale.ROOT).endsWith(".c3d"))
                    .sorted()
                    .toList();
            assertTrue(found.size() >= RECORDINGS, found.size() + " recordings are here");
            return found;
        }
    }

    private static Capture read(Path recording) {
        try {
            return C3dReader.read(recording, Optional.empty());
        } catch (UnusableInputException noUnit) {
            assertEquals("point-unit-unknown", noUnit.finding().code(), recording.toString());
            return C3dReader.read(recording, Optional.of(LengthUnit.M));
        }
    }

    private static Capture again(Capture capture, C3dEncoding encoding) {
        return C3dReader.read(capture.name(), C3dWriter.bytes(capture, encoding), ReadOptions.DEFAULT);
    }
}
