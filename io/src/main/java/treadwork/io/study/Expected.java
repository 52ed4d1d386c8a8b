package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** What the schema allows for a value, in words, with its unit. */
final class Expected {

    /** How the keys of the study file carry their units. */
    private static final Map<String, String> UNITS = Map.ofEntries(
            Map.entry("massKg", "kg"),
            Map.entry("cutoffHz", "Hz"),
            Map.entry("longestGapS", "s"),
            Map.entry("plateDelayS", "s"),
            Map.entry("contactThresholdN", "N"),
            Map.entry("heightM", "m"),
            Map.entry("comM", "m"),
            Map.entry("cornersM", "m"),
            Map.entry("originM", "m"),
            Map.entry("inertiaKgm2", "kg·m²"),
            Map.entry("pointRateHz", "Hz"),
            Map.entry("plateRateHz", "Hz"));

    /** A bound that no one comes near is not worth a word. */
    private static final double FAR = 1e9;

    private Expected() {}

    /** The unit that a key carries; empty for none. */
    static String unitOf(String key) {
        return UNITS.getOrDefault(key, "");
    }

    /** The words that the schema lists, those of a condition too. */
    static List<String> choices(JsonNode schema) {
        List<String> choices = new ArrayList<>();
        for (JsonNode list : List.of(schema.path("enum"), schema.path("then").path("enum"))) {
            list.forEach(choice -> choices.add(choice.asText()));
        }
        return choices;
    }

    static String words(JsonNode schema, String unit) {
        if (schema.has("const")) {
            return schema.get("const").toString();
        }
        List<String> choices = choices(schema);
        if (!choices.isEmpty()) {
            String words = (choices.size() == 1 ? "" : "one of ") + String.join(", ", choices);
            return schema.has("if") ? words + ", or a list" : words;
        }
        return switch (schema.path("type").asText()) {
            case "number" -> "a number" + range(schema, unit);
            case "integer" ->
                (schema.path("multipleOf").asInt() == 2 ? "an even whole number" : "a whole number")
                        + range(schema, unit);
            case "string" -> "a text that is not empty" + longest(schema);
            case "array" -> list(schema, unit);
            case "object" -> "an object { ... }";
            default -> "a path or an object { ... }";
        };
    }

    /** The way out that a default gives, for the end of a sentence; nothing where there is none. */
    static String otherwise(JsonNode schema, String unit) {
        JsonNode standard = schema.path("default");
        boolean plain = standard.isValueNode() && !standard.asText().isEmpty();
        return plain ? ", or take the key out: the default is " + (standard.asText() + " " + unit).strip() : "";
    }

    private static String list(JsonNode schema, String unit) {
        int least = schema.path("minItems").asInt();
        int most = schema.path("maxItems").asInt(Integer.MAX_VALUE);
        String count = least == most ? least + "" : least + " or more";
        JsonNode items = schema.path("items");
        JsonNode item = items.has("$ref")
                ? StudySchema.part(items.get("$ref").textValue().substring(1))
                : items;
        return "a list of " + count + ", each " + words(item, unit);
    }

    private static String longest(JsonNode schema) {
        return schema.has("maxLength") ? " of at most " + schema.get("maxLength") + " characters" : "";
    }

    private static String range(JsonNode schema, String unit) {
        String suffix = unit.isEmpty() ? "" : " " + unit;
        StringBuilder words = new StringBuilder();
        if (schema.has("exclusiveMinimum")) {
            words.append(" above ")
                    .append(plain(schema.get("exclusiveMinimum")))
                    .append(suffix);
        }
        if (schema.has("minimum")) {
            words.append(" of at least ").append(plain(schema.get("minimum"))).append(suffix);
        }
        if (schema.path("maximum").asDouble(FAR) < FAR) {
            words.append(" and at most ").append(plain(schema.get("maximum"))).append(suffix);
        }
        return words.toString();
    }

    private static String plain(JsonNode number) {
        return new BigDecimal(number.asText()).stripTrailingZeros().toPlainString();
    }
}
