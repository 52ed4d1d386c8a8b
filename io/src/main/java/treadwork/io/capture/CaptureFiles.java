package treadwork.io.capture;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.ReadOptions;
import treadwork.io.text.TextFile;
import treadwork.io.text.TextReader;
import treadwork.model.capture.Capture;
import treadwork.model.study.TextSettings;

/** Reads a capture in whichever format it is. */
public final class CaptureFiles {

    /** Every C3D file has it as its second byte; a text would have to begin with a letter and a capital P. */
    private static final int C3D_KEY = 0x50;

    private static final int LONGEST_OPENING = 4096;

    private CaptureFiles() {}

    /**
     * Reads a capture.
     *
     * @param plateFile the plates' own file, of text captures alone
     * @throws treadwork.model.finding.UnusableInputException if it cannot be used
     */
    public static Capture read(Path file, Optional<Path> plateFile, ReadOptions options, TextSettings text) {
        if (isText(file)) {
            return TextReader.read(TextFile.of(file), plateFile.map(TextFile::of), options.unit(), text);
        }
        return C3dReader.read(file, options);
    }

    /** An empty or unreadable file, and one of another binary kind, is left to the C3D reader to refuse. */
    private static boolean isText(Path file) {
        try (InputStream stream = Files.newInputStream(file)) {
            byte[] opening = stream.readNBytes(LONGEST_OPENING);
            if (opening.length < 2) {
                return false;
            }
            boolean wide = (opening[0] & 0xFF) >= 0xFE && (opening[1] & 0xFF) >= 0xFE;
            int controls = 0;
            for (byte b : opening) {
                controls += b >= 0 && b < ' ' && b != '\t' && b != '\n' && b != '\r' ? 1 : 0;
            }
            return wide || controls == 0 || (opening[1] != C3D_KEY && isTextName(file));
        } catch (IOException e) {
            return false;
        }
    }

    private static boolean isTextName(Path file) {
        return file.toString().toLowerCase(java.util.Locale.ROOT).matches(".*\\.(txt|csv|tsv|xlsx?|ods)");
    }
}
