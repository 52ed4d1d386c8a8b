/** Whether settings, the standing capture, the body built from it and the loads that come out can be true. */
package treadwork.solver.plausible;
