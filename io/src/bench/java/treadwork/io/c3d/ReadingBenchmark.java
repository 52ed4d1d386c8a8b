package treadwork.io.c3d;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;
import org.openjdk.jmh.infra.Blackhole;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/**
 * 500 MB of captures: the bytes alone through a {@link FileChannel}, and the captures in memory, of the same files in the same run,
 * with the heap that a machine with 4 GB gives by default. 60 points, 24 analog channels of 10 samples a frame, 2 % gaps.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(value = 1, jvmArgsAppend = "-Xmx1g")
@Warmup(iterations = 8)
@Measurement(iterations = 15)
public class ReadingBenchmark {

    private static final long BYTES = 500_000_000;
    private static final int POINTS = 60;
    private static final int CHANNELS = 24;
    private static final int SAMPLES = 10;
    private static final int BUFFER = 1 << 20;
    private static final int KEPT = 16 << 20;

    /** Frames of the recording that the files repeat; as reals and as integers a whole number of blocks. */
    private static final int FRAMES = 1000;

    @Param({"1", "250"})
    private int files;

    @Param({"REAL", "INTEGER"})
    private C3dEncoding.Storage storage;

    @Param({"INTEL", "DEC", "MIPS"})
    private Processor processor;

    private Path folder;
    private final List<Path> paths = new ArrayList<>();

    @Setup
    public void writeFiles() throws IOException {
        folder = Files.createTempDirectory("treadwork-bench");
        C3dEncoding encoding = new C3dEncoding(processor, storage, false);
        byte[] whole = C3dWriter.bytes(recording(FRAMES), encoding);
        int data = FRAMES * (POINTS * 4 + CHANNELS * SAMPLES) * (encoding.real() ? Float.BYTES : Short.BYTES);
        int opening = whole.length - data;
        // A full counter: the size of the file says how many frames there are.
        whole[Header.LAST_AT] = -1;
        whole[Header.LAST_AT + 1] = -1;
        for (int i = 0; i < files; i++) {
            Path file = folder.resolve(i + ".c3d");
            try (OutputStream out = Files.newOutputStream(file)) {
                out.write(whole, 0, opening);
                for (long written = 0; written + data <= BYTES / files; written += data) {
                    out.write(whole, opening, data);
                }
            }
            paths.add(file);
        }
    }

    @TearDown
    public void deleteFiles() throws IOException {
        for (Path path : paths) {
            Files.delete(path);
        }
        Files.delete(folder);
    }

    /** A direct buffer of 1 MB, used again and again, is as fast as a channel gets; nothing is kept. */
    @Benchmark
    public void bytesAlone(Blackhole hole) throws IOException {
        ByteBuffer buffer = ByteBuffer.allocateDirect(BUFFER);
        for (Path path : paths) {
            try (FileChannel channel = FileChannel.open(path, StandardOpenOption.READ)) {
                while (channel.read(buffer.clear()) > 0) {
                    hole.consume(buffer);
                }
            }
        }
    }

    /** The same bytes kept in memory, as a capture keeps its own: most of it is the first touch of the memory. */
    @Benchmark
    public void bytesKept(Blackhole hole) throws IOException {
        for (Path path : paths) {
            List<byte[]> kept = new ArrayList<>();
            try (FileChannel channel = FileChannel.open(path, StandardOpenOption.READ)) {
                for (long left = channel.size(); left > 0; ) {
                    ByteBuffer array = ByteBuffer.wrap(new byte[(int) Math.min(left, KEPT)]);
                    while (array.hasRemaining() && channel.read(array) > 0) {
                        // the channel gives as much as it likes
                    }
                    left -= array.capacity();
                    kept.add(array.array());
                }
            }
            hole.consume(kept);
        }
    }

    @Benchmark
    public void captures(Blackhole hole) {
        for (Path path : paths) {
            hole.consume(C3dReader.read(path, ReadOptions.DEFAULT));
        }
    }

    /** What looking up costs on top: a fifth of the points and channels copied into arrays, as filters do first. */
    @Benchmark
    public void capturesAndAFifthOfTheirSeries(Blackhole hole) {
        for (Path path : paths) {
            Capture capture = C3dReader.read(path, ReadOptions.DEFAULT);
            for (int i = 0; i < POINTS; i += 5) {
                hole.consume(capture.points().get(i).positions().eachComponent(values -> values));
            }
            for (int i = 0; i < CHANNELS; i += 5) {
                hole.consume(capture.analog().get(i).values().toArray());
            }
        }
    }

    private static Capture recording(int frames) {
        Random random = new Random(20261201);
        List<PointSeries> points = new ArrayList<>();
        for (int i = 0; i < POINTS; i++) {
            double[] course = random.doubles(3L * FRAMES, -1, 1).toArray();
            int skipped = random.nextInt(50);
            points.add(PointSeries.recorded("P" + i, "", () -> course(course, frames, skipped)));
        }
        List<AnalogChannel> channels = new ArrayList<>();
        for (int i = 0; i < CHANNELS; i++) {
            double[] course = random.doubles(FRAMES, -1000, 1000).toArray();
            channels.add(AnalogChannel.recorded("A" + i, "N", () -> course(course, frames * SAMPLES)));
        }
        return new Capture(
                "bench.c3d",
                1,
                frames,
                200,
                points,
                SAMPLES,
                channels,
                List.of(),
                Optional.empty(),
                List.of(),
                LengthUnit.MM,
                "",
                List.of());
    }

    private static VectorSeries course(double[] course, int frames, int skipped) {
        VectorSeries.Builder series = new VectorSeries.Builder(frames);
        for (int i = 0; i < frames; i++) {
            double x = (i + skipped) % 50 == 0 ? Double.NaN : course[i % FRAMES];
            series.set(i, x, course[FRAMES + i % FRAMES], course[2 * FRAMES + i % FRAMES]);
        }
        return series.build();
    }

    private static ScalarSeries course(double[] course, int samples) {
        ScalarSeries.Builder series = new ScalarSeries.Builder(samples);
        for (int i = 0; i < samples; i++) {
            series.set(i, course[i % FRAMES]);
        }
        return series.build();
    }
}
