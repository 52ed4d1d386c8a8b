package treadwork.solver.proof;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A rod with pointed ends and markers on its axis.
 *
 * @param markers labels, from the tip that stands on the plate towards the hand; two or more
 * @param tip     from the tip to the first marker, m; empty: found from the rod's turning about its tip
 * @param massKg  0 neglects the rod's weight
 * @param centre  of mass, as a share of the way from the tip to the hand
 */
public record Rod(List<String> markers, OptionalDouble tip, double massKg, double centre) {

    /** Of a rod that is alike along its length. */
    public static final double MIDDLE = 0.5;

    public Rod {
        markers = List.copyOf(markers);
        if (markers.size() < 2) {
            throw new IllegalArgumentException("a rod's axis needs two markers or more, not " + markers.size());
        }
        if (!(massKg >= 0 && massKg <= 20)) {
            throw new IllegalArgumentException("a rod's mass is 0 to 20 kg, not " + massKg + " kg");
        }
        if (!(centre >= 0 && centre <= 1)) {
            throw new IllegalArgumentException("a centre of mass between the ends is 0 to 1 of the way, not " + centre);
        }
    }
}
