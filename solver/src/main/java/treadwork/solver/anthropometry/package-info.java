/**
 * What the segments weigh: published tables, a person's own values and worn devices, turned into the segments' axes.
 *
 * <p>Uses {@code model} and the measured body of {@code solver.pose}. Start at {@link
 * treadwork.solver.anthropometry.BodyMasses}.
 */
package treadwork.solver.anthropometry;
