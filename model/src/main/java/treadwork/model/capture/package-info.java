/**
 * What a capture file holds: marker courses, analog channels, force plates as described, events.
 *
 * <p>Lengths are metres here whatever the file's unit was; analog channels stay in the units of the file, since what they
 * mean depends on the plate that uses them. Start at {@link treadwork.model.capture.Capture}. Uses
 * {@code space} and {@code finding}.
 */
package treadwork.model.capture;
