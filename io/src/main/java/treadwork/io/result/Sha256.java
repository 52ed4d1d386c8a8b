package treadwork.io.result;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** SHA-256 digests in hexadecimal. */
final class Sha256 {

    private Sha256() {}

    static String of(String text) {
        return HexFormat.of().formatHex(digest().digest(text.getBytes(StandardCharsets.UTF_8)));
    }

    /** Read in pieces: a capture may be larger than the memory that is free. */
    static String of(Path file) throws IOException {
        MessageDigest digest = digest();
        byte[] piece = new byte[1 << 16];
        try (InputStream stream = Files.newInputStream(file)) {
            for (int read = stream.read(piece); read >= 0; read = stream.read(piece)) {
                digest.update(piece, 0, read);
            }
        }
        return HexFormat.of().formatHex(digest.digest());
    }

    private static MessageDigest digest() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
