package treadwork.model.finding;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** The known name that a mistyped one most likely stands for. */
public final class NearestName {

    private NearestName() {}

    /** The known name with the fewest edits, case aside; empty where more than half of the letters would change. */
    public static Optional<String> of(String name, Collection<String> known) {
        return known.stream()
                .min(Comparator.comparingInt(candidate -> edits(name, candidate)))
                .filter(best -> 2 * edits(name, best) <= Math.max(name.length(), best.length()));
    }

    /** The words that go with it: {@code , nearest is "massKg"}, or nothing. */
    public static String hint(String name, Collection<String> known) {
        return of(name, known).map(best -> ", nearest is \"" + best + "\"").orElse("");
    }

    /** Insertions, deletions, exchanges and swaps of neighbours that turn one into the other (optimal string alignment). */
    static int edits(String from, String to) {
        String a = from.toLowerCase(Locale.ROOT);
        String b = to.toLowerCase(Locale.ROOT);
        int[][] cost = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                cost[i][j] = i == 0 || j == 0 ? i + j : step(cost, a, b, i, j);
            }
        }
        return cost[a.length()][b.length()];
    }

    private static int step(int[][] cost, String a, String b, int i, int j) {
        boolean same = a.charAt(i - 1) == b.charAt(j - 1);
        int least = Math.min(cost[i - 1][j] + 1, cost[i][j - 1] + 1);
        least = Math.min(least, cost[i - 1][j - 1] + (same ? 0 : 1));
        boolean swapped = i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
        return swapped ? Math.min(least, cost[i - 2][j - 2] + 1) : least;
    }
}
