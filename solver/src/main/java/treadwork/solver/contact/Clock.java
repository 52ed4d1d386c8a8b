package treadwork.solver.contact;

import java.util.BitSet;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;

/** The frames of a capture, counted from 0, and the analog samples that belong to them: the first of each block. */
record Clock(String name, int firstFrame, int frames, double rate, int samplesPerFrame) {

    static Clock of(Capture capture) {
        return new Clock(
                capture.name(), capture.firstFrame(), capture.frames(), capture.pointRate(), capture.samplesPerFrame());
    }

    int sample(int frame) {
        return frame * samplesPerFrame;
    }

    /** The frames whose sample is among those from {@code from} on, before {@code end}. */
    BitSet framesOf(int from, int end) {
        BitSet set = new BitSet();
        int first = (from + samplesPerFrame - 1) / samplesPerFrame;
        int last = (end + samplesPerFrame - 1) / samplesPerFrame;
        if (first < last) {
            set.set(first, Math.min(last, frames));
        }
        return set;
    }

    /** The least number of frames that lasts {@code seconds}. */
    int framesIn(double seconds) {
        return Math.max(1, (int) Math.ceil(seconds * rate - 1e-9));
    }

    /** In the file's own numbers. */
    FrameRange ownNumbers(int first, int last) {
        return new FrameRange(first + firstFrame, last + firstFrame);
    }
}
