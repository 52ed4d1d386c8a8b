package treadwork.model.study;

import treadwork.model.body.Segment;
import treadwork.model.space.Vector3;

/**
 * A device worn on a segment.
 *
 * @param condition the condition in which it is worn
 * @param massKg    kg
 * @param centre    of its mass, segment axes from the segment's origin, m
 */
public record Orthosis(String condition, Segment segment, double massKg, Vector3 centre) {}
