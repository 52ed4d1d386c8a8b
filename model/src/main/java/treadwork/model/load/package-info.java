/**
 * What comes out: contacts, ground reactions, joint angles, moments, forces and powers, and how they were come by.
 *
 * <p>Start at {@link treadwork.model.load.TrialResult}. Uses all other packages of {@code model}.
 */
package treadwork.model.load;
