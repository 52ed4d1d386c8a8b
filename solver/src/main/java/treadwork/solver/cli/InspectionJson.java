package treadwork.solver.cli;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import treadwork.io.file.JsonText;
import treadwork.io.result.FindingTree;
import treadwork.model.capture.Capture;
import treadwork.model.capture.CaptureEvent;
import treadwork.model.finding.Finding;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.solver.run.Inspection;

/** Inspections as one JSON document. */
final class InspectionJson {

    private InspectionJson() {}

    static Map<String, Object> of(Map<String, Inspection> inspected, Map<String, Finding> unusable) {
        return Map.of(
                "files",
                Stream.concat(
                                inspected.entrySet().stream().map(entry -> file(entry.getKey(), entry.getValue())),
                                unusable.entrySet().stream().map(entry -> refused(entry.getKey(), entry.getValue())))
                        .toList());
    }

    private static Map<String, Object> refused(String file, Finding finding) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("file", file);
        tree.put("findings", FindingTree.of(List.of(finding)));
        return tree;
    }

    private static Map<String, Object> file(String file, Inspection inspection) {
        Capture capture = inspection.capture();
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("file", file);
        tree.put("firstFrame", capture.firstFrame());
        tree.put("frames", capture.frames());
        tree.put("pointRateHz", JsonText.number(capture.pointRate()));
        tree.put("analogRateHz", JsonText.number(capture.analogRate()));
        tree.put("storage", capture.storage());
        tree.put("pointUnit", capture.pointUnit().symbol());
        tree.put("up", inspection.up().map(LabAxis::key).orElse(null));
        tree.put(
                "points",
                inspection.markers().stream().map(InspectionJson::marker).toList());
        tree.put(
                "channels",
                capture.analog().stream().map(channel -> channel.label()).toList());
        tree.put(
                "plates",
                inspection.plates().stream().map(InspectionJson::plate).toList());
        tree.put("events", capture.events().stream().map(InspectionJson::event).toList());
        tree.put("findings", FindingTree.of(inspection.findings()));
        return tree;
    }

    private static Map<String, Object> marker(Inspection.MarkerSummary marker) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("label", marker.label());
        tree.put("framesSeen", marker.seen());
        tree.put("gaps", marker.gaps());
        tree.put("longestGapS", JsonText.number(marker.longestGapS()));
        return tree;
    }

    private static Map<String, Object> plate(Inspection.PlateSummary summary) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("plate", summary.number());
        tree.put("type", summary.plate().type().code());
        tree.put(
                "cornersM",
                summary.plate().corners().stream().map(InspectionJson::vector).toList());
        tree.put("originM", vector(summary.plate().origin()));
        tree.put("greatestPushN", JsonText.number(summary.peak()));
        return tree;
    }

    private static Map<String, Object> event(CaptureEvent event) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("label", event.label());
        tree.put("context", event.context());
        tree.put("timeS", JsonText.number(event.timeS()));
        return tree;
    }

    private static List<Number> vector(Vector3 v) {
        return JsonText.numbers(v.x(), v.y(), v.z());
    }
}
