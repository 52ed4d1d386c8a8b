package treadwork.io.fuzz;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A short run of the fuzzer, and what longer ones have found. */
class FuzzTest {

    private static final int INPUTS = 1500;

    @TempDir
    Path folder;

    @Test
    void nothingComesOutOfASpoiltInputButAResultOrARefusal() throws IOException {
        for (Target target : Targets.all(folder)) {
            Fuzzer fuzzer = new Fuzzer(target, 1);
            for (int i = 0; i < INPUTS; i++) {
                assertEquals("", fuzzer.fault(fuzzer.next()), target.name() + ", input " + i);
            }
        }
    }

    @Test
    void theSeedsAreReadWithoutARefusal() throws IOException {
        for (Target target : Targets.all(folder)) {
            for (byte[] seed : target.seeds()) {
                assertTrue(target.read(seed).startsWith("read"), target.name());
            }
        }
    }

    /** Files named after the reader and what they lead to: kinds of result that no seed has, and what once came out wrong. */
    @Test
    void whatWasKeptStaysReadOrRefused() throws IOException {
        List<Target> targets = Targets.all(folder);
        Path found = Path.of("src/test/resources/treadwork/io/fuzz");
        int replayed = 0;
        try (Stream<Path> files =
                Files.list(Files.isDirectory(found) ? found : Path.of("io").resolve(found))) {
            for (Path file : files.toList()) {
                for (Target target : targets) {
                    if (file.getFileName().toString().startsWith(target.name() + "-")) {
                        assertEquals("", new Fuzzer(target, 1).fault(Files.readAllBytes(file)), file.toString());
                        replayed++;
                    }
                }
            }
        }

        assertTrue(replayed > 0, "kept inputs");
    }
}
