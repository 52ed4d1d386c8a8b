package treadwork.io.study;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.UnusableInputException;

/** The files that a study names: within its folder tree, links followed, and there. */
final class StudyPaths {

    /** More names than this in a folder are not looked through for the nearest. */
    private static final int MOST_NAMES = 10_000;

    private final Path folder;
    private final Path realFolder;

    StudyPaths(Path folder) throws IOException {
        this.folder = folder;
        this.realFolder = folder.toRealPath();
    }

    /**
     * @param place where the study names it
     * @throws UnusableInputException with code {@code study-path-outside} or {@code study-file-missing}
     */
    Path existing(Place place, String text) {
        Path path = within(place, text);
        if (!Files.isRegularFile(path)) {
            throw missing(place, text, path);
        }
        try {
            if (!path.toRealPath().startsWith(realFolder)) {
                throw outside(place, text, "leads through a link out of the study's folder");
            }
        } catch (IOException e) {
            throw missing(place, text, path);
        }
        return path;
    }

    private Path within(Place place, String text) {
        if (text.indexOf('\\') >= 0) {
            throw place.unusable(
                    "study-value",
                    "the path \"" + text + "\" holds a \\",
                    "Read on another system it would be another file",
                    "Write the path with /");
        }
        if (text.startsWith("/") || text.matches("[A-Za-z]:.*")) {
            throw outside(place, text, "does not start from the study's folder");
        }
        try {
            Path path = folder.resolve(text).normalize();
            if (!path.startsWith(folder.normalize())) {
                throw outside(place, text, "leaves the study's folder");
            }
            return path;
        } catch (InvalidPathException e) {
            throw place.unusable(
                    "study-value",
                    "the path \"" + printable(text) + "\" cannot be a file's name here",
                    "No such file can exist on this system",
                    "Give the path of a file that exists");
        }
    }

    private static UnusableInputException outside(Place place, String text, String how) {
        return place.unusable(
                "study-path-outside",
                "the path \"" + text + "\" " + how,
                "A study is handed on as one folder; what lies outside would be missing there",
                "Move the file into the study's folder and give its path from there");
    }

    private UnusableInputException missing(Place place, String text, Path path) {
        if (Files.isDirectory(path)) {
            return place.unusable(
                    "study-file-missing",
                    "\"" + text + "\" is a folder",
                    "A file is needed here",
                    "Add the file's name to the path");
        }
        Path gone = path;
        while (gone.getParent() != null && !Files.isDirectory(gone.getParent())) {
            gone = gone.getParent();
        }
        String name = String.valueOf(gone.getFileName());
        String nearest = NearestName.hint(name, namesBeside(gone));
        return place.unusable(
                "study-file-missing",
                "there is no \"" + name + "\" in " + gone.getParent() + nearest,
                "Without the file nothing can be computed from it",
                "Correct the path, or put the file there");
    }

    private static List<String> namesBeside(Path gone) {
        try (Stream<Path> siblings = Files.list(gone.getParent())) {
            return siblings.limit(MOST_NAMES)
                    .map(path -> path.getFileName().toString())
                    .sorted()
                    .toList();
        } catch (IOException e) {
            return List.of();
        }
    }

    private static String printable(String text) {
        return text.replaceAll("\\p{Cntrl}", "?");
    }
}
