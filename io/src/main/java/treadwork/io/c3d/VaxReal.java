package treadwork.io.c3d;

/**
 * Real numbers of the VAX F format.
 *
 * <p>Two 16-bit words, each low byte first; the first holds sign (1 bit), exponent e (8 bits) and the upper 7 bits of the
 * fraction f, the second the lower 16. The value is ±0.1f × 2^(e - 128) in binary, that is ±1.f × 2^(e - 129); IEEE reads the same
 * bits as ±1.f × 2^(e - 127), four times as much. So an exponent lowered by 2 makes the number an IEEE one. With e = 0 the number is
 * zero whatever its fraction, or, with the sign set, the reserved operand, which stands for no number.
 */
final class VaxReal {

    private static final int FRACTION_BITS = 23;
    private static final int EXPONENT = 0xFF;
    private static final int TWO_EXPONENTS = 2 << FRACTION_BITS;
    private static final int RESERVED = 0x8000;

    private VaxReal() {}

    /** The value of four bytes that were read as one integer, low byte first. */
    static float decode(int word) {
        int bits = Integer.rotateLeft(word, 16);
        int exponent = bits >>> FRACTION_BITS & EXPONENT;
        if (exponent > 2) {
            return Float.intBitsToFloat(bits - TWO_EXPONENTS);
        }
        if (exponent > 0) {
            return Float.intBitsToFloat(bits) / 4;
        }
        return bits < 0 ? Float.NaN : 0;
    }

    /** The integer whose four bytes, low byte first, hold {@code value}; what is too large or no number becomes the
     * reserved operand, what lies below 2^-126 zero. */
    static int encode(float value) {
        int bits = Float.floatToRawIntBits(value);
        int exponent = bits >>> FRACTION_BITS & EXPONENT;
        if (exponent > EXPONENT - 2) {
            return RESERVED;
        }
        if (exponent == 0) {
            return 0;
        }
        return Integer.rotateLeft(bits + TWO_EXPONENTS, 16);
    }
}
