package treadwork.io.result;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.io.file.JsonText;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/**
 * Everything that goes into the results of one trial.
 *
 * @param programVersion of the program that computes
 * @param inputs         the captures
 */
public record TrialRecord(String programVersion, Subject subject, Trial trial, List<InputFile> inputs) {

    public TrialRecord {
        inputs = List.copyOf(inputs);
    }

    /**
     * A hash of all that goes in: two records have the same key just when program version, subject, settings and the
     * bytes of the captures are the same. The same on every machine, and whatever other trials the study has.
     */
    public String key() {
        Map<String, Object> all = new LinkedHashMap<>();
        all.put("programVersion", programVersion);
        all.put("subject", SettingsTree.subject(subject));
        all.put("trial", SettingsTree.trial(trial));
        all.put("settings", SettingsTree.settings(subject, trial));
        all.put("inputs", SettingsTree.inputs(inputs));
        return Sha256.of(JsonText.of(all));
    }
}
