package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;

class FaultsTest {

    private final StringWriter err = new StringWriter();
    private final CommandLine command = new CommandLine(new Treadwork()).setErr(new PrintWriter(err));

    @Test
    void aFaultOfTheProgramNamesItsLogAndShowsNoTrace() throws IOException {
        int exitCode = Faults.ofExecution(new IllegalStateException("a wheel came off"), command, false);

        assertEquals(ExitCode.FAULT, exitCode);
        assertTrue(err.toString().contains("a wheel came off"), err.toString());
        assertFalse(err.toString().contains("\tat "), err.toString());
        Matcher named = Pattern.compile("The log is (\\S+\\.log)\\.").matcher(err.toString());
        assertTrue(named.find(), err.toString());
        Path log = Path.of(named.group(1));
        assertTrue(Files.readString(log).contains("\tat "), "the log holds the trace");
        Files.delete(log);
    }

    @Test
    void theTraceIsShownWhereItIsAskedFor() throws IOException {
        Faults.ofExecution(new IllegalStateException("a wheel came off"), command, true);

        assertTrue(err.toString().contains("\tat "), err.toString());
        Matcher named = Pattern.compile("The log is (\\S+\\.log)\\.").matcher(err.toString());
        assertTrue(named.find(), err.toString());
        Files.delete(Path.of(named.group(1)));
    }
}
