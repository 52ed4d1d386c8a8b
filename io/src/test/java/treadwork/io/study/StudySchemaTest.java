package treadwork.io.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.BiConsumer;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.Sex;
import treadwork.model.body.Side;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PlateType;
import treadwork.model.study.BodySettings;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.LabAxis;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.Normalisation;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.ShankAxis;

/** The schema says the same as the model: words, defaults, names. */
class StudySchemaTest {

    private static final ObjectMapper MAPPER = new ObjectMapper();

    @Test
    void theTextIsTheSchemaOfTheStatedDraft() throws Exception {
        JsonNode schema = MAPPER.readTree(StudySchema.text());

        assertEquals(
                "https://json-schema.org/draft/2020-12/schema",
                schema.get("$schema").textValue());
    }

    @Test
    void theWordsOfEachChoiceAreThoseOfTheModel() {
        assertChoices("body/properties/inertia", InertiaTable.values(), InertiaTable::key);
        assertChoices("body/properties/hipCentre", HipCentreRule.values(), HipCentreRule::key);
        assertChoices("body/properties/shankAxis", ShankAxis.values(), ShankAxis::key);
        assertChoices("body/properties/pose", PoseMethod.values(), PoseMethod::key);
        assertChoices("filter/properties/kind", FilterSettings.Kind.values(), FilterSettings.Kind::key);
        assertChoices("results/properties/momentConvention", MomentConvention.values(), MomentConvention::key);
        assertChoices("results/properties/momentAxes", MomentAxes.values(), MomentAxes::key);
        assertChoices("results/properties/normalise", Normalisation.values(), Normalisation::key);
        assertChoices("subject/properties/sex", Sex.values(), Sex::key);
        assertChoices("contact/properties/foot", Side.values(), Side::key);
        assertChoices("orthosis/properties/segment", Segment.values(), Segment::key);
        assertChoices("plate/properties/type", PlateType.values(), type -> "" + type.code());
        assertChoices("plate/properties/channelUnit", LengthUnit.values(), LengthUnit::symbol);
        assertEquals(withAuto(Stream.of(LabAxis.values()).map(LabAxis::key)), enumOf("lab/properties/up"));
        assertEquals(
                withAuto(Stream.of(LengthUnit.values()).map(LengthUnit::symbol)), enumOf("lab/properties/pointUnit"));
    }

    @Test
    void landmarksAndSegmentsAreThoseOfTheModel() {
        List<String> segments =
                Arrays.stream(Segment.values()).map(Segment::key).toList();

        assertEquals(
                Arrays.stream(Landmark.values()).map(Landmark::key).sorted().toList(),
                keys("landmarks").stream().sorted().toList());
        assertEquals(segments, keys("clusters"));
        assertEquals(segments, keys("body/properties/segments"));
    }

    @Test
    void theDefaultsAreThoseOfTheModel() {
        assertDefaults("lab", StudyTree.lab(LabSettings.DEFAULT));
        assertDefaults("body", StudyTree.body(BodySettings.DEFAULT));
        assertDefaults("processing", StudyTree.processing(Processing.DEFAULT));
        assertDefaults("results", StudyTree.results(ResultSettings.DEFAULT));
    }

    @Test
    void everyPropertyHasADescription() {
        eachNode("", StudySchema.part(""), (pointer, node) -> {
            if (node.has("type") && !pointer.contains("/items")) {
                assertFalse(
                        StudySchema.part(pointer).path("description").asText().isEmpty() && !isCondition(pointer),
                        pointer + " has no description");
            }
        });
    }

    /** A number without bounds would let infinity, or a slip of the unit, through. */
    @Test
    void everyNumberHasBothBounds() {
        List<String> numbers = new ArrayList<>();

        eachNode("", StudySchema.part(""), (pointer, node) -> {
            String type = node.path("type").asText();
            boolean listed = node.has("enum");
            if ((type.equals("number") || type.equals("integer")) && !listed) {
                numbers.add(pointer);
                assertTrue(node.has("maximum") && (node.has("minimum") || node.has("exclusiveMinimum")), pointer);
            }
        });

        assertTrue(numbers.contains("/$defs/contact/properties/plate"), numbers.toString());
    }

    /** A key with a unit is told with that unit: each such key is known to the messages. */
    @Test
    void keysThatEndInAUnitAreKnownToTheMessages() {
        Map<String, String> units = new TreeMap<>();

        eachNode("", StudySchema.part(""), (pointer, node) -> {
            String key = pointer.substring(pointer.lastIndexOf('/') + 1);
            if (key.matches(".*[a-z](Kg|Hz|S|N|M|Kgm2)") && !key.equals("clusters")) {
                units.put(key, Expected.unitOf(key));
            }
        });

        assertEquals(12, units.size(), units.toString());
        assertFalse(units.containsValue(""), units.toString());
    }

    private static boolean isCondition(String pointer) {
        return pointer.endsWith("/if");
    }

    private static <T> void assertChoices(String definition, T[] values, Function<T, String> key) {
        assertEquals(Arrays.stream(values).map(key).toList(), enumOf(definition), definition);
    }

    private static List<String> withAuto(Stream<String> keys) {
        return Stream.concat(Stream.of("auto"), keys).toList();
    }

    private static List<String> enumOf(String definition) {
        return Expected.choices(StudySchema.part("/$defs/" + definition));
    }

    private static List<String> keys(String definition) {
        List<String> keys = new ArrayList<>();
        StudySchema.part("/$defs/" + definition).get("properties").fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    /** Every key that the writer of settings gives is in the schema with that default, and no other is. */
    private static void assertDefaults(String definition, Map<String, Object> settings) {
        JsonNode properties = StudySchema.part("/$defs/" + definition).get("properties");
        JsonNode tree = MAPPER.valueToTree(settings);
        List<String> names = new ArrayList<>();
        properties.fieldNames().forEachRemaining(names::add);
        List<String> written = new ArrayList<>();
        tree.fieldNames().forEachRemaining(written::add);
        assertEquals(names, written, definition);
        for (String name : names) {
            JsonNode property = StudySchema.part("/$defs/" + definition + "/properties/" + name);
            assertEquals(defaultOf(property), tree.get(name).toString(), definition + "." + name);
        }
    }

    private static String defaultOf(JsonNode property) {
        JsonNode stated = property.path("default");
        if (!stated.isMissingNode()) {
            return stated.toString();
        }
        Map<String, Object> members = new LinkedHashMap<>();
        property.get("properties")
                .properties()
                .forEach(entry -> members.put(entry.getKey(), entry.getValue().get("default")));
        return MAPPER.valueToTree(members).toString();
    }

    private static void eachNode(String pointer, JsonNode node, BiConsumer<String, JsonNode> visitor) {
        if (!pointer.endsWith("/properties")) {
            visitor.accept(pointer, node);
        }
        node.properties().forEach(entry -> {
            String child = LocatedJson.child(pointer, entry.getKey());
            if (entry.getValue().isObject()) {
                eachNode(child, entry.getValue(), visitor);
            }
        });
    }
}
