package treadwork.solver.plate;

import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/**
 * Whether a channel ran into its rail while the plate bore load: it then holds exactly its extreme value for some samples,
 * and the load above it is not known.
 *
 * <p>A rounded signal holds its extreme value for a while as well. About the top of a parabola x = c t², rounded to steps q,
 * a run of n samples has c (n/2)² ≤ q, so within another n samples on either side the signal falls by c (n + n/2)² - c
 * (n/2)² ≤ 8 q. At a rail it comes in steeply. So a run is a flat top when the signal falls by more than twice that
 * within as many samples beside it, the run is far longer than any run of a value between the extremes under load, and the plate's other
 * channels move meanwhile.
 *
 * <p>A centre of pressure is left out: it is computed, and some programs hold it at the plate's edge.
 *
 * @param samples in which a channel is at its rail
 */
record ClippedChannels(BitSet samples, Optional<Finding> finding) {

    /** Two neighbours may be alike by chance. */
    private static final int FEWEST = 3;

    private static final int TIMES_OTHER_RUNS = 3;

    /** Twice the 8 steps of a rounded parabola. */
    private static final double STEPS = 16;

    /** Of the channel's whole range; less is not worth a blank. */
    private static final double SHARE_OF_RANGE = 0.02;

    static ClippedChannels of(MeasuredPlate plate) {
        BitSet loaded = plate.loaded();
        BitSet clipped = new BitSet();
        StringBuilder words = new StringBuilder();
        if (Stretch.longest(loaded).length() >= FEWEST) {
            for (int j = 0; j < plate.channels().count(); j++) {
                for (int end : new int[] {1, -1}) {
                    Optional<Rail> rail =
                            plate.channels().isPlace(j) ? Optional.empty() : Rail.of(plate, j, end, loaded);
                    rail.ifPresent(found -> clipped.or(found.samples));
                    rail.ifPresent(
                            found -> words.append(words.isEmpty() ? "" : "; ").append(found.words()));
                }
            }
        }
        Optional<Finding> finding =
                clipped.isEmpty() ? Optional.empty() : Optional.of(finding(plate, clipped, words.toString()));
        return new ClippedChannels(clipped, finding);
    }

    private static Finding finding(MeasuredPlate plate, BitSet clipped, String words) {
        return new Finding(
                "plate-clipped",
                Severity.REFUSES,
                plate.where() + ", " + plate.inFrames(clipped),
                words,
                "The load was beyond what the channel can show, so what the plate bore in these frames is not known",
                "Nothing mends it afterwards; choose a larger range of the amplifier, and zero the plate before recording");
    }

    /** One end of a channel's range at which it stays. */
    private record Rail(String channel, double value, int longest, int limit, BitSet samples) {

        static Optional<Rail> of(MeasuredPlate plate, int j, int end, BitSet loaded) {
            double[] signal = plate.channels().signal(j);
            double rail = extreme(signal, end);
            double opposite = extreme(signal, -end);
            double range = Math.abs(rail - opposite);
            BitSet at = new BitSet();
            int longest = 0;
            int other = 1;
            boolean steep = false;
            List<Stretch> runs = Stretch.ofOneValue(signal, loaded);
            for (Stretch run : runs) {
                if (signal[run.from()] == rail) {
                    at.set(run.from(), run.end());
                    longest = Math.max(longest, run.length());
                } else if (signal[run.from()] != opposite) {
                    other = Math.max(other, run.length());
                }
            }
            int limit = Math.max(FEWEST, TIMES_OTHER_RUNS * other);
            if (longest < limit || !(range > 0)) {
                return Optional.empty();
            }
            double least = Math.max(STEPS * step(signal, loaded), SHARE_OF_RANGE * range);
            for (Stretch run : runs) {
                steep |= signal[run.from()] == rail
                        && run.length() >= limit
                        && fall(signal, run) > least
                        && othersMove(plate, j, run);
            }
            return steep ? Optional.of(new Rail(plate.named(j), rail, longest, limit, at)) : Optional.empty();
        }

        private static double extreme(double[] signal, int end) {
            double extreme = Double.NaN;
            for (double value : signal) {
                extreme = end * value > end * extreme || Double.isNaN(extreme) ? value : extreme;
            }
            return extreme;
        }

        /** The smallest difference between two values of the signal under load. */
        private static double step(double[] signal, BitSet loaded) {
            double[] sorted =
                    loaded.stream().mapToDouble(i -> signal[i]).sorted().toArray();
            double step = Double.POSITIVE_INFINITY;
            for (int i = 1; i < sorted.length; i++) {
                double difference = sorted[i] - sorted[i - 1];
                step = difference > 0 ? Math.min(step, difference) : step;
            }
            return step;
        }

        /** How far the signal falls off within as many samples as the run has, on the steeper side. */
        private static double fall(double[] signal, Stretch run) {
            int before = Math.max(0, run.from() - run.length());
            int after = Math.min(signal.length - 1, run.end() - 1 + run.length());
            double fallBefore = Math.abs(signal[run.from()] - signal[before]);
            double fallAfter = Math.abs(signal[run.from()] - signal[after]);
            return fallBefore > fallAfter || Double.isNaN(fallAfter) ? fallBefore : fallAfter;
        }

        private static boolean othersMove(MeasuredPlate plate, int clipped, Stretch run) {
            for (int j = 0; j < plate.channels().count(); j++) {
                double[] signal = plate.channels().signal(j);
                for (int i = run.from() + 1; j != clipped && i < run.end(); i++) {
                    if (signal[i] != signal[run.from()]) {
                        return true;
                    }
                }
            }
            return false;
        }

        String words() {
            return String.format(
                    Locale.ROOT,
                    "%s holds its extreme value of %.4g for up to %d samples under load, limit %d",
                    channel,
                    value,
                    longest,
                    limit - 1);
        }
    }
}
