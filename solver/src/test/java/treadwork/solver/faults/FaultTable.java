package treadwork.solver.faults;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.solver.run.TrialComputation;

/**
 * Counts how many planted mistakes the checks find, and how many clean walks they accuse; writes a table of both.
 *
 * <p>Arguments: how many walks a mistake, and the file to write.
 */
public final class FaultTable {

    private FaultTable() {}

    public static void main(String[] arguments) throws Exception {
        int walks = Integer.parseInt(arguments[0]);
        Path file = Path.of(arguments[1]);
        Files.createDirectories(file.toAbsolutePath().getParent());
        try (PrintStream out = new PrintStream(file.toFile(), StandardCharsets.UTF_8)) {
            for (String line : lines(walks)) {
                out.println(line);
                System.out.println(line);
            }
        }
    }

    private static List<String> lines(int walks) {
        List<String> lines = new ArrayList<>();
        lines.add("| code | planted | found of " + walks + " |");
        lines.add("|---|---|---|");
        for (PlantedFault fault : FaultCatalogue.all()) {
            long found = found(fault, walks);
            String bold = fault.matters() ? "**" : "";
            lines.add(String.format(
                    Locale.ROOT, "| `%s` | %s%s%s | %d |", fault.code(), bold, fault.what(), bold, found));
        }
        Map<String, Integer> accused = accused(walks);
        lines.add("| none | nothing: walks accused, warning or worse | " + accused.getOrDefault("", 0)
                + accused.entrySet().stream()
                        .filter(entry -> !entry.getKey().isEmpty())
                        .map(entry -> " " + entry.getKey() + " " + entry.getValue())
                        .collect(Collectors.joining(","))
                + " |");
        return lines;
    }

    /** In how many walks the fault's own code is found. */
    static long found(PlantedFault fault, int walks) {
        return IntStream.rangeClosed(1, walks)
                .parallel()
                .filter(seed -> findings(fault.in(seed)).stream()
                        .anyMatch(finding -> finding.code().equals(fault.code())))
                .count();
    }

    /** How many clean walks are accused by each code; under the empty one, by any. */
    static Map<String, Integer> accused(int walks) {
        Map<String, Integer> accused = new TreeMap<>();
        for (int seed = 1; seed <= walks; seed++) {
            List<String> codes = findings(NoisyWalk.of(NoisyWalk.settings(seed))).stream()
                    .filter(finding -> finding.severity() != Severity.NOTE)
                    .map(Finding::code)
                    .distinct()
                    .toList();
            codes.forEach(code -> accused.merge(code, 1, Integer::sum));
            if (!codes.isEmpty()) {
                accused.merge("", 1, Integer::sum);
            }
        }
        return accused;
    }

    static List<Finding> findings(NoisyWalk walk) {
        try {
            return TrialComputation.compute(walk.input()).result().findings();
        } catch (UnusableInputException refused) {
            return List.of(refused.finding());
        }
    }
}
