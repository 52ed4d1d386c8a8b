package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import treadwork.model.body.Landmark;
import treadwork.model.body.Side;

/** The landmarks that markers were found for, each with its share against the alternatives. */
record LandmarkGuesses(Anatomy anatomy, boolean tellsSides) {

    /** Below it a landmark is proposed but not used. */
    static final double LEAST_CONFIDENCE = 0.9;

    static final List<String> FOOT =
            List.of("heel", "first_metatarsal_head", "fifth_metatarsal_head", "second_metatarsal_head", "toe_tip");

    List<Guess> all() {
        List<Guess> guesses = new ArrayList<>();
        addHips(guesses);
        for (Side side : Side.values()) {
            Limb limb = anatomy.limbs().get(side);
            Shares knee = limb.knee();
            Shares ankle = limb.ankle();
            add(guesses, Landmark.of(side, "lateral_epicondyle"), knee, new Slot(0, limb.spots()));
            add(guesses, Landmark.of(side, "medial_epicondyle"), knee, new Slot(1, limb.spots()));
            add(guesses, Landmark.of(side, "lateral_malleolus"), ankle, new Slot(0, limb.spots()));
            add(guesses, Landmark.of(side, "medial_malleolus"), ankle, new Slot(1, limb.spots()));
            Shares foot = limb.foot(ankle);
            List<Spot> onFoot =
                    limb.onFoot(ankle).stream().map(limb.spots()::get).toList();
            for (int slot = 0; slot < FOOT.size(); slot++) {
                add(guesses, Landmark.of(side, FOOT.get(slot)), foot, new Slot(slot, onFoot));
            }
        }
        return guesses;
    }

    private void addHips(List<Guess> guesses) {
        Hips hips = anatomy.hips();
        Shares shares = hips.shares();
        add(guesses, Landmark.RIGHT_ASIS, shares, new Slot(0, hips.spots()));
        add(guesses, Landmark.LEFT_ASIS, shares, new Slot(1, hips.spots()));
        add(guesses, Landmark.RIGHT_PSIS, shares, new Slot(2, hips.spots()));
        add(guesses, Landmark.LEFT_PSIS, shares, new Slot(3, hips.spots()));
        if (shares.best(2) < 0 || shares.best(3) < 0) {
            add(guesses, Landmark.SACRUM, shares, new Slot(4, hips.spots()));
        }
        add(guesses, Landmark.RIGHT_HIP_CENTRE, shares, new Slot(5, hips.spots()));
        add(guesses, Landmark.LEFT_HIP_CENTRE, shares, new Slot(6, hips.spots()));
    }

    private record Slot(int number, List<Spot> spots) {}

    private void add(List<Guess> guesses, Landmark landmark, Shares shares, Slot slot) {
        int best = shares.best(slot.number);
        if (best >= 0) {
            Spot spot = slot.spots.get(best);
            double confidence = shares.confidence(slot.number);
            boolean isSided = landmark != Landmark.SACRUM;
            boolean sure = confidence >= LEAST_CONFIDENCE && (tellsSides || !isSided);
            String why = String.format(
                    Locale.ROOT,
                    "standing %.2f m above the floor and %.2f m from the body's middle",
                    spot.at().y(),
                    Math.abs(spot.at().z()));
            guesses.add(new Guess(landmark, spot.label(), confidence, sure, why));
        }
    }
}
