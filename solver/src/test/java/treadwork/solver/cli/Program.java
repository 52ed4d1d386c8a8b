package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** One run of the program as its user sees it. */
record Program(int exitCode, String out, String err) {

    static Program run(Object... arguments) {
        String[] words = new String[arguments.length];
        for (int i = 0; i < words.length; i++) {
            words[i] = arguments[i].toString();
        }
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int exitCode = Treadwork.run(
                words,
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8));
        return new Program(exitCode, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    List<String> errLines() {
        return err.lines().toList();
    }

    /** Exit code 2, one line that holds all {@code words}, no stack trace. */
    void assertRefused(String... words) {
        assertEquals(ExitCode.UNUSABLE, exitCode, err);
        assertEquals(1, errLines().size(), err);
        assertTrue(!err.contains("\tat "), "a stack trace: " + err);
        for (String word : words) {
            assertTrue(err.contains(word), "\"" + word + "\" is not in: " + err);
        }
    }
}
