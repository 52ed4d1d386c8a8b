package treadwork.model.study;

import treadwork.model.capture.FrameRange;

/**
 * Two labels of a capture that stand for each other's marker in some frames.
 *
 * @param first  a label of the capture
 * @param second another
 * @param frames in the capture file's own numbers
 */
public record Exchange(String first, String second, FrameRange frames) {}
