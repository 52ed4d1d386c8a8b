package treadwork.solver.contact;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import treadwork.model.capture.FrameRange;

/** Sets of frames as runs without a hole; frames are counted from 0. */
final class FrameRuns {

    private FrameRuns() {}

    static List<FrameRange> of(BitSet frames) {
        List<FrameRange> runs = new ArrayList<>();
        int from = frames.nextSetBit(0);
        while (from >= 0) {
            int end = frames.nextClearBit(from);
            runs.add(new FrameRange(from, end - 1));
            from = frames.nextSetBit(end);
        }
        return runs;
    }

    /** Without the runs that have fewer than {@code fewest} frames. */
    static BitSet atLeast(BitSet frames, int fewest) {
        BitSet kept = new BitSet();
        for (FrameRange run : of(frames)) {
            if (run.count() >= fewest) {
                kept.set(run.first(), run.last() + 1);
            }
        }
        return kept;
    }

    /** With the holes of fewer than {@code fewest} frames between two runs filled. */
    static BitSet withoutHoles(BitSet frames, int fewest) {
        BitSet filled = (BitSet) frames.clone();
        int end = -1;
        for (FrameRange run : of(frames)) {
            if (end >= 0 && run.first() - end < fewest) {
                filled.set(end, run.first());
            }
            end = run.last() + 1;
        }
        return filled;
    }

    /** With {@code reach} frames more at either end of every run, within {@code count} frames. */
    static BitSet widened(BitSet frames, int reach, int count) {
        BitSet wide = new BitSet();
        for (FrameRange run : of(frames)) {
            wide.set(Math.max(0, run.first() - reach), Math.min(count, run.last() + 1 + reach));
        }
        return wide;
    }

    /** For people, in the file's own numbers: {@code frames 12 to 40, 55 to 60}. */
    static String inWords(BitSet frames, int firstFrame) {
        List<String> words = of(frames).stream()
                .map(run -> (run.first() + firstFrame) + " to " + (run.last() + firstFrame))
                .toList();
        return "frames " + String.join(", ", words);
    }
}
