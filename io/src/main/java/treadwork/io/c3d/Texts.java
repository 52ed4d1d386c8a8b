package treadwork.io.c3d;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;

/** Text fields of a file: of fixed width, padded with blanks or zero bytes. */
final class Texts {

    private Texts() {}

    /**
     * The text up to the first zero byte, blanks taken off both ends, control characters turned into blanks so that it keeps
     * to one line. Bytes that are not UTF-8 are taken as Latin-1.
     */
    static String of(byte[] bytes, int from, int width) {
        int length = 0;
        boolean plain = true;
        while (length < width && bytes[from + length] != 0) {
            plain &= bytes[from + length] >= ' ';
            length++;
        }
        if (plain) {
            return new String(bytes, from, length, StandardCharsets.ISO_8859_1).strip();
        }
        String text;
        try {
            text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes, from, length))
                    .toString();
        } catch (CharacterCodingException e) {
            text = new String(bytes, from, length, StandardCharsets.ISO_8859_1);
        }
        return text.codePoints()
                .map(point -> Character.isISOControl(point) ? ' ' : point)
                .collect(StringBuilder::new, StringBuilder::appendCodePoint, StringBuilder::append)
                .toString()
                .strip();
    }
}
