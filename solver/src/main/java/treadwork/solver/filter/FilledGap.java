package treadwork.solver.filter;

/**
 * A gap of a marker that was filled.
 *
 * @param marker place of the marker in the list
 * @param from   first filled frame, counted from 0
 * @param to     the frame after the last filled one
 * @param kind   where the positions come from
 */
public record FilledGap(int marker, int from, int to, Kind kind) {

    /** Where filled positions come from. */
    public enum Kind {
        /** The marker's own course before and after. */
        SPLINE,
        /** Three other markers of the segment. */
        CLUSTER
    }

    /** How many frames were filled. */
    public int length() {
        return to - from;
    }
}
