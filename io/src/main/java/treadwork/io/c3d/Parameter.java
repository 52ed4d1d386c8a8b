package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.util.Arrays;

/** One parameter as stored: an array of texts or numbers, of any stored type. */
final class Parameter {

    static final int CHARACTERS = -1;
    static final int BYTES = 1;
    static final int INTEGERS = 2;
    static final int REALS = 4;

    private final Processor processor;
    private final ByteBuffer section;
    private final int type;
    private final int[] dimensions;
    private final int from;
    private final int elements;

    /**
     * @param section    all parameters, in the order of {@code processor}
     * @param type       one of the constants of this class
     * @param dimensions the first runs fastest; none for a single value
     * @param from       byte of {@code section} at which the first value stands; all values lie inside the section
     */
    Parameter(Processor processor, ByteBuffer section, int type, int[] dimensions, int from) {
        this.processor = processor;
        this.section = section;
        this.type = type;
        this.dimensions = dimensions;
        this.from = from;
        this.elements = (int) elements(dimensions);
    }

    /** How many values an array of these dimensions has; {@link Integer#MAX_VALUE} for more than that. */
    static long elements(int... dimensions) {
        long product = 1;
        for (int dimension : dimensions) {
            product = Math.min(product * dimension, Integer.MAX_VALUE);
        }
        return product;
    }

    /** Bytes in one value of a stored type; 0 for a type that the format does not have. */
    static int width(int type) {
        return switch (type) {
            case CHARACTERS, BYTES -> 1;
            case INTEGERS -> 2;
            case REALS -> 4;
            default -> 0;
        };
    }

    /** How long the array is along one dimension; 1 for a dimension that it does not have. */
    int dimension(int index) {
        return index < dimensions.length ? dimensions[index] : 1;
    }

    /** How many numbers it holds; none where it holds text. */
    int numbers() {
        return type == CHARACTERS ? 0 : elements;
    }

    /** A number: bytes without sign, integers with sign. */
    double number(int index) {
        return switch (type) {
            case BYTES -> section.get(from + index) & 0xFF;
            case INTEGERS -> section.getShort(from + 2 * index);
            case REALS -> processor.real(section, from + 4 * index);
            default -> throw new IllegalStateException("a text is no number");
        };
    }

    boolean holdsIntegers() {
        return type == INTEGERS;
    }

    /** How many texts it holds: rows of the first dimension's width. */
    int texts() {
        return type != CHARACTERS || elements == 0 ? 0 : elements / dimension(0);
    }

    String text(int index) {
        int width = dimension(0);
        return Texts.of(section.array(), section.arrayOffset() + from + index * width, width);
    }

    /** Whether both state the same. */
    boolean sameAs(Parameter other) {
        return type == other.type
                && Arrays.equals(dimensions, other.dimensions)
                && content().equals(other.content());
    }

    private ByteBuffer content() {
        return section.slice(from, elements * width(type));
    }
}
