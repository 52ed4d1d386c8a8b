package treadwork.io.text;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;

/** The bytes of a text file in an encoding in which the signs of numbers are one byte each, without byte order mark. */
final class Source {

    private static final byte[] ZIP = {'P', 'K', 3, 4};
    private static final byte[] COMPOUND = {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0};

    final String file;
    final byte[] bytes;
    final Charset charset;

    private Source(String file, byte[] bytes, Charset charset) {
        this.file = file;
        this.bytes = bytes;
        this.charset = charset;
    }

    static Source of(String file, byte[] raw) {
        if (begins(raw, ZIP) || begins(raw, COMPOUND)) {
            throw Refusal.of(
                    "text-binary", file, "this is a spreadsheet's own binary file", "Export the table as text or CSV");
        }
        byte[] bytes = raw;
        if (begins(raw, new byte[] {(byte) 0xFF, (byte) 0xFE})) {
            bytes = new String(raw, 2, raw.length - 2, StandardCharsets.UTF_16LE).getBytes(StandardCharsets.UTF_8);
        } else if (begins(raw, new byte[] {(byte) 0xFE, (byte) 0xFF})) {
            bytes = new String(raw, 2, raw.length - 2, StandardCharsets.UTF_16BE).getBytes(StandardCharsets.UTF_8);
        } else if (begins(raw, new byte[] {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF})) {
            bytes = java.util.Arrays.copyOfRange(raw, 3, raw.length);
        }
        int line = 1;
        boolean blank = true;
        for (byte b : bytes) {
            if (b == 0) {
                throw Refusal.of(
                        "text-binary",
                        file + ", line " + line,
                        "here stands a NUL byte, which no text holds",
                        "Name a C3D file or a text export");
            }
            line += b == '\n' ? 1 : 0;
            blank &= b == ' ' || b == '\n' || b == '\r' || b == '\t';
        }
        if (blank) {
            throw Refusal.of("text-empty", file, "the file holds no text", "Export the capture again");
        }
        return new Source(file, bytes, charset(bytes));
    }

    private static Charset charset(byte[] bytes) {
        try {
            StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes, 0, lineEnd(bytes, 1 << 16)));
            return StandardCharsets.UTF_8;
        } catch (CharacterCodingException e) {
            return StandardCharsets.ISO_8859_1;
        }
    }

    /** The end of the line that holds that place. */
    private static int lineEnd(byte[] bytes, int from) {
        int at = from;
        while (at < bytes.length && bytes[at] != '\n') {
            at++;
        }
        return Math.min(at, bytes.length);
    }

    private static boolean begins(byte[] bytes, byte[] start) {
        return bytes.length >= start.length && java.util.Arrays.equals(bytes, 0, start.length, start, 0, start.length);
    }

    /** The place after the line that begins at {@code from}, its end included. */
    int nextLine(int from) {
        int end = endOfLine(from);
        if (end < bytes.length - 1 && bytes[end] == '\r' && bytes[end + 1] == '\n') {
            return end + 2;
        }
        return Math.min(end + 1, bytes.length);
    }

    int endOfLine(int from) {
        int at = from;
        while (at < bytes.length && bytes[at] != '\n' && bytes[at] != '\r') {
            at++;
        }
        return at;
    }

    String text(int from, int to) {
        return new String(bytes, from, to - from, charset);
    }
}
