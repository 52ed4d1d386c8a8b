package treadwork.io.inertia;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.body.BodyPoint;
import treadwork.model.body.InertiaRow;
import treadwork.model.body.InertiaSource;
import treadwork.model.body.MassSpread;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Sex;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;
import treadwork.model.study.InertiaTable;

class InertiaTablesTest {

    /** Rounding of a product of two numbers below 100. */
    private static final double ROUNDING = 1e-14;

    @ParameterizedTest
    @EnumSource(InertiaTable.class)
    void carriesTheSourceAndItsStatus(InertiaTable table) {
        InertiaSource source = InertiaTables.load(table);

        assertTrue(source.citation().matches(".*(1996|2007|2009).*"), source.citation());
        assertTrue(source.status().contains("read"), source.status());
        assertTrue(source.status().contains("not"), "says what was not verified: " + source.status());
        assertTrue(source.axes().length() > 40, source.axes());
    }

    @ParameterizedTest
    @EnumSource(InertiaTable.class)
    void hasEachSegmentOfTheLegForEitherSex(InertiaTable table) {
        InertiaSource source = InertiaTables.load(table);

        for (SegmentKind kind : EnumSet.of(SegmentKind.THIGH, SegmentKind.SHANK, SegmentKind.FOOT)) {
            for (Sex sex : Sex.values()) {
                assertTrue(source.row(kind, Optional.of(sex)).isPresent(), kind + " " + sex);
            }
        }
    }

    /** Percent of body mass: de Leva 1996, Table 4; Dumas 2007, Table 2; Winter 2009, Table 4.1 (copies). */
    @ParameterizedTest
    @CsvSource({
        "DE_LEVA_1996,FEMALE,14.78,4.81,1.29",
        "DE_LEVA_1996,MALE,14.16,4.33,1.37",
        "DUMAS_2007,FEMALE,14.6,4.5,1.0",
        "DUMAS_2007,MALE,12.3,4.8,1.2",
        "WINTER_DEMPSTER,FEMALE,10.0,4.65,1.45"
    })
    void givesThePublishedMasses(InertiaTable table, Sex sex, double thigh, double shank, double foot) {
        InertiaSource source = InertiaTables.load(table);

        assertEquals(thigh, percent(source, SegmentKind.THIGH, sex), 100 * ROUNDING);
        assertEquals(shank, percent(source, SegmentKind.SHANK, sex), 100 * ROUNDING);
        assertEquals(foot, percent(source, SegmentKind.FOOT, sex), 100 * ROUNDING);
    }

    /** De Leva 1996, Table 4, female foot, heel to toe tip. */
    @Test
    void readsARowOnALine() {
        InertiaRow row = row(InertiaTable.DE_LEVA_1996, SegmentKind.FOOT, Sex.FEMALE);

        assertEquals(BodyPoint.HEEL, row.from());
        assertEquals(BodyPoint.TOE_TIP, row.to());
        MassSpread.OnLine spread = (MassSpread.OnLine) row.spread();
        assertEquals(0.4014, spread.centre(), ROUNDING);
        assertEquals(0.299, spread.sagittal(), ROUNDING);
        assertEquals(0.279, spread.transverse(), ROUNDING);
        assertEquals(0.139, spread.longitudinal(), ROUNDING);
    }

    /** Dumas 2007, male foot: radii 17, 37, 36, 13, 8i, 0 percent. */
    @Test
    void takesAnImaginaryRadiusForANegativeElement() {
        InertiaRow row = row(InertiaTable.DUMAS_2007, SegmentKind.FOOT, Sex.MALE);

        MassSpread.InAxes spread = (MassSpread.InAxes) row.spread();
        Inertia tensor = spread.inertia();
        assertEquals(0, spread.centre().minus(new Vector3(0.382, -0.151, 0.026)).norm(), ROUNDING);
        assertEquals(0.0289, tensor.xx(), ROUNDING);
        assertEquals(0.1369, tensor.yy(), ROUNDING);
        assertEquals(0.1296, tensor.zz(), ROUNDING);
        assertEquals(0.0169, tensor.xy(), ROUNDING);
        assertEquals(-0.0064, tensor.xz(), ROUNDING);
        assertEquals(0, tensor.yz(), ROUNDING);
    }

    /** Winter 2009, Table 4.1, leg; the density is from memory. */
    @Test
    void readsARowInTheSagittalPlane() {
        InertiaRow row = row(InertiaTable.WINTER_DEMPSTER, SegmentKind.SHANK, Sex.MALE);

        assertEquals(new MassSpread.InSagittalPlane(0.433, 0.302, 1090), rounded(row.spread()));
        assertEquals(BodyPoint.FEMORAL_CONDYLES, row.from());
        assertEquals(BodyPoint.MEDIAL_MALLEOLUS, row.to());
    }

    /**
     * Winter 2009, Table 4.1, also lists the radii about the ends: by the parallel-axis theorem ρ² + c² of the thigh is
     * 0.540², of the leg 0.528², of the foot 0.690²; rounded to three digits there.
     */
    @ParameterizedTest
    @CsvSource({"THIGH,0.540", "SHANK,0.528", "FOOT,0.690"})
    void agreesWithTheListedRadiusAboutTheProximalEnd(SegmentKind kind, double listed) {
        InertiaRow row = row(InertiaTable.WINTER_DEMPSTER, kind, Sex.MALE);

        MassSpread.InSagittalPlane spread = (MassSpread.InSagittalPlane) row.spread();
        assertEquals(listed, Math.hypot(spread.radius(), spread.centre()), 0.0006);
    }

    /**
     * De Leva 1996 lists the shank between other ends too; the same body gives the same centre, mm from the knee. Lengths
     * of the reference subjects, mm: 434.0 and 432.3 to the ankle centre; 427.7 and 426.0 to the lateral malleolus; 421.6
     * and 419.8 to the sphyrion (from memory); percentages as read: 44.59, 44.16; 45.24, 44.81. Each is rounded to 0.1 mm
     * and 0.01 percent.
     */
    @ParameterizedTest
    @CsvSource({"MALE,434.0,427.7,44.59,421.6,45.24", "FEMALE,432.3,426.0,44.16,419.8,44.81"})
    void placesTheShanksCentreWhereTheOtherEndPointsDo(
            Sex sex, double ankle, double lateral, double lateralPercent, double medial, double medialPercent) {
        MassSpread.OnLine spread = (MassSpread.OnLine)
                row(InertiaTable.DE_LEVA_1996, SegmentKind.SHANK, sex).spread();

        double centreMm = spread.centre() * ankle;

        assertEquals(lateral * lateralPercent / 100, centreMm, 0.15);
        assertEquals(medial * medialPercent / 100, centreMm, 0.15);
    }

    @ParameterizedTest
    @EnumSource(Sex.class)
    void givesPhysicalTensors(Sex sex) {
        for (SegmentKind kind : EnumSet.of(SegmentKind.THIGH, SegmentKind.SHANK, SegmentKind.FOOT)) {
            MassSpread.InAxes spread =
                    (MassSpread.InAxes) row(InertiaTable.DUMAS_2007, kind, sex).spread();

            assertTrue(spread.inertia().isPhysical(), kind + ": " + spread.inertia());
        }
    }

    private static double percent(InertiaSource source, SegmentKind kind, Sex sex) {
        return 100 * source.row(kind, Optional.of(sex)).orElseThrow().massShare();
    }

    private static InertiaRow row(InertiaTable table, SegmentKind kind, Sex sex) {
        return InertiaTables.load(table).row(kind, Optional.of(sex)).orElseThrow();
    }

    private static MassSpread rounded(MassSpread spread) {
        MassSpread.InSagittalPlane s = (MassSpread.InSagittalPlane) spread;
        return new MassSpread.InSagittalPlane(
                Math.round(s.centre() * 1e6) / 1e6, Math.round(s.radius() * 1e6) / 1e6, s.density());
    }
}
