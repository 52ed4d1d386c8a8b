/**
 * Points, turns, loads and their courses in time: the algebra everything else is written in.
 *
 * <p>Values are immutable; a value that is not known is NaN ("a gap") and stays one through every operation. Start at
 * {@link treadwork.model.space.Vector3} and {@link treadwork.model.space.VectorSeries}. Uses the JDK only.
 */
package treadwork.model.space;
