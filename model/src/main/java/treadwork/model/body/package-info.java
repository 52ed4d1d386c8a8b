/**
 * The body as the computation sees it: sides, landmarks, segments, joints, and what segments weigh.
 *
 * <p>Start at {@link treadwork.model.body.Segment} and {@link treadwork.model.body.Joint}. Uses {@code space}.
 */
package treadwork.model.body;
