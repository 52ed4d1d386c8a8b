package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * How much of all that could be assigned speaks for each marker in each slot: weights exp(-cost/2) summed over whole
 * assignments, so that a slot's share counts every alternative of the others.
 */
final class Shares {

    /** A slot without a marker. */
    static final int NOBODY = -1;

    /** A marker that costs so much more than none is not tried: exp(-10/2) = 0.7 %. */
    private static final double NEGLIGIBLE = 10;

    private final double[][] weights;
    private double total;
    private double least = Double.POSITIVE_INFINITY;
    private int[] best;

    Shares(int slots, int spots) {
        weights = new double[slots][spots + 1];
        best = new int[slots];
        Arrays.fill(best, NOBODY);
    }

    /** One whole assignment, a marker's number or {@link #NOBODY} a slot, and its cost (-2 ln of its likelihood). */
    void add(int[] assigned, double cost) {
        double weight = Math.exp(-cost / 2);
        for (int slot = 0; slot < assigned.length; slot++) {
            weights[slot][assigned[slot] + 1] += weight;
        }
        total += weight;
        if (cost < least) {
            least = cost;
            best = assigned.clone();
        }
    }

    /** The cost of the best assignment. */
    double least() {
        return least;
    }

    int best(int slot) {
        return best[slot];
    }

    /** From 0 to 1, of the best assignment's marker in that slot. */
    double confidence(int slot) {
        return total > 0 ? weights[slot][best[slot] + 1] / total : 0;
    }

    /**
     * Adds all assignments in which no marker stands twice.
     *
     * @param costs   a slot, a marker
     * @param nobody  the cost of a slot without marker
     * @param start   slots that are taken before come first; their cost is {@code before}
     */
    void addAll(double[][] costs, double[] nobody, int[] start, double before) {
        int slots = weights.length;
        int[] assigned = Arrays.copyOf(start, slots);
        fill(new Search(costs, nobody, start.length, assigned), start.length, before);
    }

    private static final class Search {

        private final double[][] costs;
        private final double[] nobody;
        private final int fixed;
        private final int[] assigned;

        Search(double[][] costs, double[] nobody, int fixed, int[] assigned) {
            this.costs = costs;
            this.nobody = nobody;
            this.fixed = fixed;
            this.assigned = assigned;
        }

        /** Markers that are worth trying in a slot. */
        List<Integer> candidates(int slot) {
            List<Integer> worth = new ArrayList<>();
            double[] row = costs[slot - fixed];
            for (int spot = 0; spot < row.length; spot++) {
                if (row[spot] < Math.min(nobody[slot - fixed], Template.NOBODY) + NEGLIGIBLE) {
                    worth.add(spot);
                }
            }
            return worth;
        }

        boolean isTaken(int spot, int slots) {
            for (int slot = 0; slot < slots; slot++) {
                if (assigned[slot] == spot) {
                    return true;
                }
            }
            return false;
        }
    }

    private void fill(Search search, int slot, double cost) {
        if (slot == weights.length) {
            add(search.assigned, cost);
            return;
        }
        search.assigned[slot] = NOBODY;
        fill(search, slot + 1, cost + search.nobody[slot - search.fixed]);
        for (int spot : search.candidates(slot)) {
            if (!search.isTaken(spot, slot)) {
                search.assigned[slot] = spot;
                fill(search, slot + 1, cost + search.costs[slot - search.fixed][spot]);
            }
        }
        search.assigned[slot] = NOBODY;
    }
}
