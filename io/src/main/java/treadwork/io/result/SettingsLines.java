package treadwork.io.result;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import treadwork.model.study.LabAxis;

/** Conventions and settings as lines of text, for files that hold nothing deeper: {@code processing.markerFilter.cutoffHz = 6}. */
final class SettingsLines {

    /** What every reader of the C3D format can be expected to hold. */
    private static final int LONGEST = 127;

    private SettingsLines() {}

    /** How the numbers are to be read, then how they were computed; the marker set stands in {@code trial.json} alone. */
    static List<String> of(TrialRecord record, LabAxis up) {
        List<String> lines = new ArrayList<>();
        flatten("convention", ConventionTree.of(record.trial().results(), up), lines);
        Map<String, Object> settings = SettingsTree.settings(record.subject(), record.trial());
        for (String part : List.of("lab", "body", "processing", "results", "contacts", "frames", "orthoses")) {
            flatten(part, settings.get(part), lines);
        }
        lines.add("key = " + record.key());
        return lines;
    }

    private static void flatten(String name, Object value, List<String> lines) {
        if (value instanceof Map<?, ?> tree) {
            tree.forEach((key, each) -> flatten(name + "." + key, each, lines));
        } else if (value != null) {
            String line = name + " = " + value;
            lines.add(line.length() > LONGEST ? line.substring(0, LONGEST) : line);
        }
    }
}
