package treadwork.io.study;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The JSON Schema (draft 2020-12) of the study file. */
public final class StudySchema {

    private static final String TEXT = resource();
    private static final JsonNode TREE = tree();
    private static final SchemaRegistry REGISTRY =
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    private static final Schema STUDY = REGISTRY.getSchema(TREE);
    private static final Schema MARKER_SET = REGISTRY.getSchema(markerSetFile());

    private StudySchema() {}

    /** The schema as it ships. */
    public static String text() {
        return TEXT;
    }

    static List<Error> studyErrors(JsonNode document) {
        return STUDY.validate(document);
    }

    static List<Error> markerSetErrors(JsonNode document) {
        return MARKER_SET.validate(document);
    }

    /** The part of the schema at a JSON pointer, references followed. */
    static JsonNode part(String pointer) {
        JsonNode part = TREE.at(pointer);
        return part.has("$ref") ? part(part.get("$ref").textValue().substring(1)) : part;
    }

    private static String resource() {
        try (InputStream stream = StudySchema.class.getResourceAsStream("study.schema.json")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own study schema", e);
        }
    }

    private static JsonNode tree() {
        try {
            return new ObjectMapper().readTree(TEXT);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("the program's own study schema is not JSON", e);
        }
    }

    private static JsonNode markerSetFile() {
        ObjectNode schema = new ObjectMapper().createObjectNode();
        schema.put("$id", TREE.get("$id").textValue() + ":marker-set");
        schema.put("$ref", "#/$defs/markerSetFile");
        schema.set("$defs", TREE.get("$defs"));
        return schema;
    }
}
