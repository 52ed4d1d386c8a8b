package treadwork.model.study;

/**
 * How the signals are treated.
 *
 * @param longestGapS       longest gap of a marker that a spline fills, s
 * @param contactThresholdN normal force at which a contact begins, N; it ends at half of it
 */
public record Processing(
        FilterSettings markerFilter,
        FilterSettings plateFilter,
        double longestGapS,
        double contactThresholdN,
        PlateZero plateZero) {

    public static final Processing DEFAULT =
            new Processing(FilterSettings.DEFAULT, FilterSettings.DEFAULT, 0.1, 20, new PlateZero.Auto());
}
