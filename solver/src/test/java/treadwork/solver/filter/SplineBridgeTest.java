package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static treadwork.solver.filter.SwingingSegment.FRAMES;
import static treadwork.solver.filter.SwingingSegment.LONGEST;
import static treadwork.solver.filter.SwingingSegment.RATE;
import static treadwork.solver.filter.SwingingSegment.ROUNDING;
import static treadwork.solver.filter.SwingingSegment.assertSameCourse;
import static treadwork.solver.filter.SwingingSegment.course;
import static treadwork.solver.filter.SwingingSegment.gaussian;
import static treadwork.solver.filter.SwingingSegment.withGap;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** Gaps of one marker, filled from its own course. */
class SplineBridgeTest {

    /**
     * Expected in closed form: a quintic through six sites gives a quintic movement back. Rounding 1e-16 of metres,
     * times the sum of the weights of the sites, about 5.
     */
    @ParameterizedTest
    @CsvSource({"1", "2", "5", "20"})
    void aShortGapInAQuinticCourseIsFilledExactly(int length) {
        VectorSeries.Builder quintic = new VectorSeries.Builder(60);
        for (int i = 0; i < 60; i++) {
            double t = i / RATE;
            quintic.set(i, 1 + 1.3 * t, 0.1 - 2 * t * t, 40 * Math.pow(t, 5) - 9 * Math.pow(t, 4) + t * t * t);
        }
        VectorSeries whole = quintic.build();

        for (int from = 3; from + length + 3 <= 60; from++) {
            VectorSeries holed = withGap(whole, from, from + length);

            FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

            assertEquals(List.of(spline(0, from, from + length)), filled.gaps());
            // Near an end the sites have to lie closer together, and rounding grows as noise does.
            assertSameCourse(whole, filled.markers().get(0), from < 21 || from + length > 39 ? 1e-9 : ROUNDING);
        }
    }

    /**
     * Bounds, rms of a component, m, measured and rounded up. For one frame and noise alone: the weights of sites 1, 3
     * and 5 frames off are 150, -25 and 3 of 256, so that 0.84 of the noise gets through.
     */
    @ParameterizedTest
    @CsvSource({
        "5, 0, 1e-6",
        "10, 0, 2e-5",
        "20, 0, 5e-4",
        "1, 2e-4, 2e-4",
        "3, 2e-4, 3e-4",
        "5, 2e-4, 4e-4",
        "10, 2e-4, 4e-4",
        "20, 2e-4, 6.5e-4"
    })
    void walkingMovementIsFilledToAFewTimesItsNoise(int length, double noise, double rms) {
        Random random = new Random(11);
        double squares = 0;
        int count = 0;
        for (int from = 25; from + length + 25 <= FRAMES; from++) {
            VectorSeries.Builder noisy = new VectorSeries.Builder(FRAMES);
            for (int i = 0; i < FRAMES; i++) {
                noisy.set(i, walking(i).plus(gaussian(random).times(noise)));
            }

            FilledCluster filled = ClusterFilling.fill(List.of(withGap(noisy.build(), from, from + length)), LONGEST);

            for (int i = from; i < from + length; i++) {
                Vector3 off = filled.markers().get(0).at(i).minus(walking(i));
                squares += off.dot(off);
                count += 3;
            }
        }
        assertEquals(0, Math.sqrt(squares / count), rms, "rms of a component, m");
    }

    /** Second way: splines of either degree through the ten neighbours on either side of a gap of 0.1 s. */
    @ParameterizedTest
    @CsvSource({"3, 2", "5, 8"})
    void spreadSitesFillNoisyMovementBetterThanNeighbouringOnes(int degree, double times) {
        Random random = new Random(13);
        double spread = 0;
        double neighbouring = 0;
        for (int from = 25; from + LONGEST + 25 <= FRAMES; from++) {
            VectorSeries.Builder builder = new VectorSeries.Builder(FRAMES);
            for (int i = 0; i < FRAMES; i++) {
                builder.set(i, walking(i).plus(gaussian(random).times(2e-4)));
            }
            VectorSeries noisy = builder.build();
            double[] sites = new double[20];
            double[] x = new double[20];
            for (int i = 0; i < 20; i++) {
                int frame = i < 10 ? from - 10 + i : from + LONGEST + i - 10;
                sites[i] = frame;
                x[i] = noisy.x(frame);
            }
            Spline spline = Spline.through(degree, sites);
            spline.solve(x, 0);

            FilledCluster filled = ClusterFilling.fill(List.of(withGap(noisy, from, from + LONGEST)), LONGEST);

            for (int i = from; i < from + LONGEST; i++) {
                spread += square(filled.markers().get(0).x(i) - walking(i).x());
                neighbouring += square(spline.at(i, 0, x) - walking(i).x());
            }
        }
        assertTrue(Math.sqrt(neighbouring / spread) > times, "times better: " + Math.sqrt(neighbouring / spread));
    }

    @Test
    void aGapLongerThanTheLongestIsNotFilledFromTheCourse() {
        VectorSeries holed = withGap(course(0), 100, 100 + LONGEST + 1);

        FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

        assertTrue(filled.gaps().isEmpty());
        assertSameCourse(holed, filled.markers().get(0), 0);
    }

    @Test
    void noGapIsFilledFromTheCourseWhenNoneMayBe() {
        FilledCluster filled = ClusterFilling.fill(List.of(withGap(course(0), 100, 101)), 0);

        assertTrue(filled.gaps().isEmpty());
    }

    /** Two known samples on a side carry a spline of degree three, one carries none. */
    @ParameterizedTest
    @CsvSource({"0, 0", "1, 0", "2, 1", "3, 1"})
    void aGapNearTheStartNeedsTwoKnownSamplesBeforeIt(int known, int filledGaps) {
        VectorSeries holed = withGap(course(0), known, known + 4);

        FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

        assertEquals(filledGaps, filled.gaps().size());
        assertEquals(filledGaps == 0, filled.markers().get(0).isGap(known));
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "1, 0", "2, 1", "3, 1"})
    void aGapNearTheEndNeedsTwoKnownSamplesAfterIt(int known, int filledGaps) {
        VectorSeries holed = withGap(course(0), FRAMES - known - 4, FRAMES - known);

        FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

        assertEquals(filledGaps, filled.gaps().size());
    }

    /** Expected: the movement to a tenth of a millimetre; the bridges of four frames lean on samples ten frames off. */
    @Test
    void gapsNextToOneAnotherAreBridgedFromSamplesBeyondThem() {
        VectorSeries holed = withGap(withGap(withGap(course(0), 100, 104), 106, 110), 111, 115);

        FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

        assertEquals(List.of(spline(0, 100, 104), spline(0, 106, 110), spline(0, 111, 115)), filled.gaps());
        assertSameCourse(course(0), filled.markers().get(0), 1e-4);
    }

    /** One sample between two gaps: each has its third and second site beyond the other gap, eleven frames off. */
    @Test
    void aSingleSampleBetweenTwoGapsIsEnoughWithOthersBeyond() {
        VectorSeries holed = withGap(withGap(course(0), 100, 110), 111, 121);

        FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

        assertEquals(List.of(spline(0, 100, 110), spline(0, 111, 121)), filled.gaps());
        assertSameCourse(course(0), filled.markers().get(0), 1e-4);
    }

    /** A sample further off than the longest gap says nothing about the course beside the gap. */
    @Test
    void samplesBeyondALongGapAreNotUsed() {
        VectorSeries holed = withGap(withGap(course(0), 60, 90), 91, 95);

        FilledCluster filled = ClusterFilling.fill(List.of(holed), LONGEST);

        assertTrue(filled.gaps().isEmpty(), "only one known sample is near before the second gap");
    }

    private static FilledGap spline(int marker, int from, int to) {
        return new FilledGap(marker, from, to, FilledGap.Kind.SPLINE);
    }

    /** An ankle marker in walking, about: a stride a second, harmonics up to 6 Hz of the size that the foot has. */
    private static Vector3 walking(int frame) {
        double w = 2 * Math.PI * frame / RATE;
        return new Vector3(
                1.3 * frame / RATE + 0.22 * Math.sin(w) + 0.06 * Math.sin(2 * w + 0.5) + 0.015 * Math.sin(3 * w + 2),
                0.02 * Math.sin(w + 1) + 0.004 * Math.sin(5 * w),
                0.1
                        + 0.06 * Math.cos(w)
                        + 0.03 * Math.cos(2 * w + 1)
                        + 0.012 * Math.cos(4 * w)
                        + 0.003 * Math.cos(6 * w));
    }

    private static double square(double value) {
        return value * value;
    }
}
