package treadwork.solver.contact;

import java.util.BitSet;
import treadwork.model.body.Side;
import treadwork.model.space.ScalarSeries;
import treadwork.solver.plate.PlateLoad;

/**
 * A spell, or a part of one, and the foot that it belongs to.
 *
 * @param reachFrom first sample that the smoothed load of this spell may be taken from
 * @param reachEnd  first sample after those
 * @param assigned  in words, how the foot was found
 */
record OwnedSpell(PlateLoad plate, Side side, LoadedSpell spell, int reachFrom, int reachEnd, String assigned) {

    /** The frames of the contact, from the unfiltered push. */
    BitSet frames(Clock clock) {
        return clock.framesOf(spell.from(), spell.end());
    }

    /** The frames in which the smoothed push is above the threshold without a break that leads away from the contact. */
    BitSet smoothFrames(double threshold, Clock clock) {
        ScalarSeries push = plate.smoothPush();
        BitSet frames = new BitSet();
        int from = -1;
        for (int i = reachFrom; i <= reachEnd; i++) {
            boolean on = i < reachEnd && push.at(i) >= threshold;
            if (on && from < 0) {
                from = i;
            } else if (!on && from >= 0) {
                if (from < spell.end() && i > spell.from()) {
                    frames.or(clock.framesOf(from, i));
                }
                from = -1;
            }
        }
        return frames;
    }

    /** The frames within the smoothed load's reach in which the plate cannot tell its load. */
    BitSet unknownFrames(int reach, Clock clock) {
        BitSet near = FrameRuns.widened(frames(clock), reach, clock.frames());
        near.and(clock.framesOf(reachFrom, reachEnd));
        BitSet unknown = new BitSet();
        near.stream().filter(i -> plate.smooth().force().isGap(clock.sample(i))).forEach(unknown::set);
        return unknown;
    }
}
