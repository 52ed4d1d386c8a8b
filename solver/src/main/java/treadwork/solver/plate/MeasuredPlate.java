package treadwork.solver.plate;

import java.util.BitSet;
import java.util.List;
import java.util.stream.Collectors;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.WrenchSeries;

/**
 * All that is known of one plate once its level and its sign are settled: what the checks of its channels look at.
 *
 * @param channels as stored
 * @param matrix   their weights, plate axes, the sign mended
 * @param origin   plate axes, m, from the sensor origin to the centre of the surface, mended
 * @param load     zeroed, not filtered, lab axes, about the centre of the surface
 * @param push     of that load, up, what is left of an unloaded level taken off, N
 * @param unloaded whether the data show samples in which the plate carries nothing
 */
record MeasuredPlate(
        Bench bench,
        Plate plate,
        PlateChannels channels,
        ChannelMatrix matrix,
        Vector3 origin,
        WrenchSeries load,
        ScalarSeries push,
        boolean unloaded) {

    /**
     * What is known before the plate is looked at.
     *
     * @param plates of the capture, or those given in their place
     * @param number of this one, counted from 1
     */
    record Bench(Capture capture, List<Plate> plates, int number, double thresholdN) {

        String where() {
            return capture.name() + ", plate " + number;
        }
    }

    String where() {
        return bench.where();
    }

    double rate() {
        return bench.capture.analogRate();
    }

    int size() {
        return push.size();
    }

    /** For people: place within the plate and the file's label. */
    String named(int j) {
        String label = bench.capture.analog().get(plate.channels().get(j)).label();
        return "channel " + (j + 1) + (label.isEmpty() ? "" : " (" + label + ")");
    }

    /** Whether channel {@code j} shows a force rather than a moment. */
    boolean isForce(int j) {
        return plate.type() == PlateType.FOUR_SENSORS || j < 3;
    }

    /** Samples in which the plate pushes harder than the contact threshold. */
    BitSet loaded() {
        return pushedHarder(bench.thresholdN);
    }

    BitSet pushedHarder(double newtons) {
        BitSet harder = new BitSet(size());
        for (int i = 0; i < size(); i++) {
            harder.set(i, push.at(i) > newtons);
        }
        return harder;
    }

    double greatestPush() {
        double greatest = 0;
        for (int i = 0; i < size(); i++) {
            greatest = push.at(i) > greatest ? push.at(i) : greatest;
        }
        return greatest;
    }

    /** The frames that hold these samples, in the file's own numbers. */
    String inFrames(BitSet samples) {
        int perFrame = bench.capture.samplesPerFrame();
        BitSet frames = new BitSet();
        samples.stream().forEach(i -> frames.set(i / perFrame));
        int first = bench.capture.firstFrame();
        List<Stretch> stretches = Stretch.of(frames);
        return "frames "
                + stretches.stream()
                        .map(run -> (run.from() + first) + " to " + (run.end() - 1 + first))
                        .collect(Collectors.joining(", "));
    }
}
