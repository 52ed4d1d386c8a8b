package treadwork.io.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import treadwork.model.capture.Capture;
import treadwork.model.study.LabSettings;

/** Open recordings that were published as text. */
class RecordedTextTest {

    @Test
    void aWalkOverSevenPlatesIsReadFromTwoFiles() {
        Capture capture = TextReader.read(
                TextFile.of(recording("walk2_markers.tsv")),
                Optional.of(TextFile.of(recording("walk2_forces.tsv"))),
                LabSettings.DEFAULT);

        // counts and rates as the recording's own description states them
        assertEquals(251, capture.frames());
        assertEquals(28, capture.points().size());
        assertEquals(150, capture.pointRate());
        assertEquals(450, capture.analogRate());
        assertEquals(49, capture.analog().size());
        assertEquals(777, peak(capture, "FY6"), 0.5);
        assertEquals(771, peak(capture, "FY5"), 0.5);
        assertEquals(775, peak(capture, "FY3"), 0.5);
    }

    @Test
    void aLegWithItsForcesIsReadFromOneFile() {
        Capture capture =
                TextReader.read(TextFile.of(recording("gait_one_leg_d.txt")), Optional.empty(), LabSettings.DEFAULT);

        assertEquals(159, capture.frames());
        assertEquals(150, capture.pointRate());
        assertEquals(10, capture.points().size());
        assertEquals(7, capture.analog().size());
        assertEquals(737, peak(capture, "Fy"), 0.5);
        // the file's first row
        assertEquals(0.77961652, capture.points().get(0).positions().y(0), 1e-12);
    }

    private static double peak(Capture capture, String label) {
        double peak = 0;
        for (double value : capture.analog().stream()
                .filter(channel -> channel.label().equals(label))
                .findFirst()
                .orElseThrow()
                .values()
                .toArray()) {
            peak = Math.max(peak, value);
        }
        return peak;
    }

    private static Path recording(String name) {
        Path folder = Path.of(System.getProperty("shared", "../shared"), "data", "walk-text-b");
        assumeTrue(Files.isDirectory(folder), "the shared recordings are not here: " + folder);
        return folder.resolve(name);
    }
}
