package treadwork.io.study;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Stream;
import treadwork.io.file.JsonText;
import treadwork.io.file.WholeFile;
import treadwork.model.body.Sex;
import treadwork.model.study.MarkerSet;
import treadwork.model.study.Orthosis;
import treadwork.model.study.Study;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** Writes a study as a person would: what all trials share once at the top, marker sets in files of their own. */
public final class StudyWriter {

    private final Study study;
    private final List<Trial> trials;
    private final Map<MarkerSet, String> markerFiles = new LinkedHashMap<>();

    private StudyWriter(Study study) {
        this.study = study;
        this.trials = study.subjects().stream()
                .flatMap(subject -> subject.trials().stream())
                .toList();
        sets(study).distinct().forEach(set -> markerFiles.put(set, name(markerFiles.size())));
    }

    /**
     * Writes the study file and {@code markers.json} (for further sets {@code markers-2.json} and so on) beside it, so
     * that {@link StudyReader} reads the same study from them. The captures are not written.
     *
     * @throws IllegalArgumentException if the trials differ in laboratory or results, which hold for a whole study
     */
    public static void write(Study study, Path studyFile) {
        StudyWriter writer = new StudyWriter(study);
        String text = JsonText.of(writer.tree());
        writer.markerFiles.forEach(
                (set, name) -> WholeFile.write(studyFile.resolveSibling(name), JsonText.of(StudyTree.markerSet(set))));
        WholeFile.write(studyFile, text);
    }

    private static Stream<MarkerSet> sets(Study study) {
        return study.subjects().stream()
                .flatMap(subject -> Stream.concat(
                        Stream.of(subject.markerSet()),
                        subject.trials().stream().map(Trial::markerSet)));
    }

    private static String name(int earlier) {
        return earlier == 0 ? "markers.json" : "markers-" + (earlier + 1) + ".json";
    }

    private Map<String, Object> tree() {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("treadwork", 1);
        tree.put("title", study.title());
        tree.put("markerSet", name(0));
        tree.put("lab", common(Trial::lab).map(StudyTree::lab).orElseThrow(() -> differ("lab")));
        common(Trial::body).ifPresent(body -> tree.put("body", StudyTree.body(body)));
        common(Trial::processing).ifPresent(processing -> tree.put("processing", StudyTree.processing(processing)));
        tree.put("results", common(Trial::results).map(StudyTree::results).orElseThrow(() -> differ("results")));
        List<Object> subjects = new ArrayList<>();
        study.subjects().forEach(subject -> subjects.add(subject(subject)));
        tree.put("subjects", subjects);
        return tree;
    }

    private static IllegalArgumentException differ(String key) {
        return new IllegalArgumentException("a study has one \"" + key + "\", its trials have none or several");
    }

    /** What all trials share; empty where they differ. */
    private <T> Optional<T> common(Function<Trial, T> setting) {
        List<T> values = trials.stream().map(setting).distinct().toList();
        return values.size() == 1 ? Optional.of(values.get(0)) : Optional.empty();
    }

    private Map<String, Object> subject(Subject subject) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("id", subject.id());
        tree.put("massKg", JsonText.number(subject.massKg()));
        subject.heightM().ifPresent(height -> tree.put("heightM", JsonText.number(height)));
        subject.sex().map(Sex::key).ifPresent(sex -> tree.put("sex", sex));
        tree.put("static", subject.staticFile());
        String markers = markerFiles.get(subject.markerSet());
        if (!markers.equals(name(0))) {
            tree.put("markerSet", markers);
        }
        Set<Orthosis> worn = new LinkedHashSet<>();
        subject.trials().forEach(trial -> worn.addAll(trial.orthoses()));
        if (!worn.isEmpty()) {
            tree.put("orthoses", StudyTree.orthoses(List.copyOf(worn)));
        }
        List<Object> entries = new ArrayList<>();
        subject.trials().forEach(trial -> entries.add(trial(trial, subject)));
        tree.put("trials", entries);
        return tree;
    }

    private Map<String, Object> trial(Trial trial, Subject subject) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("file", trial.file());
        trial.plateFile().ifPresent(plates -> tree.put("plateFile", plates));
        if (!trial.condition().isEmpty()) {
            tree.put("condition", trial.condition());
        }
        if (!trial.markerSet().equals(subject.markerSet())) {
            tree.put("markerSet", markerFiles.get(trial.markerSet()));
        }
        if (common(Trial::body).isEmpty()) {
            tree.put("body", StudyTree.body(trial.body()));
        }
        if (common(Trial::processing).isEmpty()) {
            tree.put("processing", StudyTree.processing(trial.processing()));
        }
        if (trial.contacts().isPresent()) {
            tree.put("contacts", StudyTree.contacts(trial.contacts()));
        }
        trial.frames().ifPresent(frames -> tree.put("frames", StudyTree.frames(frames)));
        if (!trial.exchanged().isEmpty()) {
            tree.put("exchanged", StudyTree.exchanged(trial.exchanged()));
        }
        return tree;
    }
}
