package treadwork.model.load;

import treadwork.model.body.Joint;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/**
 * Angles and net loads of one joint, a frame, in the convention that the trial's settings name.
 *
 * @param angles about e1, e2, e3, each positive in its named direction, rad
 * @param moment with {@code joint} axes the three named directions in the order of the joint; else x, y, z; N·m, or as normalised
 * @param force  x, y, z of the axes, N, or as normalised
 * @param power  positive = generation, W, or as normalised
 */
public record JointLoads(
        Joint joint, VectorSeries angles, VectorSeries moment, VectorSeries force, ScalarSeries power) {}
