package treadwork.solver.cli;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import treadwork.io.file.JsonText;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.solver.run.TrialOutcome;

/** Findings as lines for a person. */
final class FindingLines {

    /** What is found in more trials than this is said once, with the count; a study of hundreds stays readable. */
    private static final int MOST_TRIALS = 3;

    private FindingLines() {}

    /** A finding and the trial it belongs to. */
    private record Entry(String trial, Finding finding) {}

    /** What kept trials from being computed, warnings and refusals, code by code; notes only as a count. */
    static void print(List<Finding> ofTheStudy, List<TrialOutcome> outcomes, PrintWriter err) {
        ofTheStudy.forEach(finding -> err.println(line(finding)));
        Map<String, List<Entry>> byCode = new LinkedHashMap<>();
        int notes = 0;
        for (TrialOutcome outcome : outcomes) {
            for (Finding finding : outcome.findings()) {
                if (finding.severity() == Severity.NOTE) {
                    notes++;
                } else {
                    byCode.computeIfAbsent(finding.code(), code -> new ArrayList<>())
                            .add(new Entry(outcome.name(), finding));
                }
            }
        }
        byCode.values().forEach(entries -> print(entries, err));
        if (notes > 0) {
            err.println(notes + (notes == 1 ? " note stands" : " notes stand") + " in the trials' trial.json.");
        }
        err.flush();
    }

    private static void print(List<Entry> entries, PrintWriter err) {
        List<String> trials = entries.stream().map(Entry::trial).distinct().toList();
        if (trials.size() <= MOST_TRIALS) {
            entries.forEach(entry -> err.println(entry.trial() + ": " + line(entry.finding())));
            return;
        }
        err.println(trials.size() + " trials (" + String.join(", ", trials.subList(0, MOST_TRIALS))
                + ", …), for example " + line(entries.get(0).finding()) + " The rest stand in the trials' trial.json.");
    }

    /** The change of the study file that would mend it, as lines to copy; empty where none is known. */
    static List<String> change(Finding finding) {
        return finding.proposal()
                .map(proposal -> Stream.concat(
                                Stream.of("in " + proposal.scope().place() + ":"),
                                JsonText.of(proposal.json()).lines())
                        .toList())
                .orElse(List.of());
    }

    /** Severity, code and text: {@code warning plate-sign: ...}. */
    static String line(Finding finding) {
        String severity = switch (finding.severity()) {
            case NOTE -> "note";
            case WARNING -> "warning";
            case REFUSES -> "refuses";
        };
        return severity + " " + finding.code() + (finding.mended() ? " (mended)" : "") + ": " + finding.line();
    }
}
