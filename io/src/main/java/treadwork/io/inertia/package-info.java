/**
 * The published inertia tables that ship with the program, as files beside this package with their sources and status.
 *
 * <p>Start at {@link treadwork.io.inertia.InertiaTables}. Uses {@code model} and Jackson.
 */
package treadwork.io.inertia;
