package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;

/** Neighbouring samples, {@code from} included, {@code end} not. */
record Stretch(int from, int end) {

    int length() {
        return end - from;
    }

    static List<Stretch> of(BitSet samples) {
        List<Stretch> stretches = new ArrayList<>();
        int from = samples.nextSetBit(0);
        while (from >= 0) {
            int end = samples.nextClearBit(from);
            stretches.add(new Stretch(from, end));
            from = samples.nextSetBit(end);
        }
        return stretches;
    }

    /** The longest of them; of none an empty one. */
    static Stretch longest(BitSet samples) {
        Stretch longest = new Stretch(0, 0);
        for (Stretch stretch : of(samples)) {
            longest = stretch.length() > longest.length() ? stretch : longest;
        }
        return longest;
    }

    /** Stretches within {@code samples} in which a signal keeps exactly one value for at least two samples. */
    static List<Stretch> ofOneValue(double[] signal, BitSet samples) {
        List<Stretch> stretches = new ArrayList<>();
        for (Stretch within : of(samples)) {
            int from = within.from;
            for (int i = from + 1; i <= within.end; i++) {
                if (i == within.end || signal[i] != signal[from]) {
                    if (i - from > 1) {
                        stretches.add(new Stretch(from, i));
                    }
                    from = i;
                }
            }
        }
        return stretches;
    }
}
