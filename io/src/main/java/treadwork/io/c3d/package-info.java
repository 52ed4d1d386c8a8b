/**
 * Capture files in the open C3D format, in and out.
 *
 * <p>Start at {@link treadwork.io.c3d.C3dReader} and {@link treadwork.io.c3d.C3dWriter}. No length, count or offset that a
 * file states is believed before it is held against the size of the file. What is odd but can be read travels as a finding
 * with the capture (all of them are in {@code Notices}); what cannot be used is thrown (all in {@code Refusals}). Uses
 * {@code model} only. Of the subject's data nothing is read, and nothing is written.
 */
package treadwork.io.c3d;
