package treadwork.solver.run;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** Which version of the program this is, as the build wrote it down. */
public final class ProgramVersion {

    public static final String TEXT = read();

    private ProgramVersion() {}

    private static String read() {
        Properties properties = new Properties();
        try (InputStream stream = ProgramVersion.class.getResourceAsStream("version.properties")) {
            properties.load(stream);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
        return properties.getProperty("version");
    }
}
