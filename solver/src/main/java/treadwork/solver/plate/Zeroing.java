package treadwork.solver.plate;

import java.util.BitSet;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.model.space.ScalarSeries;
import treadwork.model.study.PlateZero;

/**
 * Takes a plate's unloaded level off its channels, before anything that is not a sum is done with them.
 *
 * @param channels zeroed, or as they were
 * @param unloaded the push of the unloaded plate that is still left in {@code channels}, as far as it is known, N
 * @param finding  what was taken off, or why nothing was
 */
record Zeroing(PlateChannels channels, double unloaded, Optional<Finding> finding) {

    private static final Proposal ZERO_BY_ITSELF =
            new Proposal(Proposal.Scope.TRIAL, "{ \"processing\": { \"plateZero\": \"auto\" } }");

    /**
     * What zeroing looks at.
     *
     * @param push      up or down, not zeroed, N
     * @param leastLoad N; less is no contact, so a level below it is not worth a word
     * @param level     the unloaded one, found from the data
     */
    record Signal(Capture capture, String where, ScalarSeries push, double leastLoad, Optional<QuietLevel> level) {}

    static Zeroing of(PlateZero rule, PlateChannels channels, Signal signal) {
        if (rule instanceof PlateZero.Auto) {
            return signal.level
                    .map(level -> over(level.samples(), channels, signal))
                    .orElseGet(() -> new Zeroing(channels, 0, Optional.of(neverUnloaded(signal))));
        }
        if (rule instanceof PlateZero.None) {
            double unloaded = signal.level.map(QuietLevel::level).orElse(0.0);
            boolean off = Math.abs(unloaded) > signal.leastLoad;
            return new Zeroing(channels, unloaded, off ? Optional.of(leftIn(unloaded, signal)) : Optional.empty());
        }
        Optional<FrameRange> range =
                rule instanceof PlateZero.Frames frames ? Optional.of(frames.range()) : signal.capture.plateZero();
        BitSet samples = range.map(stated -> samples(stated, signal.capture)).orElseGet(BitSet::new);
        if (samples.isEmpty()) {
            double unloaded = signal.level.map(QuietLevel::level).orElse(0.0);
            return new Zeroing(channels, unloaded, Optional.of(noSuchFrames(range, signal)));
        }
        return over(samples, channels, signal);
    }

    private static BitSet samples(FrameRange range, Capture capture) {
        int from = Math.max(range.first(), capture.firstFrame()) - capture.firstFrame();
        int to = Math.min(range.last() + 1, capture.firstFrame() + capture.frames()) - capture.firstFrame();
        BitSet samples = new BitSet();
        if (from < to) {
            samples.set(from * capture.samplesPerFrame(), to * capture.samplesPerFrame());
        }
        return samples;
    }

    private static Zeroing over(BitSet samples, PlateChannels channels, Signal signal) {
        double taken = samples.stream().mapToDouble(signal.push::at).average().orElse(0);
        double missed = signal.level.map(level -> level.level() - taken).orElse(0.0);
        Optional<Finding> finding = Optional.empty();
        if (Math.abs(missed) > signal.leastLoad) {
            finding = Optional.of(loadedThere(taken, missed, signal));
        } else if (Math.abs(taken) > signal.leastLoad) {
            finding = Optional.of(takenOff(taken, signal));
        }
        return new Zeroing(channels.zeroedOver(samples), missed, finding);
    }

    private static Finding leftIn(double unloaded, Signal signal) {
        return new Finding(
                        "plate-zero",
                        Severity.WARNING,
                        signal.where,
                        String.format(
                                Locale.ROOT,
                                "unloaded, the plate shows %.1f N along its normal, limit %.1f N, and plateZero says to leave it",
                                Math.abs(unloaded),
                                signal.leastLoad),
                        "All loads of this plate are off by this much, and the centre of pressure most where the force is small",
                        "Set plateZero to auto")
                .proposing(ZERO_BY_ITSELF);
    }

    private static Finding takenOff(double taken, Signal signal) {
        return new Finding(
                "plate-zero",
                Severity.NOTE,
                signal.where,
                String.format(
                        Locale.ROOT,
                        "unloaded, the plate shows %.1f N along its normal, limit %.1f N; each channel's unloaded level was taken off",
                        Math.abs(taken),
                        signal.leastLoad),
                "Left in, the level would shift the centre of pressure most where the force is small",
                "Zero the plates before a session",
                true);
    }

    private static Finding neverUnloaded(Signal signal) {
        return new Finding(
                "plate-zero",
                Severity.NOTE,
                signal.where,
                "no samples were found in which the plate carries nothing, so its channels were left as they are",
                "An offset of the plate, if there is one, is part of its loads",
                "Begin or end the recording with the plate empty, or set plateZero to frames in which it is");
    }

    private static Finding loadedThere(double taken, double missed, Signal signal) {
        return new Finding(
                        "plate-zero",
                        Severity.WARNING,
                        signal.where,
                        String.format(
                                Locale.ROOT,
                                "in the frames stated for zeroing the plate shows %.1f N along its normal, %.1f N off its unloaded level",
                                Math.abs(taken),
                                Math.abs(missed)),
                        "The plate was loaded in these frames, so all its loads are off by this much",
                        "Set plateZero to auto, or to frames in which the plate is empty")
                .proposing(ZERO_BY_ITSELF);
    }

    private static Finding noSuchFrames(Optional<FrameRange> range, Signal signal) {
        return new Finding(
                        "plate-zero",
                        Severity.WARNING,
                        signal.where,
                        range.map(stated -> "frames " + stated.first() + " to " + stated.last()
                                        + " are stated for zeroing, the capture has "
                                        + signal.capture.range().first() + " to "
                                        + signal.capture.range().last())
                                .orElse("the file names no frames in which its plates are unloaded"),
                        "The channels were left as they are, so an offset of the plate is part of its loads",
                        "Set plateZero to auto, or to frames of this capture in which the plate is empty")
                .proposing(ZERO_BY_ITSELF);
    }
}
