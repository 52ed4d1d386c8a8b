package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.junit.jupiter.api.Test;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.Support;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.ContactRule;
import treadwork.solver.plate.PlateLoad;

/** Contacts as a person states them; expected values by construction. */
class ContactRulesTest {

    /** Rounding of moments about points 1 m apart under 700 N. */
    private static final double ROUNDING = 1e-10;

    /** Stands to the right of the line, its heel at (0, -0.1). */
    private static final FootOutline RIGHT = Stage.foot(Side.RIGHT, Stage.standingAt(0, -0.1));

    private static final IntFunction<Vector3> LEFT_PLACE = Stage.standingAt(0, 0.5);

    @Test
    void followAPersonsRulesAlone() {
        PlateLoad right = Stage.plate(1, 0.1, -0.15, Stage.during(50, 120, Stage.loadAt(0.15, -0.1)));
        PlateLoad unnamed = Stage.plate(2, 0.1, 0.5, Stage.during(80, 150, Stage.loadAt(0.12, 0.52)));
        List<ContactRule> rules = List.of(new ContactRule(1, Side.LEFT, Optional.empty()));

        Contacts found =
                Stage.find(List.of(right, unnamed), Optional.of(rules), RIGHT, Stage.foot(Side.LEFT, LEFT_PLACE));

        assertEquals(List.of("1 LEFT 71-141"), inWords(found));
        assertEquals("stated in the study file", contact(found, 0).assigned());
        assertEquals(700, found.loads().get(Side.LEFT).force().z(100), ROUNDING, "N");
        assertEquals(
                Support.UNMEASURED, found.support().get(Side.RIGHT).get(100), "it stands, and nobody says on what");
        assertEquals(
                Severity.WARNING, finding(found, "foot-off-plate").severity(), "the markers contradict the person");
    }

    @Test
    void cutALoadAtTheFramesOfARule() {
        PlateLoad plate = Stage.plate(1, 0.1, 0, Stage.during(20, 180, Stage.loadAt(0.15, -0.1)));
        List<ContactRule> rules = List.of(
                new ContactRule(1, Side.RIGHT, Optional.of(new FrameRange(1, 120))),
                new ContactRule(1, Side.LEFT, Optional.of(new FrameRange(121, 500))));

        Contacts found = Stage.find(List.of(plate), Optional.of(rules), RIGHT, Stage.foot(Side.LEFT, LEFT_PLACE));

        assertEquals(List.of("1 RIGHT 41-120", "1 LEFT 121-201"), inWords(found));
        assertEquals(700, found.loads().get(Side.RIGHT).force().z(99), ROUNDING, "frame 120, N");
        assertEquals(0, zeroOrGap(found, Side.RIGHT, 100), ROUNDING, "frame 121, N");
        assertEquals(700, found.loads().get(Side.LEFT).force().z(100), ROUNDING, "frame 121, N");
    }

    @Test
    void refuseRulesThatPutBothFeetOnOnePlateAtOnce() {
        PlateLoad plate = Stage.plate(1, 0.1, 0, Stage.during(20, 180, Stage.loadAt(0.15, -0.1)));
        List<ContactRule> rules = List.of(
                new ContactRule(1, Side.RIGHT, Optional.empty()),
                new ContactRule(1, Side.LEFT, Optional.of(new FrameRange(121, 140))));

        Contacts found = Stage.find(List.of(plate), Optional.of(rules), RIGHT, Stage.foot(Side.LEFT, LEFT_PLACE));

        assertTrue(finding(found, "shared-plate").where().contains("121 to 140"));
        assertTrue(found.loads().get(Side.RIGHT).force().isGap(110));
        assertTrue(found.loads().get(Side.LEFT).force().isGap(110));
        assertEquals(700, found.loads().get(Side.RIGHT).force().z(90), ROUNDING, "N");
    }

    @Test
    void nameARuleWithNothingToStandOn() {
        PlateLoad plate = Stage.plate(1, 0.1, 0, Stage.during(20, 180, Stage.loadAt(0.15, -0.1)));
        List<ContactRule> rules = List.of(new ContactRule(3, Side.RIGHT, Optional.empty()));

        Contacts found = Stage.find(List.of(plate), Optional.of(rules), RIGHT);

        assertTrue(finding(found, "contact-rule").where().contains("plate 3"));
    }

    private static double zeroOrGap(Contacts found, Side side, int frame) {
        VectorSeries force = found.loads().get(side).force();
        return force.isGap(frame) ? 0 : force.z(frame);
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

    private static Finding finding(Contacts contacts, String code) {
        return contacts.findings().stream()
                .filter(finding -> finding.code().equals(code))
                .findFirst()
                .orElseThrow();
    }
}
