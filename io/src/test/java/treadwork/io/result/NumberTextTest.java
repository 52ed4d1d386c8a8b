package treadwork.io.result;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {

    /** What results.md promises of every number. */
    private static final double PROMISE = 1e-9;

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "-0.0, 0",
        "1, 1",
        "-1, -1",
        "10, 10",
        "72.4, 72.4",
        "-0.005, -0.005",
        "0.015, 0.015",
        "65535, 65535",
        "1200, 1200",
        "1234.56789012, 1234.56789",
        "-98765.43210987, -98765.43211",
        "0.000123456789012, 0.000123456789",
        "1e-9, 0.000000001",
        "123456789012, 123456789000",
        "999999999999999, 1000000000000000",
        "9.99999999996, 10",
        "0.99999999996, 1",
        "0.099999999996, 0.1",
        "9.9999999994, 9.999999999",
        "1e14, 100000000000000",
    })
    void writesTenDigitsPlainly(double value, String expected) {
        assertEquals(expected, text(value));
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void whatIsNotKnownIsEmpty(double value) {
        assertEquals("", text(value));
    }

    @Test
    void theLongestNumberFitsTheRoom() {
        int longest = 0;
        for (double value :
                new double[] {-Double.MAX_VALUE, -2.2250738585072014E-308, -1.234567891e-9, -Double.MIN_VALUE}) {
            longest = Math.max(longest, text(value).length());
        }

        assertTrue(longest <= NumberText.LONGEST, "longest is " + longest);
    }

    @Test
    void sizesOfEveryOrderReadBack() {
        long seed = 20261201;
        Random random = new Random(seed);
        for (int i = 0; i < 100_000; i++) {
            double value = (random.nextBoolean() ? 1 : -1) * Math.pow(10, -300 + 600 * random.nextDouble());
            assertReadsBack(value, seed);
        }
    }

    @Test
    void sizesOfLoadsReadBackWithoutExponent() {
        long seed = 7;
        Random random = new Random(seed);
        for (int i = 0; i < 100_000; i++) {
            double value = random.nextGaussian() * Math.pow(10, random.nextInt(10) - 4);
            assertReadsBack(value, seed);
            assertFalse(Math.abs(value) > 1e-9 && text(value).contains("E"), text(value));
        }
    }

    /** Where the number of digits before the point changes. */
    @Test
    void powersOfTenAndTheirNeighboursReadBack() {
        for (int exponent = -300; exponent <= 300; exponent++) {
            double power = Double.parseDouble("1e" + exponent);
            for (double value :
                    new double[] {power, Math.nextUp(power), Math.nextDown(power), 5 * power, 9.9999999999 * power}) {
                assertReadsBack(value, exponent);
            }
        }
    }

    private static void assertReadsBack(double value, long seed) {
        double read = Double.parseDouble(text(value));
        assertTrue(
                Math.abs(read - value) <= PROMISE * Math.abs(value),
                () -> value + " became " + text(value) + ", seed " + seed);
    }

    private static String text(double value) {
        char[] text = new char[NumberText.LONGEST + 2];
        return new String(text, 2, NumberText.put(value, text, 2) - 2);
    }
}
