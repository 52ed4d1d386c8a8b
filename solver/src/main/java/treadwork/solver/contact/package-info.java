/**
 * Which foot is on which plate when, what each foot is given to stand on, and in which frames that cannot be known.
 *
 * <p>Contacts come from the unfiltered push of the plates, feet from the centre of pressure, the need for a plate from the
 * feet's own motion. Start at {@link treadwork.solver.contact.Contacts}. Uses {@code solver.plate} and {@code model}.
 */
package treadwork.solver.contact;
