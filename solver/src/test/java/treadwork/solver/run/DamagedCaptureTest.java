package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.PlatePlan;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.c3d.ReadOptions;
import treadwork.io.inertia.InertiaTables;
import treadwork.model.capture.Capture;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.Processing;

/** A capture with wrong bytes is either computed or refused with a finding; nothing else comes out of the computation. */
class DamagedCaptureTest {

    private static final int MUTANTS = 500;

    private static final Walk WALK = Walk.of(WalkerSettings.DEFAULT
            .with(Gait.DEFAULT.withDurationS(0.5).withPointRate(100))
            .with(PlatePlan.DEFAULT.withSamplesPerFrame(2)));

    private static final Walked WALKED = Walked.of(WALK, Processing.DEFAULT);

    @Test
    void wrongBytesAreComputedOrRefused() {
        byte[] sound = C3dWriter.bytes(WALK.walking(), C3dEncoding.DEFAULT);
        int computed = 0;
        for (int seed = 0; seed < MUTANTS; seed++) {
            computed += survives(damaged(sound, new Random(seed)), seed) ? 1 : 0;
        }
        assertTrue(computed > MUTANTS / 10, "only " + computed + " were readable at all, so little was tried");
    }

    /** Found by wrong bytes: a gap's longest length in frames, at such a rate, is more than an integer holds. */
    @Test
    void aRateThatNoCameraHasIsRefused() {
        Capture sound = WALK.walking();
        Capture absurd = new Capture(
                sound.name(),
                sound.firstFrame(),
                sound.frames(),
                1e30,
                sound.points(),
                sound.samplesPerFrame(),
                sound.analog(),
                sound.plates(),
                sound.plateZero(),
                sound.events(),
                sound.pointUnit(),
                sound.storage(),
                sound.findings());
        byte[] bytes = C3dWriter.bytes(absurd, C3dEncoding.DEFAULT);

        UnusableInputException refusal =
                assertThrows(UnusableInputException.class, () -> C3dReader.read("absurd", bytes, ReadOptions.DEFAULT));

        assertEquals("capture-rate", refusal.finding().code());
    }

    private static boolean survives(byte[] bytes, int seed) {
        try {
            Capture movement = C3dReader.read("damaged", bytes, ReadOptions.DEFAULT);
            TrialComputation.compute(new TrialInput(
                    WALK.standing(),
                    movement,
                    WALKED.subject(),
                    WALKED.trial(),
                    InertiaTables.load(InertiaTable.DE_LEVA_1996)));
            return true;
        } catch (UnusableInputException refused) {
            return false;
        } catch (RuntimeException fault) {
            throw new AssertionError("seed " + seed + " brings the computation down", fault);
        }
    }

    /** One to eight wrong bytes, most of them in header and parameters. */
    private static byte[] damaged(byte[] sound, Random random) {
        byte[] bytes = sound.clone();
        int wrong = 1 + random.nextInt(8);
        for (int k = 0; k < wrong; k++) {
            int end = random.nextInt(3) == 0 ? bytes.length : Math.min(bytes.length, 6144);
            bytes[random.nextInt(end)] = (byte) random.nextInt(256);
        }
        return bytes;
    }
}
