package treadwork.io.capture;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.ReadOptions;
import treadwork.io.text.TextFile;
import treadwork.io.text.TextReader;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.LabSettings;

/** Reads a capture in whichever format it is. */
public final class CaptureFiles {

    /** Every C3D file has it as its second byte; a text would have to begin with a letter and a capital P. */
    private static final int C3D_KEY = 0x50;

    private static final int LONGEST_OPENING = 4096;

    private CaptureFiles() {}

    /**
     * Reads a capture without any study.
     *
     * @param unit of the positions by the user's word, which then replaces the file's
     * @throws UnusableInputException if it cannot be used
     */
    public static Capture read(Path file, Optional<LengthUnit> unit) {
        return movement(file, Optional.empty(), new LabSettings(Optional.empty(), unit, Optional.empty()));
    }

    /**
     * Reads a trial's capture, with the plates that the study names.
     *
     * @param plateFile the plates' own file, of text captures alone
     * @throws UnusableInputException if it cannot be used
     */
    public static Capture movement(Path file, Optional<Path> plateFile, LabSettings lab) {
        if (isText(file)) {
            return NamedPlates.in(TextReader.read(TextFile.of(file), plateFile.map(TextFile::of), lab), lab);
        }
        boolean filePlates = lab.plates().isEmpty() && lab.namedPlates().isEmpty();
        Capture capture = C3dReader.read(file, new ReadOptions(lab.pointUnit(), filePlates));
        if (plateFile.isPresent()) {
            throw new UnusableInputException(new Finding(
                    "plate-file-unused",
                    Severity.REFUSES,
                    String.valueOf(file.getFileName()),
                    "the trial names the plateFile \"" + plateFile.get().getFileName()
                            + "\", but its capture is a C3D file, which holds its own plates",
                    "It is not known which of the two is meant",
                    "Take plateFile out of the trial, or name the text capture that it belongs to"));
        }
        return NamedPlates.in(capture, lab);
    }

    /**
     * Reads a standing capture, of which the markers alone are used.
     *
     * @throws UnusableInputException if it cannot be used
     */
    public static Capture standing(Path file, LabSettings lab) {
        return isText(file)
                ? TextReader.markers(TextFile.of(file), lab)
                : C3dReader.read(file, new ReadOptions(lab.pointUnit(), false));
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
        return file.toString().toLowerCase(Locale.ROOT).matches(".*\\.(txt|csv|tsv|xlsx?|ods)");
    }
}
