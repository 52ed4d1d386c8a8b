package treadwork.solver.filter;

import treadwork.model.space.VectorSeries;

/**
 * A series after smoothing.
 *
 * @param series   as long as the original; a gap where that has one, and where a run between gaps was too short
 * @param cutoffHz where the smoothing is at -3 dB, as used or as found; NaN where nothing was smoothed
 */
public record Smoothed(VectorSeries series, double cutoffHz) {}
