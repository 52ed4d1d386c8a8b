package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/**
 * How much a channel scatters from sample to sample, as the force or the moment that it stands for.
 *
 * @param channel  for people
 * @param isForce  else a moment
 * @param figure   standard deviation, N or N·m
 */
record ChannelNoise(String where, String channel, boolean isForce, double figure) {

    /** A channel that is this many times as noisy as the others of its kind is not like them; makes differ by up to 3. */
    private static final double TIMES_PEERS = 5;

    /**
     * What matters, whatever the peers do: recorded plates scatter by 0.3 to 1.2 N; 0.5 N·m moves the centre of pressure by 5
     * mm at 100 N.
     */
    private static final double FORCE = 3;

    private static final double MOMENT = 0.5;

    /** Below this rate neighbouring samples differ by movement more than by noise, Hz. */
    private static final double SLOWEST = 200;

    /** Of (x[i-1] - 2 x[i] + x[i+1]) over that of x, for white noise. */
    private static final double SECOND_DIFFERENCE = Math.sqrt(6);

    /** Standard deviation over median absolute deviation of a normal distribution. */
    private static final double PER_MEDIAN = 1.4826;

    private static final int FEWEST_PEERS = 2;

    /**
     * From the scatter within windows of 50 ms in which the plate carries nothing; where there are none, from second
     * differences over the whole record, most of which change slowly. A channel that never changes is left out.
     */
    static List<ChannelNoise> of(MeasuredPlate plate, List<Stretch> quiet) {
        List<ChannelNoise> noises = new ArrayList<>();
        for (int j = 0; j < plate.channels().count(); j++) {
            double[] signal = plate.channels().signal(j);
            double deviation = quiet.isEmpty() ? overall(signal, plate.rate()) : within(quiet, signal, plate.rate());
            double force = 0;
            double moment = 0;
            for (int row = 0; row < 3; row++) {
                force = Math.max(force, Math.abs(plate.matrix().at(row, j)) * deviation);
                moment = Math.max(moment, Math.abs(plate.matrix().at(row + 3, j)) * deviation);
            }
            boolean isForce = plate.isForce(j);
            if (deviation > 0 && force + moment > 0) {
                noises.add(new ChannelNoise(plate.where(), plate.named(j), isForce, isForce ? force : moment));
            }
        }
        return noises;
    }

    private static double within(List<Stretch> quiet, double[] signal, double rate) {
        int length = QuietBlocks.window(rate);
        List<Double> deviations = new ArrayList<>();
        for (Stretch block : quiet) {
            for (int from = block.from(); from + length <= block.end(); from += length) {
                deviations.add(QuietBlocks.Spread.of(signal, from, length).deviation());
            }
        }
        return Medians.of(deviations.stream().mapToDouble(Double::doubleValue).toArray());
    }

    private static double overall(double[] signal, double rate) {
        if (rate < SLOWEST || signal.length < 3) {
            return Double.NaN;
        }
        double[] differences = new double[signal.length - 2];
        for (int i = 0; i < differences.length; i++) {
            differences[i] = Math.abs(signal[i] - 2 * signal[i + 1] + signal[i + 2]);
        }
        return PER_MEDIAN * Medians.of(differences) / SECOND_DIFFERENCE;
    }

    /** The channels that stand out among all of a capture. */
    static List<Finding> among(List<ChannelNoise> noises) {
        List<Finding> findings = new ArrayList<>();
        for (ChannelNoise noise : noises) {
            noise.beside(noises).ifPresent(findings::add);
        }
        return findings;
    }

    private Optional<Finding> beside(List<ChannelNoise> all) {
        double[] peers = all.stream()
                .filter(other -> !other.equals(this) && other.isForce == isForce)
                .mapToDouble(ChannelNoise::figure)
                .toArray();
        double limit = Math.max(isForce ? FORCE : MOMENT, TIMES_PEERS * Medians.of(peers));
        boolean noisy = peers.length >= FEWEST_PEERS && figure > limit;
        return noisy ? Optional.of(finding(limit)) : Optional.empty();
    }

    private Finding finding(double limit) {
        String unit = isForce ? "N" : "N·m";
        return new Finding(
                "plate-noise",
                Severity.WARNING,
                where,
                String.format(
                        Locale.ROOT,
                        "%s scatters by %.2f %s (standard deviation), limit %.2f %s; that is 5 times the median of its peers, or %s",
                        channel,
                        figure,
                        unit,
                        limit,
                        unit,
                        isForce ? "3 N" : "0.5 N·m"),
                "The filter takes out most of it, but the centre of pressure jitters and contacts may begin late or end early",
                "Check the channel's cable, earth and amplifier; for this trial a lower cut-off of the plate filter helps a little");
    }
}
