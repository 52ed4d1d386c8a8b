/**
 * A study: who, which captures, and how they are to be processed, every default filled in.
 *
 * <p>The reader resolves "the nearest wins", so what stands in a {@link treadwork.model.study.Trial} is what holds for it.
 * Start at {@link treadwork.model.study.Study}. Uses {@code body}, {@code capture} and {@code space}.
 */
package treadwork.model.study;
