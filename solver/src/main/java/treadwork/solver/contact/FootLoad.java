package treadwork.solver.contact;

import java.util.BitSet;
import java.util.List;
import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/**
 * What the ground does to one foot, as far as its plates tell, at the frames, about the lab's origin.
 *
 * @param touching frames in which one of the foot's contacts, unfiltered or smoothed, is on
 * @param beside   those and the frames beside them that still belong to a contact
 * @param load     the sum of the smoothed loads of the foot's contacts, a gap where a plate cannot tell; zero in all other
 *                 frames
 */
record FootLoad(BitSet touching, BitSet beside, WrenchSeries load) {

    static FootLoad of(Side side, List<OwnedSpell> owned, double threshold, Clock clock) {
        BitSet touching = new BitSet();
        BitSet beside = new BitSet();
        Sum sum = new Sum(clock.frames());
        for (OwnedSpell spell : owned) {
            if (spell.side() == side) {
                BitSet raw = spell.frames(clock);
                int reach = FilterReach.frames(spell.plate(), clock);
                BitSet smooth = spell.smoothFrames(threshold, clock);
                smooth.or(spell.unknownFrames(reach, clock));
                for (int i = smooth.nextSetBit(0); i >= 0; i = smooth.nextSetBit(i + 1)) {
                    sum.add(i, spell.plate().smooth(), clock.sample(i));
                }
                touching.or(raw);
                touching.or(smooth);
                beside.or(FrameRuns.widened(raw, reach, clock.frames()));
            }
        }
        beside.or(touching);
        return new FootLoad(touching, beside, sum.load());
    }

    /** The load with a gap in these frames. */
    WrenchSeries blankedIn(BitSet frames) {
        return new WrenchSeries(load.point(), blanked(load.force(), frames), blanked(load.moment(), frames));
    }

    private static VectorSeries blanked(VectorSeries series, BitSet frames) {
        return series.eachComponent(values -> {
            frames.stream().forEach(i -> values[i] = Double.NaN);
            return values;
        });
    }

    /** Loads of several plates, added about the lab's origin. */
    private static final class Sum {

        private final double[] fx;
        private final double[] fy;
        private final double[] fz;
        private final double[] mx;
        private final double[] my;
        private final double[] mz;

        Sum(int frames) {
            fx = new double[frames];
            fy = new double[frames];
            fz = new double[frames];
            mx = new double[frames];
            my = new double[frames];
            mz = new double[frames];
        }

        /** M about the origin is M about P plus P × F. */
        void add(int frame, WrenchSeries load, int sample) {
            Vector3 force = load.force().at(sample);
            Vector3 moment = load.moment().at(sample).plus(load.point().cross(force));
            fx[frame] += force.x();
            fy[frame] += force.y();
            fz[frame] += force.z();
            mx[frame] += moment.x();
            my[frame] += moment.y();
            mz[frame] += moment.z();
        }

        WrenchSeries load() {
            return new WrenchSeries(Vector3.ZERO, VectorSeries.of(fx, fy, fz), VectorSeries.of(mx, my, mz));
        }
    }
}
