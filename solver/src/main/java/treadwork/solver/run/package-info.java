/**
 * The steps strung together: one trial in memory, and one study from files to files.
 *
 * <p>Start at {@link treadwork.solver.run.TrialComputation}, which is the main job in one method, and {@link
 * treadwork.solver.run.StudyRun}, which does it for every trial of a study side by side. Uses all steps, {@code io} and
 * {@code fixtures}.
 */
package treadwork.solver.run;
