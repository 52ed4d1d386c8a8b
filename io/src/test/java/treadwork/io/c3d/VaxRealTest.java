package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.ByteBuffer;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Bit patterns worked out by hand from the layout of the VAX F format: value = ±0.1f × 2^(e - 128), first word s eeeeeeee fffffff,
 * second word the lower 16 bits of f, each word low byte first.
 *
 * <p>1 is 0.1 (binary) × 2^1, so e = 129 = 10000001, f = 0: first word 0 10000001 0000000 = 4080, bytes 80 40 00 00. -2.5 is -0.101 × 2^2:
 * e = 130, f = 01: 1 10000010 0100000 = C120. 0.1 is 0.110011001100... × 2^-3: e = 125, f = 10011001100110011001101 (rounded): first word
 * 0 01111101... gives 3ECC, second CCCD. 100 is 0.1100100 × 2^7: e = 135, f = 1001000...: 0 10000111 1001000 = 43C8. The largest has all
 * bits but the sign set: (1 - 2^-24) × 2^127; the smallest e = 1, f = 0: 2^-128.
 */
class VaxRealTest {

    @ParameterizedTest
    @CsvSource({
        "80, 40, 00, 00, 1",
        "20, C1, 00, 00, -2.5",
        "CC, 3E, CD, CC, 0.1",
        "C8, 43, 00, 00, 100",
        "FF, 7F, FF, FF, 1.7014117E38",
        "80, 00, 00, 00, 2.938736E-39",
        "00, 00, 00, 00, 0",
        "00, 00, 01, 00, 0"
    })
    void decodesPatternsWorkedOutByHand(String b0, String b1, String b2, String b3, float value) {
        ByteBuffer bytes = bytes(b0, b1, b2, b3);

        assertEquals(value, Processor.DEC.real(bytes, 0));
    }

    @Test
    void takesTheReservedOperandForNoNumber() {
        assertTrue(Float.isNaN(Processor.DEC.real(bytes("00", "80", "00", "00"), 0)));
    }

    @ParameterizedTest
    @CsvSource({
        "80, 40, 00, 00, 1",
        "20, C1, 00, 00, -2.5",
        "CC, 3E, CD, CC, 0.1",
        "FF, 7F, FF, FF, 1.7014117E38",
        "00, 80, 00, 00, NaN",
        "00, 80, 00, 00, 1.8E38",
        "00, 80, 00, 00, -Infinity",
        "00, 00, 00, 00, -0.0",
        "00, 00, 00, 00, 1E-40"
    })
    void encodesPatternsWorkedOutByHand(String b0, String b1, String b2, String b3, float value) {
        ByteBuffer bytes = ByteBuffer.allocate(4).order(Processor.DEC.order());

        bytes.putInt(Processor.DEC.word(value));

        assertEquals(bytes(b0, b1, b2, b3), bytes.rewind());
    }

    @Test
    void anyNormalNumberThatBothFormatsHoldComesBackToTheBit() {
        SplittableRandom random = new SplittableRandom(20_261_201);
        for (int i = 0; i < 100_000; i++) {
            float value = (float) ((random.nextDouble() - 0.5) * Math.pow(2, random.nextInt(-90, 120)));

            assertEquals(value, VaxReal.decode(VaxReal.encode(value)));
        }
    }

    private static ByteBuffer bytes(String... hex) {
        ByteBuffer bytes = ByteBuffer.allocate(4).order(Processor.DEC.order());
        for (String each : hex) {
            bytes.put((byte) Integer.parseInt(each, 16));
        }
        return bytes.rewind();
    }
}
