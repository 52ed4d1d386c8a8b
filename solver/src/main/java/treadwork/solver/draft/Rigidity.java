package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.model.capture.Capture;
import treadwork.model.space.VectorSeries;

/** How far the distances between markers change in motion. */
final class Rigidity {

    /**
     * The distance of two markers on one segment varies by less, m: skin motion of 4 mm in each gives 4√2 = 6 mm; flexing a knee
     * changes distances across it by 15 mm and more.
     */
    static final double LIMIT = 0.012;

    private static final int FRAMES = 80;
    private static final int LEAST_FRAMES = 8;

    private final List<Map<String, VectorSeries>> trials;
    private final Map<String, Double> known = new LinkedHashMap<>();

    Rigidity(List<Capture> movements) {
        trials = movements.stream().map(Places::courses).toList();
    }

    boolean isRecorded(String label) {
        return !trials.isEmpty() && trials.stream().allMatch(trial -> trial.containsKey(label));
    }

    /** The standard deviation of their distance, the greatest of the trials, m; NaN where they are seldom seen together. */
    double change(String one, String other) {
        String key = one.compareTo(other) < 0 ? one + "\n" + other : other + "\n" + one;
        return known.computeIfAbsent(key, both -> {
            double greatest = Double.NaN;
            for (Map<String, VectorSeries> trial : trials) {
                double spread = trial.containsKey(one) && trial.containsKey(other)
                        ? spread(trial.get(one), trial.get(other))
                        : Double.NaN;
                greatest = Double.isNaN(greatest) || spread > greatest ? spread : greatest;
            }
            return greatest;
        });
    }

    private static double spread(VectorSeries one, VectorSeries other) {
        double sum = 0;
        double squares = 0;
        int count = 0;
        for (int i = 0; i < one.size(); i += Math.max(1, one.size() / FRAMES)) {
            double distance = one.at(i).minus(other.at(i)).norm();
            if (!Double.isNaN(distance)) {
                sum += distance;
                squares += distance * distance;
                count++;
            }
        }
        double mean = sum / count;
        return count < LEAST_FRAMES ? Double.NaN : Math.sqrt(Math.max(0, squares / count - mean * mean));
    }

    /** The mean change of a marker's distances from a group's; NaN where they are not known. */
    double change(String label, List<String> group) {
        return group.stream()
                .mapToDouble(other -> change(label, other))
                .average()
                .orElse(Double.NaN);
    }

    /** Markers joined, nearest first, while groups change less than {@link #LIMIT} in the mean of their distances. */
    List<List<String>> groups(List<String> labels) {
        List<List<String>> groups = new ArrayList<>();
        labels.forEach(label -> groups.add(new ArrayList<>(List.of(label))));
        while (joinNearest(groups)) {
            // Each turn joins two groups.
        }
        return groups;
    }

    private boolean joinNearest(List<List<String>> groups) {
        double least = LIMIT;
        int first = -1;
        int second = -1;
        for (int i = 0; i < groups.size(); i++) {
            for (int j = i + 1; j < groups.size(); j++) {
                List<String> other = groups.get(j);
                double change = groups.get(i).stream()
                        .mapToDouble(label -> change(label, other))
                        .average()
                        .orElse(Double.NaN);
                if (change < least) {
                    least = change;
                    first = i;
                    second = j;
                }
            }
        }
        if (first >= 0) {
            groups.get(first).addAll(groups.remove(second));
        }
        return first >= 0;
    }
}
