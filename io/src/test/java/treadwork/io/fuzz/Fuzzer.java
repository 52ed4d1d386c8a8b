package treadwork.io.fuzz;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.Set;
import treadwork.model.finding.UnusableInputException;

/**
 * Feeds spoilt inputs to the readers: own seeds, changed at random; what leads to a kind of result that was not met before
 * is kept and changed further. Nothing but a result or a reader's own refusal may come out, within five seconds and a small
 * heap.
 *
 * <p>Arguments: minutes, seed, and the folder for inputs that lead to anything else.
 */
public final class Fuzzer {

    private static final double LONGEST_S = 5;

    /** What is kept leaves the readers most of a small heap. */
    private static final long KEPT_BYTES = 16 << 20;

    private final Target target;
    private final Random random;
    private final Mutator mutator;
    private final List<byte[]> corpus;
    private final Set<String> kinds = new HashSet<>();
    private long runs;
    private long keptBytes;

    Fuzzer(Target target, long seed) {
        this.target = target;
        this.random = new Random(seed);
        this.mutator = new Mutator(random);
        this.corpus = new ArrayList<>(target.seeds());
    }

    public static void main(String[] arguments) throws IOException {
        double minutes = Double.parseDouble(arguments[0]);
        long seed = Long.parseLong(arguments[1]);
        Path folder = Path.of(arguments[2]);
        List<Fuzzer> fuzzers = new ArrayList<>();
        for (Target target : Targets.all(folder.resolve("work"))) {
            fuzzers.add(new Fuzzer(target, seed));
        }
        int findings = 0;
        long end = System.nanoTime() + (long) (minutes * 60e9);
        while (System.nanoTime() < end) {
            for (Fuzzer fuzzer : fuzzers) {
                findings += fuzzer.round(System.nanoTime() + 1_000_000_000L, folder);
            }
        }
        for (Fuzzer fuzzer : fuzzers) {
            System.out.printf(
                    Locale.ROOT,
                    "%s: %d inputs, %d kinds of result, %d kept%n",
                    fuzzer.target.name(),
                    fuzzer.runs,
                    fuzzer.kinds.size(),
                    fuzzer.corpus.size());
        }
        System.out.printf(
                Locale.ROOT,
                "%d findings in %.1f minutes, seed %d, heap %d MB%n",
                findings,
                minutes,
                seed,
                Runtime.getRuntime().maxMemory() >> 20);
        System.exit(findings == 0 ? 0 : 1);
    }

    private int round(long end, Path folder) throws IOException {
        int findings = 0;
        while (System.nanoTime() < end) {
            byte[] input = next();
            String fault = fault(input);
            if (!fault.isEmpty()) {
                findings++;
                Files.createDirectories(folder);
                Path file = folder.resolve(target.name() + "-" + Integer.toHexString(fault.hashCode()));
                Files.write(file, input);
                System.out.println(file + ": " + fault);
            }
        }
        return findings;
    }

    byte[] next() {
        byte[] input = corpus.get(random.nextInt(corpus.size()));
        byte[] other = corpus.get(random.nextInt(corpus.size()));
        return mutator.mutated(input, other, target.words());
    }

    /** What came out that must not; empty where nothing did. */
    String fault(byte[] input) throws IOException {
        runs++;
        long start = System.nanoTime();
        String kind;
        try {
            kind = target.read(input);
        } catch (UnusableInputException refused) {
            kind = Results.kind(refused.finding());
        } catch (RuntimeException | Error fault) {
            StackTraceElement[] trace = fault.getStackTrace();
            return fault.getClass().getName() + " " + fault.getMessage() + (trace.length > 0 ? " at " + trace[0] : "");
        }
        double seconds = (System.nanoTime() - start) / 1e9;
        if (seconds > LONGEST_S) {
            return String.format(Locale.ROOT, "took %.0f s", seconds);
        }
        if (kinds.add(kind) && keptBytes + input.length <= KEPT_BYTES) {
            corpus.add(input);
            keptBytes += input.length;
        }
        return "";
    }
}
