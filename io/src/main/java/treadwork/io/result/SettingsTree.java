package treadwork.io.result;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.io.file.JsonText;
import treadwork.io.study.StudyTree;
import treadwork.model.body.Sex;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** What went into a trial, as {@code trial.json} has it: the settings look as they do in a study file. */
final class SettingsTree {

    private SettingsTree() {}

    static Map<String, Object> subject(Subject subject) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("id", subject.id());
        tree.put("massKg", JsonText.number(subject.massKg()));
        tree.put("heightM", subject.heightM().map(JsonText::number).orElse(null));
        tree.put("sex", subject.sex().map(Sex::key).orElse(null));
        tree.put("static", subject.staticFile());
        return tree;
    }

    static Map<String, Object> trial(Trial trial) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("file", trial.file());
        tree.put("plateFile", trial.plateFile().orElse(null));
        tree.put("condition", trial.condition().isEmpty() ? null : trial.condition());
        return tree;
    }

    /** Every setting in force, defaults written out; {@code frames} is {@code null} for all. */
    static Map<String, Object> settings(Subject subject, Trial trial) {
        Map<String, Object> markers = new LinkedHashMap<>();
        markers.put("static", StudyTree.markerSet(subject.markerSet()));
        markers.put("trial", StudyTree.markerSet(trial.markerSet()));
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("lab", StudyTree.lab(trial.lab()));
        tree.put("body", StudyTree.body(trial.body()));
        tree.put("processing", StudyTree.processing(trial.processing()));
        tree.put("results", StudyTree.results(trial.results()));
        tree.put("contacts", StudyTree.contacts(trial.contacts()));
        tree.put("frames", trial.frames().map(StudyTree::frames).orElse(null));
        tree.put("orthoses", StudyTree.orthoses(trial.orthoses()));
        tree.put("exchanged", StudyTree.exchanged(trial.exchanged()));
        tree.put("markerSet", markers);
        return tree;
    }

    static List<Map<String, String>> inputs(List<InputFile> inputs) {
        return inputs.stream().map(SettingsTree::input).toList();
    }

    private static Map<String, String> input(InputFile input) {
        Map<String, String> tree = new LinkedHashMap<>();
        tree.put("file", input.file());
        tree.put("sha256", input.sha256());
        return tree;
    }
}
