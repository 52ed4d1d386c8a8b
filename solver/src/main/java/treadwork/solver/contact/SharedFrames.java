package treadwork.solver.contact;

import java.util.BitSet;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.solver.plate.PlateLoad;

/**
 * The frames of a spell in which both feet stand on the plate, so that neither's load is known.
 *
 * <p>Told by the feet: both bear load and have at least half of their planted points over the plate for 50 ms or more. And
 * told by the centre of pressure, for feet that never come to rest in the lab because the ground moves: it leaves one
 * foot for the other and stays there longer than a foot takes to swing past; then the whole spell is shared.
 */
final class SharedFrames {

    /** Nearer to the other foot by this much is nearer for certain, m: twice the error of a centre of pressure at 50 N. */
    private static final double CLEARLY_NEARER = 0.02;

    /** A foot swings past the other in 0.1 s. */
    private static final double LONGER_THAN_A_SWING_S = 0.2;

    private static final int FEET = 2;

    private final List<FootOutline> feet;
    private final Map<Side, FootPlanting> planting;
    private final Attribution.Finder finder;

    SharedFrames(List<FootOutline> feet, Map<Side, FootPlanting> planting, Attribution.Finder finder) {
        this.feet = feet;
        this.planting = planting;
        this.finder = finder;
    }

    /**
     * @param frames of the spell
     * @param reach  frames that the filter carries a load to, and by which the feet's motion is unsure
     */
    BitSet in(BitSet frames, PlateLoad plate, int reach) {
        if (feet.size() < FEET) {
            return new BitSet();
        }
        if (changesFeet(frames, plate)) {
            return (BitSet) frames.clone();
        }
        BitSet both = (BitSet) frames.clone();
        for (FootOutline foot : feet) {
            both.and(on(plate, planting.get(foot.side()), frames));
        }
        BitSet lasting = FrameRuns.atLeast(both, finder.clock().framesIn(LoadedSpell.SHORTEST_S));
        BitSet shared = FrameRuns.widened(lasting, reach, finder.clock().frames());
        shared.and(frames);
        return shared;
    }

    private static BitSet on(PlateLoad plate, FootPlanting foot, BitSet frames) {
        BitSet on = new BitSet();
        for (int i = frames.nextSetBit(0); i >= 0; i = frames.nextSetBit(i + 1)) {
            double[] overhangs = foot.overhangs(i, List.of(plate.top()));
            if (foot.bearing().get(i) && overhangs.length > 0 && overhangs[(overhangs.length - 1) / 2] == 0) {
                on.set(i);
            }
        }
        return on;
    }

    private boolean changesFeet(BitSet frames, PlateLoad plate) {
        BitSet one = new BitSet();
        BitSet other = new BitSet();
        for (int i = frames.nextSetBit(0); i >= 0; i = frames.nextSetBit(i + 1)) {
            double difference = finder.distance(i, plate, feet.get(0)) - finder.distance(i, plate, feet.get(1));
            one.set(i, difference < -CLEARLY_NEARER);
            other.set(i, difference > CLEARLY_NEARER);
        }
        int lasting = finder.clock().framesIn(LONGER_THAN_A_SWING_S);
        return !FrameRuns.atLeast(one, lasting).isEmpty()
                && !FrameRuns.atLeast(other, lasting).isEmpty();
    }
}
