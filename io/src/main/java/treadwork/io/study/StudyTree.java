package treadwork.io.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.IntStream;
import treadwork.io.file.JsonText;
import treadwork.model.body.MassProperties;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;
import treadwork.model.study.BodySettings;
import treadwork.model.study.ContactRule;
import treadwork.model.study.Exchange;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.LabAxis;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MarkerSet;
import treadwork.model.study.NamedPlate;
import treadwork.model.study.Orthosis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.TextSettings;

/**
 * Settings as they stand in a study file, every default written out, keys in the order of the schema: maps, lists, texts
 * and numbers, ready to be written as JSON.
 */
public final class StudyTree {

    private static final String AUTO = "auto";

    private StudyTree() {}

    public static Map<String, Object> lab(LabSettings lab) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("up", lab.up().map(LabAxis::key).orElse(AUTO));
        tree.put("pointUnit", lab.pointUnit().map(LengthUnit::symbol).orElse(AUTO));
        Object plates = lab.namedPlates().isEmpty() ? "file" : each(lab.namedPlates(), StudyTree::plate);
        tree.put(
                "plates",
                lab.plates().<Object>map(given -> each(given, StudyTree::plate)).orElse(plates));
        tree.put("text", text(lab.text()));
        return tree;
    }

    private static Map<String, Object> text(TextSettings text) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("pointRateHz", text.pointRateHz().<Object>map(JsonText::number).orElse(AUTO));
        tree.put("plateRateHz", text.plateRateHz().<Object>map(JsonText::number).orElse(AUTO));
        tree.put("channels", text.channels());
        return tree;
    }

    public static Map<String, Object> body(BodySettings body) {
        Map<String, Object> segments = new LinkedHashMap<>();
        body.overrides().forEach((segment, given) -> segments.put(segment.key(), massProperties(given)));
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("inertia", body.inertia().key());
        tree.put("hipCentre", body.hipCentre().key());
        tree.put("shankAxis", body.shankAxis().key());
        tree.put("pose", body.pose().key());
        tree.put("segments", segments);
        return tree;
    }

    public static Map<String, Object> processing(Processing processing) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("markerFilter", filter(processing.markerFilter()));
        tree.put("plateFilter", filter(processing.plateFilter()));
        tree.put("longestGapS", JsonText.number(processing.longestGapS()));
        tree.put("contactThresholdN", JsonText.number(processing.contactThresholdN()));
        tree.put("plateZero", plateZero(processing.plateZero()));
        tree.put("plateDelayS", JsonText.number(processing.plateDelayS()));
        return tree;
    }

    public static Map<String, Object> results(ResultSettings results) {
        Map<String, Object> uncertainty = new LinkedHashMap<>();
        uncertainty.put("draws", results.draws());
        uncertainty.put("seed", results.seed());
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("momentConvention", results.momentConvention().key());
        tree.put("momentAxes", results.momentAxes().key());
        tree.put("normalise", results.normalise().key());
        tree.put("uncertainty", uncertainty);
        return tree;
    }

    public static Map<String, Object> markerSet(MarkerSet set) {
        Map<String, Object> landmarks = new LinkedHashMap<>();
        set.landmarks().forEach((landmark, label) -> landmarks.put(landmark.key(), label));
        Map<String, Object> clusters = new LinkedHashMap<>();
        set.clusters().forEach((segment, labels) -> clusters.put(segment.key(), labels));
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("landmarks", landmarks);
        tree.put("clusters", clusters);
        return tree;
    }

    /** {@code "auto"}, or the rules. */
    public static Object contacts(Optional<List<ContactRule>> contacts) {
        return contacts.<Object>map(rules -> each(rules, StudyTree::contact)).orElse(AUTO);
    }

    public static List<Object> orthoses(List<Orthosis> orthoses) {
        return each(orthoses, StudyTree::orthosis);
    }

    public static List<Object> exchanged(List<Exchange> exchanged) {
        return each(exchanged, StudyTree::exchange);
    }

    public static List<Integer> frames(FrameRange frames) {
        return List.of(frames.first(), frames.last());
    }

    public static List<Number> vector(Vector3 vector) {
        return JsonText.numbers(vector.x(), vector.y(), vector.z());
    }

    /** The matrix's elements xx, yy, zz, xy, xz, yz. */
    public static List<Number> inertia(Inertia inertia) {
        return JsonText.numbers(inertia.xx(), inertia.yy(), inertia.zz(), inertia.xy(), inertia.xz(), inertia.yz());
    }

    private static Map<String, Object> filter(FilterSettings filter) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("kind", filter.kind().key());
        tree.put("cutoffHz", JsonText.number(filter.cutoffHz()));
        tree.put("order", filter.order());
        return tree;
    }

    private static Object plateZero(PlateZero zero) {
        if (zero instanceof PlateZero.Frames frames) {
            return frames(frames.range());
        }
        if (zero instanceof PlateZero.None) {
            return "none";
        }
        return zero instanceof PlateZero.File ? "file" : AUTO;
    }

    private static Map<String, Object> plate(Plate plate) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("type", plate.type().code());
        tree.put("cornersM", each(plate.corners(), StudyTree::vector));
        tree.put("originM", vector(plate.origin()));
        tree.put("channels", each(plate.channels(), place -> place + 1));
        tree.put("channelUnit", plate.channelUnit().symbol());
        plate.calibration().ifPresent(matrix -> tree.put("calibration", rows(matrix)));
        return tree;
    }

    private static Map<String, Object> plate(NamedPlate plate) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("type", plate.type().code());
        tree.put("axes", plate.labAxes() ? "lab" : "plate");
        tree.put("cornersM", each(plate.corners(), StudyTree::vector));
        tree.put("originM", vector(plate.origin()));
        tree.put("channels", plate.channels());
        tree.put("channelUnit", plate.channelUnit().symbol());
        plate.calibration().ifPresent(matrix -> tree.put("calibration", rows(matrix)));
        return tree;
    }

    private static List<Object> rows(CalibrationMatrix matrix) {
        List<Object> rows = new ArrayList<>();
        for (int row = 0; row < CalibrationMatrix.SIZE; row++) {
            int r = row;
            rows.add(IntStream.range(0, CalibrationMatrix.SIZE)
                    .mapToObj(column -> JsonText.number(matrix.at(r, column)))
                    .toList());
        }
        return rows;
    }

    private static Map<String, Object> massProperties(MassProperties given) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("massKg", JsonText.number(given.mass()));
        tree.put("comM", vector(given.centre()));
        tree.put("inertiaKgm2", inertia(given.inertia()));
        return tree;
    }

    private static Map<String, Object> contact(ContactRule rule) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("plate", rule.plate());
        tree.put("foot", rule.foot().key());
        rule.frames().ifPresent(frames -> tree.put("frames", frames(frames)));
        return tree;
    }

    private static Map<String, Object> exchange(Exchange exchange) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("labels", List.of(exchange.first(), exchange.second()));
        tree.put("frames", frames(exchange.frames()));
        return tree;
    }

    private static Map<String, Object> orthosis(Orthosis orthosis) {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("condition", orthosis.condition());
        tree.put("segment", orthosis.segment().key());
        tree.put("massKg", JsonText.number(orthosis.massKg()));
        tree.put("comM", vector(orthosis.centre()));
        return tree;
    }

    private static <T> List<Object> each(List<T> values, Function<T, Object> tree) {
        List<Object> list = new ArrayList<>();
        values.forEach(value -> list.add(tree.apply(value)));
        return list;
    }
}
