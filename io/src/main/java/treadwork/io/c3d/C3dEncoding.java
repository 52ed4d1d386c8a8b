package treadwork.io.c3d;

/**
 * In which formats a file holds its numbers.
 *
 * @param processor      whose byte order and reals
 * @param storage        of positions and analog values
 * @param unsignedAnalog whether integer analog values count from 0 to 65535; of no meaning to {@link Storage#REAL}
 */
public record C3dEncoding(Processor processor, Storage storage, boolean unsignedAnalog) {

    /** What is read everywhere and loses least. */
    public static final C3dEncoding DEFAULT = new C3dEncoding(Processor.INTEL, Storage.REAL, false);

    /** How positions and analog values are held. */
    public enum Storage {
        /** 32-bit reals. */
        REAL,
        /** 16-bit integers with a scale. */
        INTEGER
    }

    boolean real() {
        return storage == Storage.REAL;
    }
}
