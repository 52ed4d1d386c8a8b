package treadwork.model.load;

import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;

/**
 * What was used for a segment.
 *
 * @param mass     in the segment's own axes, with whatever is worn on it
 * @param lengthM  between the segment's two joint centres, or of the foot from heel to toe, m; NaN for the pelvis
 * @param source   table, its frame and end points, and how they were turned into the segment's
 * @param fitRmsM  root mean square of the markers' distances from the fitted segment over all frames, m; NaN when not tracked
 */
public record SegmentSheet(Segment segment, MassProperties mass, double lengthM, String source, double fitRmsM) {}
