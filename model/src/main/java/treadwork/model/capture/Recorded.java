package treadwork.model.capture;

import java.lang.ref.SoftReference;
import java.util.function.Supplier;

/**
 * A series that is made from what was recorded when it is asked for, and kept as long as memory allows: most of a large capture is
 * never asked for, and as doubles would take up to four times the room of its file.
 */
final class Recorded<T> {

    private final Supplier<T> source;
    private volatile SoftReference<T> last = new SoftReference<>(null);

    /** @param source makes the same series whenever it is asked, on any thread */
    Recorded(Supplier<T> source) {
        this.source = source;
    }

    T get() {
        T series = last.get();
        if (series == null) {
            series = source.get();
            last = new SoftReference<>(series);
        }
        return series;
    }
}
