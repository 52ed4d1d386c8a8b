package treadwork.solver.filter;

import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

/** The open recordings and check values beside the repository; a test that asks for them is skipped without them. */
final class SharedFiles {

    private SharedFiles() {}

    static Path path(String name) {
        Path path = Path.of(System.getProperty("shared", "../shared"), name);
        assumeTrue(Files.exists(path), "skipped: the shared folder with " + name + " is not there");
        return path;
    }

    /**
     * Filters and splines computed by scipy 1.10.1 and numpy 1.24.2 for 60 samples at 200 Hz; each value stands beside
     * the call that made it, and was recomputed by scipy 1.17.1 and Octave 7.3.0.
     */
    static JsonNode filterCheckValues() throws IOException {
        return new ObjectMapper()
                .readTree(path("reference/filter-check-values.json").toFile());
    }

    static double[] numbers(JsonNode array) {
        double[] numbers = new double[array.size()];
        Arrays.setAll(numbers, i -> array.get(i).doubleValue());
        return numbers;
    }

    /** A column of a comma-separated table with one line of headings. */
    static double[] column(Path table, String heading) throws IOException {
        List<String> lines = Files.readAllLines(table);
        int column = List.of(lines.get(0).split(",", -1)).indexOf(heading);
        return lines.stream()
                .skip(1)
                .mapToDouble(line -> Double.parseDouble(line.split(",", -1)[column]))
                .toArray();
    }
}
