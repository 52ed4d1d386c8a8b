package treadwork.io.study;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.Deque;
import treadwork.model.finding.UnusableInputException;

/**
 * A JSON text as a tree, with the place of every key and value.
 *
 * <p>Comments are taken; a key that stands twice in an object, text after the document and numbers beyond the range of a
 * double are refused. Depth, number and length of values are bounded, so that memory stays in proportion to the file.
 */
final class LocatedJson {

    /** A study of ten thousand trials has some 100 000 values. */
    private static final int MOST_VALUES = 500_000;

    /** No study is deeper than twelve; names and texts are those that people write. */
    private static final StreamReadConstraints BOUNDS = StreamReadConstraints.builder()
            .maxNestingDepth(50)
            .maxNameLength(500)
            .maxStringLength(10_000)
            .build();

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(JsonReadFeature.ALLOW_JAVA_COMMENTS)
            .streamReadConstraints(BOUNDS)
            .build();
    private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

    private final String file;
    private final Deque<String> path = new ArrayDeque<>();
    private final Spot spots;
    private final JsonNode root;
    private int values;

    private LocatedJson(String file, String text) throws IOException {
        this.file = file;
        try (JsonParser parser = FACTORY.createParser(text)) {
            if (parser.nextToken() == null) {
                throw new Place(file, 1, 1, "")
                        .unusable(
                                "study-not-json",
                                "the file is empty",
                                "There is nothing to read",
                                "Begin with the example in the guide, or with treadwork draft");
            }
            spots = Spot.at(parser.currentTokenLocation());
            root = value(parser, spots);
            if (parser.nextToken() != null) {
                throw notJson(here(parser.currentTokenLocation()), "text follows after the end of the document");
            }
        }
    }

    /**
     * @param file as the person named it, for messages
     * @throws UnusableInputException with code {@code study-not-json}, {@code study-key-twice} or {@code study-value}
     */
    static LocatedJson parse(String file, byte[] bytes) {
        try {
            String text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
            boolean marked = text.startsWith("\uFEFF");
            return new LocatedJson(file, marked ? text.substring(1) : text);
        } catch (CharacterCodingException e) {
            throw new Place(file, 1, 1, "")
                    .unusable(
                            "study-not-json",
                            "the file is not UTF-8 text",
                            "A study file is text, and its letters must be told from one another",
                            "Save it as UTF-8, or name the study file if this is another");
        } catch (JsonProcessingException e) {
            JsonLocation spot = e.getLocation() == null ? JsonLocation.NA : e.getLocation();
            throw notJson(new Place(file, spot.getLineNr(), spot.getColumnNr(), ""), words(e));
        } catch (IOException e) {
            throw new UncheckedIOException("reading from memory", e);
        }
    }

    JsonNode root() {
        return root;
    }

    /** The node at a JSON pointer; a missing node where there is none. */
    JsonNode node(String pointer) {
        return root.at(pointer);
    }

    /** The place of a value (of its key, in an object); of the nearest thing around it where it does not stand. */
    Place at(String pointer) {
        JsonLocation spot = spots.nearest(pointer).at();
        return new Place(file, spot.getLineNr(), spot.getColumnNr(), Place.pathOf(pointer));
    }

    static String child(String pointer, String key) {
        return pointer + "/" + key.replace("~", "~0").replace("/", "~1");
    }

    private JsonNode value(JsonParser parser, Spot spot) throws IOException {
        values++;
        if (values > MOST_VALUES) {
            throw here(spot.at())
                    .unusable(
                            "study-not-json",
                            "here begins value " + values + ", read are at most " + MOST_VALUES,
                            "No study has that many",
                            "Name the study file, or split the study");
        }
        return switch (parser.currentToken()) {
            case START_OBJECT -> object(parser, spot);
            case START_ARRAY -> array(parser, spot);
            case VALUE_STRING -> NODES.textNode(parser.getText());
            case VALUE_NUMBER_INT -> integer(parser);
            case VALUE_NUMBER_FLOAT -> real(parser, spot);
            case VALUE_TRUE -> NODES.booleanNode(true);
            case VALUE_FALSE -> NODES.booleanNode(false);
            default -> NODES.nullNode();
        };
    }

    private ObjectNode object(JsonParser parser, Spot spot) throws IOException {
        ObjectNode object = NODES.objectNode();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String key = parser.currentName();
            Spot member = Spot.at(parser.currentTokenLocation());
            Spot earlier = spot.inside().put(key, member);
            path.addLast(key);
            if (earlier != null) {
                throw here(member.at())
                        .unusable(
                                "study-key-twice",
                                "the key \"" + key + "\" stands here and in line "
                                        + earlier.at().getLineNr(),
                                "Which of the two holds would be chance",
                                "Take one of them out");
            }
            parser.nextToken();
            object.set(key, value(parser, member));
            path.removeLast();
        }
        return object;
    }

    private ArrayNode array(JsonParser parser, Spot spot) throws IOException {
        ArrayNode array = NODES.arrayNode();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            String index = String.valueOf(array.size());
            Spot element = Spot.at(parser.currentTokenLocation());
            spot.inside().put(index, element);
            path.addLast(index);
            array.add(value(parser, element));
            path.removeLast();
        }
        return array;
    }

    private static JsonNode integer(JsonParser parser) throws IOException {
        return parser.getNumberType() == JsonParser.NumberType.BIG_INTEGER
                ? NODES.numberNode(parser.getBigIntegerValue())
                : NODES.numberNode(parser.getLongValue());
    }

    private JsonNode real(JsonParser parser, Spot spot) throws IOException {
        double value = parser.getDoubleValue();
        if (!Double.isFinite(value)) {
            throw here(spot.at())
                    .unusable(
                            "study-value",
                            "the number " + parser.getText() + " is too large to be held",
                            "No quantity of a study is that large",
                            "Give the value in the unit that its key ends in");
        }
        return NODES.numberNode(value);
    }

    private Place here(JsonLocation spot) {
        StringBuilder pointer = new StringBuilder();
        path.forEach(token -> pointer.append(child("", token)));
        return new Place(file, spot.getLineNr(), spot.getColumnNr(), Place.pathOf(pointer.toString()));
    }

    private static String words(JsonProcessingException fault) {
        if (fault instanceof JsonEOFException) {
            return "the file ends before the document does";
        }
        String first = fault.getOriginalMessage().lines().findFirst().orElse("not JSON");
        return first.replaceAll("[(,] *from `[^`]*`\\)?", "").strip();
    }

    private static UnusableInputException notJson(Place place, String what) {
        return place.unusable(
                "study-not-json",
                what,
                "From here on the text is not a study",
                "Look for a comma, quote or bracket too many or too few, here or just before");
    }
}
