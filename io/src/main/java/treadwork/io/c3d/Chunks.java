package treadwork.io.c3d;

/**
 * How frames are shared out over arrays: a power of two of them in each, the last may hold fewer.
 *
 * @param frames     in all, at least 1
 * @param frameBytes in a frame
 * @param shift      an array holds 2^shift frames
 */
record Chunks(int frames, int frameBytes, int shift) {

    /** An array this long is a large object to any collector, and its rounding up to whole regions small beside it. */
    private static final long LONGEST = 16 << 20;

    /** A shorter one is not worth a second thread. */
    private static final long SHORTEST = 256 << 10;

    /** At least two arrays, so that they can be filled side by side, unless they would be too short. */
    static Chunks of(int frames, int frameBytes) {
        long bytes = (long) frames * frameBytes;
        long wanted = Math.max(SHORTEST, Math.min(LONGEST, bytes / 2));
        int shift = 0;
        while ((long) frameBytes << (shift + 1) <= wanted) {
            shift++;
        }
        return new Chunks(frames, frameBytes, shift);
    }

    int count() {
        return of(frames - 1) + 1;
    }

    /** In which array a frame lies. */
    int of(int frame) {
        return frame >>> shift;
    }

    /** At which byte of its array a frame begins. */
    int byteOf(int frame) {
        return (frame & (1 << shift) - 1) * frameBytes;
    }

    /** The first frame of an array. */
    int first(int chunk) {
        return chunk << shift;
    }

    /** How many frames an array holds. */
    int size(int chunk) {
        return Math.min(1 << shift, frames - first(chunk));
    }
}
