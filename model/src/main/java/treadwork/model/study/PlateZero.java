package treadwork.model.study;

import treadwork.model.capture.FrameRange;

/** Where a plate's unloaded level is taken from. */
public sealed interface PlateZero {

    /** Samples in which the plate carries nothing, found from the data. */
    record Auto() implements PlateZero {}

    /** Nowhere: the channels stay as they are. */
    record None() implements PlateZero {}

    /** The frames that the capture file itself names. */
    record File() implements PlateZero {}

    /** Frames that the study file names. */
    record Frames(FrameRange range) implements PlateZero {}
}
