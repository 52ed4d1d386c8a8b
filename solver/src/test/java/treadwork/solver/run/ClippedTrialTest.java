package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import treadwork.fixtures.fault.PlateFaults;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.load.Support;
import treadwork.model.load.TrialResult;
import treadwork.model.study.Processing;

/** What becomes of a trial when the second plate's vertical force is clipped at 0.9 of its peak. */
class ClippedTrialTest {

    private static final int VERTICAL_OF_PLATE_2 = 8;

    /** One time constant of 6 Hz, 0.027 s, at 200 Hz, rounded up; the clipped samples of a frame may begin after its own. */
    private static final int REACH = 7;

    private final Walk walk = Walk.of(WalkerSettings.DEFAULT);
    private final Capture clipped =
            PlateFaults.clipped(walk.walking(), VERTICAL_OF_PLATE_2, 0.9 * peak(walk.walking()));
    private final TrialResult whole =
            Walked.of(walk, Processing.DEFAULT).computed().result();
    private final TrialResult result =
            Walked.of(withWalking(clipped), Processing.DEFAULT).computed().result();

    private Walk withWalking(Capture other) {
        return new Walk(walk.standing(), other, walk.markerSet(), walk.massKg(), walk.body(), walk.exact());
    }

    @Test
    void callsTheFootUnmeasuredWhereThePlateIsClippedAndNowhereElse() {
        Side foot = result.contacts().stream()
                .filter(contact -> contact.contact().plate() == 2)
                .findFirst()
                .orElseThrow()
                .contact()
                .foot();
        int blanked = 0;
        for (int i = 0; i < result.frames(); i++) {
            boolean atRail = isClippedNear(i, 0);
            boolean nearRail = isClippedNear(i, REACH);
            Support before = whole.support().get(foot).get(i);
            Support now = result.support().get(foot).get(i);
            if (atRail) {
                assertEquals(Support.UNMEASURED, now, "frame " + i);
                blanked++;
            } else if (!nearRail) {
                assertEquals(before, now, "frame " + i);
            }
        }
        assertTrue(blanked > 5, blanked + " frames at the rail");
    }

    @Test
    void keepsTheContactWhole() {
        assertEquals(contacts(whole), contacts(result));
    }

    @Test
    void reportsIt() {
        List<String> codes = result.findings().stream()
                .map(finding -> finding.code())
                .filter(code -> code.equals("plate-clipped"))
                .toList();

        assertEquals(List.of("plate-clipped"), codes);
    }

    private static List<String> contacts(TrialResult of) {
        return of.contacts().stream()
                .map(series -> series.contact())
                .map(contact -> contact.plate() + " " + contact.foot() + " " + contact.frames())
                .toList();
    }

    private boolean isClippedNear(int frame, int reach) {
        double[] recorded =
                walk.walking().analog().get(VERTICAL_OF_PLATE_2).values().toArray();
        double[] shown = clipped.analog().get(VERTICAL_OF_PLATE_2).values().toArray();
        int perFrame = clipped.samplesPerFrame();
        int from = Math.max(0, (frame - reach) * perFrame);
        int to = Math.min(recorded.length - 1, (frame + reach) * perFrame);
        return !Arrays.equals(recorded, from, to + 1, shown, from, to + 1);
    }

    private static double peak(Capture capture) {
        return Arrays.stream(capture.analog().get(VERTICAL_OF_PLATE_2).values().toArray())
                .map(Math::abs)
                .max()
                .orElseThrow();
    }
}
