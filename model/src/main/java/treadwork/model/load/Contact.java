package treadwork.model.load;

import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;

/**
 * One foot on one plate for a while.
 *
 * @param plate    counted from 1, in the capture's order
 * @param frames   the file's own numbers, from the raw force
 * @param assigned in words, how the foot was found
 */
public record Contact(int plate, Side foot, FrameRange frames, String assigned) {}
