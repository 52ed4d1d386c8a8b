/**
 * Captures as delimited text: comma, semicolon or tab, decimal point or comma, markers and plates in one file or two.
 *
 * <p>Start at {@link treadwork.io.text.TextReader}. What cannot be used is refused in one line that names file, line and
 * column. Memory stays in proportion to the bytes of the file. Uses {@code model} only.
 */
package treadwork.io.text;
