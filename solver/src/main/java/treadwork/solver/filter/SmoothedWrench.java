package treadwork.solver.filter;

import treadwork.model.space.WrenchSeries;

/**
 * A load after smoothing.
 *
 * @param series   about the same point as the original; a gap where that has one, and where a run between gaps was too
 *                 short
 * @param cutoffHz where the smoothing is at -3 dB, the same for all six components; NaN where nothing was smoothed
 */
public record SmoothedWrench(WrenchSeries series, double cutoffHz) {}
