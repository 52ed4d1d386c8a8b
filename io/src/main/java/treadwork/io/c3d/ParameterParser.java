package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Set;

/**
 * Walks along the records of the parameter section.
 *
 * <p>Record: length of the name (below zero: locked), group number (below zero: this is the group itself), name, way to the
 * next record counted from here; a parameter goes on with its type, the count of dimensions, the dimensions and the values. The
 * walk ends at a name without length, a way of 0, or the end of the section, whatever the last record says.
 */
final class ParameterParser {

    /** Bytes before the first record: two without meaning, the count of blocks, the processor. */
    static final int OPENING = 4;

    /** More records than any real file has; a section of that many is damage, and each takes memory. */
    private static final int MOST_RECORDS = 60_000;

    private static final int NO_WAY = 0xFFFF;

    private record Entry(int group, String name, Parameter parameter) {}

    private final Processor processor;
    private final ByteBuffer section;
    private final Map<Integer, String> groups = new HashMap<>();
    private final List<Entry> entries = new ArrayList<>();
    private OptionalInt damage = OptionalInt.empty();

    private ParameterParser(Processor processor, ByteBuffer section) {
        this.processor = processor;
        this.section = section;
    }

    /** Reads all records; of parameters stated twice the first counts. */
    static Parameters parse(Processor processor, ByteBuffer section, Reading reading) {
        ParameterParser parser = new ParameterParser(processor, section);
        parser.walk();
        parser.damage.ifPresent(at -> reading.note(Notices.parameterSection(reading.file(), at)));
        return parser.parameters(reading);
    }

    private void walk() {
        int at = OPENING;
        for (int i = 0; at + 2 <= section.limit(); i++) {
            int length = Math.abs(section.get(at));
            if (length == 0) {
                return;
            }
            int end = at + 2 + length;
            if (end + 2 > section.limit() || i == MOST_RECORDS) {
                damaged(at);
                return;
            }
            int way = section.getShort(end) & 0xFFFF;
            if (way == NO_WAY) {
                damaged(at);
                return;
            }
            int next = end + way;
            if (record(at, length, end + 2) > next && way != 0) {
                damaged(at);
                return;
            }
            if (way == 0) {
                return;
            }
            at = next;
        }
    }

    /** Keeps the record if it is whole; returns where its values end, or 0. */
    private int record(int at, int length, int body) {
        int group = section.get(at + 1);
        String name = Texts.of(section.array(), section.arrayOffset() + at + 2, length)
                .toUpperCase(Locale.ROOT);
        if (group < 0) {
            groups.putIfAbsent(-group, name);
            return 0;
        }
        int valuesEnd = parameter(group, name, body);
        if (valuesEnd == 0) {
            damaged(at);
        }
        return valuesEnd;
    }

    /** Keeps the parameter if all of it lies inside the section; returns where its values end, or 0. */
    private int parameter(int group, String name, int at) {
        if (at + 2 > section.limit()) {
            return 0;
        }
        int type = section.get(at);
        int[] dimensions = new int[section.get(at + 1) & 0xFF];
        int from = at + 2 + dimensions.length;
        if (from > section.limit()) {
            return 0;
        }
        for (int i = 0; i < dimensions.length; i++) {
            dimensions[i] = section.get(at + 2 + i) & 0xFF;
        }
        int width = Parameter.width(type);
        long valuesEnd = from + width * Parameter.elements(dimensions);
        if (width == 0 || valuesEnd > section.limit()) {
            return 0;
        }
        entries.add(new Entry(group, name, new Parameter(processor, section, type, dimensions, from)));
        return (int) valuesEnd;
    }

    private void damaged(int at) {
        if (damage.isEmpty()) {
            damage = OptionalInt.of(at);
        }
    }

    /** A parameter may stand before its group, so groups are looked up at the end; without a group it is left out. */
    private Parameters parameters(Reading reading) {
        Map<String, Parameter> named = new LinkedHashMap<>();
        Set<String> repeated = new LinkedHashSet<>();
        for (Entry entry : entries) {
            String group = groups.get(entry.group());
            if (group == null) {
                continue;
            }
            String name = group + ":" + entry.name();
            Parameter first = named.putIfAbsent(name, entry.parameter());
            if (first != null && !first.sameAs(entry.parameter())) {
                repeated.add(name);
            }
        }
        if (!repeated.isEmpty()) {
            reading.note(Notices.parameterRepeated(reading.file(), List.copyOf(repeated)));
        }
        return new Parameters(named, List.copyOf(groups.values()));
    }
}
