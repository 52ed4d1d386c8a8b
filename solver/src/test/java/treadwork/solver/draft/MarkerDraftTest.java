package treadwork.solver.draft;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/** Marker maps from geometry alone, of walks whose labels and order tell nothing. */
class MarkerDraftTest {

    private static final int SUBJECTS = Integer.getInteger("subjects", 25);

    /** Required of 100 subjects: all landmarks and clusters right in 95, and no side exchanged in any. */
    private static final double LEAST_SHARE = 0.95;

    @Test
    void mapsEveryLandmarkAndClusterOfDisguisedWalksAndNeverExchangesSides() {
        int right = 0;
        long exchanged = 0;
        Map<Long, Set<String>> wrong = new TreeMap<>();

        for (long seed = 1; seed <= SUBJECTS; seed++) {
            Disguise disguise = Disguise.of(seed);
            MarkerDraft draft = MarkerDraft.of(disguise.standing(), List.of(disguise.walking()));
            Set<String> faults = disguise.faults(draft);
            exchanged += disguise.exchangedSides(draft);
            right += faults.isEmpty() ? 1 : 0;
            if (!faults.isEmpty()) {
                wrong.put(seed, faults);
            }
        }

        assertEquals(0, exchanged, "sides exchanged; " + wrong);
        assertTrue(right >= LEAST_SHARE * SUBJECTS, right + " of " + SUBJECTS + " right: " + wrong);
    }
}
