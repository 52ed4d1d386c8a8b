/**
 * Captures of any format, told apart by their content. Start at {@link treadwork.io.capture.CaptureFiles}. Uses
 * {@code io.c3d} and {@code io.text}.
 */
package treadwork.io.capture;
