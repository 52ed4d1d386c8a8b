/**
 * A first marker map from geometry: which labels are which landmarks of an upright body, and which move rigidly together.
 *
 * <p>Labels are names without meaning here. Start at {@link treadwork.solver.draft.MarkerDraft}. Uses {@code model} and
 * {@code plate}.
 */
package treadwork.solver.draft;
