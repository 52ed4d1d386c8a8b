package treadwork.solver.cli;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.io.file.JsonText;
import treadwork.io.result.FindingTree;
import treadwork.solver.proof.RodResult;
import treadwork.solver.proof.WeightsResult;

/** Proofs of plates as one JSON document. */
final class ProofJson {

    private ProofJson() {}

    static Map<String, Object> of(Path file, RodResult result, String change) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("file", file.toString());
        tree.put("plate", result.plate());
        tree.put("places", result.places());
        tree.put("frames", result.frames());
        tree.put("tipMm", JsonText.number(1e3 * result.tip()));
        tree.put("tipErrorMm", JsonText.number(1e3 * result.tipError()));
        tree.put("movedMm", components(result.moved(), 1e3));
        tree.put("turnedDeg", components(result.turned(), Math.toDegrees(1)));
        tree.put("asDescribed", miss(result.asFound()));
        tree.put("corrected", miss(result.corrected()));
        tree.put("change", JsonText.parse(change));
        tree.put("findings", FindingTree.of(result.findings()));
        return tree;
    }

    private static Map<String, Object> components(List<RodResult.Component> components, double unit) {
        Map<String, Object> tree = new LinkedHashMap<>();
        List<String> axes = List.of("x", "y", "z");
        for (int k = 0; k < axes.size(); k++) {
            RodResult.Component component = components.get(k);
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("value", JsonText.number(unit * component.value().orElse(Double.NaN)));
            entry.put("standardError", JsonText.number(unit * component.error()));
            tree.put(axes.get(k), entry);
        }
        return tree;
    }

    private static Map<String, Object> miss(RodResult.Miss miss) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("distanceMm", JsonText.number(1e3 * miss.distance()));
        tree.put("angleDeg", JsonText.number(Math.toDegrees(miss.angle())));
        tree.put("accepted", miss.isAccepted());
        return tree;
    }

    static Map<String, Object> of(List<Path> files, WeightsResult result) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("files", files.stream().map(Path::toString).toList());
        tree.put("plate", result.plate());
        tree.put("gain", JsonText.number(result.gain()));
        tree.put("accepted", result.isAccepted());
        tree.put("masses", result.masses().stream().map(ProofJson::mass).toList());
        tree.put("findings", FindingTree.of(result.findings()));
        return tree;
    }

    private static Map<String, Object> mass(WeightsResult.Row row) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("massKg", JsonText.number(row.mass().massKg()));
        tree.put("weightN", JsonText.number(row.expected()));
        tree.put("shownN", JsonText.number(row.shown()));
        tree.put("errorPercent", JsonText.number(100 * row.error()));
        tree.put("noiseN", JsonText.number(row.scatter()));
        tree.put("shearN", JsonText.number(row.shear()));
        tree.put("offXMm", JsonText.number(1e3 * row.offX().orElse(Double.NaN)));
        tree.put("offYMm", JsonText.number(1e3 * row.offY().orElse(Double.NaN)));
        return tree;
    }
}
