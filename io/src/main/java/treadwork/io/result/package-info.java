/**
 * The files that {@code compute} writes for a trial: {@code loads.csv}, {@code contacts.csv} and {@code trial.json}, in
 * one folder that is written whole or not at all.
 *
 * <p>Values come in the convention and normalisation that the trial's settings name; here they get their columns, and
 * radians become degrees. Start at {@link treadwork.io.result.TrialFiles}. Uses {@code model}, {@code io.study} (how
 * settings stand in a file) and {@code io.file}; Jackson stays inside.
 */
package treadwork.io.result;
