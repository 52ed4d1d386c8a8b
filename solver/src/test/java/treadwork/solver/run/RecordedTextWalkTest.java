package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.fixtures.published.SharedData;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.inertia.InertiaTables;
import treadwork.io.study.StudyDocument;
import treadwork.io.study.StudyReader;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.finding.Severity;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.JointLoads;
import treadwork.model.load.TrialResult;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/**
 * An open recording as tab-separated text, plates in lab axes, with nothing but a study file. Mass, sex and height of the
 * adult are not recorded. The medial markers stay on, so one frame of the walk serves as standing capture.
 */
class RecordedTextWalkTest {

    private static final double MASS = 71.5;

    /** The frame after which both feet are on the ground, by the description of the recording. */
    private static final int BOTH_FEET = 95;

    @TempDir
    static Path folder;

    private static TrialResult result;

    @BeforeAll
    static void computeFromTheStudyFileAlone() throws IOException {
        Optional<Path> recording = SharedData.find("data/walk-text-b");
        Assumptions.assumeTrue(recording.isPresent(), "skipped: the walk as text is not there");
        for (String name : List.of("walk2_markers.tsv", "walk2_forces.tsv")) {
            Files.copy(recording.orElseThrow().resolve(name), folder.resolve(name));
        }
        writeStanding(Files.readAllLines(folder.resolve("walk2_markers.tsv")));
        try (InputStream study = RecordedTextWalkTest.class.getResourceAsStream("text-walk/study.json")) {
            Files.copy(study, folder.resolve("study.json"));
        }
        StudyDocument document = StudyReader.read(folder.resolve("study.json"));
        Subject subject = document.study().subjects().get(0);
        Trial trial = subject.trials().get(0);
        result = TrialComputation.compute(new TrialInput(
                        CaptureFiles.standing(document.pathOf(subject.staticFile()), trial.lab()),
                        CaptureFiles.movement(
                                document.pathOf(trial.file()), trial.plateFile().map(document::pathOf), trial.lab()),
                        subject,
                        trial,
                        InertiaTables.load(trial.body().inertia())))
                .result();
    }

    private static void writeStanding(List<String> walk) throws IOException {
        String frame = walk.get(BOTH_FEET);
        String markers = frame.substring(frame.indexOf('\t', frame.indexOf('\t') + 1));
        StringBuilder text = new StringBuilder(walk.get(0)).append('\n');
        for (int i = 0; i < 30; i++) {
            text.append(i + 1).append('\t').append(i / 150.0).append(markers).append('\n');
        }
        Files.writeString(folder.resolve("standing.tsv"), text);
    }

    /** Plates and times by the description of the recording, to its hundredth of a second and one frame. */
    @Test
    void findsWhichFootIsOnWhichPlateAndWhen() {
        assertContact(0, 4, Side.RIGHT, 0.05, 0.66);
        assertContact(1, 3, Side.LEFT, 0.58, 1.19);
        assertContact(2, 1, Side.RIGHT, 1.08, 1.66);
    }

    /** The description says that part of that plate's signal is missing; nothing is computed from it. */
    @Test
    void theFaultyPlateIsGivenToNeitherFootAndSaid() {
        assertEquals(3, result.contacts().size());
        assertTrue(
                result.findings().stream()
                        .anyMatch(finding -> finding.severity() == Severity.WARNING
                                && finding.where().contains("plate 2, frames 238 to 251")),
                result.findings().toString());
    }

    /**
     * Ranges of healthy adults from memory of the literature, two standard deviations wide (knee abductors: PLoS ONE
     * 12:e0179260, 2017, three); that of the knee extensors begins lower than at a chosen speed, since this walk goes at
     * 1.15 m/s (0.6 m from plate to plate in 0.52 s) and their moment falls with speed.
     */
    @Test
    void momentsLieInTheRangesOfHealthyWalking() {
        for (Side side : Side.values()) {
            assertBetween(1.1, 1.9, greatest(side, JointKind.ANKLE, 0), "plantarflexor " + side);
            assertBetween(0.15, 1.1, greatest(side, JointKind.KNEE, 0), "knee extensor " + side);
            assertBetween(0.4, 1.4, greatest(side, JointKind.HIP, 0), "hip extensor " + side);
            assertBetween(0.6, 1.3, greatest(side, JointKind.HIP, 1), "hip abductor " + side);
            assertBetween(0.45 - 3 * 0.13, 0.45 + 3 * 0.13, greatest(side, JointKind.KNEE, 1), "knee abductor " + side);
        }
    }

    private static void assertBetween(double least, double most, double value, String what) {
        assertTrue(value >= least && value <= most, what + " is " + value + ", expected " + least + " to " + most);
    }

    private static void assertContact(int place, int plate, Side foot, double from, double to) {
        ContactSeries found = result.contacts().get(place);
        double offset = (found.contact().frames().first() - 1) / 150.0;
        double end = (found.contact().frames().last() - 1) / 150.0;
        assertEquals(plate, found.contact().plate());
        assertEquals(foot, found.contact().foot());
        assertEquals(from, offset, 0.02);
        assertEquals(to, end, 0.02);
    }

    /** The greatest moment against the named direction about axis {@code k}, N·m/kg. */
    private static double greatest(Side side, JointKind kind, int k) {
        JointLoads joint = Loads.of(result, new Joint(side, kind));
        double greatest = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < result.frames(); i++) {
            double moment = k == 0 ? joint.moment().x(i) : joint.moment().y(i);
            greatest = -moment / MASS > greatest ? -moment / MASS : greatest;
        }
        return greatest;
    }
}
