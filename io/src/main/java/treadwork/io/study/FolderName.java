package treadwork.io.study;

import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** Names of the folders that results are written to, which must serve on every common file system. */
public final class FolderName {

    private static final int LONGEST = 100;
    private static final String FORBIDDEN = "/\\:*?\"<>|";
    private static final Set<String> RESERVED = Set.of("con", "prn", "aux", "nul");

    private FolderName() {}

    /** The folder of a trial's results within its subject's: the capture's file name without its ending. */
    public static String ofTrial(String file) {
        String name = file.substring(file.lastIndexOf('/') + 1);
        int dot = name.lastIndexOf('.');
        return dot > 0 ? name.substring(0, dot) : name;
    }

    /** What is wrong with a name, in words; empty for a safe one. */
    static Optional<String> fault(String name) {
        if (name.isBlank() || name.length() > LONGEST) {
            return Optional.of("it has " + name.length() + " characters, allowed are 1 to " + LONGEST);
        }
        Optional<String> character = name.chars()
                .filter(c -> c < ' ' || c == 127 || FORBIDDEN.indexOf(c) >= 0)
                .mapToObj(c ->
                        c < ' ' || c == 127 ? "it holds a control character" : "it holds the character " + (char) c)
                .findFirst();
        if (character.isPresent()) {
            return character;
        }
        if (name.startsWith(".") || name.endsWith(".") || !name.equals(name.strip())) {
            return Optional.of("it begins or ends with a full stop or a blank");
        }
        String stem = name.toLowerCase(Locale.ROOT).split("\\.", 2)[0];
        boolean device = RESERVED.contains(stem) || stem.matches("(com|lpt)[0-9]");
        return device ? Optional.of("Windows keeps that name for a device") : Optional.empty();
    }
}
