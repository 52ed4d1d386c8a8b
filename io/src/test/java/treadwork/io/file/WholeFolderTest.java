package treadwork.io.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.model.finding.UnusableInputException;

class WholeFolderTest {

    private static final Set<String> OWN = Set.of("a.csv");

    /** Above the largest number that Linux, macOS and Windows give a process in practice: no process has it. */
    private static final long NO_PROCESS = 999_999_999_999L;

    @TempDir
    Path parent;

    private Path target;

    @BeforeEach
    void nameTheTarget() {
        target = parent.resolve("walk");
    }

    @Test
    void replacesTheOldFolder() throws IOException {
        write("old");

        write("new");

        assertEquals("new", Files.readString(target.resolve("a.csv")));
        assertEquals(List.of("walk"), names());
    }

    @Test
    void aFullDiskLeavesTheOldFolderAndIsTold() throws IOException {
        write("old");

        UnusableInputException thrown = assertThrows(
                UnusableInputException.class,
                () -> WholeFolder.write(target, OWN, folder -> {
                    Files.writeString(folder.resolve("a.csv"), "half");
                    throw new FileSystemException(folder.toString(), null, "No space left on device");
                }));

        assertEquals("results-not-writable", thrown.finding().code());
        assertEquals(target.toString(), thrown.finding().where());
        assertTrue(thrown.finding().figure().contains("No space left on device"));
        assertEquals("old", Files.readString(target.resolve("a.csv")));
        assertEquals(List.of("walk"), names());
    }

    /** The new folder is gone when it is to be renamed, after the old one was put aside. */
    @Test
    void aRenamingThatFailsPutsTheOldFolderBack() throws IOException {
        write("old");

        UnusableInputException thrown =
                assertThrows(UnusableInputException.class, () -> WholeFolder.write(target, OWN, Files::delete));

        assertEquals("results-not-writable", thrown.finding().code());
        assertEquals("old", Files.readString(target.resolve("a.csv")));
        assertEquals(List.of("walk"), names());
    }

    @Test
    void whatAnInterruptedRunWasWritingIsCleared() throws IOException {
        write("old");
        leave(PartName.PART, NO_PROCESS, "half");

        WholeFolder.recover(target);

        assertEquals("old", Files.readString(target.resolve("a.csv")));
        assertEquals(List.of("walk"), names());
    }

    @Test
    void anOldFolderThatWasPutAsideGoesBack() throws IOException {
        leave(PartName.OLD, NO_PROCESS, "old");
        leave(PartName.PART, NO_PROCESS, "new");

        WholeFolder.recover(target);

        assertEquals("old", Files.readString(target.resolve("a.csv")));
        assertEquals(List.of("walk"), names());
    }

    @Test
    void anOldFolderBesideItsReplacementIsCleared() throws IOException {
        write("new");
        leave(PartName.OLD, NO_PROCESS, "old");

        WholeFolder.recover(target);

        assertEquals("new", Files.readString(target.resolve("a.csv")));
        assertEquals(List.of("walk"), names());
    }

    @Test
    void theNextWritingClearsLeftoversToo() throws IOException {
        leave(PartName.PART, NO_PROCESS, "half");

        write("new");

        assertEquals(List.of("walk"), names());
    }

    @Test
    void whatARunningProcessIsWritingStays() throws IOException {
        long other = ProcessHandle.current().parent().orElseThrow().pid();
        leave(PartName.PART, other, "half");

        write("new");

        assertEquals(List.of(".walk." + other + ".part", "walk"), names());
    }

    @Test
    void leftoversOfAnotherFolderAndFilesOfLikeNameStay() throws IOException {
        Files.createDirectories(parent.resolve(".walk.2." + NO_PROCESS + ".part"));
        Files.writeString(parent.resolve(".walk.notes.part"), "a person's");

        write("new");

        assertEquals(List.of(".walk.2." + NO_PROCESS + ".part", ".walk.notes.part", "walk"), names());
    }

    @Test
    void aFolderThatALinkLeadsToIsNotEmptied(@TempDir Path elsewhere) throws IOException {
        Files.writeString(elsewhere.resolve("capture.c3d"), "a capture");
        Path part = Files.createDirectories(PartName.of(target, PartName.PART, NO_PROCESS));
        Files.createSymbolicLink(part.resolve("link"), elsewhere);

        WholeFolder.recover(target);

        assertEquals("a capture", Files.readString(elsewhere.resolve("capture.c3d")));
        assertEquals(List.of(), names());
    }

    @Test
    void litterOfADesktopDoesNotKeepAFolder() throws IOException {
        write("old");
        Files.writeString(target.resolve(".DS_Store"), "litter");

        write("new");

        assertEquals("new", Files.readString(target.resolve("a.csv")));
    }

    @Test
    void anotherFileKeepsAFolder() throws IOException {
        write("old");
        Files.writeString(target.resolve("notes.txt"), "a person's");

        UnusableInputException thrown = assertThrows(UnusableInputException.class, () -> write("new"));

        assertEquals("results-folder-foreign", thrown.finding().code());
        assertEquals("a person's", Files.readString(target.resolve("notes.txt")));
        assertEquals("old", Files.readString(target.resolve("a.csv")));
    }

    @Test
    void aFileIsReplacedWhole() throws IOException {
        Path file = parent.resolve("deep/report.html");

        WholeFile.write(file, "first");
        WholeFile.write(file, "zweite Größe");

        assertEquals("zweite Größe", Files.readString(file));
        assertEquals(List.of("deep"), names());
    }

    @Test
    void aFileThatCannotBeWrittenIsTold() throws IOException {
        Path inTheWay = Files.createDirectories(parent.resolve("report.html/inner"));

        UnusableInputException thrown = assertThrows(
                UnusableInputException.class, () -> WholeFile.write(parent.resolve("report.html"), "text"));

        assertEquals("results-not-writable", thrown.finding().code());
        assertTrue(Files.isDirectory(inTheWay));
        assertEquals(List.of("report.html"), names());
    }

    private void write(String text) {
        WholeFolder.write(target, OWN, folder -> Files.writeString(folder.resolve("a.csv"), text));
    }

    private void leave(String ending, long process, String text) throws IOException {
        Path folder = Files.createDirectories(PartName.of(target, ending, process));
        Files.writeString(folder.resolve("a.csv"), text);
    }

    private List<String> names() throws IOException {
        try (Stream<Path> entries = Files.list(parent)) {
            return entries.map(path -> path.getFileName().toString()).sorted().toList();
        }
    }
}
