package treadwork.solver.proof;

import treadwork.model.space.Vector3;

/**
 * One frame of a rod test, lab axes.
 *
 * @param tip    of the rod, m
 * @param axis   of length one, from the tip to the hand
 * @param force  of the plate on the rod, as the plate's description has it, N
 * @param moment of the same about the described centre of the surface, N·m
 */
record RodFrame(Vector3 tip, Vector3 axis, Vector3 force, Vector3 moment) {}
