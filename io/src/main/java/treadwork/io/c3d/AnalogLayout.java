package treadwork.io.c3d;

import java.util.OptionalInt;

/**
 * How the analog values of a frame are shared out.
 *
 * @param channels in the file's order
 * @param samples  of each in a frame; 0 without channels
 */
record AnalogLayout(int channels, int samples) {

    static final AnalogLayout NONE = new AnalogLayout(0, 0);

    /**
     * From the header, by which the frames are laid out. Where its samples per frame do not divide its analog values, the stated
     * count of channels is asked.
     */
    static AnalogLayout of(Header header, Parameters parameters, Reading reading) {
        int values = header.analogPerFrame();
        if (values == 0) {
            return NONE;
        }
        int samples = header.samplesPerFrame();
        OptionalInt used = parameters.count("ANALOG:USED");
        if (samples > 0 && values % samples == 0) {
            AnalogLayout layout = new AnalogLayout(values / samples, samples);
            used.ifPresent(stated -> layout.compare(stated, reading));
            return layout;
        }
        int stated = used.orElse(0);
        if (stated <= 0 || values % stated != 0) {
            throw Refusals.analogCount(reading.file(), values, samples);
        }
        return new AnalogLayout(stated, values / stated);
    }

    private void compare(int stated, Reading reading) {
        if (stated != channels) {
            reading.note(Notices.analogCount(reading.file(), stated, channels));
        }
    }

    /** Values of all channels in a frame. */
    int values() {
        return channels * samples;
    }
}
