package treadwork.model.capture;

/** Frames from {@code first} to {@code last}, both included, in the file's own numbers. */
public record FrameRange(int first, int last) {

    public FrameRange {
        if (last < first) {
            throw new IllegalArgumentException("frames " + first + " to " + last + " are none");
        }
    }

    public int count() {
        return last - first + 1;
    }

    public boolean contains(int frame) {
        return frame >= first && frame <= last;
    }
}
