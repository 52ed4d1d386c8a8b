package treadwork.solver.draft;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import treadwork.model.body.Landmark;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.study.LabAxis;

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

    @Test
    void mapsNoSideOfOneWhoWalksBackwards() {
        Disguise disguise = Disguise.of(1);

        MarkerDraft draft = MarkerDraft.of(disguise.standing(), List.of(reversed(disguise.walking())));

        assertEquals(
                Set.of(),
                draft.sure().landmarks().keySet().stream()
                        .filter(landmark -> landmark != Landmark.SACRUM)
                        .collect(Collectors.toSet()));
        assertEquals(Set.of(), draft.sure().clusters().keySet());
        assertTrue(
                draft.remarks().get(1).contains("not told apart"),
                draft.remarks().get(1));
    }

    @Test
    void tellsSidesFromTheFeetWhereNothingTravels() {
        Disguise disguise = Disguise.of(2);

        MarkerDraft draft = MarkerDraft.of(disguise.standing(), List.of());

        assertEquals(disguise.truth().landmarks(), draft.sure().landmarks());
    }

    @Test
    void findsTheStandingCaptureByItsStillness() {
        Disguise disguise = Disguise.of(3);

        Optional<Capture> found = Stillness.standing(List.of(disguise.walking(), disguise.standing()));

        assertEquals(Optional.of(disguise.standing()), found);
    }

    @Test
    void weighsTheOneWhoStandsOnPlates() {
        Disguise disguise = Disguise.of(4);
        LabAxis up = disguise.settings().lab().up();
        List<String> heels = List.of(disguise.truth().landmarks().get(Landmark.RIGHT_HEEL));

        double mass = StandingMass.of(disguise.standing(), up, heels).orElseThrow();

        // 1 N of noise a sample is 0.1 kg; its median over 100 frames is far smaller.
        assertEquals(disguise.settings().figure().massKg(), mass, 0.1);
    }

    private static Capture reversed(Capture capture) {
        return capture.withPoints(capture.points().stream()
                .map(point ->
                        new PointSeries(point.label(), "", point.positions().eachComponent(values -> {
                            double[] back = new double[values.length];
                            for (int i = 0; i < values.length; i++) {
                                back[i] = values[values.length - 1 - i];
                            }
                            return back;
                        })))
                .toList());
    }
}
