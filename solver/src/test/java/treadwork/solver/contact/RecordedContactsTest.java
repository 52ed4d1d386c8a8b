package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.Support;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.LabAxis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;
import treadwork.solver.plate.LabUp;
import treadwork.solver.plate.PlateLoads;
import treadwork.solver.plate.Recordings;

/** Contacts of open recordings; feet are made from their markers. */
class RecordedContactsTest {

    /** Unfiltered, so that no filter's reach blurs what the feet's motion says. */
    private static final Processing UNFILTERED =
            new Processing(FilterSettings.NONE, FilterSettings.NONE, 0.1, 20, new PlateZero.Auto());

    /**
     * The recordings' description gives the frames in which the push is above 20 N; a contact ends below 10 N, up to two
     * frames of 1/240 s later.
     */
    @ParameterizedTest
    @CsvSource({"1, 447, 594, 571, 719", "3, 516, 659, 636, 773", "5, 436, 580, 557, 698"})
    void areWhereAnIndependentReadingSeesThem(int trial, int rightOn, int rightOff, int leftOn, int leftOff) {
        Contacts found = walk(trial, UNFILTERED);

        assertEquals(2, found.contacts().size());
        assertContact(found.contacts().get(0), Side.RIGHT, rightOn, rightOff);
        assertContact(found.contacts().get(1), Side.LEFT, leftOn, leftOff);
    }

    private static void assertContact(ContactSeries series, Side side, int on, int off) {
        assertEquals(side, series.contact().foot());
        assertEquals(side == Side.RIGHT ? 1 : 2, series.contact().plate());
        assertEquals(on, series.contact().frames().first());
        assertEquals(off + 1, series.contact().frames().last(), 1, "last frame");
    }

    /**
     * The same description, of trial 3: with the sensor origin mended the left centre of pressure is 164, 181, 188 and 192 mm
     * ahead of the heel at 50, 80, 90 and 97 % of stance; as stored it would run back from 165 to 135 mm. There the distance is
     * to the heel marker along the lab's x, read to 1 mm; the share of stance is good to a frame, in which it moves 1 mm.
     */
    @Test
    void haveACentreOfPressureThatRunsForwardOnceTheOriginIsMended() {
        Capture capture = Recordings.read("walk-static-a/Walking_Hybrid_1_3.c3d");
        ContactSeries left = walk(3, UNFILTERED).contacts().get(1);
        VectorSeries heel = Recordings.course(capture, "L_HEEL");

        double[] shares = {0.50, 0.80, 0.90, 0.97};
        double[] expectedMm = {164, 181, 188, 192};

        double planted = heel.x(661 - capture.firstFrame());
        for (int k = 0; k < shares.length; k++) {
            int i = (int) Math.round(shares[k] * (773 - 636));
            double ahead = 1e3 * (left.centreOfPressure().x(i) - planted);
            assertEquals(expectedMm[k], ahead, 6, "mm ahead of the heel at " + shares[k]);
        }
    }

    /**
     * In the frames in which a plate measures a stance the foot's own motion must say so too, but for 50 ms at either end; and
     * it must say nothing in the swings beside it.
     */
    @ParameterizedTest
    @CsvSource({"1", "3", "5"})
    void agreeWithWhatTheFeetsOwnMotionSays(int trial) {
        Capture capture = Recordings.read("walk-static-a/Walking_Hybrid_1_" + trial + ".c3d");
        PlateLoads plates = PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Z, UNFILTERED);
        List<FootOutline> feet = RecordedFeet.walkersFeet(capture);
        Clock clock = Clock.of(capture);
        Vector3 up = LabAxis.PLUS_Z.direction();

        var planting = FootPlanting.of(feet, plates.plates(), up, clock);

        int margin = clock.framesIn(0.05);
        for (ContactSeries series : walk(trial, UNFILTERED).contacts()) {
            FootPlanting foot = planting.get(series.contact().foot());
            int on = series.contact().frames().first() - capture.firstFrame();
            int off = series.contact().frames().last() - capture.firstFrame();
            for (int i = on + margin; i <= off - margin; i++) {
                assertTrue(foot.bearing().get(i), series.contact() + ", index " + i + " is stance");
            }
            for (int i = 0; i < clock.framesIn(0.2); i++) {
                assertTrue(!foot.bearing().get(on - margin - i), series.contact() + ", " + i + " before it is swing");
                assertTrue(!foot.bearing().get(off + margin + i), series.contact() + ", " + i + " after it is swing");
            }
        }
    }

    /** The feet walk on the bare floor before and after the two plates: each has a stance there that nothing measures. */
    @ParameterizedTest
    @CsvSource({"1", "3", "5"})
    void areMissingWhereTheFeetStandOnTheFloorBesideThePlates(int trial) {
        Capture capture = Recordings.read("walk-static-a/Walking_Hybrid_1_" + trial + ".c3d");
        Contacts found = walk(trial, Processing.DEFAULT);

        ContactSeries right = found.contacts().get(0);
        ContactSeries left = found.contacts().get(1);
        List<Support> ofRight = found.support().get(Side.RIGHT);
        List<Support> ofLeft = found.support().get(Side.LEFT);

        int rightMiddle = middle(right) - capture.firstFrame();
        int leftMiddle = middle(left) - capture.firstFrame();
        assertEquals(Support.PLATE, ofRight.get(rightMiddle));
        assertEquals(Support.PLATE, ofLeft.get(leftMiddle));
        int stride = 2 * (leftMiddle - rightMiddle);
        assertEquals(Support.UNMEASURED, ofRight.get(rightMiddle + stride), "its next stance is on the floor");
        assertEquals(Support.UNMEASURED, ofLeft.get(leftMiddle - stride), "its stance before is on the floor");
        assertEquals(Support.AIR, ofRight.get(rightMiddle + stride / 2), "it swings past the left one");
        assertEquals(Support.AIR, ofLeft.get(leftMiddle - stride / 2), "it swings past the right one");
        assertTrue(found.loads().get(Side.RIGHT).force().isGap(rightMiddle + stride));
        assertEquals(Vector3.ZERO, found.loads().get(Side.RIGHT).force().at(rightMiddle + stride / 2));
        assertEquals(List.of("unmeasured-support", "unmeasured-support"), codes(found));
    }

    private static int middle(ContactSeries series) {
        return (series.contact().frames().first() + series.contact().frames().last()) / 2;
    }

    /**
     * A plate that gives its centre of pressure: 158 mm forward along the right foot, 0.52 s, by the description. The heel is
     * taken behind the ankle, the first metatarsal head across from the fifth.
     */
    @Test
    void followTheRightFootOverAPlateThatGivesItsCentreOfPressure() {
        Capture capture = Recordings.read("walk-static-d/type1.C3D");
        PlateLoads plates = PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Y, UNFILTERED);
        List<FootOutline> feet = List.of(
                RecordedFeet.fromAnkle(Side.RIGHT, capture, "RANK", "RMET", "RMET1"),
                RecordedFeet.fromAnkle(Side.LEFT, capture, "LANK", "LMET", "LMET1"));

        Contacts found = Contacts.find(capture, plates.plates(), feet, settings(LabAxis.PLUS_Y));

        assertEquals(1, found.contacts().size());
        ContactSeries series = found.contacts().get(0);
        assertEquals(Side.RIGHT, series.contact().foot());
        assertEquals(0.52, series.contact().frames().count() / 100.0, 0.01, "s, to a frame of 10 ms");
        VectorSeries cop = series.centreOfPressure();
        int last = cop.isGap(cop.size() - 1) ? cop.size() - 2 : cop.size() - 1;
        assertEquals(0.158, cop.x(last) - cop.x(0), 0.02, "m; the ends are at small forces");
        int lifted = 160;
        assertEquals(Support.UNMEASURED, found.support().get(Side.LEFT).get(lifted), "the left foot's next stance");
    }

    /** Both feet stand on the one plate throughout. */
    @Test
    void areNobodysWhereBothFeetStandOnOnePlate() {
        Capture capture = Recordings.read("walk-static-d/standing.C3D", Optional.of(LengthUnit.MM));
        PlateLoads plates = PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Y, UNFILTERED);
        List<FootOutline> feet = List.of(
                RecordedFeet.fromHeel(Side.RIGHT, capture, "r heel", "r met"),
                RecordedFeet.fromHeel(Side.LEFT, capture, "l heel", "l met"));

        Contacts found = Contacts.find(capture, plates.plates(), feet, settings(LabAxis.PLUS_Y));

        assertEquals(List.of(), found.contacts());
        assertEquals(List.of("shared-plate"), codes(found));
        assertEquals(Support.UNMEASURED, found.support().get(Side.RIGHT).get(100));
        assertEquals(Support.UNMEASURED, found.support().get(Side.LEFT).get(100));
    }

    /** Take-off at 0.692 s and landing at 1.183 s by the file's own events, right and left foot on different plates. */
    @Test
    void partInAJumpAndMeetAgain() {
        Capture capture = Recordings.read("jump-c/Sample_Jump2.c3d");
        LabAxis up =
                LabUp.find(capture, capture.plates(), Optional.empty()).axis().orElseThrow();
        PlateLoads plates = PlateLoads.resolve(capture, capture.plates(), up, UNFILTERED);
        List<FootOutline> feet = List.of(
                RecordedFeet.fromHeelAndToe(Side.RIGHT, capture), RecordedFeet.fromHeelAndToe(Side.LEFT, capture));

        Contacts found = Contacts.find(capture, plates.plates(), feet, settings(up));

        assertEquals(4, found.contacts().size());
        for (ContactSeries series : found.contacts()) {
            boolean before = series.contact().frames().first() == 1;
            double edge = before
                    ? series.contact().frames().last() / 120.0
                    : (series.contact().frames().first() - 1) / 120.0;
            assertEquals(before ? 0.692 : 1.183, edge, 0.03, series.contact() + ", s; the feet part 25 ms apart");
        }
        assertEquals(
                2,
                found.contacts().stream()
                        .filter(series -> series.contact().foot() == Side.RIGHT)
                        .map(series -> series.contact().plate())
                        .filter(plate -> plate.equals(plateOf(found, Side.RIGHT)))
                        .count());
        assertTrue(plateOf(found, Side.RIGHT) != plateOf(found, Side.LEFT));
        for (Side side : Side.values()) {
            assertEquals(Support.PLATE, found.support().get(side).get(40));
            assertEquals(Support.AIR, found.support().get(side).get(112), "the middle of the flight");
            assertEquals(Support.PLATE, found.support().get(side).get(200));
        }
        assertEquals(List.of(), codes(found));
    }

    private static int plateOf(Contacts found, Side side) {
        return found.contacts().stream()
                .filter(series -> series.contact().foot() == side)
                .findFirst()
                .orElseThrow()
                .contact()
                .plate();
    }

    private static Contacts walk(int trial, Processing processing) {
        Capture capture = Recordings.read("walk-static-a/Walking_Hybrid_1_" + trial + ".c3d");
        PlateLoads plates = PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Z, processing);
        return Contacts.find(capture, plates.plates(), RecordedFeet.walkersFeet(capture), settings(LabAxis.PLUS_Z));
    }

    private static ContactSettings settings(LabAxis up) {
        return new ContactSettings(up, 20, Optional.empty());
    }

    private static List<String> codes(Contacts found) {
        return found.findings().stream().map(finding -> finding.code()).toList();
    }
}
