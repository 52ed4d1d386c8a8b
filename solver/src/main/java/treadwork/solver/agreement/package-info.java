/**
 * Whether plates and markers agree: in time, in place, in which way round a plate lies, in which channels are whose, and in
 * how heavy the body is. Each check works from the laws of motion or from where feet can press, and says how sure it is.
 */
package treadwork.solver.agreement;
