package treadwork.io.file;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.BasicFileAttributes;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;

/** Moving, deleting, and saying why it could not be done. */
final class Places {

    private Places() {}

    /** Renames within a folder, in one step where the file system can. */
    static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    /** Deletes a file or a folder with all in it, if it is there; links are deleted, not followed. */
    static void delete(Path path) throws IOException {
        if (!Files.exists(path, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        Files.walkFileTree(path, new SimpleFileVisitor<>() {
            @Override
            public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) throws IOException {
                Files.delete(file);
                return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult postVisitDirectory(Path folder, IOException fault) throws IOException {
                Files.delete(folder);
                return FileVisitResult.CONTINUE;
            }
        });
    }

    /** Deletes if it can; what stays is cleaned by the next run. */
    static void discard(Path path) {
        try {
            delete(path);
        } catch (IOException e) {
            // It bears a leftover's name, so it is never read, and the next run tries again.
            return;
        }
    }

    static UnusableInputException notWritable(Path target, IOException cause) {
        return new UnusableInputException(
                new Finding(
                        "results-not-writable",
                        Severity.REFUSES,
                        target.toString(),
                        "it cannot be written: " + reason(cause),
                        "Nothing of it was written, and what stood there before still stands",
                        "Free space, give leave to write there, or choose another folder"),
                cause);
    }

    private static String reason(IOException cause) {
        String about = cause instanceof FileSystemException fault ? fault.getFile() + " " : "";
        if (cause instanceof AccessDeniedException) {
            return about + "may not be written to";
        }
        if (cause instanceof FileAlreadyExistsException || cause instanceof NotDirectoryException) {
            return about + "is in the way";
        }
        if (cause instanceof NoSuchFileException) {
            return about + "does not exist";
        }
        boolean stated = cause instanceof FileSystemException fault && fault.getReason() != null;
        return stated ? ((FileSystemException) cause).getReason() : String.valueOf(cause.getMessage());
    }
}
