package treadwork.model.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class NearestNameTest {

    /** By hand: one exchange; one insertion; one swap; kitten to sitting is the textbook's 3. */
    @Test
    void countsExchangesInsertionsAndSwaps() {
        assertEquals(1, NearestName.edits("heel", "heal"));
        assertEquals(1, NearestName.edits("gap", "gaps"));
        assertEquals(1, NearestName.edits("wlak", "walk"));
        assertEquals(3, NearestName.edits("kitten", "sitting"));
        assertEquals(0, NearestName.edits("MASSKG", "massKg"));
        assertEquals(4, NearestName.edits("", "heel"));
    }

    @Test
    void givesNoNameThatHasLittleInCommon() {
        assertEquals(Optional.empty(), NearestName.of("zzz", List.of("up", "plates")));
        assertEquals(Optional.of("plates"), NearestName.of("plate", List.of("up", "plates")));
        assertEquals(Optional.empty(), NearestName.of("up", List.of()));
    }
}
