package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.solver.plate.PlateTop;

/**
 * Whether a foot on its plates reaches over their edge with points that bear load.
 *
 * @param mostlyOff frames in which at least half of its planted points are beyond every plate that carries it: part of
 *                  what it stands on is not measured; none where a person says that the foot is on the plate
 */
record EdgeCheck(BitSet mostlyOff, Optional<Finding> finding) {

    /** Markers of the heel and the metatarsal heads sit outside of where the sole bears, m. */
    private static final double LIMIT = 0.03;

    static EdgeCheck of(Side side, Ownership ownership, FootPlanting foot, Clock clock) {
        List<OwnedSpell> own =
                ownership.owned().stream().filter(spell -> spell.side() == side).toList();
        BitSet over = new BitSet();
        BitSet mostly = new BitSet();
        double farthest = 0;
        for (OwnedSpell spell : own) {
            BitSet frames = spell.frames(clock);
            frames.and(foot.bearing());
            for (int i = frames.nextSetBit(0); i >= 0; i = frames.nextSetBit(i + 1)) {
                double[] overhangs = foot.overhangs(i, under(own, i, clock));
                int points = overhangs.length;
                over.set(i, points > 0 && overhangs[points - 1] > LIMIT);
                mostly.set(i, points > 0 && overhangs[points / 2] > LIMIT);
                farthest = points > 0 ? Math.max(farthest, overhangs[points - 1]) : farthest;
            }
        }
        int lasting = clock.framesIn(LoadedSpell.SHORTEST_S);
        BitSet lastingOver = FrameRuns.atLeast(over, lasting);
        BitSet lastingMostly = ownership.stated() ? new BitSet() : FrameRuns.atLeast(mostly, lasting);
        return new EdgeCheck(
                lastingMostly,
                lastingOver.isEmpty()
                        ? Optional.empty()
                        : Optional.of(finding(
                                clock.name() + ", " + side.key() + " foot",
                                words(lastingOver, clock),
                                words(lastingMostly, clock),
                                farthest)));
    }

    private static List<PlateTop> under(List<OwnedSpell> own, int frame, Clock clock) {
        List<PlateTop> tops = new ArrayList<>();
        for (OwnedSpell spell : own) {
            int sample = clock.sample(frame);
            if (sample >= spell.spell().from() && sample < spell.spell().end()) {
                tops.add(spell.plate().top());
            }
        }
        return tops;
    }

    private static String words(BitSet frames, Clock clock) {
        return frames.isEmpty() ? "" : FrameRuns.inWords(frames, clock.firstFrame());
    }

    private static Finding finding(String foot, String over, String mostly, double farthest) {
        boolean refused = !mostly.isEmpty();
        return new Finding(
                "foot-off-plate",
                refused ? Severity.REFUSES : Severity.WARNING,
                foot + ", " + over,
                String.format(
                        Locale.ROOT,
                        "points of the foot that bear load lie up to %.0f mm beyond the plate's edge, limit %.0f mm",
                        1e3 * farthest,
                        1e3 * LIMIT),
                refused
                        ? "Half of the foot or more is off the plate in " + mostly
                                + ", so its reaction is not known there"
                        : "What this part of the foot bears may be missing from its reaction",
                "Have the foot step on the middle of the plate; check the plate's corners if it did");
    }
}
