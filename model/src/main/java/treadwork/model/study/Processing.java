package treadwork.model.study;

/**
 * How the signals are treated.
 *
 * @param longestGapS       longest gap of a marker that a spline fills, s
 * @param contactThresholdN normal force at which a contact begins, N; it ends at half of it
 * @param plateDelayS       by how much the plates' clock lags the markers', s: a plate sample at t holds the load at
 *                          {@code t - plateDelayS}
 */
public record Processing(
        FilterSettings markerFilter,
        FilterSettings plateFilter,
        double longestGapS,
        double contactThresholdN,
        PlateZero plateZero,
        double plateDelayS) {

    public static final Processing DEFAULT =
            new Processing(FilterSettings.DEFAULT, FilterSettings.DEFAULT, 0.1, 20, new PlateZero.Auto());

    /** With plates and markers on one clock. */
    public Processing(
            FilterSettings markerFilter,
            FilterSettings plateFilter,
            double longestGapS,
            double contactThresholdN,
            PlateZero plateZero) {
        this(markerFilter, plateFilter, longestGapS, contactThresholdN, plateZero, 0);
    }
}
