/**
 * Proves a plate with simple means before anybody steps on it: a rod with pointed ends shows where the plate stands and how
 * it lies, known masses show its gain.
 *
 * <p>Uses {@code plate} and {@code model}; knows no files. Start at {@link treadwork.solver.proof.RodTest} and {@link
 * treadwork.solver.proof.WeightsTest}.
 */
package treadwork.solver.proof;
