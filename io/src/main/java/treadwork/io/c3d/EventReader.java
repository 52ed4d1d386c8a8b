package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import treadwork.model.capture.CaptureEvent;

/**
 * The events that a file names: those of the group EVENT, else those of the header.
 *
 * <p>Both count seconds from frame 1 of the recording, so (first frame - 1) / rate is taken off. The group states pairs of minutes
 * and seconds.
 */
final class EventReader {

    /** Word 150 of the header when its events have labels of four characters. */
    private static final int FOUR_CHARACTERS = 12345;

    private static final int KEY_AT = 298;
    private static final int COUNT_AT = 300;
    private static final int TIMES_AT = 304;
    private static final int LABELS_AT = 396;
    private static final int LABEL = 4;
    private static final int MOST_IN_HEADER = 18;
    private static final double MINUTE_S = 60;

    private EventReader() {}

    /**
     * Reads them in the order of their times; those outside the recording are left out, with a finding.
     *
     * @param header the first block, in the order of {@code opening}'s processor
     * @param rate   frames a second
     */
    static List<CaptureEvent> read(Opening opening, ByteBuffer header, FrameSpan span, double rate, Reading reading) {
        List<CaptureEvent> stated = ofGroup(opening.parameters());
        if (stated.isEmpty()) {
            stated = ofHeader(header, opening.processor());
        }
        double before = (span.first() - 1) / rate;
        List<CaptureEvent> events = stated.stream()
                .map(event -> new CaptureEvent(event.label(), event.context(), event.timeS() - before))
                .filter(event -> event.timeS() >= -1 / rate && event.timeS() <= span.count() / rate)
                .sorted(Comparator.comparingDouble(CaptureEvent::timeS))
                .toList();
        if (events.size() < stated.size()) {
            reading.note(Notices.eventsOutside(reading.file(), stated.size() - events.size(), stated.size()));
        }
        return events;
    }

    private static List<CaptureEvent> ofGroup(Parameters parameters) {
        double[] times = parameters.numbers("EVENT:TIMES", Integer.MAX_VALUE);
        int rows = parameters.find("EVENT:TIMES").map(each -> each.dimension(0)).orElse(0);
        int used = parameters.count("EVENT:USED").orElse(Integer.MAX_VALUE);
        int count = rows == 2 ? Math.min(used, times.length / 2) : 0;
        if (count < 1) {
            return List.of();
        }
        List<String> labels = Labels.of(parameters, "EVENT:LABELS", count);
        List<String> contexts = Labels.of(parameters, "EVENT:CONTEXTS", count);
        List<CaptureEvent> events = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double time = times[2 * i] * MINUTE_S + times[2 * i + 1];
            events.add(new CaptureEvent(labels.get(i), contexts.get(i), time));
        }
        return events;
    }

    private static List<CaptureEvent> ofHeader(ByteBuffer header, Processor processor) {
        if (header.getShort(KEY_AT) != FOUR_CHARACTERS) {
            return List.of();
        }
        byte[] bytes = new byte[Header.BLOCK];
        header.get(0, bytes);
        List<CaptureEvent> events = new ArrayList<>();
        int count = Math.min(header.getShort(COUNT_AT), MOST_IN_HEADER);
        for (int i = 0; i < count; i++) {
            double time = processor.real(header, TIMES_AT + Float.BYTES * i);
            events.add(new CaptureEvent(Texts.of(bytes, LABELS_AT + LABEL * i, LABEL), "", time));
        }
        return events;
    }
}
