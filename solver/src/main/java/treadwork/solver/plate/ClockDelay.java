package treadwork.solver.plate;

import treadwork.model.space.WrenchSeries;

/** Takes out of a plate's load by how much its clock lags. */
final class ClockDelay {

    private ClockDelay() {}

    /**
     * The load with sample k taken from k + {@code samples}, between samples by the cubic through the nearest four; a gap where
     * one of them lies beyond the record.
     *
     * @param samples the lag in samples, of either sign, whole or not
     */
    static WrenchSeries takenOut(WrenchSeries load, double samples) {
        if (samples == 0) {
            return load;
        }
        return new WrenchSeries(
                load.point(),
                load.force().eachComponent(values -> shifted(values, samples)),
                load.moment().eachComponent(values -> shifted(values, samples)));
    }

    private static double[] shifted(double[] values, double samples) {
        int whole = (int) Math.floor(samples);
        double u = samples - whole;
        double[] shifted = new double[values.length];
        for (int k = 0; k < values.length; k++) {
            int i = k + whole;
            shifted[k] = u == 0
                    ? at(values, i)
                    : -at(values, i - 1) * u * (u - 1) * (u - 2) / 6
                            + at(values, i) * (u + 1) * (u - 1) * (u - 2) / 2
                            - at(values, i + 1) * (u + 1) * u * (u - 2) / 2
                            + at(values, i + 2) * (u + 1) * u * (u - 1) / 6;
        }
        return shifted;
    }

    private static double at(double[] values, int i) {
        return i >= 0 && i < values.length ? values[i] : Double.NaN;
    }
}
