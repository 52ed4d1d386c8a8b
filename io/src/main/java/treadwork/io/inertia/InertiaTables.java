package treadwork.io.inertia;

import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import treadwork.model.body.InertiaSource;
import treadwork.model.study.InertiaTable;

/** Reads the inertia tables that ship with the program. */
public final class InertiaTables {

    private static final ObjectMapper STRICT = JsonMapper.builder()
            .enable(
                    DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES,
                    DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
            .build();

    private InertiaTables() {}

    /** The thigh, shank and foot of a table, in its own axes and between its own ends. */
    public static InertiaSource load(InertiaTable table) {
        String file = table.key() + ".json";
        try (InputStream in = InertiaTables.class.getResourceAsStream(file)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks its own file " + file);
            }
            return STRICT.readValue(in, TableFile.class).source();
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own file " + file, e);
        }
    }
}
