/** Mistakes in the markers themselves, found before a segment is fitted to them: exchanged labels, spikes, jitter, slips. */
package treadwork.solver.marker;
