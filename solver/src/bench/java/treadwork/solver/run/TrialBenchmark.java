package treadwork.solver.run;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.inertia.InertiaTables;
import treadwork.model.body.InertiaSource;
import treadwork.model.capture.Capture;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.Processing;

/** One trial of 3.3 s at 200 Hz with 46 markers and 7 plates at 1000 Hz, from the file on disk to loads in memory. */
@State(Scope.Benchmark)
@BenchmarkMode({Mode.AverageTime, Mode.SampleTime})
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(value = 1, jvmArgsAppend = "-XX:+UseSerialGC")
@Warmup(iterations = 5, time = 2)
@Measurement(iterations = 5, time = 2)
public class TrialBenchmark {

    private Walked walked;
    private Path file;
    private Capture standing;
    private Capture movement;
    private InertiaSource table;

    @Setup
    public void writeTrial() throws IOException {
        Walk walk = Walk.of(WalkerSettings.DEFAULT.with(Disturbance.NONE
                .withMarkerNoise(0.0005)
                .withSkinMotion(0.003)
                .withPlateNoise(1)
                .withPlateBaseline(3)));
        walked = Walked.of(walk, Processing.DEFAULT);
        file = Files.createTempFile("treadwork-bench", ".c3d");
        C3dWriter.write(walk.walking(), C3dEncoding.DEFAULT, file);
        standing = walk.standing();
        movement = C3dReader.read(file, Optional.empty());
        table = InertiaTables.load(InertiaTable.DE_LEVA_1996);
    }

    @TearDown
    public void deleteTrial() throws IOException {
        Files.delete(file);
    }

    @Benchmark
    public ComputedTrial fromDiskToLoads() {
        return compute(C3dReader.read(file, Optional.empty()));
    }

    @Benchmark
    public Capture readingAlone() {
        return C3dReader.read(file, Optional.empty());
    }

    @Benchmark
    public ComputedTrial computingAlone() {
        return compute(movement);
    }

    private ComputedTrial compute(Capture capture) {
        return TrialComputation.compute(new TrialInput(standing, capture, walked.subject(), walked.trial(), table));
    }
}
