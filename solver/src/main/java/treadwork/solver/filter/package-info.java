/**
 * Gaps, filters and derivatives of sampled positions and loads.
 *
 * <p>In the order of use: {@link treadwork.solver.filter.ClusterFilling} fills what can be known of a segment's markers,
 * {@link treadwork.solver.filter.Smoothing} takes the noise out, {@link treadwork.solver.filter.Derivatives} gives
 * velocities and accelerations. All work run by run between gaps and never across one. Uses {@code model} and Commons
 * Math.
 */
package treadwork.solver.filter;
