package treadwork.io.c3d;

import java.util.Arrays;
import java.util.Locale;

/** Offset and scale of every analog channel. */
final class AnalogScaling {

    /** What an unsigned 16-bit number is more than the signed one of the same bits, when that is below zero. */
    static final int WRAP = 0x10000;

    private final double[] offsets;
    private final double[] scales;
    private final boolean unsigned;

    private AnalogScaling(double[] offsets, double[] scales, boolean unsigned) {
        this.offsets = offsets;
        this.scales = scales;
        this.unsigned = unsigned;
    }

    /**
     * From the parameters; a missing offset is 0, a missing scale 1, each with a finding.
     *
     * <p>Offsets of unsigned data are unsigned too, though the format holds them as signed integers: -32750 is 32786. A scale that
     * is no number leaves its channel unknown.
     */
    static AnalogScaling of(Parameters parameters, int channels, Reading reading) {
        if (channels == 0) {
            return new AnalogScaling(new double[0], new double[0], false);
        }
        boolean unsigned =
                parameters.text("ANALOG:FORMAT").toUpperCase(Locale.ROOT).startsWith("UNSIGNED");
        double[] offsets = filled(parameters, "OFFSET", channels, reading);
        double[] scales = filled(parameters, "SCALE", channels, reading);
        double general = filled(parameters, "GEN_SCALE", 1, reading)[0];
        for (int i = 0; i < channels; i++) {
            scales[i] *= general;
            offsets[i] += unsigned && offsets[i] < 0 ? WRAP : 0;
        }
        return new AnalogScaling(offsets, scales, unsigned);
    }

    private static double[] filled(Parameters parameters, String name, int count, Reading reading) {
        double[] stated = parameters.numbers("ANALOG:" + name, count);
        if (stated.length == count) {
            return stated;
        }
        reading.note(Notices.analogScaling(reading.file(), name, stated.length, count));
        double[] filled = Arrays.copyOf(stated, count);
        Arrays.fill(filled, stated.length, count, name.equals("OFFSET") ? 0 : 1);
        return filled;
    }

    double offset(int channel) {
        return offsets[channel];
    }

    /** The channel's own scale times the general one. */
    double scale(int channel) {
        return scales[channel];
    }

    /** Whether 16-bit integers count from 0 to 65535. */
    boolean unsigned() {
        return unsigned;
    }
}
