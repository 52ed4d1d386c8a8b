package treadwork.solver.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.fixtures.rod.ProvedPlate;
import treadwork.fixtures.rod.RodPress;
import treadwork.fixtures.rod.WeightsCapture;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dWriter;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Vector3;

/** The proofs of plates as their user sees them; files are single precision. */
class PlatesCommandTest {

    private static final ProvedPlate PLATE = ProvedPlate.of(PlateType.FORCE_AND_MOMENT)
            .withMoved(new Vector3(0.012, -0.019, 0.007))
            .withTurned(new Vector3(0, 0, Math.toRadians(2)));

    @TempDir
    Path folder;

    @Test
    void printsWhereThePlateStandsWithItsEntryForTheStudyFile() throws IOException {
        Path file = written("rod.c3d", RodPress.of(PLATE).capture());

        Program run = Program.run("plates", "rod", file, "--markers", "ROD1,ROD2,ROD3");

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        assertTrue(run.out().contains("its tip is 80.0 mm before the first marker"), run.out());
        assertTrue(run.out().contains("12.0 ± 0.0  -19.0 ± 0.0    7.0 ± 0.0"), run.out());
        assertTrue(run.out().contains("0.00 ± 0.00  0.00 ± 0.00  2.00 ± 0.00"), run.out());
        assertTrue(run.out().contains("\"lab\": { \"plates\": [{ \"type\": 2, \"cornersM\": [["), run.out());
        assertTrue(run.out().contains("This is a proposal."), run.out());
        assertTrue(run.out().lines().count() < 25, "one screen: " + run.out());
    }

    @Test
    void printsTheRodTestAsJson() throws IOException {
        Path file = written("rod.c3d", RodPress.of(PLATE).capture());

        Program run = Program.run("plates", "rod", file, "--markers", "ROD1,ROD3", "--tip-mm", 80, "--json");

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        assertTrue(run.out().startsWith("{") && run.out().contains("\"movedMm\""), run.out());
        assertTrue(run.out().contains("\"cornersM\""), run.out());
    }

    @Test
    void printsTheGainOfAPlate() throws IOException {
        List<WeightsCapture.Mass> masses =
                List.of(new WeightsCapture.Mass(20, 0.1, 0.05), new WeightsCapture.Mass(10, 0, 0));
        Path file = written(
                "weights.c3d", new WeightsCapture(ProvedPlate.of(PlateType.FOUR_SENSORS), masses, 1.02, 1).capture());

        Program run = Program.run("plates", "weights", file, "--masses", "20,10", "--at", "100,50", "--at", "0,0");

        assertEquals(ExitCode.DONE, run.exitCode(), run.err());
        assertTrue(run.out().contains("Gain 1.0200: the plate does not pass"), run.out());
        assertTrue(run.out().contains("196.20"), run.out());
    }

    @Test
    void refusesARodOfOneMarker() throws IOException {
        Path file = written("rod.c3d", RodPress.of(PLATE).capture());

        Program run = Program.run("plates", "rod", file, "--markers", "ROD1");

        assertEquals(ExitCode.UNUSABLE, run.exitCode());
        assertTrue(run.errLines().get(0).contains("two markers or more, not 1"), run.err());
    }

    @Test
    void refusesMassesThatWereNotFound() throws IOException {
        Path file = written("rod.c3d", RodPress.of(PLATE).capture());

        Program.run("plates", "weights", file, "--masses", "5,5,5").assertRefused("3 masses are stated", "plate 1");
    }

    @Test
    void refusesAPlaceThatIsNoPlace() throws IOException {
        Path file = written("rod.c3d", RodPress.of(PLATE).capture());

        Program run = Program.run("plates", "weights", file, "--masses", "5", "--at", "here");

        assertEquals(ExitCode.UNUSABLE, run.exitCode());
        assertTrue(run.errLines().get(0).contains("X,Y in mm"), run.err());
    }

    @Test
    void asksWhichProofIsMeant() {
        Program run = Program.run("plates");

        assertEquals(ExitCode.UNUSABLE, run.exitCode());
        assertTrue(run.errLines().get(0).contains("plates rod"), run.err());
    }

    private Path written(String name, Capture capture) throws IOException {
        Path file = folder.resolve(name);
        C3dWriter.write(capture, C3dEncoding.DEFAULT, file);
        return file;
    }
}
