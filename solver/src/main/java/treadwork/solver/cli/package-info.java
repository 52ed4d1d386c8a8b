/**
 * The command line: arguments in, messages, tables and exit codes out.
 *
 * <p>Start at {@link treadwork.solver.cli.Treadwork}. Each command reads its arguments, calls {@code run}, and words the
 * outcome; all that goes wrong passes through {@link treadwork.solver.cli.Faults}. Nothing below this package prints.
 */
package treadwork.solver.cli;
