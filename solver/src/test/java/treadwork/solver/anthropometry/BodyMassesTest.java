package treadwork.solver.anthropometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.io.inertia.InertiaTables;
import treadwork.model.body.InertiaSource;
import treadwork.model.body.Landmark;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Sex;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Inertia;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.study.BodySettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.Orthosis;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.ShankAxis;
import treadwork.solver.pose.StandingBody;
import treadwork.solver.pose.StandingModel;

class BodyMassesTest {

    /** Rounding: lengths below 1 m, masses below 100 kg, some hundred operations. */
    private static final double ROUNDING = 1e-13;

    private static final double KG = 70;
    private static final BodyMass WOMAN = new BodyMass("S01", KG, Optional.of(Sex.FEMALE));
    private static final BodyMass MAN = new BodyMass("S02", KG, Optional.of(Sex.MALE));
    private static final BodyMass SOMEONE = new BodyMass("S03", KG, Optional.empty());
    private static final InertiaSource DE_LEVA = InertiaTables.load(InertiaTable.DE_LEVA_1996);
    private static final InertiaSource DUMAS = InertiaTables.load(InertiaTable.DUMAS_2007);
    private static final InertiaSource WINTER = InertiaTables.load(InertiaTable.WINTER_DEMPSTER);
    private static final StandingBody BODY = body(StandingModel.whole(), ShankAxis.MALLEOLI);

    /** Sums of percentages: de Leva 1996, Dumas 2007 and Winter 2009, thigh, shank and foot of both legs. */
    @ParameterizedTest
    @CsvSource({
        "DE_LEVA_1996,FEMALE,20.88",
        "DE_LEVA_1996,MALE,19.86",
        "DUMAS_2007,FEMALE,20.1",
        "DUMAS_2007,MALE,18.3",
        "WINTER_DEMPSTER,MALE,16.1"
    })
    void weighsBothLegsAsTheTableSays(InertiaTable table, Sex sex, double percentOfOneLeg) {
        BodyMass subject = new BodyMass("S", KG, Optional.of(sex));

        Map<Segment, WeighedSegment> masses = BodyMasses.of(BODY, subject, InertiaTables.load(table), Map.of());

        double total =
                masses.values().stream().mapToDouble(part -> part.mass().mass()).sum();
        assertEquals(2 * percentOfOneLeg / 100 * KG, total, ROUNDING * KG);
        assertFalse(masses.containsKey(Segment.PELVIS));
    }

    /** De Leva 1996, Table 4, male: thigh 14.16 %, centre 40.95 %, radii 32.9 (sagittal, transverse), 14.9 % of 0.43 m. */
    @Test
    void placesTheThighOnTheLineBetweenItsJointCentres() {
        MassProperties thigh = weigh(MAN, DE_LEVA, Segment.LEFT_THIGH).mass();

        double length = StandingModel.THIGH_LENGTH;
        assertSame(new Vector3(0, -0.4095 * length, 0), thigh.centre());
        double mass = 0.1416 * KG;
        assertSame(
                Inertia.diagonal(
                        mass * square(0.329 * length), mass * square(0.149 * length), mass * square(0.329 * length)),
                thigh.inertia());
    }

    /** De Leva 1996, Table 4, female shank: sagittal radius 26.7 about X, transverse 26.3 about Z, longitudinal 9.2 about Y. */
    @Test
    void takesTheSagittalRadiusAboutXAndTheTransverseAboutZ() {
        Inertia shank = weigh(WOMAN, DE_LEVA, Segment.RIGHT_SHANK).mass().inertia();

        double mass = 0.0481 * KG;
        double length = StandingModel.SHANK_LENGTH;
        assertSame(
                Inertia.diagonal(
                        mass * square(0.267 * length), mass * square(0.092 * length), mass * square(0.263 * length)),
                shank);
    }

    /**
     * De Leva 1996, Table 4, male foot, from heel (-0.05, -0.05, -0.004) to toe tip (0.21, -0.055, -0.02): the moment about
     * any axis u is uᵀ I u, so along the line it is m (0.124 L)², across it and level m (0.245 L)², across both m (0.257 L)².
     */
    @Test
    void laysTheFootAlongTheLineFromHeelToToe() {
        WeighedSegment foot = weigh(MAN, DE_LEVA, Segment.RIGHT_FOOT);

        Vector3 heel = new Vector3(-0.05, -0.05, -0.004);
        Vector3 line = new Vector3(0.26, -0.005, -0.016);
        double m = 0.0137 * KG;
        assertSame(heel.plus(line.times(0.4415)), foot.mass().centre());
        Vector3 along = line.unit();
        Vector3 up = new Vector3(0, 0, 1).cross(line).unit();
        Vector3 across = along.cross(up);
        Inertia inertia = foot.mass().inertia();
        assertEquals(m * square(0.124 * line.norm()), along.dot(inertia.times(along)), ROUNDING);
        assertEquals(m * square(0.257 * line.norm()), up.dot(inertia.times(up)), ROUNDING);
        assertEquals(m * square(0.245 * line.norm()), across.dot(inertia.times(across)), ROUNDING);
        assertEquals(0, along.dot(inertia.times(up)), ROUNDING);
        assertTrue(foot.source().contains("heel to toe tip, 0.2605 m"), foot.source());
    }

    @Test
    void saysThatTheToeTipIsEstimated() {
        StandingBody body = body(StandingModel.whole().without(Landmark.RIGHT_TOE_TIP), ShankAxis.MALLEOLI);

        WeighedSegment foot = BodyMasses.of(body, MAN, DE_LEVA, Map.of()).get(Segment.RIGHT_FOOT);

        assertTrue(foot.source().contains("toe tip (not mapped: estimated"), foot.source());
        assertTrue(foot.source().contains("from memory"), foot.source());
    }

    /** Dumas 2007, female shank of 0.41 m: centre -4.9, -40.4, 3.1 %, radii 28, 10, 28, 2, 1, 6 %. */
    @Test
    void turnsAFullTensorIntoTheSegment() {
        MassProperties shank = weigh(WOMAN, DUMAS, Segment.RIGHT_SHANK).mass();

        double length = StandingModel.SHANK_LENGTH;
        double unit = 0.045 * KG * length * length;
        assertSame(new Vector3(-0.049, -0.404, 0.031).times(length), shank.centre());
        assertSame(new Inertia(0.0784, 0.01, 0.0784, 0.0004, 0.0001, 0.0036).times(unit), shank.inertia());
    }

    /** By construction: the left limb of the model is the right one mirrored, so Z, Ixz and Iyz change their sign. */
    @ParameterizedTest
    @EnumSource(InertiaTable.class)
    void mirrorsTheLeftSide(InertiaTable table) {
        Map<Segment, WeighedSegment> masses = BodyMasses.of(BODY, WOMAN, InertiaTables.load(table), Map.of());

        for (SegmentKind kind : List.of(SegmentKind.THIGH, SegmentKind.SHANK, SegmentKind.FOOT)) {
            MassProperties right = masses.get(Segment.of(kind, Side.RIGHT)).mass();
            MassProperties left = masses.get(Segment.of(kind, Side.LEFT)).mass();
            Inertia i = right.inertia();
            assertSame(
                    new Vector3(
                            right.centre().x(),
                            right.centre().y(),
                            -right.centre().z()),
                    left.centre());
            assertSame(new Inertia(i.xx(), i.yy(), i.zz(), i.xy(), -i.xz(), -i.yz()), left.inertia());
        }
    }

    /** Principal radii of gyration of the published tensors, percent, worked by an eigenvalue program; rounded to 0.1. */
    @ParameterizedTest
    @CsvSource({
        "MALE,RIGHT_THIGH,14.8,29.0,30.1", "MALE,LEFT_SHANK,9.9,27.9,28.1", "MALE,RIGHT_FOOT,16.1,36.0,37.4",
        "FEMALE,LEFT_THIGH,18.8,31.0,32.1", "FEMALE,RIGHT_SHANK,9.9,28.0,28.0", "FEMALE,LEFT_FOOT,16.7,35.0,36.2"
    })
    void keepsThePrincipalRadiiOfTheTable(Sex sex, Segment segment, double least, double middle, double most) {
        BodyMass subject = new BodyMass("S", KG, Optional.of(sex));
        StandingBody body = body(StandingModel.whole(), ShankAxis.EPICONDYLES);

        MassProperties mass =
                BodyMasses.of(body, subject, DUMAS, Map.of()).get(segment).mass();

        double length = segment.kind() == SegmentKind.FOOT
                ? new Vector3(0.135, -0.05, -0.004).norm()
                : body.segments().get(segment).length();
        double[] radii = principalRadii(mass);
        assertEquals(least, 100 * radii[0] / length, 0.0501);
        assertEquals(middle, 100 * radii[1] / length, 0.0501);
        assertEquals(most, 100 * radii[2] / length, 0.0501);
    }

    /** The shank's mass lies where it lies, whichever landmarks the study turns the shank's axes by. */
    @ParameterizedTest
    @CsvSource({"RIGHT_SHANK", "LEFT_SHANK"})
    void keepsTheTablesShankAxesWhenTheStudyTurnsTheShankByTheEpicondyles(Segment shank) {
        StandingBody turned = body(StandingModel.whole(), ShankAxis.EPICONDYLES);

        MassProperties other =
                BodyMasses.of(turned, MAN, DUMAS, Map.of()).get(shank).mass();

        Rotation labFromOwn = BODY.segments().get(shank).standing().labFromBody();
        Rotation labFromOther = turned.segments().get(shank).standing().labFromBody();
        assertTrue(labFromOwn.columnX().minus(labFromOther.columnX()).norm() > 0.01, "the axes differ");
        MassProperties own = weigh(MAN, DUMAS, shank).mass();
        assertSame(labFromOwn.times(own.centre()), labFromOther.times(other.centre()));
        assertSame(own.inertia().in(labFromOwn), other.inertia().in(labFromOther));
    }

    /**
     * Winter 2009, Table 4.1: leg 4.65 %, centre 43.3 %, radius 30.2 % of knee centre to medial malleolus, seen from the
     * side: 0.41 - 0.006 m. Long axis by hand: R² = m / (π δ L), I = m R² / 2.
     */
    @Test
    void seesThePlanarTablesLegFromTheSide() {
        WeighedSegment shank = weigh(SOMEONE, WINTER, Segment.RIGHT_SHANK);

        double length = StandingModel.SHANK_LENGTH - 0.006;
        double m = 0.0465 * KG;
        assertSame(new Vector3(0, -0.433 * length, 0), shank.mass().centre());
        double across = m * square(0.302 * length);
        double along = m * m / (2 * Math.PI * 1090 * length);
        assertSame(Inertia.diagonal(across, along, across), shank.mass().inertia());
        assertTrue(shank.source().contains("solid cylinder"), shank.source());
        assertTrue(shank.source().contains("X-Y plane"), shank.source());
    }

    /** Winter 2009: halfway from lateral malleolus to second metatarsal head, here seen from the side. */
    @Test
    void seesThePlanarTablesFootBetweenMalleolusAndSecondHead() {
        StandingModel model = StandingModel.whole();

        Vector3 centre = weigh(SOMEONE, WINTER, Segment.RIGHT_FOOT).mass().centre();

        Vector3 malleolus =
                model.poses().get(Segment.RIGHT_FOOT).toBody(model.landmarks().get(Landmark.RIGHT_LATERAL_MALLEOLUS));
        assertSame(new Vector3((malleolus.x() + 0.149) / 2, (malleolus.y() - 0.045) / 2, 0), centre);
    }

    @Test
    void saysWhichEndsStandInForOthers() {
        StandingBody body =
                body(StandingModel.whole().without(Landmark.LEFT_SECOND_METATARSAL_HEAD), ShankAxis.MALLEOLI);

        Map<Segment, WeighedSegment> masses = BodyMasses.of(body, SOMEONE, WINTER, Map.of());

        String thigh = masses.get(Segment.RIGHT_THIGH).source();
        assertTrue(thigh.contains("in place of the greater trochanter"), thigh);
        String foot = masses.get(Segment.LEFT_FOOT).source();
        assertTrue(foot.contains("in place of the second"), foot);
    }

    @ParameterizedTest
    @EnumSource(InertiaTable.class)
    void givesEachSegmentATensorThatABodyCanHave(InertiaTable table) {
        BodyMasses.of(BODY, WOMAN, InertiaTables.load(table), Map.of())
                .forEach((segment, weighed) ->
                        assertTrue(weighed.mass().inertia().isPhysical(), segment + ": " + weighed.mass()));
    }

    @Test
    void asksForTheSexWhereTheTableNeedsIt() {
        Finding finding = assertThrows(
                        UnusableInputException.class, () -> BodyMasses.of(BODY, SOMEONE, DE_LEVA, Map.of()))
                .finding();

        assertEquals("sex-missing", finding.code());
        assertEquals("subject S03", finding.where());
        assertTrue(finding.mend().contains("subjects[].sex"), finding.mend());
    }

    @Test
    void takesAPersonsValuesInPlaceOfTheTables() {
        MassProperties own =
                new MassProperties(3.1, new Vector3(0, -0.18, 0), new Inertia(0.04, 0.005, 0.04, 0, 0, 0.001));

        Map<Segment, WeighedSegment> masses =
                BodyMasses.of(BODY, MAN, DE_LEVA, Map.of(Segment.RIGHT_SHANK, own, Segment.PELVIS, own));

        assertEquals(own, masses.get(Segment.RIGHT_SHANK).mass());
        assertEquals(own, masses.get(Segment.PELVIS).mass());
        assertEquals(0.0433 * KG, masses.get(Segment.LEFT_SHANK).mass().mass(), ROUNDING);
        assertTrue(masses.get(Segment.RIGHT_SHANK).source().contains("study file"));
    }

    /** Mass in kg, then the tensor's six elements; each row breaks one law. */
    @ParameterizedTest
    @CsvSource({
        "0,0.04,0.005,0.04,0,massKg is 0.000",
        "-1,0.04,0.005,0.04,0,massKg is -1.000",
        "NaN,0.04,0.005,0.04,0,massKg is NaN",
        "70,0.04,0.005,0.04,0,massKg is 70.000",
        "3,0.04,-0.005,0.04,0,'[0.0400000, -0.00500000'",
        "3,0.04,0.005,0.05,0,'[0.0400000, 0.00500000, 0.0500000'",
        "3,0.04,0.005,0.04,0.02,0.0200000",
        "3,NaN,0.005,0.04,0,'[NaN'"
    })
    void refusesValuesThatNoBodyCanHave(double mass, double xx, double yy, double zz, double xy, String figure) {
        MassProperties own = new MassProperties(mass, new Vector3(0, -0.18, 0), new Inertia(xx, yy, zz, xy, 0, 0));

        Finding finding = assertThrows(
                        UnusableInputException.class,
                        () -> BodyMasses.of(BODY, MAN, DE_LEVA, Map.of(Segment.RIGHT_SHANK, own)))
                .finding();

        assertEquals("segment-mass", finding.code());
        assertEquals("subject S02, body.segments.right_shank", finding.where());
        assertTrue(finding.figure().contains(figure), finding.figure());
    }

    /** By hand: two masses on a line d apart add m1 m2 / (m1 + m2) d² across it (reduced mass). */
    @Test
    void addsADeviceAsAPointMass() {
        Map<Segment, WeighedSegment> bare = BodyMasses.of(BODY, MAN, DE_LEVA, Map.of());
        MassProperties shank = bare.get(Segment.RIGHT_SHANK).mass();
        Vector3 place = shank.centre().plus(new Vector3(0.03, 0, 0));
        Orthosis orthosis = new Orthosis("brace on", Segment.RIGHT_SHANK, 0.42, place);

        Map<Segment, WeighedSegment> dressed = BodyMasses.wearing(bare, List.of(orthosis));

        MassProperties both = dressed.get(Segment.RIGHT_SHANK).mass();
        assertEquals(shank.mass() + 0.42, both.mass(), ROUNDING);
        assertSame(shank.centre().plus(new Vector3(0.03 * 0.42 / both.mass(), 0, 0)), both.centre());
        double reduced = shank.mass() * 0.42 / both.mass() * square(0.03);
        assertSame(shank.inertia().plus(Inertia.diagonal(0, reduced, reduced)), both.inertia());
        assertTrue(dressed.get(Segment.RIGHT_SHANK).source().endsWith("with \"brace on\", 0.420 kg as a point mass"));
        assertEquals(bare.get(Segment.LEFT_SHANK), dressed.get(Segment.LEFT_SHANK));
    }

    @ParameterizedTest
    @CsvSource({"0", "-0.4", "NaN", "Infinity"})
    void refusesADeviceWithoutMass(double mass) {
        Orthosis orthosis = new Orthosis("brace on", Segment.LEFT_FOOT, mass, Vector3.ZERO);

        Finding finding = assertThrows(
                        UnusableInputException.class, () -> BodyMasses.wearing(Map.of(), List.of(orthosis)))
                .finding();

        assertEquals("segment-mass", finding.code());
        assertEquals("orthosis \"brace on\" on left_foot", finding.where());
    }

    private static WeighedSegment weigh(BodyMass subject, InertiaSource table, Segment segment) {
        return BodyMasses.of(BODY, subject, table, Map.of()).get(segment);
    }

    private static StandingBody body(StandingModel model, ShankAxis axis) {
        BodySettings settings = new BodySettings(
                BodySettings.DEFAULT.inertia(), HipCentreRule.MARKER, axis, PoseMethod.SEGMENT_FIT, Map.of());
        return StandingBody.measure(model.capture(), model.markerSet(), settings);
    }

    private static double[] principalRadii(MassProperties mass) {
        Inertia i = mass.inertia().times(1 / mass.mass());
        DMatrixRMaj matrix =
                new DMatrixRMaj(3, 3, true, i.xx(), i.xy(), i.xz(), i.xy(), i.yy(), i.yz(), i.xz(), i.yz(), i.zz());
        EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(3, false, true);
        eigen.decompose(matrix);
        double[] radii = new double[3];
        for (int k = 0; k < 3; k++) {
            radii[k] = Math.sqrt(eigen.getEigenvalue(k).getReal());
        }
        Arrays.sort(radii);
        return radii;
    }

    private static double square(double value) {
        return value * value;
    }

    private static void assertSame(Vector3 expected, Vector3 actual) {
        assertEquals(0, expected.minus(actual).norm(), ROUNDING, expected + " against " + actual);
    }

    private static void assertSame(Inertia expected, Inertia actual) {
        Inertia difference = expected.plus(actual.times(-1));
        String both = expected + " against " + actual;
        assertEquals(0, difference.xx(), ROUNDING, both);
        assertEquals(0, difference.yy(), ROUNDING, both);
        assertEquals(0, difference.zz(), ROUNDING, both);
        assertEquals(0, difference.xy(), ROUNDING, both);
        assertEquals(0, difference.xz(), ROUNDING, both);
        assertEquals(0, difference.yz(), ROUNDING, both);
    }
}
