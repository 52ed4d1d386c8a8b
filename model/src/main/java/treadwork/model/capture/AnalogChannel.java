package treadwork.model.capture;

import treadwork.model.space.ScalarSeries;

/**
 * One analog channel.
 *
 * @param label  as in the file, blanks taken off
 * @param unit   as the file states it, which is often wrong; for display only
 * @param values offset and scales of the file applied, so in what the file calls physical units
 */
public record AnalogChannel(String label, String unit, ScalarSeries values) {}
