package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.junit.jupiter.api.Test;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.Support;
import treadwork.model.space.Axes;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.Wrench;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.LabAxis;
import treadwork.solver.plate.PlateLoad;

/** Expected values by construction: the tests set down the feet and write the loads themselves. */
class ContactsTest {

    /** Rounding of moments about points 1 m apart under 700 N. */
    private static final double ROUNDING = 1e-10;

    /** Stands to the right of the line, its heel at (0, -0.1). */
    private static final FootOutline RIGHT = Stage.foot(Side.RIGHT, Stage.standingAt(0, -0.1));

    private static final IntFunction<Vector3> LEFT_PLACE = Stage.standingAt(0, 0.5);

    @Test
    void giveALoadToTheFootUnderIt() {
        PlateLoad right = Stage.plate(1, 0.1, -0.15, Stage.during(50, 120, Stage.loadAt(0.15, -0.1)));
        PlateLoad left = Stage.plate(2, 0.1, 0.5, Stage.during(80, 150, Stage.loadAt(0.12, 0.52)));

        Contacts found = Stage.find(List.of(right, left), RIGHT, Stage.foot(Side.LEFT, LEFT_PLACE));

        assertEquals(List.of("1 RIGHT 71-141", "2 LEFT 101-171"), inWords(found));
        assertTrue(
                contact(found, 0).assigned().contains("0 mm from the right foot"),
                contact(found, 0).assigned());
    }

    /** Ten samples belong to a frame; the first of them decides. */
    @Test
    void begunWithTheFirstSampleOfAFrame() {
        IntFunction<Wrench> load = i -> i > 300 && i <= 1000 ? Stage.loadAt(0.1, -0.1) : Stage.nothing();

        Contacts found = Stage.find(List.of(Stage.plate(1, 0.1, -0.1, load)), RIGHT);

        assertEquals(
                List.of("1 RIGHT 52-121"), inWords(found), "samples 301 to 1000 are frames 31 to 100 counted from 0");
    }

    /** A belt carries the right foot first, the left one after it. */
    @Test
    void giveEachLoadOfOnePlateToItsOwnFoot() {
        FootOutline right = Stage.foot(
                Side.RIGHT, Stage.swingingFrom(Stage.standingAt(0, -0.1), Stage.standingAt(0.9, -0.1), 80, 120));
        FootOutline left = Stage.foot(
                Side.LEFT, Stage.swingingFrom(Stage.standingAt(-0.9, 0.1), Stage.standingAt(0.1, 0.1), 60, 90));
        IntFunction<Wrench> load = i ->
                i < 780 ? Stage.loadAt(0.1, -0.1) : i >= 920 && i < 1500 ? Stage.loadAt(0.2, 0.1) : Stage.nothing();

        Contacts found = Stage.find(List.of(Stage.plate(1, 0.1, 0, load)), right, left);

        assertEquals(List.of("1 RIGHT 21-98", "1 LEFT 113-170"), inWords(found));
        assertEquals(700, found.loads().get(Side.RIGHT).force().z(40), ROUNDING, "N");
        assertTrue(found.loads().get(Side.LEFT).force().isGap(40), "it stands behind the plate");
        assertEquals(0, found.loads().get(Side.LEFT).force().z(75), ROUNDING, "N");
        assertEquals(700, found.loads().get(Side.LEFT).force().z(140), ROUNDING, "N");
    }

    @Test
    void addTheLoadsOfTwoPlatesUnderOneFoot() {
        Wrench heel = Stage.loadAt(0.02, -0.1);
        Wrench toe = Stage.loadAt(0.22, -0.11);
        PlateLoad behind = Stage.plate(1, -0.15, -0.1, Stage.during(0, 199, heel));
        PlateLoad ahead = Stage.plate(2, 0.35, -0.1, Stage.during(0, 199, toe));

        Contacts found = Stage.find(List.of(behind, ahead), RIGHT);

        Wrench expected = heel.about(Vector3.ZERO).plus(toe);
        assertLoad(expected, found.loads().get(Side.RIGHT), 100);
        assertEquals(Support.PLATE, found.support().get(Side.RIGHT).get(100));
        assertEquals(List.of(), found.findings(), "the foot is on either plate with all its points");
    }

    @Test
    void giveTheLoadAboutTheLabsOrigin() {
        Wrench load = Stage.loadAt(0.15, -0.1);

        Contacts found = Stage.find(List.of(Stage.plate(1, 0.1, -0.15, Stage.during(0, 199, load))), RIGHT);

        assertLoad(load.about(Vector3.ZERO), found.loads().get(Side.RIGHT), 100);
        assertEquals(Vector3.ZERO, found.loads().get(Side.RIGHT).point());
    }

    /** Neither foot is within 150 mm of (0.1, -0.4): the right one's edge is 250 mm away or more. */
    @Test
    void giveALoadFarFromBothFeetToNobody() {
        PlateLoad plate = Stage.plate(1, 0.1, -0.45, Stage.during(50, 120, Stage.loadAt(0.1, -0.45)));

        Contacts found = Stage.find(List.of(plate), RIGHT, Stage.foot(Side.LEFT, LEFT_PLACE));

        assertEquals(List.of(), found.contacts());
        assertEquals(List.of("contact-nobody", "unmeasured-support", "unmeasured-support"), codes(found));
    }

    @Test
    void refuseBothFeetWhileTheyShareAPlate() {
        FootOutline left = Stage.foot(
                Side.LEFT, Stage.swingingFrom(Stage.standingAt(-0.9, 0.05), Stage.standingAt(0, 0.05), 60, 100));
        IntFunction<Wrench> load = i -> Stage.loadAt(0.1, i < 1000 ? -0.1 : -0.02);

        Contacts found = Stage.find(List.of(Stage.plate(1, 0.1, 0, load)), RIGHT, left);

        assertEquals(List.of("1 RIGHT 21-114"), inWords(found), "the left one rests from frame 123 on, less 80 ms");
        assertEquals(Severity.REFUSES, finding(found, "shared-plate").severity());
        assertTrue(
                finding(found, "shared-plate").where().contains("frames 115 to 220"),
                finding(found, "shared-plate").where());
        for (Side side : Side.values()) {
            assertEquals(Support.UNMEASURED, found.support().get(side).get(150));
            assertTrue(found.loads().get(side).force().isGap(150), "N");
            assertTrue(found.loads().get(side).moment().isGap(150), "N·m");
        }
        assertEquals(700, found.loads().get(Side.RIGHT).force().z(50), ROUNDING, "N");
    }

    /** On a moving belt no foot is at rest in the lab; the centre of pressure goes from one to the other without a break. */
    @Test
    void refuseAPlateThatTheCentreOfPressureChangesFeetOn() {
        IntFunction<Vector3> back = i -> new Vector3(0.6 - 0.008 * i, -0.1, Stage.FLOOR);
        FootOutline right = Stage.foot(Side.RIGHT, back);
        FootOutline left = Stage.foot(Side.LEFT, i -> back.apply(i).plus(new Vector3(0.3, 0.2, 0)));
        IntFunction<Wrench> load = i -> {
            double heel = 0.6 - 0.0008 * i;
            return i < 1000 ? Stage.loadAt(heel + 0.1, -0.1) : Stage.loadAt(heel + 0.4, 0.1);
        };

        Contacts found = Stage.find(List.of(Stage.plate(1, 0.1, 0, load)), right, left);

        assertEquals(List.of(), found.contacts());
        assertEquals(Severity.REFUSES, finding(found, "shared-plate").severity());
        assertTrue(found.loads().get(Side.RIGHT).force().isGap(50));
    }

    /** The smoothed push outlasts the raw one and is cut where it falls below the threshold: frames 45 to 124. */
    @Test
    void takeTheSmoothedLoadForAsLongAsItStaysAboveTheThreshold() {
        PlateLoad raw = Stage.plate(
                1, new Vector3(0.1, -0.15, Stage.FLOOR), Stage.during(50, 120, Stage.loadAt(0.15, -0.1)), 12);
        PlateLoad smeared = Stage.plate(
                1, new Vector3(0.1, -0.15, Stage.FLOOR), Stage.during(45, 124, Stage.loadAt(0.16, -0.1)), 12);
        PlateLoad plate = new PlateLoad(1, raw.top(), raw.raw(), smeared.smooth(), 12);

        Contacts found = Stage.find(List.of(plate), RIGHT);

        VectorSeries force = found.loads().get(Side.RIGHT).force();
        assertEquals(List.of("1 RIGHT 71-141"), inWords(found), "the contact itself is that of the raw push");
        assertEquals(700, force.z(45), ROUNDING, "N");
        assertEquals(700, force.z(124), ROUNDING, "N");
        assertEquals(0, force.z(44), ROUNDING, "N");
        assertEquals(0, force.z(125), ROUNDING, "N");
        assertLoad(Stage.loadAt(0.16, -0.1).about(Vector3.ZERO), found.loads().get(Side.RIGHT), 60);
    }

    @Test
    void showTheReactionOfEveryFrameOfAContact() {
        IntFunction<Wrench> load = i -> {
            double x = 0.02 + 0.0002 * (i - 500);
            return i >= 500 && i < 1210
                    ? new Wrench(
                            Axes.LAB, new Vector3(x, -0.1, Stage.FLOOR), new Vector3(i, 5, 600), Stage.UP.times(1.5))
                    : Stage.nothing();
        };

        ContactSeries series = Stage.find(List.of(Stage.plate(1, 0.1, -0.15, load)), RIGHT)
                .contacts()
                .get(0);

        assertEquals(71, series.contact().frames().count());
        assertEquals(71, series.force().size());
        assertEquals(500 + 10 * 10, series.force().x(10), ROUNDING, "frame 60 is sample 600, N");
        Vector3 cop = series.centreOfPressure().at(10);
        assertEquals(0, cop.minus(new Vector3(0.04, -0.1, Stage.FLOOR)).norm(), ROUNDING, "m");
        assertEquals(1.5, series.freeMoment().at(10), ROUNDING, "N·m");
    }

    @Test
    void workForOneLegAlone() {
        PlateLoad right = Stage.plate(1, 0.1, -0.15, Stage.during(50, 120, Stage.loadAt(0.15, -0.1)));

        Contacts found = Stage.find(List.of(right), RIGHT);

        assertEquals(List.of("1 RIGHT 71-141"), inWords(found));
        assertEquals(1, found.support().size());
    }

    @Test
    void refuseAThresholdThatIsNotAboveZero() {
        assertThrows(IllegalArgumentException.class, () -> new ContactSettings(LabAxis.PLUS_Z, 0, Optional.empty()));
    }

    /** The smoothed push never falls between two feet on one belt; halfway between the two contacts it changes hands: sample 850. */
    @Test
    void partASmoothedLoadHalfwayBetweenTwoFeet() {
        FootOutline right = Stage.foot(
                Side.RIGHT, Stage.swingingFrom(Stage.standingAt(0, -0.1), Stage.standingAt(0.9, -0.1), 80, 120));
        FootOutline left = Stage.foot(
                Side.LEFT, Stage.swingingFrom(Stage.standingAt(-0.9, 0.1), Stage.standingAt(0.1, 0.1), 60, 90));
        IntFunction<Wrench> load = i ->
                i < 780 ? Stage.loadAt(0.1, -0.1) : i >= 920 && i < 1500 ? Stage.loadAt(0.2, 0.1) : Stage.nothing();
        PlateLoad raw = Stage.plate(1, 0.1, 0, load);
        WrenchSeries bridge = Stage.plate(1, 0.1, 0, i -> Stage.loadAt(0.1, 0)).raw();

        Contacts found = Stage.find(List.of(new PlateLoad(1, raw.top(), raw.raw(), bridge, 12)), right, left);

        assertEquals(700, found.loads().get(Side.RIGHT).force().z(84), ROUNDING, "N");
        assertEquals(0, found.loads().get(Side.RIGHT).force().z(85), ROUNDING, "N");
        assertEquals(0, found.loads().get(Side.LEFT).force().z(84), ROUNDING, "N");
        assertEquals(700, found.loads().get(Side.LEFT).force().z(85), ROUNDING, "N");
    }

    /** A knock of 30 ms is no contact, however long its smoothed push stays above the threshold: frames 10 to 20. */
    @Test
    void takeNothingFromAKnockApartFromTheContact() {
        FootOutline right = Stage.foot(
                Side.RIGHT, Stage.swingingFrom(Stage.standingAt(-0.9, -0.1), Stage.standingAt(0, -0.1), 0, 45));
        IntFunction<Wrench> load = i -> (i >= 140 && i < 170) || i >= 500 ? Stage.loadAt(0.15, -0.1) : Stage.nothing();
        PlateLoad raw = Stage.plate(1, 0.1, -0.15, load);
        WrenchSeries smeared = Stage.plate(
                        1,
                        0.1,
                        -0.15,
                        i -> (i >= 100 && i < 210) || i >= 460 ? Stage.loadAt(0.15, -0.1) : Stage.nothing())
                .raw();

        Contacts found = Stage.find(List.of(new PlateLoad(1, raw.top(), raw.raw(), smeared, 12)), right);

        assertEquals(0, found.loads().get(Side.RIGHT).force().z(15), ROUNDING, "N");
        assertEquals(700, found.loads().get(Side.RIGHT).force().z(46), ROUNDING, "N");
    }

    @Test
    void refuseFeetThatAreNotOfThisCapture() {
        VectorSeries tooShort = VectorSeries.constant(Vector3.ZERO, Stage.FRAMES - 1);
        FootOutline foot = new FootOutline(Side.RIGHT, tooShort, tooShort, tooShort, tooShort);

        assertThrows(IllegalArgumentException.class, () -> Stage.find(List.of(), foot));
    }

    private static void assertLoad(Wrench expected, WrenchSeries found, int frame) {
        assertEquals(0, found.force().at(frame).minus(expected.force()).norm(), ROUNDING, "N");
        assertEquals(0, found.moment().at(frame).minus(expected.moment()).norm(), ROUNDING, "N·m");
    }

    private static List<String> inWords(Contacts contacts) {
        return contacts.contacts().stream()
                .map(ContactSeries::contact)
                .map(contact -> contact.plate() + " " + contact.foot() + " "
                        + contact.frames().first() + "-" + contact.frames().last())
                .toList();
    }

    private static Contact contact(Contacts contacts, int i) {
        return contacts.contacts().get(i).contact();
    }

    private static List<String> codes(Contacts contacts) {
        return contacts.findings().stream().map(Finding::code).toList();
    }

    private static Finding finding(Contacts contacts, String code) {
        return contacts.findings().stream()
                .filter(finding -> finding.code().equals(code))
                .findFirst()
                .orElseThrow();
    }
}
