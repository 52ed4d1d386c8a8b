package treadwork.io.file;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.ObjectWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** JSON that a person likes to read: two blanks a level, a key a line, lists of numbers on one line, keys in their order. */
public final class JsonText {

    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final ObjectWriter WRITER = MAPPER.writer(printer());

    private JsonText() {}

    /**
     * The text of a tree of maps, lists, texts, numbers, truth values and {@code null}, with a line end at its end.
     *
     * @throws IllegalArgumentException if the tree holds anything else that JSON cannot say
     */
    public static String of(Map<String, Object> tree) {
        try {
            return WRITER.writeValueAsString(tree) + "\n";
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException("the tree holds what JSON cannot say", e);
        }
    }

    /**
     * JSON that the program itself has made, as a person likes to read it.
     *
     * @throws IllegalArgumentException if the text is no JSON
     */
    public static String of(String json) {
        try {
            return WRITER.writeValueAsString(MAPPER.readTree(json)) + "\n";
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException("no JSON: " + json, e);
        }
    }

    /**
     * What {@link #of(Map)} takes as part of a tree, from JSON that the program itself has made.
     *
     * @throws IllegalArgumentException if the text is no JSON
     */
    public static Object parse(String json) {
        try {
            return MAPPER.readTree(json);
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException("no JSON: " + json, e);
        }
    }

    /** A number of a tree: {@code null} for one that is not known, whole ones as a person writes them, without {@code .0}. */
    public static Number number(double value) {
        if (!Double.isFinite(value)) {
            return null;
        }
        boolean whole = value == Math.rint(value) && Math.abs(value) < 1e15;
        return whole ? (Number) (long) value : (Number) value;
    }

    /** A list of such numbers. */
    public static List<Number> numbers(double... values) {
        List<Number> list = new ArrayList<>();
        for (double value : values) {
            list.add(number(value));
        }
        return list;
    }

    private static DefaultPrettyPrinter printer() {
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter(
                Separators.createDefaultInstance().withObjectFieldValueSpacing(Separators.Spacing.AFTER));
        printer.indentObjectsWith(new DefaultIndenter("  ", "\n"));
        return printer;
    }
}
