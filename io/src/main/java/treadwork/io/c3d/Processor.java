package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.Arrays;
import java.util.Optional;

/** The processor family in whose number formats a file is written. */
public enum Processor {
    /** Low byte first, IEEE reals. */
    INTEL(84, ByteOrder.LITTLE_ENDIAN, "little-endian"),
    /** Low byte first, reals of the VAX F format. */
    DEC(85, ByteOrder.LITTLE_ENDIAN, "little-endian with DEC reals"),
    /** High byte first, IEEE reals. */
    MIPS(86, ByteOrder.BIG_ENDIAN, "big-endian");

    private final int code;
    private final ByteOrder order;
    private final String words;

    Processor(int code, ByteOrder order, String words) {
        this.code = code;
        this.order = order;
        this.words = words;
    }

    /** The number by which the parameter section names this family. */
    int code() {
        return code;
    }

    ByteOrder order() {
        return order;
    }

    /** For display. */
    String words() {
        return words;
    }

    static Optional<Processor> ofCode(int code) {
        return Arrays.stream(values())
                .filter(processor -> processor.code == code)
                .findFirst();
    }

    /** The real number at {@code index} bytes; {@code from} is in this processor's order. */
    float real(ByteBuffer from, int index) {
        int word = from.getInt(index);
        return this == DEC ? VaxReal.decode(word) : Float.intBitsToFloat(word);
    }

    /** The 32 bits that hold {@code value}, to be put in this processor's order. */
    int word(float value) {
        return this == DEC ? VaxReal.encode(value) : Float.floatToRawIntBits(value);
    }
}
