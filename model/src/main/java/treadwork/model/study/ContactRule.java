package treadwork.model.study;

import java.util.Optional;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;

/**
 * A person's word on which foot is on which plate.
 *
 * @param plate  counted from 1, in the capture's order
 * @param frames empty: in every contact of that plate
 */
public record ContactRule(int plate, Side foot, Optional<FrameRange> frames) {}
