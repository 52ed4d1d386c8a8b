package treadwork.solver.faults;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.finding.Finding;
import treadwork.model.space.Vector3;

/** How close the figures come that the checks give for what was planted. */
class EstimatesTest {

    private static final int WALKS = Integer.getInteger("walks", 12);

    private static final Pattern LAG = Pattern.compile("the plates (lag|lead) the markers by (\\d+) ms");
    private static final Pattern PLACE = Pattern.compile("by \\((-?\\d+), (-?\\d+), (-?\\d+)\\) mm");

    /** Root mean square within 3 ms: skin motion of 4 mm shakes the body's centre, and a walk has but six steps. */
    @Test
    void theClocksLagIsRightToThreeMilliseconds() {
        double squares = 0;
        for (int seed = 1; seed <= WALKS; seed++) {
            double shift = new Random(seed).nextBoolean() ? 0.03 : -0.03;
            WalkerSettings settings = NoisyWalk.settings(seed);
            NoisyWalk walk = NoisyWalk.of(settings.with(settings.disturbance().withClockShift(shift)));

            Matcher figure = LAG.matcher(figure(walk, "clock-shift"));

            assertTrue(figure.find(), "a lag");
            double found = Integer.parseInt(figure.group(2)) * (figure.group(1).equals("lag") ? 1 : -1);
            squares += Math.pow(found - 1e3 * shift, 2);
        }

        double error = Math.sqrt(squares / WALKS);
        assertTrue(error <= 3, "root mean square error " + error + " ms");
    }

    @Test
    void theVectorToAMisplacedPlateIsRightToFourMillimetres() {
        List<Double> errors = new ArrayList<>();
        for (int seed = 1; seed <= WALKS; seed++) {
            double way = 2 * Math.PI * new Random(seed).nextDouble();
            Vector3 off = new Vector3(Math.cos(way), Math.sin(way), 0).times(20);
            WalkerSettings settings = NoisyWalk.settings(seed);
            NoisyWalk walk =
                    NoisyWalk.of(settings.with(settings.disturbance().withMisplaced(Map.of(4, off.times(1e-3)))));

            Matcher figure = PLACE.matcher(figure(walk, "plate-place"));

            assertTrue(figure.find(), "a vector");
            Vector3 found = new Vector3(
                    Integer.parseInt(figure.group(1)),
                    Integer.parseInt(figure.group(2)),
                    Integer.parseInt(figure.group(3)));
            errors.add(found.minus(off).norm());
        }

        double worst = errors.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
        assertEquals(0, worst, 4, "mm");
    }

    private static String figure(NoisyWalk walk, String code) {
        return FaultTable.findings(walk).stream()
                .filter(finding -> finding.code().equals(code))
                .map(Finding::figure)
                .findFirst()
                .orElse("");
    }
}
