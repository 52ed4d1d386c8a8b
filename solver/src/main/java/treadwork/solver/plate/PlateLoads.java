package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Processing;
import treadwork.solver.filter.RunEnds;
import treadwork.solver.filter.SmoothedWrench;
import treadwork.solver.filter.Smoothing;

/**
 * The loads of all plates of a capture that can be used, and what was noticed on the way.
 *
 * @param plates in the capture's order; those that cannot be used are missing
 */
public record PlateLoads(List<PlateLoad> plates, List<Finding> findings) {

    public PlateLoads {
        plates = List.copyOf(plates);
        findings = List.copyOf(findings);
    }

    /**
     * From channels to ground reactions: zero level, calibration and sensor origin, lab axes, sign, filter.
     *
     * @param plates  the capture's own, or those that a person gives in their place; channels refer to {@code capture}
     * @param up      see {@link LabUp}
     * @param settings filter, zeroing, and the contact threshold, half of which is the least that counts as a load
     */
    public static PlateLoads resolve(Capture capture, List<Plate> plates, LabAxis up, Processing settings) {
        List<PlateLoad> loads = new ArrayList<>();
        List<Finding> findings = new ArrayList<>();
        List<ChannelNoise> noises = new ArrayList<>();
        for (int i = 0; i < plates.size(); i++) {
            Bench bench = new Bench(capture, plates, i + 1, up.direction(), settings);
            bench.load(findings, noises).ifPresent(loads::add);
        }
        findings.addAll(ChannelNoise.among(noises));
        return new PlateLoads(loads, findings);
    }

    /** What resolving one plate needs. */
    private record Bench(Capture capture, List<Plate> plates, int number, Vector3 up, Processing settings) {

        private Optional<PlateLoad> load(List<Finding> findings, List<ChannelNoise> noises) {
            Plate plate = plates.get(number - 1);
            PlateAxes axes = PlateAxes.of(plate);
            if (!axes.describe(plate) || !axes.isFloor(up)) {
                findings.add(PlateAxes.unusable(plate, where()));
                return Optional.empty();
            }
            if (!PlateChannels.present(plate, capture)) {
                findings.add(noSignal());
                return Optional.empty();
            }
            PlateChannels channels = PlateChannels.of(plate, capture);
            if (channels.isFlat()) {
                findings.add(dead());
            }
            MeasuredPlate measured = measured(plate, channels, axes, findings);
            ChannelChecks checks = ChannelChecks.of(measured, axes);
            findings.addAll(checks.findings());
            noises.addAll(checks.noises());
            return checks.unusable()
                    ? Optional.empty()
                    : Optional.of(smoothed(measured.load(), axes.top(plate, up), checks.unknown()));
        }

        /**
         * The load filtered as recorded, then blanked where a channel was at its rail: what is recorded there is nearer the truth
         * than the odd reflection at a gap would be. Beside it the filter mixes it in, for about a time constant.
         */
        private PlateLoad smoothed(WrenchSeries load, PlateTop top, BitSet unknown) {
            SmoothedWrench smooth = Smoothing.smooth(load, settings.plateFilter(), capture.analogRate());
            int reach = RunEnds.frames(smooth.cutoffHz(), capture.analogRate());
            double delay = settings.plateDelayS() * capture.analogRate();
            return new PlateLoad(
                    number,
                    top,
                    ClockDelay.takenOut(blanked(load, unknown, 0), delay),
                    ClockDelay.takenOut(blanked(smooth.series(), unknown, reach), delay),
                    smooth.cutoffHz());
        }

        private static WrenchSeries blanked(WrenchSeries load, BitSet samples, int reach) {
            if (samples.isEmpty()) {
                return load;
            }
            UnaryOperator<double[]> blank = values -> {
                for (Stretch run : Stretch.of(samples)) {
                    int end = Math.min(values.length, run.end() + reach);
                    Arrays.fill(values, Math.max(0, run.from() - reach), end, Double.NaN);
                }
                return values;
            };
            return new WrenchSeries(
                    load.point(),
                    load.force().eachComponent(blank),
                    load.moment().eachComponent(blank));
        }

        private MeasuredPlate measured(Plate plate, PlateChannels channels, PlateAxes axes, List<Finding> findings) {
            SensorOrigin origin = SensorOrigin.of(plate, axes.side(up), where());
            origin.finding().ifPresent(findings::add);
            ChannelMatrix stored = ChannelMatrix.inPlate(plate, origin.used());
            double side = axes.side(up);
            double leastLoad = settings.contactThresholdN() / 2;
            double rate = capture.analogRate();
            ScalarSeries push = channels.push(stored, side);
            Optional<QuietLevel> level =
                    UnloadedSamples.find(push, rate, leastLoad, new Surroundings(capture, axes.top(plate, up)));
            Zeroing zeroing = Zeroing.of(
                    settings.plateZero(), channels, new Zeroing.Signal(capture, where(), push, leastLoad, level));
            zeroing.finding().ifPresent(findings::add);
            LoadSign sign = LoadSign.of(
                    zeroing.channels().push(stored, side), rate, settings.contactThresholdN(), zeroing.unloaded());
            if (sign.isReversed()) {
                findings.add(sign.finding(where()));
            }
            ChannelMatrix matrix = sign.isReversed() ? stored.negated() : stored;
            double left = sign.isReversed() ? -zeroing.unloaded() : zeroing.unloaded();
            return new MeasuredPlate(
                    new MeasuredPlate.Bench(capture, plates, number, settings.contactThresholdN()),
                    plate,
                    channels,
                    matrix,
                    plate.type() == PlateType.FOUR_SENSORS
                            ? new Vector3(0, 0, origin.used().z())
                            : origin.used(),
                    zeroing.channels().load(matrix, axes),
                    zeroing.channels().push(matrix, side).map(values -> less(values, left)),
                    level.isPresent());
        }

        private static double[] less(double[] values, double level) {
            for (int i = 0; i < values.length; i++) {
                values[i] -= level;
            }
            return values;
        }

        private String where() {
            return capture.name() + ", plate " + number;
        }

        private Finding noSignal() {
            return new Finding(
                    "plate-dead",
                    Severity.NOTE,
                    where(),
                    "its channels are not among the file's " + capture.analog().size() + " analog channels",
                    "The plate was declared but not recorded, so a foot on it is not measured",
                    "Give the plate's channels in lab.plates of the study file, if they were recorded");
        }

        private Finding dead() {
            return new Finding(
                    "plate-dead",
                    Severity.NOTE,
                    where(),
                    "every channel keeps exactly the same value throughout",
                    "The plate seems to have measured nothing; a foot on it would count as unmeasured",
                    "Check that the plate was switched on, if it was stepped on");
        }
    }
}
