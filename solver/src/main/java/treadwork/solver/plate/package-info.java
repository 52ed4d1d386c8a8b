/**
 * From a plate's channels to what it does to the foot: which way is up, the channels' unloaded level, the six components
 * in lab axes about the centre of the plate's surface, their sign, and the same smoothed.
 *
 * <p>Nothing here divides by the normal force except {@link treadwork.solver.plate.CentreOfPressure}, which is for display
 * and for finding the foot; loads are carried as force and moment about a fixed point. Start at
 * {@link treadwork.solver.plate.PlateLoads}. Uses {@code solver.filter} and {@code model}.
 */
package treadwork.solver.plate;
