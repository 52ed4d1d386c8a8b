package treadwork.model.load;

import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/**
 * The ground reaction of one contact, for display: zeroed, not filtered, a row for each frame of the contact.
 *
 * @param force            on the foot, lab axes, N
 * @param centreOfPressure lab axes, m; a gap where the normal force is too small to place it
 * @param freeMoment       about the surface's upward normal at the centre of pressure, N·m; a gap likewise
 */
public record ContactSeries(
        Contact contact, VectorSeries force, VectorSeries centreOfPressure, ScalarSeries freeMoment) {}
