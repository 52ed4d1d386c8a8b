/**
 * From markers to moving segments: axes and joint centres of the standing body, the rigid fit of every frame, joint angles.
 *
 * <p>A pure function of captures and settings; uses {@code model} and {@code solver.filter} only. Start at {@link
 * treadwork.solver.pose.StandingBody} and {@link treadwork.solver.pose.SegmentMotion}.
 */
package treadwork.solver.pose;
