package treadwork.io.c3d;

import treadwork.model.space.VectorSeries;

/**
 * A computed quantity.
 *
 * @param label       names it
 * @param description what the three numbers are
 * @param unit        of the numbers
 * @param values      as they are written, whatever the unit of length of the file; a gap where nothing is known
 */
public record ComputedPoint(String label, String description, String unit, VectorSeries values) {}
