/**
 * What was noticed about the data, and what mends it.
 *
 * <p>A check or a reader says what it noticed as a {@link treadwork.model.finding.Finding}; input that cannot be used at
 * all is thrown inside {@link treadwork.model.finding.UnusableInputException}. Uses the JDK only.
 */
package treadwork.model.finding;
