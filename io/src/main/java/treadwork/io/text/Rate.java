package treadwork.io.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/** Rows a second: by the user's word, by a line of the file, or by a straight line through all times. */
final class Rate {

    /** Above it no camera or plate is sampled, Hz. */
    private static final double FASTEST = 1e6;

    private final Table table;
    private final List<Finding> findings = new ArrayList<>();

    private Rate(Table table) {
        this.table = table;
    }

    /** Hz; what it was taken from goes to the findings. */
    static double of(Table table, Optional<Double> stated, List<Finding> findings) {
        Rate rate = new Rate(table);
        double hertz = rate.find(stated);
        findings.addAll(rate.findings);
        return hertz;
    }

    private double find(Optional<Double> stated) {
        Optional<Double> fitted = fit();
        Optional<Double> word = stated.or(table.header::rate);
        double rate = word.or(() -> fitted).orElseThrow(this::unknown);
        if (!(rate > 0 && rate <= FASTEST)) {
            throw Refusal.of("text-rate", table.source.file, "the rate is " + rate + " Hz", "State it in lab.text");
        }
        String from = stated.isPresent() ? "the study file" : word.isPresent() ? "the file's own words" : "its times";
        boolean apart = fitted.isPresent() && Math.abs(fitted.get() - rate) > 0.01 * rate;
        findings.add(new Finding(
                "text-rate",
                apart ? Severity.WARNING : Severity.NOTE,
                table.source.file,
                String.format(Locale.ROOT, "%.6g rows a second by %s", rate, from)
                        + (apart ? String.format(Locale.ROOT, ", %.6g by its times, limit 1 %%", fitted.get()) : ""),
                apart ? "Every velocity and acceleration depends on it" : "Velocities and accelerations rest on it",
                "State another in lab.text of the study file if this is wrong"));
        return rate;
    }

    private RuntimeException unknown() {
        return Refusal.of(
                "text-rate",
                table.source.file,
                table.header.time() < 0
                        ? "neither a time column nor a rate is stated"
                        : "the column \"" + table.header.names().get(table.header.time()) + "\" only counts the rows",
                "Give pointRateHz or plateRateHz in lab.text of the study file");
    }

    /** The least-squares line through time over row, whole hertz where the rounding of the times allows it. */
    private Optional<Double> fit() {
        int column = table.header.time();
        int rows = table.rows();
        if (column < 0 || rows < 2) {
            return Optional.empty();
        }
        double[] times = table.column(column);
        double mean = 0;
        for (double time : times) {
            mean += time / rows;
        }
        double slope = 0;
        double square = 0;
        for (int i = 0; i < rows; i++) {
            double row = i - (rows - 1) / 2.0;
            slope += row * (times[i] - mean);
            square += row * row;
        }
        slope /= square;
        even(times, slope);
        if (slope == 1 && table.header.timeUnit(column) == 1) {
            return Optional.empty();
        }
        double worst = 0;
        for (int i = 0; i < rows; i++) {
            worst = Math.max(worst, Math.abs(times[i] - mean - slope * (i - (rows - 1) / 2.0)));
        }
        double rate = 1 / (slope * table.header.timeUnit(column));
        double play = rate * 2 * worst / (slope * (rows - 1));
        double whole = Math.rint(rate);
        return Optional.of(Math.abs(rate - whole) <= play + 1e-6 * rate ? whole : rate);
    }

    /** A step off by half a step is a missing or a double row; rounding to 0.001 s moves steps of 450 Hz by less. */
    private void even(double[] times, double slope) {
        for (int i = 1; i < times.length; i++) {
            if (!(Math.abs(times[i] - times[i - 1] - slope) < 0.5 * slope)) {
                throw Refusal.of(
                        "text-time-uneven",
                        table.source.file + ", line " + table.line(i),
                        String.format(
                                Locale.ROOT,
                                "the time goes from %.6g to %.6g, the mean step is %.6g, limit half a step off",
                                times[i - 1],
                                times[i],
                                slope),
                        "Export all rows at one rate, missing markers as empty cells");
            }
        }
    }
}
