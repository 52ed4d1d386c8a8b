package treadwork.solver.run;

import treadwork.model.body.Joint;
import treadwork.solver.dynamics.LoadSeries;
import treadwork.solver.pose.SegmentMotion;

/**
 * A joint with its load, before a convention is chosen.
 *
 * @param load what the proximal segment does to the distal one at the joint centre, lab axes
 */
record SolvedJoint(Joint joint, SegmentMotion proximal, SegmentMotion distal, LoadSeries load) {}
