package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The first block as the format's description counts it, in words of 16 bits from 1; read here without the reader. */
class WrittenHeaderTest {

    @ParameterizedTest
    @CsvSource({"INTEL, 84", "MIPS, 86"})
    void statesTheWordsOfTheFormat(Processor processor, int code) {
        ByteBuffer file = written(processor, C3dEncoding.Storage.REAL);

        assertEquals(2, file.get(0), "block of the parameters");
        assertEquals(80, file.get(1), "key");
        assertEquals(5, word(file, 2), "points");
        assertEquals(26 * 3, word(file, 3), "analog values a frame");
        assertEquals(33, word(file, 4), "first frame");
        assertEquals(72, word(file, 5), "last frame");
        assertEquals(0, word(file, 6), "longest interpolated gap");
        assertTrue(file.getFloat(12) < 0, "scale of reals");
        assertEquals(3, word(file, 10), "samples a frame");
        assertEquals(120f, file.getFloat(20), "rate");
        assertEquals(12345, word(file, 150), "labels of four characters");
        assertEquals(0, word(file, 151), "events in the header");
        assertEquals(80, file.get(513), "key of the parameters");
        assertEquals(2 + file.get(514), word(file, 9), "the frames follow the parameters");
        assertEquals(code, file.get(515) & 0xFF, "processor");
    }

    @Test
    void aFileIsAWholeNumberOfBlocksAsLongAsItsFrames() {
        ByteBuffer real = written(Processor.INTEL, C3dEncoding.Storage.REAL);
        ByteBuffer integer = written(Processor.INTEL, C3dEncoding.Storage.INTEGER);

        // 5 points × 4 and 26 × 3 analog values are 98 numbers a frame, 40 frames: 15680 bytes in 31 blocks, 7840 in
        // 16.
        assertEquals(512 * (word(real, 9) - 1 + 31), real.limit());
        assertEquals(512 * (word(integer, 9) - 1 + 16), integer.limit());
    }

    @Test
    void theLargestCoordinateTakes32000StepsOfTheScale() {
        ByteBuffer file = written(Processor.INTEL, C3dEncoding.Storage.INTEGER);

        // The largest is some y of at most 1.9 m; a step is about 1900 mm / 32000.
        assertEquals(0.0594, file.getFloat(12), 0.0003, "mm");
    }

    @Test
    void aGapHasTheResidualMinusOne() {
        ByteBuffer real = written(Processor.INTEL, C3dEncoding.Storage.REAL);
        ByteBuffer integer = written(Processor.INTEL, C3dEncoding.Storage.INTEGER);

        // The first point of the invented capture is not seen in its fourth frame.
        assertEquals(-1f, real.getFloat(512 * (word(real, 9) - 1) + 3 * 98 * 4 + 12));
        assertEquals(-1, integer.getShort(512 * (word(integer, 9) - 1) + 3 * 98 * 2 + 6));
    }

    private static ByteBuffer written(Processor processor, C3dEncoding.Storage storage) {
        byte[] file = C3dWriter.bytes(new CaptureFixture().capture(), new C3dEncoding(processor, storage, false));
        return ByteBuffer.wrap(file)
                .order(processor == Processor.MIPS ? ByteOrder.BIG_ENDIAN : ByteOrder.LITTLE_ENDIAN);
    }

    private static int word(ByteBuffer file, int number) {
        return file.getShort(2 * (number - 1));
    }
}
