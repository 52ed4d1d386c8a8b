package treadwork.io.c3d;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeSet;
import java.util.stream.Collectors;

/**
 * Which frames a file holds.
 *
 * @param first the file's own number of the first
 * @param count how many
 */
record FrameSpan(int first, int count) {

    private static final String ACTUAL = "TRIAL:ACTUAL_START_FIELD and ACTUAL_END_FIELD";
    private static final String HEADER = "header";

    /**
     * Decides between what the file states in several places; {@code held} is where its size has the last word.
     *
     * <p>The first statement counts that fills the file up to less than one block. If none does: the first that the file can
     * hold, unless that is a full 16-bit counter and the file holds more; else what the file holds, with a finding.
     *
     * @param header     counts up to frame 65535
     * @param parameters state longer counts, in pairs of 16-bit words or as reals
     * @param held       the bytes for frames and the bytes in a frame
     */
    static FrameSpan of(Header header, Parameters parameters, Room held, Reading reading) {
        Map<String, Long> stated = stated(header, parameters);
        if (stated.isEmpty()) {
            throw Refusals.empty(reading.file(), "no frame is stated, in the header or in the parameters");
        }
        if (held.frames() < 1) {
            throw Refusals.cutShort(reading.file(), "first frame", held.from() + held.frame(), held.end());
        }
        String source = stated.keySet().stream()
                .filter(each -> held.fits(stated.get(each)))
                .findFirst()
                .orElse(stated.keySet().iterator().next());
        long wanted = stated.get(source);
        boolean full = !held.fits(wanted) && header.lastFrame() == Header.FULL && !source.equals(ACTUAL);
        int count = (int) (full ? held.frames() : Math.min(wanted, held.frames()));
        boolean disagree = count <= Header.FULL && new TreeSet<>(stated.values()).size() > 1;
        if (count < wanted) {
            reading.note(Notices.framesMissing(reading.file(), wanted, count));
        } else if (full || disagree) {
            reading.note(Notices.frameCount(reading.file(), words(stated), count));
        }
        long first = source.equals(ACTUAL) ? actual(parameters, "START") : header.firstFrame();
        return new FrameSpan((int) first, count);
    }

    /** All statements of at least one frame, the most trusted first. */
    private static Map<String, Long> stated(Header header, Parameters parameters) {
        Map<String, Long> stated = new LinkedHashMap<>();
        long start = actual(parameters, "START");
        long end = actual(parameters, "END");
        if (start >= 0 && end < Integer.MAX_VALUE) {
            stated.put(ACTUAL, end - start + 1);
        }
        stated.put(HEADER, header.lastFrame() - header.firstFrame() + 1L);
        parameters.number("POINT:LONG_FRAMES").ifPresent(frames -> stated.put("POINT:LONG_FRAMES", (long) frames));
        parameters.count("POINT:FRAMES").ifPresent(frames -> stated.put("POINT:FRAMES", (long) frames));
        stated.values().removeIf(frames -> frames < 1);
        return stated;
    }

    /** A frame number of two 16-bit words, the lower first, or of one number; -1 where it is not stated. */
    private static long actual(Parameters parameters, String which) {
        String name = "TRIAL:ACTUAL_" + which + "_FIELD";
        double[] words = parameters.numbers(name, 2);
        boolean integers = parameters.find(name).map(Parameter::holdsIntegers).orElse(false);
        if (integers && words.length == 2) {
            return ((long) words[0] & 0xFFFF) + (((long) words[1] & 0xFFFF) << 16);
        }
        return parameters.number(name).isPresent() ? (long) words[0] : -1;
    }

    private static String words(Map<String, Long> stated) {
        return stated.entrySet().stream()
                .map(entry -> entry.getKey() + " " + entry.getValue())
                .collect(Collectors.joining(", "));
    }

    /**
     * The part of the file in which the frames lie.
     *
     * @param from  its first byte
     * @param end   the byte behind its last
     * @param frame bytes in a frame, above 0
     */
    record Room(long from, long end, long frame) {

        /** Whole frames that there is room for. */
        long frames() {
            return Math.min((end - from) / frame, Integer.MAX_VALUE - Header.FULL);
        }

        /** Whether so many frames fill the room up to less than one block. */
        boolean fits(long count) {
            return count <= frames() && end - from - count * frame < Header.BLOCK;
        }
    }
}
