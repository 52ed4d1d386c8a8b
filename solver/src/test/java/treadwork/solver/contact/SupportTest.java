package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.load.Support;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.ContactRule;
import treadwork.solver.plate.PlateLoad;

/** What feet stand on; expected values by construction. */
class SupportTest {

    /** Rounding of moments about points 1 m apart under 700 N. */
    private static final double ROUNDING = 1e-10;

    /** Stands to the right of the line, its heel at (0, -0.1). */
    private static final FootOutline RIGHT = Stage.foot(Side.RIGHT, Stage.standingAt(0, -0.1));

    /** 0.71/6 Hz are 118 ms: twelve frames beside a contact a standing foot still belongs to it, further away it is unmeasured. */
    @Test
    void reachAsFarBesideAContactAsTheFilterDoes() {
        PlateLoad plate = Stage.plate(
                1, new Vector3(0.1, -0.15, Stage.FLOOR), Stage.during(50, 120, Stage.loadAt(0.15, -0.1)), 6);

        List<Support> support = Stage.find(List.of(plate), RIGHT).support().get(Side.RIGHT);

        assertEquals(Support.UNMEASURED, support.get(37));
        assertEquals(Support.PLATE, support.get(38));
        assertEquals(Support.PLATE, support.get(132));
        assertEquals(Support.UNMEASURED, support.get(133));
    }

    @Test
    void callAFootUnmeasuredWhereItStandsBesideThePlates() {
        FootOutline right = Stage.foot(
                Side.RIGHT, Stage.swingingFrom(Stage.standingAt(-0.8, -0.1), Stage.standingAt(0, -0.1), 70, 110));
        PlateLoad plate = Stage.plate(1, 0.1, -0.15, Stage.during(110, 199, Stage.loadAt(0.15, -0.1)));

        Contacts found = Stage.find(List.of(plate), right);

        List<Support> support = found.support().get(Side.RIGHT);
        assertEquals(Support.UNMEASURED, support.get(0));
        assertEquals(Support.UNMEASURED, support.get(68));
        assertEquals(Support.AIR, support.get(90));
        assertEquals(Support.PLATE, support.get(110));
        assertEquals(Support.PLATE, support.get(199));
        assertTrue(found.loads().get(Side.RIGHT).force().isGap(30));
        assertEquals(Vector3.ZERO, found.loads().get(Side.RIGHT).force().at(90));
        Finding finding = finding(found, "unmeasured-support");
        assertEquals(Severity.REFUSES, finding.severity());
        assertEquals("stage.c3d, right foot, frames 21 to 89", finding.where(), "until two frames before it lifts");
    }

    /** At rest for all of the trial, little or much above the floor: held, not stood on; the other foot shows where the floor is. */
    @ParameterizedTest
    @ValueSource(doubles = {0.08, 0.3})
    void callAFootThatIsHeldUpInTheAir(double height) {
        FootOutline left = Stage.foot(Side.LEFT, i -> new Vector3(0, 0.1, Stage.FLOOR + height));
        PlateLoad plate = Stage.plate(1, 0.1, -0.15, Stage.during(0, 199, Stage.loadAt(0.15, -0.1)));

        Contacts found = Stage.find(List.of(plate), RIGHT, left);

        assertEquals(Support.AIR, found.support().get(Side.LEFT).get(100));
        assertEquals(Support.PLATE, found.support().get(Side.RIGHT).get(100));
        assertEquals(List.of(), found.findings());
    }

    /** One leg alone, 0.3 m above the plates throughout: no other foot shows the floor, but the plates do. */
    @Test
    void callAFootInTheAirThatNeverComesNearThePlates() {
        FootOutline right = Stage.foot(Side.RIGHT, i -> new Vector3(0, -0.1, Stage.FLOOR + 0.3));
        PlateLoad plate = Stage.plate(1, 0.1, -0.15, i -> Stage.nothing());

        Contacts found = Stage.find(List.of(plate), right);

        assertEquals(Support.AIR, found.support().get(Side.RIGHT).get(100));
    }

    @Test
    void callAFootUnmeasuredWhoseMotionIsNotKnown() {
        FootOutline lost =
                Stage.foot(Side.RIGHT, i -> i > 100 ? Vector3.GAP : new Vector3(0.02 * i, -0.1, Stage.FLOOR + 0.3));

        Contacts found = Stage.find(List.of(), lost);

        assertEquals(Support.AIR, found.support().get(Side.RIGHT).get(50));
        assertEquals(Support.UNMEASURED, found.support().get(Side.RIGHT).get(150));
    }

    /** Heel at x = 0, edge at x = 0.06: the heel is 60 mm off, the other three points are on. */
    @Test
    void warnOfAFootThatReachesOverTheEdge() {
        PlateLoad plate = Stage.plate(1, 0.31, -0.15, Stage.during(0, 199, Stage.loadAt(0.15, -0.1)));

        Contacts found = Stage.find(List.of(plate), RIGHT);

        Finding finding = finding(found, "foot-off-plate");
        assertEquals(Severity.WARNING, finding.severity());
        assertTrue(finding.figure().contains("60 mm"), finding.figure());
        assertEquals(Support.PLATE, found.support().get(Side.RIGHT).get(100));
    }

    /** Edge at x = 0.21: only the toe at 0.25 is on; heel and metatarsal heads are off by 30 mm or more. */
    @Test
    void refuseFramesInWhichMostOfTheFootIsOffThePlate() {
        PlateLoad plate = Stage.plate(1, 0.463, -0.15, Stage.during(0, 199, Stage.loadAt(0.23, -0.1)));

        Contacts found = Stage.find(List.of(plate), RIGHT);

        assertEquals(Severity.REFUSES, finding(found, "foot-off-plate").severity());
        assertEquals(Support.UNMEASURED, found.support().get(Side.RIGHT).get(100));
        assertTrue(found.loads().get(Side.RIGHT).force().isGap(100));
    }

    /** A plate whose moments cannot be known: the foot on it is unmeasured even when a person says that it is there. */
    @Test
    void refuseAFootOnAPlateWithoutMoments() {
        PlateLoad whole = Stage.plate(1, 0.1, -0.15, Stage.during(50, 120, Stage.loadAt(0.15, -0.1)));
        WrenchSeries load = new WrenchSeries(
                whole.raw().point(),
                whole.raw().force(),
                VectorSeries.gaps(whole.raw().size()));
        PlateLoad plate = new PlateLoad(1, whole.top(), load, load, Double.NaN);
        List<ContactRule> rules = List.of(new ContactRule(1, Side.RIGHT, Optional.empty()));

        Contacts found = Stage.find(List.of(plate), Optional.of(rules), RIGHT);

        assertEquals(Support.UNMEASURED, found.support().get(Side.RIGHT).get(100));
        assertTrue(found.loads().get(Side.RIGHT).force().isGap(100));
        assertTrue(found.contacts().get(0).centreOfPressure().isGap(30));
        assertEquals(700, found.contacts().get(0).force().z(30), ROUNDING, "N");
    }

    private static Finding finding(Contacts contacts, String code) {
        return contacts.findings().stream()
                .filter(finding -> finding.code().equals(code))
                .findFirst()
                .orElseThrow();
    }
}
