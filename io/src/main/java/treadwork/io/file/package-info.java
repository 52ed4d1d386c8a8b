/**
 * Writing so that what stands on disk is whole or not there: a file or a folder is written beside its place under
 * another name and renamed into it.
 *
 * <p>Start at {@link treadwork.io.file.WholeFile} and {@link treadwork.io.file.WholeFolder}. Uses {@code
 * model.finding}.
 */
package treadwork.io.file;
