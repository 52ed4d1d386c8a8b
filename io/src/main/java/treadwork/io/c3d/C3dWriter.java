package treadwork.io.c3d;

import java.io.BufferedOutputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.VectorSeries;

/**
 * Writes captures as C3D files.
 *
 * <p>Lengths are written in the capture's own unit, a gap as a sample with residual -1. Reals keep 32-bit precision; integers are
 * right to half a step of the scale. A position of exactly (0, 0, 0), which readers take for a gap, is moved by the least step.
 */
public final class C3dWriter {

    static final int PARAMETER_BLOCK = 2;

    private static final int EVENT_KEY_AT = 298;
    private static final short EVENT_KEY = 12345;

    private final Capture capture;
    private final C3dEncoding encoding;
    private final WriteScaling scaling;
    private final Optional<ComputedPoints> computed;

    private C3dWriter(Capture capture, C3dEncoding encoding) {
        this(capture, encoding, Optional.empty());
    }

    private C3dWriter(Capture capture, C3dEncoding encoding, Optional<ComputedPoints> computed) {
        require(
                capture.points().size() <= Header.FULL,
                "points",
                capture.points().size());
        long analog = (long) capture.analog().size() * capture.samplesPerFrame();
        require(analog <= Header.FULL, "analog values a frame", analog);
        require(capture.firstFrame() >= 0, "is the first frame,", capture.firstFrame());
        this.capture = capture;
        this.encoding = encoding;
        this.scaling = WriteScaling.of(capture, encoding);
        this.computed = computed;
    }

    private static void require(boolean possible, String what, long number) {
        if (!possible) {
            throw new IllegalArgumentException(number + " " + what + " cannot be stated in the header");
        }
    }

    /**
     * Writes a file. It appears whole or not at all: it is written beside its place and then moved there.
     *
     * @throws IllegalArgumentException if the format cannot hold the capture
     */
    public static void write(Capture capture, C3dEncoding encoding, Path file) throws IOException {
        new C3dWriter(capture, encoding).write(file);
    }

    /**
     * Writes a file of reals with what was computed from the capture as further points; else like {@link #write(Capture,
     * C3dEncoding, Path)}. A computed label that a marker of the capture bears gets an ending of its own.
     *
     * @throws IllegalArgumentException if the format cannot hold all of it
     */
    public static void write(Capture capture, ComputedPoints computed, Path file) throws IOException {
        ComputedPoints named = withOwnLabels(computed, capture);
        new C3dWriter(withPoints(capture, named), C3dEncoding.DEFAULT, Optional.of(named)).write(file);
    }

    private static ComputedPoints withOwnLabels(ComputedPoints computed, Capture capture) {
        Set<String> taken = capture.points().stream().map(PointSeries::label).collect(Collectors.toSet());
        List<ComputedPoint> named = new ArrayList<>();
        for (ComputedPoint point : computed.points()) {
            String label = point.label();
            while (!taken.add(label)) {
                label = label + "_computed";
            }
            named.add(new ComputedPoint(label, point.description(), point.unit(), point.values()));
        }
        return new ComputedPoints(computed.version(), named, computed.settings());
    }

    /** Positions are written in the file's unit of length, which is taken off the computed numbers beforehand. */
    private static Capture withPoints(Capture capture, ComputedPoints computed) {
        double unit = capture.pointUnit().metres();
        List<PointSeries> points = new ArrayList<>(capture.points());
        for (ComputedPoint point : computed.points()) {
            VectorSeries values = point.values();
            VectorSeries.Builder inUnits = new VectorSeries.Builder(values.size());
            for (int i = 0; i < values.size(); i++) {
                inUnits.set(i, values.at(i).times(unit));
            }
            points.add(new PointSeries(point.label(), point.description(), inUnits.build()));
        }
        return new Capture(
                capture.name(),
                capture.firstFrame(),
                capture.frames(),
                capture.pointRate(),
                points,
                capture.samplesPerFrame(),
                capture.analog(),
                capture.plates(),
                capture.plateZero(),
                capture.events(),
                capture.pointUnit(),
                capture.storage(),
                capture.findings());
    }

    private void write(Path file) throws IOException {
        Path part = file.resolveSibling(file.getFileName() + ".part");
        try {
            try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(part))) {
                write(out);
            }
            moveTo(part, file);
        } finally {
            Files.deleteIfExists(part);
        }
    }

    /**
     * The bytes of the file.
     *
     * @throws IllegalArgumentException if the format cannot hold the capture
     */
    public static byte[] bytes(Capture capture, C3dEncoding encoding) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            new C3dWriter(capture, encoding).write(out);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return out.toByteArray();
    }

    private static void moveTo(Path part, Path file) throws IOException {
        try {
            Files.move(part, file, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(part, file, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private void write(OutputStream out) throws IOException {
        byte[] section = new SectionWriter(capture, encoding, scaling, computed).section();
        out.write(header(PARAMETER_BLOCK + section.length / Header.BLOCK));
        out.write(section);
        new FrameWriter(capture, encoding, scaling).write(out);
    }

    private byte[] header(int dataBlock) {
        Processor processor = encoding.processor();
        ByteBuffer header = ByteBuffer.allocate(Header.BLOCK).order(processor.order());
        header.put(0, (byte) PARAMETER_BLOCK).put(1, (byte) Header.KEY);
        header.putShort(Header.POINTS_AT, (short) capture.points().size());
        header.putShort(Header.ANALOG_AT, (short) (capture.analog().size() * capture.samplesPerFrame()));
        header.putShort(Header.FIRST_AT, (short) Math.min(capture.firstFrame(), Header.FULL));
        header.putShort(Header.LAST_AT, (short) Math.min(capture.range().last(), Header.FULL));
        header.putShort(Header.GAP_AT, (short) 0);
        header.putInt(Header.SCALE_AT, processor.word(scaling.pointStep()));
        header.putShort(Header.DATA_AT, (short) dataBlock);
        header.putShort(Header.SAMPLES_AT, (short) capture.samplesPerFrame());
        header.putInt(Header.RATE_AT, processor.word((float) capture.pointRate()));
        header.putShort(EVENT_KEY_AT, EVENT_KEY);
        return header.array();
    }
}
