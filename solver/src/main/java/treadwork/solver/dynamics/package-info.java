/**
 * From moving segments and ground reactions to net joint loads: the Newton-Euler recursion from foot to pelvis.
 *
 * <p>Start at {@link treadwork.solver.dynamics.LimbLoads}. The recursion works in lab axes and knows nothing of joints'
 * names, axes choices or normalisation.
 */
package treadwork.solver.dynamics;
