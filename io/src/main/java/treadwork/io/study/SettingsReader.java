package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;
import treadwork.model.study.BodySettings;
import treadwork.model.study.ContactRule;
import treadwork.model.study.Exchange;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.LabAxis;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.NamedPlate;
import treadwork.model.study.Normalisation;
import treadwork.model.study.Orthosis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.ShankAxis;
import treadwork.model.study.TextSettings;

/** Settings from JSON that the schema has passed; a key that does not stand has its default. */
final class SettingsReader {

    private SettingsReader() {}

    static LabSettings lab(JsonNode lab) {
        JsonNode plates = lab.path("plates");
        boolean named = areNamed(plates);
        return new LabSettings(
                LabAxis.ofKey(lab.path("up").asText()),
                LengthUnit.ofSymbol(lab.path("pointUnit").asText()),
                plates.isArray() && !named ? Optional.of(each(plates, SettingsReader::plate)) : Optional.empty(),
                text(lab.path("text")),
                named ? each(plates, SettingsReader::namedPlate) : List.of());
    }

    /** Whether any plate has a channel by its name, or must have. */
    static boolean areNamed(JsonNode plates) {
        for (JsonNode plate : plates) {
            if (inLabAxes(plate)) {
                return true;
            }
            for (JsonNode channel : plate.path("channels")) {
                if (channel.isTextual()) {
                    return true;
                }
            }
        }
        return false;
    }

    /** Whether forces and centre of pressure of a plate are along the lab's axes. */
    static boolean inLabAxes(JsonNode plate) {
        return plate.path("axes").asText().equals("lab");
    }

    private static NamedPlate namedPlate(JsonNode plate) {
        return new NamedPlate(
                type(plate),
                inLabAxes(plate),
                each(plate.get("cornersM"), SettingsReader::vector),
                plate.has("originM") ? vector(plate.get("originM")) : Vector3.ZERO,
                each(plate.get("channels"), name -> name.textValue().strip()),
                calibration(plate),
                channelUnit(plate));
    }

    private static TextSettings text(JsonNode text) {
        List<String> channels = new ArrayList<>();
        text.path("channels").forEach(name -> channels.add(name.asText().strip()));
        return new TextSettings(hertz(text.path("pointRateHz")), hertz(text.path("plateRateHz")), channels);
    }

    private static Optional<Double> hertz(JsonNode rate) {
        return rate.isNumber() ? Optional.of(rate.asDouble()) : Optional.empty();
    }

    static BodySettings body(JsonNode body) {
        BodySettings defaults = BodySettings.DEFAULT;
        Map<Segment, MassProperties> overrides = new EnumMap<>(Segment.class);
        JsonNode segments = body.path("segments");
        segments.fieldNames()
                .forEachRemaining(
                        key -> overrides.put(Segment.ofKey(key).orElseThrow(), massProperties(segments.get(key))));
        return new BodySettings(
                choice(InertiaTable.values(), InertiaTable::key, body.path("inertia"), defaults.inertia()),
                choice(HipCentreRule.values(), HipCentreRule::key, body.path("hipCentre"), defaults.hipCentre()),
                choice(ShankAxis.values(), ShankAxis::key, body.path("shankAxis"), defaults.shankAxis()),
                choice(PoseMethod.values(), PoseMethod::key, body.path("pose"), defaults.pose()),
                overrides);
    }

    static Processing processing(JsonNode processing) {
        Processing defaults = Processing.DEFAULT;
        return new Processing(
                filter(processing.path("markerFilter"), defaults.markerFilter()),
                filter(processing.path("plateFilter"), defaults.plateFilter()),
                processing.path("longestGapS").asDouble(defaults.longestGapS()),
                processing.path("contactThresholdN").asDouble(defaults.contactThresholdN()),
                plateZero(processing.path("plateZero")),
                processing.path("plateDelayS").asDouble(defaults.plateDelayS()));
    }

    static ResultSettings results(JsonNode results) {
        ResultSettings defaults = ResultSettings.DEFAULT;
        JsonNode convention = results.path("momentConvention");
        JsonNode uncertainty = results.path("uncertainty");
        return new ResultSettings(
                choice(MomentConvention.values(), MomentConvention::key, convention, defaults.momentConvention()),
                choice(MomentAxes.values(), MomentAxes::key, results.path("momentAxes"), defaults.momentAxes()),
                choice(Normalisation.values(), Normalisation::key, results.path("normalise"), defaults.normalise()),
                uncertainty.path("draws").asInt(defaults.draws()),
                uncertainty.path("seed").asLong(defaults.seed()));
    }

    static Optional<List<ContactRule>> contacts(JsonNode contacts) {
        return contacts.isArray() ? Optional.of(each(contacts, SettingsReader::contact)) : Optional.empty();
    }

    static List<Orthosis> orthoses(JsonNode orthoses) {
        return each(orthoses, SettingsReader::orthosis);
    }

    static List<Exchange> exchanged(JsonNode exchanged) {
        return each(exchanged, SettingsReader::exchange);
    }

    static Optional<FrameRange> frames(JsonNode frames) {
        return frames.isArray()
                ? Optional.of(
                        new FrameRange(frames.get(0).asInt(), frames.get(1).asInt()))
                : Optional.empty();
    }

    static Inertia inertia(JsonNode six) {
        return new Inertia(
                six.get(0).asDouble(),
                six.get(1).asDouble(),
                six.get(2).asDouble(),
                six.get(3).asDouble(),
                six.get(4).asDouble(),
                six.get(5).asDouble());
    }

    /** The value whose key the text is. */
    static <T> T choice(T[] values, Function<T, String> key, JsonNode text, T otherwise) {
        return Arrays.stream(values)
                .filter(value -> key.apply(value).equals(text.textValue()))
                .findFirst()
                .orElse(otherwise);
    }

    private static FilterSettings filter(JsonNode filter, FilterSettings defaults) {
        return new FilterSettings(
                choice(FilterSettings.Kind.values(), FilterSettings.Kind::key, filter.path("kind"), defaults.kind()),
                filter.path("cutoffHz").asDouble(defaults.cutoffHz()),
                filter.path("order").asInt(defaults.order()));
    }

    private static PlateZero plateZero(JsonNode zero) {
        if (zero.isArray()) {
            return new PlateZero.Frames(frames(zero).orElseThrow());
        }
        return switch (zero.asText("auto")) {
            case "none" -> new PlateZero.None();
            case "file" -> new PlateZero.File();
            default -> new PlateZero.Auto();
        };
    }

    private static Plate plate(JsonNode plate) {
        return new Plate(
                type(plate),
                each(plate.get("cornersM"), SettingsReader::vector),
                vector(plate.get("originM")),
                each(plate.get("channels"), number -> number.asInt() - 1),
                calibration(plate),
                channelUnit(plate));
    }

    private static PlateType type(JsonNode plate) {
        return PlateType.ofCode(plate.get("type").asInt()).orElseThrow();
    }

    private static LengthUnit channelUnit(JsonNode plate) {
        return LengthUnit.ofSymbol(plate.path("channelUnit").asText()).orElse(LengthUnit.MM);
    }

    private static Optional<CalibrationMatrix> calibration(JsonNode plate) {
        if (!plate.has("calibration")) {
            return Optional.empty();
        }
        List<Double> elements = new ArrayList<>();
        plate.get("calibration").forEach(row -> row.forEach(element -> elements.add(element.asDouble())));
        return Optional.of(CalibrationMatrix.ofRows(
                elements.stream().mapToDouble(Double::doubleValue).toArray()));
    }

    private static MassProperties massProperties(JsonNode given) {
        return new MassProperties(
                given.get("massKg").asDouble(), vector(given.get("comM")), inertia(given.get("inertiaKgm2")));
    }

    private static ContactRule contact(JsonNode rule) {
        return new ContactRule(rule.get("plate").asInt(), side(rule.get("foot")), frames(rule.path("frames")));
    }

    private static Exchange exchange(JsonNode exchange) {
        JsonNode labels = exchange.get("labels");
        return new Exchange(
                labels.get(0).textValue().strip(),
                labels.get(1).textValue().strip(),
                frames(exchange.get("frames")).orElseThrow());
    }

    private static Side side(JsonNode foot) {
        return choice(Side.values(), Side::key, foot, Side.RIGHT);
    }

    private static Orthosis orthosis(JsonNode orthosis) {
        return new Orthosis(
                orthosis.get("condition").textValue().strip(),
                Segment.ofKey(orthosis.get("segment").textValue()).orElseThrow(),
                orthosis.get("massKg").asDouble(),
                vector(orthosis.get("comM")));
    }

    private static Vector3 vector(JsonNode three) {
        return new Vector3(
                three.get(0).asDouble(), three.get(1).asDouble(), three.get(2).asDouble());
    }

    private static <T> List<T> each(JsonNode array, Function<JsonNode, T> reader) {
        List<T> list = new ArrayList<>();
        array.forEach(element -> list.add(reader.apply(element)));
        return list;
    }
}
