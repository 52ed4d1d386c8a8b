package treadwork.solver.agreement;

import java.util.BitSet;
import java.util.Optional;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.solver.filter.Smoothing;

/**
 * By how much the plates lag the markers, from Newton's second law for the whole body: the sum of the ground reactions less
 * the weight is mass times the acceleration of its centre.
 *
 * <p>For every lag τ each component of the ground's force F(t + τ) is regressed on that of the acceleration a(t). With r the
 * correlation, the likelihood is greatest where Σ log(1 - r²) over the three components is least; factor and level are free,
 * so neither a wrong mass nor a plate's gain moves it. Its curvature there gives the standard error, with as many independent
 * samples as twice the bandwidth times the duration.
 *
 * @param seconds  positive where the plates are behind
 * @param standardError of that, s, with {@link #SYSTEMATIC_S} in it
 * @param atLimit  whether the likelihood still rises where the search ends
 */
record ClockLag(double seconds, double standardError, boolean atLimit) {

    /** How far the search goes, s. */
    static final double REACH_S = 0.1;

    /** Trunk and arms do not quite move with the hips: on open recordings of walking adults this much, s. */
    static final double SYSTEMATIC_S = 0.004;

    /** So long a stretch, or several, must be fully measured, s. */
    private static final double LEAST_S = 0.3;

    /** A component that fits worse tells nothing. */
    private static final double LEAST_CORRELATION = 0.8;

    private static final FilterSettings STEPS_AND_SLOWER = new FilterSettings(FilterSettings.Kind.BUTTERWORTH, 2, 2);

    /** Up to which the smoothed signals carry anything, for the number of independent samples, Hz. */
    private static final double BANDWIDTH_HZ = 6;

    /**
     * @param rate of the frames, Hz
     * @return empty where too little is measured, or body and ground do not go together at any lag
     */
    static Optional<ClockLag> of(BodyCentre body, GroundForce ground, int samplesPerFrame, double rate) {
        BitSet frames = usable(body, ground, (int) Math.ceil(REACH_S * rate) + 1);
        double duration = frames.cardinality() / rate;
        if (duration < LEAST_S) {
            return Optional.empty();
        }
        Misfit misfit = new Misfit(
                slow(body.acceleration(), rate), slow(ground.force(), rate * samplesPerFrame), frames, samplesPerFrame);
        double analogRate = rate * samplesPerFrame;
        int step = Math.max(1, (int) Math.floor(0.001 * analogRate));
        int steps = (int) Math.floor(REACH_S * analogRate / step);
        double[] values = new double[2 * steps + 1];
        int best = 0;
        for (int k = 0; k < values.length; k++) {
            values[k] = misfit.at((k - steps) * step);
            best = values[k] < values[best] ? k : best;
        }
        if (misfit.best() < LEAST_CORRELATION) {
            return Optional.empty();
        }
        if (best == 0 || best == values.length - 1) {
            return Optional.of(new ClockLag((best - steps) * step / analogRate, Double.POSITIVE_INFINITY, true));
        }
        double slope = (values[best + 1] - values[best - 1]) / 2;
        double curvature = values[best + 1] - 2 * values[best] + values[best - 1];
        double seconds = (best - steps - slope / curvature) * step / analogRate;
        double perSecond = curvature * Math.pow(analogRate / step, 2);
        double random = Math.sqrt(1 / (BANDWIDTH_HZ * duration * perSecond));
        return Optional.of(new ClockLag(seconds, Math.hypot(random, SYSTEMATIC_S), false));
    }

    /** Skin motion grows with the square of the frequency in an acceleration; the steps' own rate is about 2 Hz. */
    private static VectorSeries slow(VectorSeries series, double rate) {
        return Smoothing.smooth(series, STEPS_AND_SLOWER, rate).series();
    }

    /** Measured frames with a known acceleration, and so for {@code reach} frames around. */
    private static BitSet usable(BodyCentre body, GroundForce ground, int reach) {
        BitSet usable = new BitSet();
        int since = 0;
        for (int i = 0; i < body.acceleration().size(); i++) {
            since = ground.measured().get(i) ? since + 1 : 0;
            int middle = i - reach;
            if (since > 2 * reach && !body.acceleration().isGap(middle)) {
                usable.set(middle);
            }
        }
        return usable;
    }

    /** Σ log(1 - r²) at a lag in analog samples. */
    private static final class Misfit {

        private final VectorSeries acceleration;
        private final VectorSeries force;
        private final BitSet frames;
        private final int samplesPerFrame;
        private double best;

        Misfit(VectorSeries acceleration, VectorSeries force, BitSet frames, int samplesPerFrame) {
            this.acceleration = acceleration;
            this.force = force;
            this.frames = frames;
            this.samplesPerFrame = samplesPerFrame;
        }

        /** The greatest correlation met so far. */
        double best() {
            return best;
        }

        double at(int lag) {
            double sum = 0;
            for (int component = 0; component < 3; component++) {
                double r = Math.max(0, correlation(component, lag));
                best = Math.max(best, r);
                sum += Math.log1p(-Math.min(r * r, 1 - 1e-12));
            }
            return sum;
        }

        private double correlation(int component, int lag) {
            double n = 0;
            double x = 0;
            double y = 0;
            double xx = 0;
            double yy = 0;
            double xy = 0;
            for (int i = frames.nextSetBit(0); i >= 0; i = frames.nextSetBit(i + 1)) {
                double a = component(acceleration, component, i);
                double f = component(force, component, i * samplesPerFrame + lag);
                if (!Double.isNaN(f)) {
                    n++;
                    x += a;
                    y += f;
                    xx += a * a;
                    yy += f * f;
                    xy += a * f;
                }
            }
            double spread = (n * xx - x * x) * (n * yy - y * y);
            return spread > 0 ? (n * xy - x * y) / Math.sqrt(spread) : 0;
        }

        private static double component(VectorSeries series, int component, int i) {
            return switch (component) {
                case 0 -> series.x(i);
                case 1 -> series.y(i);
                default -> series.z(i);
            };
        }
    }
}
