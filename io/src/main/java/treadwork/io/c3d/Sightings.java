package treadwork.io.c3d;

/** How often the points were seen. */
final class Sightings {

    private final boolean[] anyZero;
    private long seen;
    private long zeros;

    Sightings(int points) {
        this.anyZero = new boolean[points];
    }

    /** Looks through the points of the frame that begins at byte {@code frameAt}. */
    void look(StoredNumber number, byte[] bytes, int frameAt) {
        int points = anyZero.length;
        int unseen = number.firstUnseen(bytes, frameAt, 0, points);
        seen += points;
        while (unseen < points) {
            seen--;
            lookAtUnseen(number, bytes, frameAt, unseen);
            unseen = number.firstUnseen(bytes, frameAt, unseen + 1, points);
        }
    }

    /** Flagged valid and exactly zero is how some programs write a gap. */
    private void lookAtUnseen(StoredNumber number, byte[] bytes, int frameAt, int point) {
        int width = number.width();
        int at = frameAt + Layout.POINT_VALUES * width * point;
        boolean zero = number.at(bytes, at) == 0
                && number.at(bytes, at + width) == 0
                && number.at(bytes, at + 2 * width) == 0
                && number.at(bytes, at + 3 * width) >= 0;
        if (zero) {
            zeros++;
            anyZero[point] = true;
        }
    }

    void add(Sightings other) {
        seen += other.seen;
        zeros += other.zeros;
        for (int i = 0; i < anyZero.length; i++) {
            anyZero[i] |= other.anyZero[i];
        }
    }

    /** Notes what is odd. */
    void note(int frames, Reading reading) {
        if (zeros > 0) {
            int markers = 0;
            for (boolean any : anyZero) {
                markers += any ? 1 : 0;
            }
            reading.note(Notices.markerZero(reading.file(), zeros, markers));
        }
        if (seen == 0 && anyZero.length > 0) {
            reading.note(Notices.noPoint(reading.file(), anyZero.length, frames));
        }
    }
}
