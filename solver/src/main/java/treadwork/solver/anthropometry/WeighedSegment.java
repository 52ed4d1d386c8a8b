package treadwork.solver.anthropometry;

import treadwork.model.body.MassProperties;

/**
 * What a segment weighs.
 *
 * @param mass   in the segment's own axes
 * @param source table, its axes and ends, how they were turned into the segment's, and what is worn on it
 */
public record WeighedSegment(MassProperties mass, String source) {}
