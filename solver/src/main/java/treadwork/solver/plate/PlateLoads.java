package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Processing;
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
        for (int i = 0; i < plates.size(); i++) {
            Bench bench = new Bench(capture, i + 1, up.direction(), settings);
            bench.load(plates.get(i), findings).ifPresent(loads::add);
        }
        return new PlateLoads(loads, findings);
    }

    /** What resolving one plate needs besides the plate. */
    private record Bench(Capture capture, int number, Vector3 up, Processing settings) {

        private Optional<PlateLoad> load(Plate plate, List<Finding> findings) {
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
            SensorOrigin origin = SensorOrigin.of(plate, axes.side(up), where());
            origin.finding().ifPresent(findings::add);
            PlateTop top = axes.top(plate, up);
            WrenchSeries raw =
                    mended(channels, ChannelMatrix.inPlate(plate, origin.used()), new Place(axes, top), findings);
            SmoothedWrench smooth = Smoothing.smooth(raw, settings.plateFilter(), capture.analogRate());
            return Optional.of(new PlateLoad(number, top, raw, smooth.series(), smooth.cutoffHz()));
        }

        private WrenchSeries mended(PlateChannels channels, ChannelMatrix stored, Place place, List<Finding> findings) {
            double side = place.axes.side(up);
            double leastLoad = settings.contactThresholdN() / 2;
            double rate = capture.analogRate();
            ScalarSeries push = channels.push(stored, side);
            Optional<QuietLevel> level =
                    UnloadedSamples.find(push, rate, leastLoad, new Surroundings(capture, place.top));
            Zeroing zeroing = Zeroing.of(
                    settings.plateZero(), channels, new Zeroing.Signal(capture, where(), push, leastLoad, level));
            zeroing.finding().ifPresent(findings::add);
            LoadSign sign = LoadSign.of(
                    zeroing.channels().push(stored, side), rate, settings.contactThresholdN(), zeroing.unloaded());
            if (sign.isReversed()) {
                findings.add(sign.finding(where()));
            }
            return zeroing.channels().load(sign.isReversed() ? stored.negated() : stored, place.axes);
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

    private record Place(PlateAxes axes, PlateTop top) {}
}
