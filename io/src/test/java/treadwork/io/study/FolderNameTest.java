package treadwork.io.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FolderNameTest {

    @ParameterizedTest
    @ValueSource(strings = {"S01", "walk 1 (left)", "Größe_2", "a.b", "console"})
    void lettersDigitsAndInnerBlanksAreSafe(String name) {
        assertTrue(FolderName.fault(name).isEmpty());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "", " ", ".", "..", ".hidden", "a.", "a ", " a", "a/b", "a\\b", "a:b", "a\tb", "CON", "nul.c", "Lpt1"
            })
    void whatAnyFileSystemRefusesIsUnsafe(String name) {
        assertTrue(FolderName.fault(name).isPresent());
    }

    @Test
    void aTrialIsNamedByItsFileWithoutFolderAndEnding() {
        assertEquals("walk.01", FolderName.ofTrial("S01/day.2/walk.01.c3d"));
        assertEquals("walk", FolderName.ofTrial("walk"));
        assertEquals(".c3d", FolderName.ofTrial("S01/.c3d"));
    }
}
