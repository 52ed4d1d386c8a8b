package treadwork.model.capture;

import treadwork.model.space.VectorSeries;

/**
 * One labelled point of a capture.
 *
 * @param label       as in the file, blanks and a common {@code subject:} prefix taken off
 * @param description the file's longer name, or empty
 * @param positions   lab axes, m; a gap where the point was not seen
 */
public record PointSeries(String label, String description, VectorSeries positions) {}
