package treadwork.solver.cli;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.io.file.JsonText;
import treadwork.io.result.FindingTree;
import treadwork.io.study.StudyDocument;
import treadwork.solver.run.TrialOutcome;
import treadwork.solver.run.TrialSummary;

/** The outcome of a run as one JSON document. */
final class OutcomeJson {

    private OutcomeJson() {}

    static String of(StudyDocument document, List<TrialOutcome> outcomes) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("study", document.file().toString());
        tree.put("title", document.study().title());
        tree.put("findings", FindingTree.of(document.findings()));
        tree.put("trials", outcomes.stream().map(OutcomeJson::trial).toList());
        return JsonText.of(tree);
    }

    private static Map<String, Object> trial(TrialOutcome outcome) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("trial", outcome.name());
        tree.put("condition", outcome.condition());
        tree.put("status", outcome.status().name().toLowerCase(Locale.ROOT).replace('_', '-'));
        tree.put("folder", outcome.folder().toString());
        outcome.summary().ifPresent(summary -> tree.put("peaks", peaks(summary)));
        tree.put("findings", FindingTree.of(outcome.findings()));
        return tree;
    }

    private static Map<String, Object> peaks(TrialSummary summary) {
        Map<String, Object> tree = new LinkedHashMap<>();
        summary.sides().forEach((side, peaks) -> {
            Map<String, Object> values = new LinkedHashMap<>();
            values.put("ankle_plantarflexion_moment_Nm_per_kg", JsonText.number(peaks.plantarflexor()));
            values.put("knee_extension_moment_Nm_per_kg", JsonText.number(peaks.kneeExtensor()));
            values.put("hip_extension_moment_Nm_per_kg", JsonText.number(peaks.hipExtensor()));
            values.put("hip_abduction_moment_Nm_per_kg", JsonText.number(peaks.hipAbductor()));
            values.put("ankle_power_W_per_kg", JsonText.number(peaks.anklePower()));
            values.put("known_share", JsonText.number(peaks.knownShare()));
            tree.put(side.key(), values);
        });
        return tree;
    }
}
