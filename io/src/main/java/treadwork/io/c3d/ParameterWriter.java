package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Lays out the parameter section, record by record. */
final class ParameterWriter {

    /** Most entries that a dimension can count; a longer list goes on in a parameter with the next number. */
    static final int MOST_ENTRIES = 255;

    private static final int MOST_BLOCKS = 255;

    private final Processor processor;
    private final ByteBuffer records;
    private int group;

    ParameterWriter(Processor processor) {
        this.processor = processor;
        this.records = ByteBuffer.allocate(MOST_BLOCKS * Header.BLOCK - ParameterParser.OPENING)
                .order(processor.order());
    }

    /** Begins a group; parameters go into it from now on. */
    void group(String name) {
        group++;
        name(name, -group, Short.BYTES + 1);
        records.put((byte) 0);
    }

    /** One text. */
    void text(String name, String text) {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        parameter(name, Parameter.CHARACTERS, bytes.length);
        records.put(bytes);
        end();
    }

    /** A list of texts, each as wide as the widest; over 255 of them in several parameters. */
    void texts(String name, List<String> texts) {
        for (Part<String> part : parts(name, texts, MOST_ENTRIES)) {
            List<byte[]> fields = part.values().stream()
                    .map(text -> text.getBytes(StandardCharsets.UTF_8))
                    .toList();
            int width = fields.stream().mapToInt(field -> field.length).reduce(1, Math::max);
            parameter(part.name(), Parameter.CHARACTERS, width, fields.size());
            for (byte[] field : fields) {
                records.put(field);
                for (int i = field.length; i < width; i++) {
                    records.put((byte) ' ');
                }
            }
            end();
        }
    }

    /** One unsigned 16-bit number. */
    void integer(String name, int value) {
        integers(name, List.of(value), new int[0]);
    }

    /** A list of 16-bit numbers; over 255 of them in several parameters. */
    void integers(String name, List<Integer> values) {
        for (Part<Integer> part : parts(name, values, MOST_ENTRIES)) {
            integers(part.name(), part.values(), part.values().size());
        }
    }

    /** An array of 16-bit numbers of the given dimensions, the first runs fastest. */
    void integers(String name, List<Integer> values, int... dimensions) {
        parameter(name, Parameter.INTEGERS, dimensions);
        values.forEach(value -> records.putShort(value.shortValue()));
        end();
    }

    /** One real number. */
    void real(String name, double value) {
        reals(name, List.of(value), new int[0]);
    }

    /** A list of real numbers; over 255 of them in several parameters. */
    void reals(String name, List<Double> values) {
        for (Part<Double> part : parts(name, values, MOST_ENTRIES)) {
            reals(part.name(), part.values(), part.values().size());
        }
    }

    /** A list of pairs of real numbers; over 255 pairs in several parameters. */
    void pairs(String name, List<Double> values) {
        for (Part<Double> part : parts(name, values, 2 * MOST_ENTRIES)) {
            reals(part.name(), part.values(), 2, part.values().size() / 2);
        }
    }

    /** An array of real numbers of the given dimensions, the first runs fastest. */
    void reals(String name, List<Double> values, int... dimensions) {
        parameter(name, Parameter.REALS, dimensions);
        values.forEach(value -> records.putInt(processor.word(value.floatValue())));
        end();
    }

    /** Bytes up to the end of the last record. */
    int length() {
        return ParameterParser.OPENING + records.position();
    }

    /** How many blocks the section takes, with a name of no length that ends it. */
    int blocks() {
        int bytes = length() + 2;
        return (bytes + Header.BLOCK - 1) / Header.BLOCK;
    }

    /** The whole section. */
    byte[] section() {
        byte[] section = new byte[blocks() * Header.BLOCK];
        section[0] = 1;
        section[1] = Header.KEY;
        section[2] = (byte) blocks();
        section[3] = (byte) processor.code();
        records.get(0, section, ParameterParser.OPENING, records.position());
        return section;
    }

    private void parameter(String name, int type, int... dimensions) {
        for (int dimension : dimensions) {
            if (dimension > MOST_ENTRIES) {
                throw new IllegalArgumentException(
                        name + " has a dimension of " + dimension + ", at most " + MOST_ENTRIES + " can be stated");
            }
        }
        int values = (int) Parameter.elements(dimensions) * Parameter.width(type);
        int way = Short.BYTES + 2 + dimensions.length + values + 1;
        if (records.remaining() < 2 + name.length() + way + 2) {
            throw new IllegalArgumentException("the parameters take more than " + MOST_BLOCKS + " blocks, at " + name);
        }
        name(name, group, way);
        records.put((byte) type).put((byte) dimensions.length);
        for (int dimension : dimensions) {
            records.put((byte) dimension);
        }
    }

    private void name(String name, int number, int way) {
        records.put((byte) name.length()).put((byte) number);
        records.put(name.getBytes(StandardCharsets.US_ASCII));
        records.putShort((short) way);
    }

    /** An empty description ends every record. */
    private void end() {
        records.put((byte) 0);
    }

    /** A parameter of a list that goes on over several. */
    private record Part<T>(String name, List<T> values) {}

    private static <T> List<Part<T>> parts(String name, List<T> whole, int size) {
        List<Part<T>> parts = new ArrayList<>();
        for (int from = 0; from < whole.size(); from += size) {
            String partName = from == 0 ? name : name + (parts.size() + 1);
            parts.add(new Part<>(partName, whole.subList(from, Math.min(from + size, whole.size()))));
        }
        return parts;
    }
}
