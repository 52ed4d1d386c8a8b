package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.space.ScalarSeries;

/**
 * Analog samples in which a plate is loaded without a break.
 *
 * @param from first sample
 * @param end  first sample after it
 */
record LoadedSpell(int from, int end) {

    /** No foot stands for less; what is shorter is a knock, s. */
    static final double SHORTEST_S = 0.05;

    /** Unless the record begins or ends in it, s. */
    private static final double SHORTEST_CUT_S = 0.01;

    /**
     * The spells that begin when the push reaches {@code threshold}, end when it falls below half of it, and last at least 50
     * ms, or 10 ms where the record cuts them off (the lower second level keeps noise from ending a contact). Where the push is not known a spell goes on if the plate
     * is loaded right after it, too; else it ends there.
     */
    static List<LoadedSpell> find(ScalarSeries push, double threshold, double rate) {
        List<LoadedSpell> spells = new ArrayList<>();
        int from = -1;
        for (int i = 0; i <= push.size(); i++) {
            int next = from < 0 ? i : firstKnown(push, i);
            boolean on = next < push.size() && push.at(next) >= (from < 0 ? threshold : threshold / 2);
            if (on && from < 0) {
                from = i;
            } else if (!on && from >= 0) {
                boolean cut = from == 0 || i == push.size();
                if (i - from >= (cut ? SHORTEST_CUT_S : SHORTEST_S) * rate - 1e-9) {
                    spells.add(new LoadedSpell(from, i));
                }
                from = -1;
            }
            i = on ? next : i;
        }
        return spells;
    }

    /** The first sample from {@code i} on at which the push is known. */
    private static int firstKnown(ScalarSeries push, int i) {
        int known = i;
        while (known < push.size() && Double.isNaN(push.at(known))) {
            known++;
        }
        return known;
    }
}
