package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import treadwork.model.space.ScalarSeries;

/** Samples at 1000 Hz, so that 50 of them are the shortest contact. */
class LoadedSpellTest {

    @Test
    void beginsAtTheThresholdAndEndsBelowHalfOfIt() {
        ScalarSeries push = ramps(0, 100, 200);

        List<LoadedSpell> spells = LoadedSpell.find(push, 20, 1000);

        assertEquals(List.of(new LoadedSpell(20, 191)), spells, "rises by 1 N a sample to 100 N, falls by 1 N to 0");
    }

    @Test
    void doesNotEndWhileThePushStaysAboveHalfTheThreshold() {
        ScalarSeries push = ScalarSeries.of(IntStream.range(0, 300)
                .mapToDouble(i -> i < 100 || i > 200 ? 30 : 11)
                .toArray());

        assertEquals(List.of(new LoadedSpell(0, 300)), LoadedSpell.find(push, 20, 1000));
    }

    @Test
    void doesNotBeginBelowTheThreshold() {
        ScalarSeries push =
                ScalarSeries.of(IntStream.range(0, 300).mapToDouble(i -> 19.9).toArray());

        assertEquals(List.of(), LoadedSpell.find(push, 20, 1000));
    }

    @Test
    void lastsFiftyMilliseconds() {
        assertEquals(List.of(), LoadedSpell.find(block(49), 20, 1000));
        assertEquals(List.of(new LoadedSpell(10, 60)), LoadedSpell.find(block(50), 20, 1000));
    }

    @Test
    void goesOnAcrossSamplesThatAreNotKnownWhileThePlateIsLoadedOnBothSides() {
        double[] values = block(200).toArray();
        Arrays.fill(values, 100, 120, Double.NaN);

        assertEquals(List.of(new LoadedSpell(10, 210)), LoadedSpell.find(ScalarSeries.of(values), 20, 1000));
    }

    @Test
    void endsWhereThePushIsNotKnownAndThePlateIsEmptyAfterwards() {
        double[] values = block(200).toArray();
        Arrays.fill(values, 150, 215, Double.NaN);

        assertEquals(List.of(new LoadedSpell(10, 150)), LoadedSpell.find(ScalarSeries.of(values), 20, 1000));
    }

    @Test
    void doesNotBeginWhereThePushIsNotKnown() {
        double[] values = block(200).toArray();
        Arrays.fill(values, 0, 30, Double.NaN);

        assertEquals(List.of(new LoadedSpell(30, 210)), LoadedSpell.find(ScalarSeries.of(values), 20, 1000));
    }

    private static ScalarSeries block(int length) {
        return ScalarSeries.of(IntStream.range(0, 300)
                .mapToDouble(i -> i >= 10 && i < 10 + length ? 500 : 0)
                .toArray());
    }

    private static ScalarSeries ramps(int from, int top, int to) {
        return ScalarSeries.of(IntStream.rangeClosed(from, to)
                .mapToDouble(i -> i <= top ? i : to - i)
                .toArray());
    }
}
