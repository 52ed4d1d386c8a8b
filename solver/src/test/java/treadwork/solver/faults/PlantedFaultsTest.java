package treadwork.solver.faults;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** How many walks are looked at says the system property {@code walks}; the whole table is made by {@link FaultTable}. */
class PlantedFaultsTest {

    private static final int WALKS = Integer.getInteger("walks", 8);

    static Stream<Named<PlantedFault>> thatMatter() {
        return FaultCatalogue.all().stream()
                .filter(PlantedFault::matters)
                .map(fault -> Named.of(fault.code() + ": " + fault.what(), fault));
    }

    @ParameterizedTest
    @MethodSource("thatMatter")
    void aPlantedMistakeIsFoundInNinetyEightOfAHundredWalks(PlantedFault fault) {
        long found = FaultTable.found(fault, WALKS);

        assertTrue(found >= Math.ceil(0.98 * WALKS), found + " of " + WALKS);
    }

    @Test
    void noMoreThanTwoOfAHundredCleanWalksAreAccused() {
        Map<String, Integer> accused = FaultTable.accused(3 * WALKS);

        assertTrue(accused.getOrDefault("", 0) <= 0.02 * 3 * WALKS, accused.toString());
    }

    @Test
    void everyCodeOfTheCatalogueHasASizeThatMatters() {
        long codes =
                FaultCatalogue.all().stream().map(PlantedFault::code).distinct().count();

        assertEquals(
                codes,
                FaultCatalogue.all().stream()
                        .filter(PlantedFault::matters)
                        .map(PlantedFault::code)
                        .distinct()
                        .count());
    }
}
