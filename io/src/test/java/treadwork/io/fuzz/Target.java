package treadwork.io.fuzz;

import java.io.IOException;
import java.util.List;

/** A reader under test. */
interface Target {

    String name();

    /** Inputs that it reads without a complaint. */
    List<byte[]> seeds();

    /** Words that mean something to it, to be put anywhere. */
    List<String> words();

    /**
     * Reads an input and all that comes out of it.
     *
     * @return what kind of result it was: the more kinds the inputs lead to, the more of the reader they have been through
     * @throws RuntimeException only {@link treadwork.model.finding.UnusableInputException}
     */
    String read(byte[] input) throws IOException;
}
