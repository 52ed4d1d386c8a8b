package treadwork.model.study;

import java.util.Locale;

/**
 * A smoothing filter.
 *
 * @param kind     which
 * @param cutoffHz where {@code BUTTERWORTH}, both passes together, is at -3 dB; no meaning for the other kinds
 * @param order    of {@code BUTTERWORTH}, both passes counted: 4 is a second-order filter run forward and backward
 */
public record FilterSettings(Kind kind, double cutoffHz, int order) {

    public static final FilterSettings DEFAULT = new FilterSettings(Kind.BUTTERWORTH, 6, 4);

    public static final FilterSettings NONE = new FilterSettings(Kind.NONE, DEFAULT.cutoffHz, DEFAULT.order);

    /** The kinds of filter. */
    public enum Kind {
        NONE,
        BUTTERWORTH,
        /** Smoothing spline whose stiffness generalised cross-validation chooses. */
        GCV_SPLINE,
        /** As {@code BUTTERWORTH}, the cut-off chosen a marker by residual analysis. */
        RESIDUAL;

        /** The name in study files. */
        public String key() {
            return name().toLowerCase(Locale.ROOT).replace('_', '-');
        }
    }
}
