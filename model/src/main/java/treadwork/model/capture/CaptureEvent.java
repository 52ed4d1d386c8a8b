package treadwork.model.capture;

/**
 * An event that the capture file itself names.
 *
 * @param label   for example "Foot Strike"; may be empty
 * @param context for example "Left"; may be empty
 * @param timeS   seconds from the capture's first frame
 */
public record CaptureEvent(String label, String context, double timeS) {}
