/**
 * The study file: reading it with every fault named by path and line, writing one, and its JSON Schema.
 *
 * <p>A file is parsed with the place of each value kept, checked against the schema, checked for what a schema cannot
 * say, and resolved so that each trial carries all that holds for it. Start at {@link treadwork.io.study.StudyReader}.
 * Uses {@code model} and {@code io.file}; Jackson and the schema validator stay inside.
 */
package treadwork.io.study;
