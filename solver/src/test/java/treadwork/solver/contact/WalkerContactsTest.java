package treadwork.solver.contact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.fixtures.plate.ChannelSign;
import treadwork.fixtures.plate.PlateDesign;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.LabPlan;
import treadwork.fixtures.walker.PlatePlan;
import treadwork.fixtures.walker.TrueContact;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PlateType;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.Support;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.LabAxis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.Processing;
import treadwork.solver.plate.LabUp;
import treadwork.solver.plate.PlateLoads;

/** Against a walk whose ground reactions are known exactly. */
class WalkerContactsTest {

    private static final Processing UNFILTERED =
            new Processing(FilterSettings.NONE, FilterSettings.NONE, 0.1, 20, new PlateZero.Auto());

    /** Rounding: moments about an origin up to 6 m away of 1000 N, in N·mm on the way, each good to 1e-16 of that. */
    private static final double ROUNDING = 1e-8;

    /** The motion of the feet tells when they bear load to 50 ms. */
    private static final double MOTION_S = 0.05;

    @ParameterizedTest
    @EnumSource(LabAxis.class)
    void giveTheExactGroundReactionInEveryLab(LabAxis up) {
        LabPlan lab = LabPlan.DEFAULT.withUp(up).withHeadingRad(0.7);

        assertExact(Walk.of(WalkerSettings.DEFAULT.with(lab)), List.of());
    }

    /** Every plate differs: type, quarter turn, sign of the channels, sign of the sensor origin. */
    @Test
    void giveTheExactGroundReactionOnPlatesOfAllKinds() {
        PlateDesign reversed =
                PlateDesign.of(PlateType.FOUR_SENSORS).withQuarterTurns(1).withSign(ChannelSign.ACTION);
        PlateDesign lost = PlateDesign.of(PlateType.CALIBRATED).withQuarterTurns(2);
        PlatePlan plan = PlatePlan.DEFAULT.withDesigns(
                PlateDesign.of(PlateType.FORCE_AND_CENTRE_OF_PRESSURE).withQuarterTurns(3),
                PlateDesign.of(PlateType.FORCE_AND_MOMENT),
                reversed,
                lost.withStatedOrigin(lost.origin().negated()));

        assertExact(Walk.of(WalkerSettings.DEFAULT.with(plan)), List.of("plate-sign", "plate-origin"));
    }

    /** In frames in which the true push is above the threshold; those below it are in the air by convention. */
    private static void assertExact(Walk walk, List<String> expectedFirst) {
        PlateLoads plates = plates(walk.walking(), UNFILTERED);
        Contacts found = contacts(walk, plates);

        List<String> codes = plates.findings().stream()
                .map(finding -> finding.code())
                .distinct()
                .toList();
        assertEquals(expectedFirst, codes);
        assertEquals(List.of(), found.findings());
        Vector3 up = walk.exact().gravity().unit().negated();
        for (Side side : Side.values()) {
            WrenchSeries exact = walk.exact().ground().get(side);
            WrenchSeries load = found.loads().get(side);
            for (int i = 0; i < exact.size(); i++) {
                boolean loaded = exact.force().at(i).dot(up) >= 20;
                Vector3 force = loaded ? exact.force().at(i) : Vector3.ZERO;
                Vector3 moment = loaded ? exact.moment().at(i) : Vector3.ZERO;
                assertEquals(0, load.force().at(i).minus(force).norm(), ROUNDING, side + " force, index " + i + ", N");
                assertEquals(
                        0, load.moment().at(i).minus(moment).norm(), ROUNDING, side + " moment, index " + i + ", N·m");
            }
        }
    }

    @Test
    void giveEachFootholdToItsFoot() {
        Walk walk = Walk.of(WalkerSettings.DEFAULT);

        List<Contact> found = contacts(walk, plates(walk.walking(), UNFILTERED)).contacts().stream()
                .map(ContactSeries::contact)
                .toList();

        List<TrueContact> expected = walk.exact().contacts();
        assertEquals(expected.size(), found.size());
        for (int k = 0; k < found.size(); k++) {
            assertEquals(expected.get(k).plate().orElseThrow(), found.get(k).plate());
            assertEquals(expected.get(k).foot(), found.get(k).foot());
            int rise = expected.get(k).frames().first() == 1 ? 0 : 6;
            int fall = expected.get(k).frames().last() == 660 ? 0 : 5;
            assertEquals(
                    expected.get(k).frames().first() + rise,
                    found.get(k).frames().first(),
                    1,
                    "20 N after 31 ms");
            assertEquals(
                    expected.get(k).frames().last() - fall,
                    found.get(k).frames().last(),
                    1,
                    "10 N 27 ms before the end");
        }
    }

    /** Slow and fast steps, and marker noise: without a plate below it a stance is unmeasured, beside it all stays as it was. */
    @ParameterizedTest
    @ValueSource(doubles = {0.95, 1.1, 1.35})
    void missAFootholdThatNoPlateMeasures(double strideS) {
        Walk walk = Walk.of(WalkerSettings.DEFAULT
                .with(Gait.DEFAULT.withStrideS(strideS))
                .with(PlatePlan.DEFAULT.withAbsent(Set.of(3)))
                .with(Disturbance.NONE.withMarkerNoise(0.0005).withPlateNoise(1).withPlateBaseline(15)));

        Contacts found = contacts(walk, plates(walk.walking(), UNFILTERED));

        assertSupport(walk, found, MOTION_S);
    }

    @Test
    void missAllFootholdsWithoutPlates() {
        Walk walk = Walk.of(WalkerSettings.DEFAULT.with(PlatePlan.DEFAULT.withMost(0)));

        Contacts found = Contacts.find(
                walk.walking(),
                List.of(),
                feet(walk.walking()),
                new ContactSettings(LabAxis.PLUS_Z, 20, Optional.empty()));

        assertEquals(List.of(), found.contacts());
        assertSupport(walk, found, MOTION_S);
    }

    /** With its own filter the reach is 0.71/6 s; beyond it, what is on a plate, in the air and unmeasured is as it truly is. */
    @Test
    void tellTheTruthBeyondTheReachOfTheFilter() {
        Walk walk = Walk.of(WalkerSettings.DEFAULT.with(PlatePlan.DEFAULT.withAbsent(Set.of(2, 5))));

        Contacts found = contacts(walk, plates(walk.walking(), Processing.DEFAULT));

        assertSupport(walk, found, 0.71 / 6);
    }

    /** All frames but those within {@code marginS} of a change of the true support. */
    private static void assertSupport(Walk walk, Contacts found, double marginS) {
        int margin = (int) Math.ceil(marginS * walk.walking().pointRate());
        int unmeasured = 0;
        for (Side side : Side.values()) {
            List<Support> expected = walk.exact().support().get(side);
            for (int i = 0; i < expected.size(); i++) {
                int from = Math.max(0, i - margin);
                int to = Math.min(expected.size() - 1, i + margin);
                boolean steady = Set.copyOf(expected.subList(from, to + 1)).size() == 1;
                if (steady) {
                    assertEquals(expected.get(i), found.support().get(side).get(i), side + ", index " + i);
                    boolean gap = found.loads().get(side).force().isGap(i);
                    assertEquals(expected.get(i) == Support.UNMEASURED, gap, side + " load, index " + i);
                    unmeasured += gap ? 1 : 0;
                }
            }
        }
        assertTrue(unmeasured > 20, "the walk has such frames");
    }

    @Test
    void refuseTheStandingCaptureWhoseFeetShareAPlate() {
        Walk walk = Walk.of(WalkerSettings.DEFAULT);
        PlateLoads plates = plates(walk.standing(), Processing.DEFAULT);

        Contacts found = Contacts.find(
                walk.standing(),
                plates.plates(),
                feet(walk.standing()),
                new ContactSettings(LabAxis.PLUS_Z, 20, Optional.empty()));

        assertEquals(List.of(), found.contacts());
        assertEquals(
                List.of("shared-plate"),
                found.findings().stream().map(finding -> finding.code()).toList());
    }

    private static PlateLoads plates(Capture capture, Processing processing) {
        LabAxis up =
                LabUp.find(capture, capture.plates(), Optional.empty()).axis().orElseThrow();
        return PlateLoads.resolve(capture, capture.plates(), up, processing);
    }

    private static Contacts contacts(Walk walk, PlateLoads plates) {
        LabAxis up = LabAxis.nearest(walk.exact().gravity().negated());
        return Contacts.find(
                walk.walking(), plates.plates(), feet(walk.walking()), new ContactSettings(up, 20, Optional.empty()));
    }

    private static List<FootOutline> feet(Capture capture) {
        return List.of(foot(Side.RIGHT, capture), foot(Side.LEFT, capture));
    }

    private static FootOutline foot(Side side, Capture capture) {
        return new FootOutline(
                side,
                course(capture, side.key() + " heel"),
                course(capture, side.key() + " fifth metatarsal head"),
                course(capture, side.key() + " toe tip"),
                course(capture, side.key() + " first metatarsal head"));
    }

    private static VectorSeries course(Capture capture, String label) {
        return capture.points().stream()
                .filter(point -> point.label().equals(label))
                .findFirst()
                .orElseThrow()
                .positions();
    }
}
