package treadwork.solver.cli;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.solver.run.TrialOutcome;
import treadwork.solver.run.TrialSummary;

/** The outcome of a run as a table: the greatest loads of each trial and side. */
final class OutcomeTable {

    private OutcomeTable() {}

    static String of(List<TrialOutcome> outcomes) {
        TextTable table = new TextTable().words().words().words().numbers(6);
        table.row("trial", "condition", "side", "plantar-", "knee", "hip", "hip", "ankle", "frames");
        table.row("", "", "", "flexor", "extensor", "extensor", "abductor", "power", "known");
        table.row("", "", "", "N·m/kg", "N·m/kg", "N·m/kg", "N·m/kg", "W/kg", "%");
        for (TrialOutcome outcome : outcomes) {
            if (outcome.summary().isEmpty()) {
                table.row(outcome.name(), outcome.condition(), Progress.words(outcome));
            }
            outcome.summary().ifPresent(summary -> rows(table, outcome, summary));
        }
        return table + "Greatest net internal moments and ankle power in each trial; estimates, not for diagnosis."
                + System.lineSeparator();
    }

    private static void rows(TextTable table, TrialOutcome outcome, TrialSummary summary) {
        String name = outcome.name();
        String condition = outcome.condition();
        for (Map.Entry<Side, TrialSummary.Peaks> side : summary.sides().entrySet()) {
            TrialSummary.Peaks peaks = side.getValue();
            table.row(
                    name,
                    condition,
                    side.getKey().key(),
                    number("%.2f", peaks.plantarflexor()),
                    number("%.2f", peaks.kneeExtensor()),
                    number("%.2f", peaks.hipExtensor()),
                    number("%.2f", peaks.hipAbductor()),
                    number("%.2f", peaks.anklePower()),
                    number("%.0f", 100 * peaks.knownShare()));
            name = "";
            condition = "";
        }
    }

    static String number(String format, double value) {
        return Double.isNaN(value) ? "blank" : String.format(Locale.ROOT, format, value);
    }
}
