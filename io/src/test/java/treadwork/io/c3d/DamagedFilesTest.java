package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.time.Duration;
import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.UnusableInputException;

/** Damage anywhere gives a capture or a refusal: no other failure, no waiting, no memory beyond the file's size. */
class DamagedFilesTest {

    /** Five times what 20 000 readings take on a slow machine; an endless loop takes longer. */
    private static final Duration SOON = Duration.ofSeconds(60);

    @ParameterizedTest
    @EnumSource(Processor.class)
    void aFileCutAtAnyBlockOrByteIsReadOrRefused(Processor processor) {
        byte[] whole = whole(new C3dEncoding(processor, C3dEncoding.Storage.REAL, false));
        int data = dataStart(whole, processor);
        SplittableRandom random = new SplittableRandom(512);

        assertTimeout(SOON, () -> {
            for (int length = 0; length < whole.length; length += 1 + random.nextInt(40)) {
                assertCut(Arrays.copyOf(whole, length), data);
                assertCut(Arrays.copyOf(whole, length / 512 * 512), data);
            }
        });
    }

    /** Frames of 5 points and 26 × 3 analog values, reals: 392 bytes each; 40 of them. */
    private static void assertCut(byte[] file, int data) {
        int held = Math.max(0, file.length - data) / 392;
        if (held == 0) {
            assertTrue(!outcome(file).equals("read"), "a file of " + file.length + " bytes is read");
            return;
        }
        Capture capture = C3dReader.read("cut.c3d", file, ReadOptions.DEFAULT);
        assertEquals(Math.min(held, 40), capture.frames());
        if (held < 40) {
            assertEquals(
                    "40 frames are stated, the file holds " + held,
                    Shared.finding(capture, "frames-missing").figure());
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void aFileWithRandomBytesIsReadOrRefused(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        C3dEncoding[] encodings = RoundTripTest.encodings().toArray(C3dEncoding[]::new);
        byte[][] wholes = Arrays.stream(encodings).map(DamagedFilesTest::whole).toArray(byte[][]::new);

        assertTimeout(SOON, () -> {
            int read = 0;
            for (int i = 0; i < 5_000; i++) {
                byte[] file = wholes[i % wholes.length].clone();
                // Most of the damage goes where the sizes stand.
                int reach = i % 3 == 0 ? 24 : i % 3 == 1 ? 4_608 : file.length;
                for (int hits = 1 + random.nextInt(6); hits > 0; hits--) {
                    file[random.nextInt(reach)] = (byte) random.nextInt(256);
                }
                read += outcome(file).equals("read") ? 1 : 0;
            }
            assertTrue(read > 500 && read < 4_500, read + " of 5000 are read: the damage is too weak or too strong");
        });
    }

    @Test
    void aFileOfRandomBytesBehindAGoodKeyIsReadOrRefused() {
        SplittableRandom random = new SplittableRandom(5);

        assertTimeout(SOON, () -> {
            for (int i = 0; i < 2_000; i++) {
                byte[] file = new byte[512 * (1 + random.nextInt(40))];
                random.nextBytes(file);
                file[0] = 2;
                file[1] = 80;
                if (file.length > 515) {
                    file[515] = (byte) (84 + i % 3);
                }
                outcome(file);
            }
        });
    }

    /** Sizes at their largest in a file of 1 MB, whose values alone become 4 MB. */
    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 3, 4, 5})
    void aMegabyteNeverTakesManyTimesItsSize(int kind) {
        byte[] file = hostile(kind);
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        outcome(file);
        long before = threads.getThreadAllocatedBytes(Thread.currentThread().getId());

        String outcome = outcome(file);

        long taken = threads.getThreadAllocatedBytes(Thread.currentThread().getId()) - before;
        assertTrue(taken < 100L << 20, outcome + " took " + (taken >> 20) + " MB");
    }

    private static byte[] hostile(int kind) {
        byte[] file = Arrays.copyOf(new FileBuilder().build(), 1 << 20);
        switch (kind) {
            case 0 -> word(file, 2, 0xFFFF);
            case 1 -> word(file, 3, 0xFFFF, 10, 1);
            case 2 -> word(file, 3, 1, 2, 0, 10, 1, 5, 0xFFFF);
            case 3 -> {
                // A million bytes of records that are as short as can be.
                word(file, 9, 2_000);
                put(file, 516, 5, -1, 'P', 'O', 'I', 'N', 'T', 3, 0, 0);
                for (int at = 526; at + 8 < 1_000_000; at += 8) {
                    put(file, at, 1, 1, 'A' + at / 8 % 26, 5, 0, 1, 0, at / 256);
                }
            }
            case 4 -> {
                // A list of four thousand million texts without width.
                put(file, 516, 5, -1, 'P', 'O', 'I', 'N', 'T', 3, 0, 0);
                put(file, 526, 6, 1, 'L', 'A', 'B', 'E', 'L', 'S', 0, 0, -1, 5, 0, -1, -1, -1, -1, 0);
            }
            default -> {
                word(file, 2, 1, 3, 0xFFFE, 10, 0xFFFE);
                file[512 + 2] = 0;
            }
        }
        return file;
    }

    private static void put(byte[] file, int at, int... bytes) {
        for (int i = 0; i < bytes.length; i++) {
            file[at + i] = (byte) bytes[i];
        }
    }

    private static void word(byte[] file, int... wordsAndValues) {
        for (int i = 0; i < wordsAndValues.length; i += 2) {
            int at = 2 * (wordsAndValues[i] - 1);
            file[at] = (byte) wordsAndValues[i + 1];
            file[at + 1] = (byte) (wordsAndValues[i + 1] >>> 8);
        }
    }

    /** "read", or the code of the refusal; anything else that is thrown fails the test. A capture must be sound. */
    private static String outcome(byte[] file) {
        try {
            Capture capture = C3dReader.read("damaged.c3d", file, ReadOptions.DEFAULT);
            for (PointSeries point : capture.points()) {
                assertEquals(capture.frames(), point.positions().size());
            }
            assertTrue(capture.frames() > 0 && capture.pointRate() > 0);
            assertTrue(capture.range().count() == capture.frames());
            return "read";
        } catch (UnusableInputException e) {
            assertTrue(e.getMessage().lines().count() == 1, "more than one line: " + e.getMessage());
            return e.finding().code();
        }
    }

    private static byte[] whole(C3dEncoding encoding) {
        return C3dWriter.bytes(new CaptureFixture().capture(), encoding);
    }

    private static int dataStart(byte[] file, Processor processor) {
        int block = processor == Processor.MIPS ? file[17] & 0xFF : file[16] & 0xFF;
        return 512 * (block - 1);
    }
}
