package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import treadwork.model.body.Sex;
import treadwork.model.finding.Finding;
import treadwork.model.finding.NearestName;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MarkerSet;
import treadwork.model.study.Normalisation;
import treadwork.model.study.Orthosis;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Study;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** Turns a study file that the schema has passed into a study in which each trial carries all that holds for it. */
final class StudyResolver {

    private final LocatedJson document;
    private final StudyPaths paths;
    private final MarkerFiles markerFiles;
    private final MarkerSource studyMarkers;
    private final LabSettings lab;
    private final ResultSettings results;
    private final Set<Finding> findings = new LinkedHashSet<>();

    StudyResolver(LocatedJson document, StudyPaths paths) {
        this.document = document;
        this.paths = paths;
        this.markerFiles = new MarkerFiles(document, paths);
        this.studyMarkers = markerFiles.resolve("", MarkerSource.NONE);
        this.lab = SettingsReader.lab(document.node("/lab"));
        this.results = SettingsReader.results(document.node("/results"));
    }

    Study study() {
        Map<String, String> taken = new HashMap<>();
        List<Subject> subjects = new ArrayList<>();
        for (int i = 0; i < document.node("/subjects").size(); i++) {
            subjects.add(subject("/subjects/" + i, taken));
        }
        return new Study(document.node("/title").asText(""), subjects);
    }

    List<Finding> findings() {
        return List.copyOf(findings);
    }

    private Subject subject(String pointer, Map<String, String> taken) {
        JsonNode node = document.node(pointer);
        String id = node.get("id").textValue();
        refuseId(pointer + "/id", id, taken);
        refuseWithoutHeight(pointer, node);
        String standing = existing(pointer + "/static");
        MarkerSource markers = markerFiles.resolve(pointer, studyMarkers);
        if (markers.layers().isEmpty()) {
            throw document.at(pointer)
                    .unusable(
                            "marker-set-missing",
                            "neither the study nor this subject has a markerSet",
                            "Without one it is not known which marker is where",
                            "Add markerSet to the study or to the subject");
        }
        findings.addAll(MarkerSetChecks.standing(markers));
        return new Subject(
                id,
                node.get("massKg").asDouble(),
                node.has("heightM") ? Optional.of(node.get("heightM").asDouble()) : Optional.empty(),
                Optional.ofNullable(SettingsReader.choice(Sex.values(), Sex::key, node.path("sex"), null)),
                standing,
                markers.set(),
                trials(pointer, markers));
    }

    private List<Trial> trials(String subject, MarkerSource markers) {
        Map<String, String> taken = new HashMap<>();
        List<Trial> trials = new ArrayList<>();
        for (int i = 0; i < document.node(subject + "/trials").size(); i++) {
            String pointer = subject + "/trials/" + i;
            trials.add(trial(subject, pointer, markers));
            refuseName(pointer + "/file", taken);
        }
        warnOfUnusedOrthoses(subject, trials);
        return trials;
    }

    private Trial trial(String subject, String pointer, MarkerSource standing) {
        JsonNode node = document.node(pointer);
        String condition = node.path("condition").asText("").strip();
        List<Orthosis> worn = SettingsReader.orthoses(document.node(subject + "/orthoses")).stream()
                .filter(orthosis -> orthosis.condition().equals(condition))
                .toList();
        return new Trial(
                existing(pointer + "/file"),
                condition,
                trialMarkers(pointer, standing),
                lab,
                SettingsReader.body(nearest("/body", subject, pointer)),
                SettingsReader.processing(nearest("/processing", subject, pointer)),
                results,
                SettingsReader.contacts(node.path("contacts")),
                SettingsReader.frames(node.path("frames")),
                worn,
                SettingsReader.exchanged(node.path("exchanged")),
                node.has("plateFile") ? Optional.of(existing(pointer + "/plateFile")) : Optional.empty());
    }

    private MarkerSet trialMarkers(String pointer, MarkerSource standing) {
        if (!document.node(pointer).has("markerSet")) {
            return standing.set();
        }
        MarkerSource own = markerFiles.resolve(pointer, standing);
        MarkerSetChecks.trial(own, standing.set());
        return own.set();
    }

    /** The path at {@code pointer}, once it is known to lead to a file of the study. */
    private String existing(String pointer) {
        String text = document.node(pointer).textValue();
        paths.existing(document.at(pointer), text);
        return text;
    }

    private JsonNode nearest(String key, String subject, String trial) {
        ObjectNode merged = JsonNodeFactory.instance.objectNode();
        for (String level : List.of("", subject, trial)) {
            lay(merged, document.node(level + key));
        }
        return merged;
    }

    /** Lays one object over another, key by key; what is not an object is taken as a whole. */
    private static void lay(ObjectNode under, JsonNode over) {
        over.fieldNames().forEachRemaining(key -> {
            JsonNode value = over.get(key);
            if (value.isObject()) {
                lay(under.get(key) instanceof ObjectNode there ? there : under.putObject(key), value);
            } else {
                under.set(key, value);
            }
        });
    }

    private void refuseId(String pointer, String id, Map<String, String> taken) {
        Place place = document.at(pointer);
        FolderName.fault(id).ifPresent(fault -> {
            throw place.unusable(
                    "subject-id-unsafe",
                    "the id \"" + id + "\" cannot name a folder: " + fault,
                    "Results are written into a folder of that name",
                    "Use letters, digits, - and _");
        });
        String other = taken.putIfAbsent(id.toLowerCase(Locale.ROOT), id);
        if (other != null) {
            throw place.unusable(
                    "subject-twice",
                    "the id \"" + id + "\" stands twice, first as \"" + other + "\"",
                    "The results of one would replace those of the other (capitals do not tell folders apart everywhere)",
                    "Give each subject its own id");
        }
    }

    private void refuseName(String pointer, Map<String, String> taken) {
        Place place = document.at(pointer);
        String file = document.node(pointer).textValue();
        String name = FolderName.ofTrial(file);
        FolderName.fault(name).ifPresent(fault -> {
            throw place.unusable(
                    "trial-name-unsafe",
                    "the file name \"" + name + "\" cannot name a folder: " + fault,
                    "Results are written into a folder of that name",
                    "Rename the capture file");
        });
        String other = taken.putIfAbsent(name.toLowerCase(Locale.ROOT), file);
        if (other != null) {
            throw place.unusable(
                    "trial-name-twice",
                    "the trials \"" + other + "\" and \"" + file + "\" both have the name \"" + name + "\"",
                    "The results of one would replace those of the other",
                    "Rename one of the two capture files");
        }
    }

    private void refuseWithoutHeight(String pointer, JsonNode subject) {
        Normalisation by = results.normalise();
        boolean needed = by == Normalisation.MASS_HEIGHT || by == Normalisation.WEIGHT_HEIGHT_PERCENT;
        if (needed && !subject.has("heightM")) {
            throw document.at(pointer)
                    .unusable(
                            "study-key-missing",
                            "the key \"heightM\" is missing here",
                            "results.normalise is " + by.key() + ", which divides by the body height",
                            "Add \"heightM\", in metres, or choose another normalise");
        }
    }

    private void warnOfUnusedOrthoses(String subject, List<Trial> trials) {
        List<String> conditions =
                trials.stream().map(Trial::condition).distinct().toList();
        List<Orthosis> all = SettingsReader.orthoses(document.node(subject + "/orthoses"));
        for (int i = 0; i < all.size(); i++) {
            String condition = all.get(i).condition();
            if (!conditions.contains(condition)) {
                findings.add(document.at(subject + "/orthoses/" + i + "/condition")
                        .warning(
                                "orthosis-unused",
                                "no trial of this subject has the condition \"" + condition + "\""
                                        + NearestName.hint(condition, conditions),
                                "The device's mass enters no computation",
                                "Write the condition as it stands in the trials"));
            }
        }
    }
}
