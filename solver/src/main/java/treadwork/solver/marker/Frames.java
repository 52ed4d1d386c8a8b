package treadwork.solver.marker;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import treadwork.model.capture.FrameRange;

/** Sets of frames for people. */
final class Frames {

    /** Of many runs so many are named. */
    private static final int NAMED = 5;

    private Frames() {}

    /** Runs without a hole, in the file's own numbers. */
    static List<FrameRange> runs(BitSet frames, int firstFrame) {
        List<FrameRange> runs = new ArrayList<>();
        int from = frames.nextSetBit(0);
        while (from >= 0) {
            int end = frames.nextClearBit(from);
            runs.add(new FrameRange(from + firstFrame, end - 1 + firstFrame));
            from = frames.nextSetBit(end);
        }
        return runs;
    }

    static String inWords(List<FrameRange> runs) {
        List<String> words = runs.stream()
                .limit(NAMED)
                .map(run -> run.first() == run.last() ? "" + run.first() : run.first() + " to " + run.last())
                .toList();
        String more = runs.size() > NAMED ? " and " + (runs.size() - NAMED) + " more" : "";
        boolean one = runs.size() == 1 && runs.get(0).count() == 1;
        return (one ? "frame " : "frames ") + String.join(", ", words) + more;
    }
}
