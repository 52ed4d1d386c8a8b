package treadwork.io.c3d;

import java.util.Optional;
import treadwork.model.capture.LengthUnit;

/**
 * What a reader of a capture file decides for itself.
 *
 * @param unit       the unit of length by the user's word, which then replaces the file's
 * @param filePlates whether the file's description of the force plates is read; false where the study describes them itself
 */
public record ReadOptions(Optional<LengthUnit> unit, boolean filePlates) {

    /** Everything as the file states it. */
    public static final ReadOptions DEFAULT = new ReadOptions(Optional.empty(), true);
}
