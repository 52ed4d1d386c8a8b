package treadwork.solver.filter;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static treadwork.solver.filter.SwingingSegment.CLUSTER;
import static treadwork.solver.filter.SwingingSegment.FRAMES;
import static treadwork.solver.filter.SwingingSegment.LONGEST;
import static treadwork.solver.filter.SwingingSegment.ROUNDING;
import static treadwork.solver.filter.SwingingSegment.assertSameCourse;
import static treadwork.solver.filter.SwingingSegment.course;
import static treadwork.solver.filter.SwingingSegment.gaussian;
import static treadwork.solver.filter.SwingingSegment.moving;
import static treadwork.solver.filter.SwingingSegment.place;
import static treadwork.solver.filter.SwingingSegment.rigid;
import static treadwork.solver.filter.SwingingSegment.withGap;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

class ClusterFillingTest {

    private static final Vector3 ORIGIN = new Vector3(0, 0, 0);
    private static final Vector3 ALONG_X = new Vector3(0.2, 0, 0);
    private static final Vector3 ALONG_Y = new Vector3(0, 0.2, 0);

    @Test
    void leavesAFullClusterAsItIs() {
        FilledCluster filled = ClusterFilling.fill(rigid(CLUSTER), LONGEST);

        assertTrue(filled.gaps().isEmpty(), "nothing was filled");
        for (int m = 0; m < 5; m++) {
            assertSameCourse(rigid(CLUSTER).get(m), filled.markers().get(m), 0);
        }
    }

    /** Expected by construction: the segment is rigid, so the lost marker is where it was. */
    @Test
    void aLongGapAnywhereIsFilledExactlyFromARigidCluster() {
        int length = 60;
        for (int from = 0; from + length <= FRAMES; from += 5) {
            List<VectorSeries> markers = rigid(CLUSTER);
            VectorSeries whole = markers.set(0, withGap(markers.get(0), from, from + length));

            FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

            assertEquals(List.of(cluster(0, from, from + length)), filled.gaps());
            assertSameCourse(whole, filled.markers().get(0), ROUNDING);
        }
    }

    /** Expected by construction: what the skin does in a straight line over the gap is found again. */
    @Test
    void aMarkerThatCreepsEvenlyOverTheSegmentIsFilledWithoutAJump() {
        List<VectorSeries> markers = rigid(CLUSTER);
        VectorSeries whole = moving(i -> CLUSTER.get(0).plus(new Vector3(1e-4, -5e-5, 2e-5).times(i)));
        markers.set(0, withGap(whole, 70, 150));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertSameCourse(whole, filled.markers().get(0), ROUNDING);
    }

    /** Expected by construction: before it is first seen, the marker stays where it was then. */
    @Test
    void aMarkerKnownOnOneSideOnlyStaysWhereItWasThere() {
        List<VectorSeries> markers = rigid(CLUSTER);
        Vector3 creep = new Vector3(1e-4, -5e-5, 2e-5);
        markers.set(0, withGap(moving(i -> CLUSTER.get(0).plus(creep.times(i))), 0, 40));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertEquals(List.of(cluster(0, 0, 40)), filled.gaps());
        VectorSeries expected = moving(i -> CLUSTER.get(0).plus(creep.times(Math.max(i, 40))));
        assertSameCourse(expected, filled.markers().get(0), ROUNDING);
    }

    @Test
    void aShortGapAtTheStartIsFilledFromTheCluster() {
        List<VectorSeries> markers = rigid(CLUSTER);
        VectorSeries whole = markers.set(0, withGap(markers.get(0), 0, 3));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertEquals(List.of(cluster(0, 0, 3)), filled.gaps());
        assertSameCourse(whole, filled.markers().get(0), ROUNDING);
    }

    @Test
    void twoOtherMarkersAreTooFew() {
        List<VectorSeries> markers = rigid(CLUSTER.subList(0, 3));
        markers.set(0, withGap(markers.get(0), 70, 150));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertStaysGap(filled, 0, 70, 150);
    }

    @Test
    void threeOtherMarkersOnOneLineAreNotEnough() {
        List<VectorSeries> markers = rigid(List.of(CLUSTER.get(0), CLUSTER.get(2), CLUSTER.get(3), CLUSTER.get(4)));
        markers.set(0, withGap(markers.get(0), 70, 150));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertStaysGap(filled, 0, 70, 150);
    }

    /** Three markers at one point, as a faulty file has them, have no axes. */
    @Test
    void threeOtherMarkersAtOnePointAreNotEnough() {
        Vector3 one = CLUSTER.get(1);
        List<VectorSeries> markers = rigid(List.of(CLUSTER.get(0), one, one, one));
        markers.set(0, withGap(markers.get(0), 70, 150));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertStaysGap(filled, 0, 70, 150);
    }

    @Test
    void aGapIsFilledAsFarAsThreeOthersAreKnown() {
        List<VectorSeries> markers = rigid(CLUSTER.subList(0, 4));
        markers.set(0, withGap(markers.get(0), 70, 150));
        markers.set(1, withGap(markers.get(1), 149, 190));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertEquals(List.of(cluster(0, 70, 149), cluster(1, 150, 190)), filled.gaps());
        assertTrue(filled.markers().get(0).isGap(149), "the one lost first");
        assertTrue(filled.markers().get(1).isGap(149), "the one lost then");
    }

    /** Expected: the rigid place, to what bridging the short gap of the other marker costs at its distance. */
    @Test
    void othersThatASplineBridgedCarryALostMarker() {
        List<VectorSeries> markers = rigid(CLUSTER.subList(0, 4));
        VectorSeries whole = markers.set(0, withGap(markers.get(0), 70, 150));
        markers.set(1, withGap(markers.get(1), 100, 105));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertEquals(List.of(cluster(0, 70, 150), spline(1, 100, 105)), filled.gaps());
        assertSameCourse(whole, filled.markers().get(0), 1e-5);
    }

    /** Where both are lost, either would have three others only if the other were filled first. */
    @Test
    void noMarkerIsCarriedByOneThatWasItselfCarried() {
        List<VectorSeries> markers = rigid(CLUSTER.subList(0, 4));
        markers.set(0, withGap(markers.get(0), 70, 150));
        markers.set(3, withGap(markers.get(3), 100, 200));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertEquals(List.of(cluster(0, 70, 100), cluster(3, 150, 200)), filled.gaps());
        for (int i = 100; i < 150; i++) {
            assertTrue(filled.markers().get(0).isGap(i), "first at " + i);
            assertTrue(filled.markers().get(3).isGap(i), "last at " + i);
        }
    }

    /** Expected: the rigid place; no three others are known through the whole gap, but three through each part. */
    @Test
    void aGapWhoseCarriersChangeIsFilledInParts() {
        List<VectorSeries> markers = rigid(CLUSTER);
        markers.set(0, withGap(markers.get(0), 70, 150));
        markers.set(3, withGap(markers.get(3), 155, 230));
        VectorSeries whole = markers.set(4, withGap(markers.get(4), 100, 200));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertEquals(
                List.of(cluster(0, 70, 150), cluster(3, 155, 230), cluster(4, 100, 155), cluster(4, 155, 200)),
                filled.gaps());
        assertSameCourse(whole, filled.markers().get(4), 1e-12);
    }

    @Test
    void aMarkerThatIsNeverSeenStaysAGap() {
        List<VectorSeries> markers = rigid(CLUSTER);
        markers.set(0, VectorSeries.gaps(FRAMES));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertStaysGap(filled, 0, 0, FRAMES);
    }

    /**
     * The marker creeps 7.9 mm until it is lost; the widest triangle was last whole before that, a narrower one is whole
     * up to the gap. Expected by construction: no jump, so the narrower one carries.
     */
    @Test
    void prefersMarkersThatAreKnownRightBesideTheGap() {
        List<VectorSeries> markers = rigid(CLUSTER);
        VectorSeries whole =
                moving(i -> CLUSTER.get(0).plus(new Vector3(1e-4 * Math.min(Math.max(i - 20, 0), 79), 0, 0)));
        markers.set(0, withGap(whole, 100, 150));
        markers.set(4, withGap(markers.get(4), 10, 100));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertSameCourse(whole, filled.markers().get(0), ROUNDING);
    }

    /** Expected by construction, as the creep goes on evenly: carriers known on both sides of the gap are taken. */
    @Test
    void prefersMarkersThatAreKnownOnBothSidesOfTheGap() {
        List<VectorSeries> markers = rigid(CLUSTER);
        VectorSeries whole = moving(i -> CLUSTER.get(0).plus(new Vector3(1e-4, -5e-5, 2e-5).times(i)));
        markers.set(0, withGap(whole, 70, 150));
        markers.set(4, withGap(markers.get(4), 0, 70));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertSameCourse(whole, filled.markers().get(0), ROUNDING);
    }

    /** The fourth of the others wobbles; expected by construction: it is left out, for the widest triangle is without it. */
    @Test
    void prefersTheTriangleWithTheLargestHeight() {
        List<VectorSeries> markers = rigid(List.of(CLUSTER.get(0), ORIGIN, ALONG_X, ALONG_Y));
        VectorSeries whole = markers.set(0, withGap(markers.get(0), 70, 150));
        markers.add(1, moving(i -> new Vector3(0.1 + 0.005 * Math.sin(0.2 * i), 0.03, 0)));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertSameCourse(whole, filled.markers().get(0), ROUNDING);
    }

    /**
     * The corner of a right angle slides along the line through its middle parallel to the longest side, in the gap
     * only. Expected: the three's middle goes with it by a third, and their axes, laid along that side, do not turn.
     */
    @ParameterizedTest
    @CsvSource({"0", "1", "2"})
    void theAxesLieAlongTheLongestSide(int turns) {
        Vector3 slide = ALONG_Y.minus(ALONG_X).times(0.05);
        List<VectorSeries> others = new ArrayList<>(rigid(List.of(ALONG_X, ALONG_Y)));
        others.add(moving(i -> i >= 80 && i < 140 ? ORIGIN.plus(slide) : ORIGIN));
        Collections.rotate(others, turns);
        others.add(0, withGap(course(0), 70, 150));

        VectorSeries filled = ClusterFilling.fill(others, LONGEST).markers().get(0);

        VectorSeries expected =
                moving(i -> i >= 80 && i < 140 ? CLUSTER.get(0).plus(slide.times(1.0 / 3)) : CLUSTER.get(0));
        assertSameCourse(expected, filled, ROUNDING);
    }

    /** In the gap only, then next to it only. */
    @ParameterizedTest
    @CsvSource({"100, 101", "69, 70", "150, 151"})
    void threeOtherMarkersThatComeOntoOneLineForAFrameAreNotEnough(int from, int to) {
        List<VectorSeries> markers = rigid(List.of(CLUSTER.get(0), ORIGIN, ALONG_X));
        markers.set(0, withGap(markers.get(0), 70, 150));
        markers.add(moving(i -> i >= from && i < to ? ALONG_X.times(0.4) : ALONG_Y));

        FilledCluster filled = ClusterFilling.fill(markers, LONGEST);

        assertStaysGap(filled, 0, 70, 150);
    }

    /**
     * Noise of 0.5 mm on all markers. The lost marker lies no further from the carriers' base than their tip does, so
     * their noise enters about once in the frame itself and once, with its own, in the frames beside the gap: three
     * times the noise at most.
     */
    @Test
    void noiseOfTheCarriersIsHardlyMagnified() {
        Random random = new Random(12);
        List<VectorSeries> markers = new ArrayList<>();
        for (VectorSeries marker : rigid(CLUSTER)) {
            VectorSeries.Builder noisy = new VectorSeries.Builder(FRAMES);
            for (int i = 0; i < FRAMES; i++) {
                noisy.set(i, marker.at(i).plus(gaussian(random).times(5e-4)));
            }
            markers.add(noisy.build());
        }
        markers.set(0, withGap(markers.get(0), 40, 200));

        VectorSeries filled = ClusterFilling.fill(markers, LONGEST).markers().get(0);

        double squares = 0;
        for (int i = 40; i < 200; i++) {
            Vector3 off = filled.at(i).minus(place(i, CLUSTER.get(0)));
            squares += off.dot(off);
        }
        assertEquals(0, Math.sqrt(squares / 160 / 3), 3 * 5e-4, "rms of a component, m");
    }

    @Test
    void refusesMarkersOfDifferentLengthAndANegativeLength() {
        List<VectorSeries> uneven = List.of(VectorSeries.gaps(3), VectorSeries.gaps(4));

        assertThrows(IllegalArgumentException.class, () -> ClusterFilling.fill(uneven, LONGEST));
        assertThrows(IllegalArgumentException.class, () -> ClusterFilling.fill(rigid(CLUSTER), -1));
    }

    @Test
    void aSegmentWithoutMarkersHasNothingToFill() {
        assertTrue(ClusterFilling.fill(List.of(), LONGEST).markers().isEmpty());
    }

    private static void assertStaysGap(FilledCluster filled, int marker, int from, int to) {
        assertTrue(filled.gaps().stream().noneMatch(gap -> gap.marker() == marker), "reported as filled");
        for (int i = from; i < to; i++) {
            assertTrue(filled.markers().get(marker).isGap(i), "gap at " + i);
        }
    }

    private static FilledGap spline(int marker, int from, int to) {
        return new FilledGap(marker, from, to, FilledGap.Kind.SPLINE);
    }

    private static FilledGap cluster(int marker, int from, int to) {
        return new FilledGap(marker, from, to, FilledGap.Kind.CLUSTER);
    }
}
