package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

/**
 * A small whole file, of which a test changes the one thing that it is about: two points, ten frames at 100 Hz, eight channels with
 * two samples a frame, one type-2 plate; mm, reals.
 */
final class FileBuilder {

    static final int POINTS = 2;
    static final int FRAMES = 10;
    static final int CHANNELS = 8;
    static final int SAMPLES = 2;
    static final String NAME = "odd.c3d";

    private final Map<String, Map<String, Consumer<ParameterWriter>>> groups = new LinkedHashMap<>();
    private final Map<Integer, Number> headerWords = new LinkedHashMap<>();
    private final Map<Integer, float[]> points = new LinkedHashMap<>();
    private final Processor processor = Processor.INTEL;
    private boolean real = true;
    private int frames = FRAMES;
    private byte[] rawSection = new byte[0];

    FileBuilder() {
        integer("POINT", "USED", POINTS);
        integer("POINT", "FRAMES", FRAMES);
        real("POINT", "RATE", 100);
        real("POINT", "SCALE", -1);
        text("POINT", "UNITS", "mm");
        with("POINT", "LABELS", writer -> writer.texts("LABELS", List.of("HEEL", "TOE")));
        integer("ANALOG", "USED", CHANNELS);
        real("ANALOG", "RATE", 200);
        real("ANALOG", "GEN_SCALE", 0.5);
        reals("ANALOG", "SCALE", 2.0, 3.0, 4.0, 5.0, 6.0, 7.0, 8.0, 9.0);
        integers("ANALOG", "OFFSET", 1, 2, 3, 4, 5, 6, 7, 8);
        integer("FORCE_PLATFORM", "USED", 1);
        integers("FORCE_PLATFORM", "TYPE", 2);
        integers("FORCE_PLATFORM", "ZERO", 0, 0);
        plates(1);
    }

    /** Plates beside each other, each with the same six channels. */
    FileBuilder plates(int count) {
        integer("FORCE_PLATFORM", "USED", count);
        float[] corners = new float[12 * count];
        for (int i = 0; i < count; i++) {
            float at = 700 * i;
            float[] own = {at + 600, 400, 0, at, 400, 0, at, 0, 0, at + 600, 0, 0};
            System.arraycopy(own, 0, corners, 12 * i, 12);
        }
        corners(corners);
        List<Double> origins = Collections.nCopies(3 * count, -40.0);
        with("FORCE_PLATFORM", "ORIGIN", writer -> writer.reals("ORIGIN", origins, 3, count));
        List<Integer> channels = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            channels.addAll(List.of(1, 2, 3, 4, 5, 6));
        }
        with("FORCE_PLATFORM", "CHANNEL", writer -> writer.integers("CHANNEL", channels, 6, count));
        return integers("FORCE_PLATFORM", "TYPE", Collections.nCopies(count, 2).toArray(Integer[]::new));
    }

    FileBuilder corners(float... millimetres) {
        List<Double> numbers = new ArrayList<>();
        for (float each : millimetres) {
            numbers.add((double) each);
        }
        return with("FORCE_PLATFORM", "CORNERS", writer -> writer.reals("CORNERS", numbers, 3, 4, numbers.size() / 12));
    }

    FileBuilder with(String group, String name, Consumer<ParameterWriter> write) {
        groups.computeIfAbsent(group, key -> new LinkedHashMap<>()).put(name, write);
        return this;
    }

    FileBuilder without(String group, String name) {
        groups.get(group).remove(name);
        return this;
    }

    FileBuilder withoutGroup(String group) {
        groups.remove(group);
        return this;
    }

    FileBuilder renameGroup(String group, String name) {
        groups.put(name, groups.remove(group));
        return this;
    }

    FileBuilder integer(String group, String name, int value) {
        return with(group, name, writer -> writer.integer(name, value));
    }

    FileBuilder integers(String group, String name, Integer... values) {
        return with(group, name, writer -> writer.integers(name, List.of(values)));
    }

    FileBuilder real(String group, String name, double value) {
        return with(group, name, writer -> writer.real(name, value));
    }

    FileBuilder reals(String group, String name, Double... values) {
        return with(group, name, writer -> writer.reals(name, List.of(values)));
    }

    FileBuilder text(String group, String name, String value) {
        return with(group, name, writer -> writer.text(name, value));
    }

    /** A word of the header, counted from 1; a float takes two. */
    FileBuilder word(int word, Number value) {
        headerWords.put(2 * (word - 1), value);
        return this;
    }

    FileBuilder integerStorage() {
        real = false;
        real("POINT", "SCALE", 0.5);
        return this;
    }

    FileBuilder frames(int count) {
        frames = count;
        return this;
    }

    /** x, y, z and residual of the first point in one frame. */
    FileBuilder sample(int frame, float... stored) {
        points.put(frame, stored);
        return this;
    }

    /** Bytes that follow the last record in place of the end. */
    FileBuilder rawSection(byte... bytes) {
        rawSection = bytes;
        return this;
    }

    byte[] build() {
        int blocks = records(0).blocks();
        ParameterWriter records = records(2 + blocks);
        byte[] section = records.section();
        System.arraycopy(rawSection, 0, section, records.length(), rawSection.length);
        int frameValues = 4 * POINTS + CHANNELS * SAMPLES;
        int frameBytes = frameValues * (real ? 4 : 2);
        int data = (frames * frameBytes + 511) / 512 * 512;
        ByteBuffer file = ByteBuffer.allocate(512 + section.length + data).order(processor.order());
        header(file, 2 + blocks);
        file.put(512, section);
        file.position(512 + section.length);
        for (int frame = 0; frame < frames; frame++) {
            frame(file, frame);
        }
        return file.array();
    }

    private void header(ByteBuffer file, int dataBlock) {
        file.put(0, (byte) 2).put(1, (byte) 80);
        file.putShort(2, (short) POINTS).putShort(4, (short) (CHANNELS * SAMPLES));
        file.putShort(6, (short) 1).putShort(8, (short) FRAMES);
        file.putFloat(12, real ? -1 : 0.5f);
        file.putShort(16, (short) dataBlock).putShort(18, (short) SAMPLES);
        file.putFloat(20, 100);
        headerWords.forEach((at, value) -> {
            if (value instanceof Float) {
                file.putFloat(at, value.floatValue());
            } else {
                file.putShort(at, value.shortValue());
            }
        });
    }

    /** Stored numbers: point p has (100 + frame, 200 + p, 300), channel c 10 × c + sample of the recording. */
    private void frame(ByteBuffer file, int frame) {
        for (int p = 0; p < POINTS; p++) {
            float[] stored = {100 + frame, 200 + p, 300, 0};
            for (float value : p == 0 ? points.getOrDefault(frame, stored) : stored) {
                put(file, value);
            }
        }
        for (int sample = 0; sample < SAMPLES; sample++) {
            for (int c = 0; c < CHANNELS; c++) {
                put(file, 10 * c + frame * SAMPLES + sample);
            }
        }
    }

    private void put(ByteBuffer file, float value) {
        if (real) {
            file.putFloat(value);
        } else {
            file.putShort((short) value);
        }
    }

    private ParameterWriter records(int dataBlock) {
        ParameterWriter writer = new ParameterWriter(processor);
        groups.forEach((group, parameters) -> {
            writer.group(group);
            if (group.equals("POINT") && !parameters.containsKey("DATA_START")) {
                writer.integer("DATA_START", dataBlock);
            }
            parameters.values().forEach(each -> each.accept(writer));
        });
        return writer;
    }
}
