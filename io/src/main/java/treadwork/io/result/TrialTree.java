package treadwork.io.result;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.io.file.JsonText;
import treadwork.io.study.StudyTree;
import treadwork.model.load.Contact;
import treadwork.model.load.SegmentSheet;
import treadwork.model.load.TrialResult;

/** {@code trial.json}: what went in, in which convention results are given, and what was found on the way. */
final class TrialTree {

    /** The key under which the hash of all that went in stands. */
    static final String KEY = "key";

    private TrialTree() {}

    static Map<String, Object> of(TrialRecord record, TrialResult result) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("programVersion", record.programVersion());
        tree.put(KEY, record.key());
        tree.put("subject", SettingsTree.subject(record.subject()));
        tree.put("trial", SettingsTree.trial(record.trial()));
        tree.put("inputs", SettingsTree.inputs(record.inputs()));
        tree.put("settings", SettingsTree.settings(record.subject(), record.trial()));
        tree.put("conventions", ConventionTree.of(record.trial().results(), result.up()));
        tree.put("capture", capture(result));
        tree.put("segments", result.segments().stream().map(TrialTree::segment).toList());
        tree.put("events", List.of());
        tree.put(
                "contacts",
                result.contacts().stream()
                        .map(series -> contact(series.contact()))
                        .toList());
        tree.put("findings", FindingTree.of(result.findings()));
        tree.put("uncertainty", null);
        return tree;
    }

    private static Map<String, Object> capture(TrialResult result) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("firstFrame", result.firstFrame());
        tree.put("frames", result.frames());
        tree.put("pointRateHz", JsonText.number(result.pointRate()));
        return tree;
    }

    private static Map<String, Object> segment(SegmentSheet sheet) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("segment", sheet.segment().key());
        tree.put("massKg", JsonText.number(sheet.mass().mass()));
        tree.put("comM", StudyTree.vector(sheet.mass().centre()));
        tree.put("inertiaKgm2", StudyTree.inertia(sheet.mass().inertia()));
        tree.put("lengthM", JsonText.number(sheet.lengthM()));
        tree.put("source", sheet.source());
        tree.put("fitRmsM", JsonText.number(sheet.fitRmsM()));
        return tree;
    }

    private static Map<String, Object> contact(Contact contact) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("plate", contact.plate());
        tree.put("foot", contact.foot().key());
        tree.put("frames", StudyTree.frames(contact.frames()));
        tree.put("assigned", contact.assigned());
        return tree;
    }
}
