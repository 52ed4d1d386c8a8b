package treadwork.io.text;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/** The bytes of a text file in an encoding in which the signs of numbers are one byte each, without byte order mark. */
final class Source {

    private static final byte[] ZIP = {'P', 'K', 3, 4};
    private static final byte[] COMPOUND = {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0};

    final String file;
    final byte[] bytes;
    final Charset charset;

    /** Ends of lines in it. */
    final int lines;

    private Source(String file, byte[] bytes, Charset charset, int lines) {
        this.file = file;
        this.bytes = bytes;
        this.charset = charset;
        this.lines = lines;
    }

    static Source of(String file, byte[] raw) {
        if (begins(raw, ZIP) || begins(raw, COMPOUND)) {
            throw Refusal.of(
                    "text-binary", file, "this is a spreadsheet's own binary file", "Export the table as text or CSV");
        }
        byte[] bytes = withoutMark(raw);
        int lines = 1;
        boolean blank = true;
        boolean wide = false;
        byte before = 0;
        for (byte b : bytes) {
            if (b <= ' ') {
                if (b == 0) {
                    throw nul(file, lines);
                }
                lines += b == '\r' || (b == '\n' && before != '\r') ? 1 : 0;
                blank &= b == ' ' || b == '\n' || b == '\r' || b == '\t';
                wide |= b < 0;
            } else {
                blank = false;
            }
            before = b;
        }
        if (blank) {
            throw Refusal.of("text-empty", file, "the file holds no text", "Export the capture again");
        }
        return new Source(file, bytes, wide ? charset(bytes) : StandardCharsets.UTF_8, lines);
    }

    private static byte[] withoutMark(byte[] raw) {
        if (begins(raw, new byte[] {(byte) 0xFF, (byte) 0xFE})) {
            return new String(raw, 2, raw.length - 2, StandardCharsets.UTF_16LE).getBytes(StandardCharsets.UTF_8);
        }
        if (begins(raw, new byte[] {(byte) 0xFE, (byte) 0xFF})) {
            return new String(raw, 2, raw.length - 2, StandardCharsets.UTF_16BE).getBytes(StandardCharsets.UTF_8);
        }
        boolean marked = begins(raw, new byte[] {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF});
        return marked ? Arrays.copyOfRange(raw, 3, raw.length) : raw;
    }

    private static RuntimeException nul(String file, int line) {
        return Refusal.of(
                "text-binary",
                file + ", line " + line,
                "here stands a NUL byte, which no text holds",
                "Name a C3D file or a text export");
    }

    /** UTF-8 if all of the file is; decoded in pieces, so that no second copy of it stands in memory. */
    private static Charset charset(byte[] bytes) {
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder();
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer piece = CharBuffer.allocate(1 << 13);
        CoderResult result;
        do {
            piece.clear();
            result = decoder.decode(in, piece, true);
        } while (result.isOverflow());
        return result.isError() ? StandardCharsets.ISO_8859_1 : StandardCharsets.UTF_8;
    }

    private static boolean begins(byte[] bytes, byte[] start) {
        return bytes.length >= start.length && Arrays.equals(bytes, 0, start.length, start, 0, start.length);
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

    /** Where the cell that begins at {@code from} ends; in quotes a delimiter is part of it. */
    int endOfCell(int from, int end, byte delimiter) {
        int at = from;
        if (at < end && bytes[at] == '"') {
            at++;
            while (at < end && bytes[at] != '"') {
                at++;
            }
        }
        while (at < end && bytes[at] != delimiter) {
            at++;
        }
        return at;
    }

    String text(int from, int to) {
        return new String(bytes, from, to - from, charset);
    }
}
