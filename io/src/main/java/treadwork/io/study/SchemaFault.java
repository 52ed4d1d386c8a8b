package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.Error;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.UnusableInputException;

/**
 * One breach of the schema, in the words of the trade: the validator's own messages follow the machine's language and
 * name neither unit nor neighbour.
 */
final class SchemaFault {

    private final LocatedJson document;
    private final Error error;
    private final String pointer;
    private final String schemaPointer;

    SchemaFault(LocatedJson document, Error error) {
        this.document = document;
        this.error = error;
        String at = error.getInstanceLocation().toString();
        this.pointer = keyword().equals("additionalProperties") ? LocatedJson.child(at, error.getProperty()) : at;
        String keywordPointer = error.getSchemaLocation().getFragment().toString();
        this.schemaPointer =
                keywordPointer.substring(0, keywordPointer.lastIndexOf('/')).replaceFirst("/then$", "");
    }

    Place place() {
        return document.at(pointer);
    }

    boolean isMissingKey() {
        return keyword().equals("required");
    }

    UnusableInputException exception() {
        return switch (keyword()) {
            case "additionalProperties" -> unknownKey();
            case "required" -> missingKey();
            case "minItems" -> isPartOf("cluster") ? smallCluster() : badValue("study-value");
            case "uniqueItems" -> isPartOf("cluster") ? labelTwice() : badValue("study-value");
            case "const" -> badValue("study-version");
            case "exclusiveMinimum" ->
                badValue(schemaPointer.equals("/$defs/subject/properties/massKg") ? "mass-zero" : "study-value");
            default -> badValue("study-value");
        };
    }

    private String keyword() {
        return error.getKeyword();
    }

    private boolean isPartOf(String definition) {
        return schemaPointer.startsWith("/$defs/" + definition);
    }

    private UnusableInputException unknownKey() {
        List<String> known = new ArrayList<>();
        StudySchema.part(schemaPointer).get("properties").fieldNames().forEachRemaining(known::add);
        String key = error.getProperty();
        String thing = isPartOf("landmarks") ? "landmark" : isPartOf("clusters") ? "segment" : "key";
        String code = thing.equals("key") ? "study-key-unknown" : "marker-set-" + thing;
        String mend = NearestName.of(key, known)
                .map(best -> "Write \"" + best + "\", or take it out")
                .orElse("Known here are " + String.join(", ", known));
        return place().unusable(
                        code,
                        "\"" + key + "\" is no " + thing + " known here" + NearestName.hint(key, known),
                        "A name that is not known would be left out of the computation unnoticed",
                        mend);
    }

    private UnusableInputException missingKey() {
        String key = error.getProperty();
        JsonNode wanted = StudySchema.part(schemaPointer + "/properties/" + key);
        return place().unusable(
                        "study-key-missing",
                        "the key \"" + key + "\" is missing here",
                        description(wanted),
                        "Add \"" + key + "\": " + Expected.words(wanted, Expected.unitOf(key)));
    }

    private UnusableInputException smallCluster() {
        return place().unusable(
                        "marker-set-cluster-small",
                        "the cluster has " + error.getInstanceNode().size() + " labels, needed are 3 or more",
                        "Fewer than three markers do not fix where a segment is and how it is turned",
                        "Add the labels of further markers on this segment, or take the segment out");
    }

    private UnusableInputException labelTwice() {
        return place().unusable(
                        "marker-set-label-twice",
                        "a label stands twice in " + shown(error.getInstanceNode()),
                        "One marker counted twice would pull the segment towards it",
                        "Take one of the two out");
    }

    private UnusableInputException badValue(String code) {
        JsonNode schema = StudySchema.part(described());
        String unit = Expected.unitOf(lastKey());
        JsonNode value = error.getInstanceNode();
        List<String> choices = Expected.choices(StudySchema.part(schemaPointer));
        Optional<String> near = value.isTextual() ? NearestName.of(value.textValue(), choices) : Optional.empty();
        String mend = near.map(word -> "Write \"" + word + "\"").orElse("Give such a value");
        return place().unusable(
                        code,
                        "the value is " + shown(value) + ", expected is "
                                + Expected.words(StudySchema.part(schemaPointer), unit)
                                + near.map(word -> ", nearest is \"" + word + "\"")
                                        .orElse(""),
                        description(schema),
                        mend + Expected.otherwise(schema, unit));
    }

    /** The part of the schema that speaks of the value: conditions and items have no description of their own. */
    private String described() {
        String part = schemaPointer;
        while (!StudySchema.part(part).has("description")) {
            part = part.substring(0, part.lastIndexOf('/'));
        }
        return part;
    }

    private String lastKey() {
        String[] tokens = pointer.split("/", -1);
        for (int i = tokens.length - 1; i >= 0; i--) {
            if (!tokens[i].isEmpty() && !Character.isDigit(tokens[i].charAt(0))) {
                return tokens[i];
            }
        }
        return "";
    }

    /** What the schema says of the value, its first sentence. */
    private static String description(JsonNode schema) {
        String text = schema.path("description").asText("This part of the study file is needed");
        int end = text.indexOf(". ");
        String first = end < 0 ? text : text.substring(0, end);
        return first.endsWith(".") ? first.substring(0, first.length() - 1) : first;
    }

    private static String shown(JsonNode value) {
        String text = value.toString();
        return text.length() <= 60 ? text : text.substring(0, 57) + "...";
    }
}
