package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The command {@code inspect} on delimited text. */
class InspectTextTest {

    @TempDir
    Path folder;

    @Test
    void inspectShowsATextCapture() throws IOException {
        Path file = Files.writeString(
                folder.resolve("walk.txt"), "time;A_x;A_y;A_z\n0;1000,5;2;3\n0,01;1001;2;3\n0,02;1002;2;3\n");

        Program run = Program.run("inspect", file);

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        assertTrue(run.out().contains("text, semicolon, decimal comma"), run.out());
    }

    @Test
    void inspectSaysWhereATextIsRagged() throws IOException {
        Path file = Files.writeString(
                folder.resolve("walk.txt"), "time,A_x,A_y,A_z\n0,1000,2,3\n0.01,1001,2,3\n0.02,1002\n");

        Program run = Program.run("inspect", file);

        run.assertRefused("walk.txt, line 4", "the row has 2 cells");
    }
}
