package treadwork.model.capture;

import java.util.List;
import java.util.Optional;
import treadwork.model.finding.Finding;

/**
 * One recording.
 *
 * @param name         of the file, for messages
 * @param firstFrame   the file's own number of the first frame held here
 * @param frames       how many
 * @param pointRate    frames a second, Hz
 * @param points       in the file's order; labels may repeat
 * @param samplesPerFrame analog samples in a frame; 0 without analog data
 * @param analog       in the file's order, each {@code frames × samplesPerFrame} long
 * @param plates       in the file's order
 * @param plateZero    frames in which the file says that the plates are unloaded
 * @param events       in the order of their times
 * @param pointUnit    the file's own unit of length
 * @param storage      how the file holds its numbers, in words for display
 * @param findings     what was noticed while reading
 */
public record Capture(
        String name,
        int firstFrame,
        int frames,
        double pointRate,
        List<PointSeries> points,
        int samplesPerFrame,
        List<AnalogChannel> analog,
        List<Plate> plates,
        Optional<FrameRange> plateZero,
        List<CaptureEvent> events,
        LengthUnit pointUnit,
        String storage,
        List<Finding> findings) {

    public Capture {
        points = List.copyOf(points);
        analog = List.copyOf(analog);
        plates = List.copyOf(plates);
        events = List.copyOf(events);
        findings = List.copyOf(findings);
    }

    /** The same with other points. */
    public Capture withPoints(List<PointSeries> other) {
        return new Capture(
                name,
                firstFrame,
                frames,
                pointRate,
                other,
                samplesPerFrame,
                analog,
                plates,
                plateZero,
                events,
                pointUnit,
                storage,
                findings);
    }

    /** Analog samples a second, Hz; 0 without analog data. */
    public double analogRate() {
        return pointRate * samplesPerFrame;
    }

    /** The file's own numbers of the first and last frame. */
    public FrameRange range() {
        return new FrameRange(firstFrame, firstFrame + frames - 1);
    }

    /** Seconds from the first frame to that with index {@code i}, counted from 0. */
    public double timeOf(int i) {
        return i / pointRate;
    }
}
