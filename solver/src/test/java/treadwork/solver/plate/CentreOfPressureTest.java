package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import treadwork.model.space.Axes;
import treadwork.model.space.Plane;
import treadwork.model.space.Vector3;
import treadwork.model.space.Wrench;

class CentreOfPressureTest {

    private static final Vector3 UP = new Vector3(0, 0, 1);
    private static final Plane TOP = new Plane(new Vector3(0.4, 0.6, 0), UP);

    /** Rounding only: some 20 operations on values below 1e3, each good to 1e-16 of that. */
    private static final double ROUNDING = 1e-12;

    /** Expected values by construction: the wrench is built from a chosen point and free moment. */
    @Test
    void findsThePointAndFreeMomentTheLoadWasBuiltFrom() {
        Vector3 foot = new Vector3(0.10, -0.05, 0);
        Wrench atFoot = new Wrench(Axes.LAB, foot, new Vector3(40, -25, 700), UP.times(2.5));
        Wrench atTransducer = atFoot.about(new Vector3(0.3, 0.2, -0.04));

        CentreOfPressure cop = CentreOfPressure.of(atTransducer, TOP, 20).orElseThrow();

        assertEquals(0, cop.point().minus(foot).norm(), ROUNDING, "distance from the true point, m");
        assertEquals(2.5, cop.freeMoment(), ROUNDING, "free moment, N·m");
    }

    /** By construction, on a surface that is neither level nor through the lab's origin. */
    @Test
    void findsThePointOnATiltedSurface() {
        Vector3 normal = new Vector3(0.2, -0.1, 0.9).unit();
        Plane slope = new Plane(new Vector3(0.4, 0.6, 0.3), normal);
        Vector3 along = normal.cross(new Vector3(1, 0, 0)).unit();
        Vector3 foot = slope.point().plus(along.times(0.17));
        Wrench atFoot = new Wrench(Axes.LAB, foot, new Vector3(60, 35, 640), normal.times(-1.5));

        CentreOfPressure cop = CentreOfPressure.of(atFoot.about(new Vector3(-0.7, 0.2, 0.1)), slope, 20)
                .orElseThrow();

        assertEquals(0, cop.point().minus(foot).norm(), ROUNDING, "distance from the true point, m");
        assertEquals(-1.5, cop.freeMoment(), ROUNDING, "free moment, N·m");
    }

    @Test
    void placesNoContactBelowTheThresholdOrWithoutAForce() {
        Wrench light = new Wrench(Axes.LAB, TOP.point(), new Vector3(0, 0, 19.9), Vector3.ZERO);
        Wrench pulling = new Wrench(Axes.LAB, TOP.point(), new Vector3(0, 0, -300), Vector3.ZERO);
        Wrench unknown = new Wrench(Axes.LAB, TOP.point(), Vector3.GAP, Vector3.ZERO);
        Wrench momentUnknown = new Wrench(Axes.LAB, TOP.point(), new Vector3(0, 0, 300), Vector3.GAP);

        assertTrue(CentreOfPressure.of(light, TOP, 20).isEmpty(), "19.9 N");
        assertTrue(CentreOfPressure.of(pulling, TOP, 20).isEmpty(), "-300 N");
        assertTrue(CentreOfPressure.of(unknown, TOP, 20).isEmpty(), "force not known");
        assertTrue(CentreOfPressure.of(momentUnknown, TOP, 20).isEmpty(), "moment not known");
    }

    @Test
    void refusesAThresholdThatIsNotAboveZero() {
        Wrench load = new Wrench(Axes.LAB, TOP.point(), new Vector3(0, 0, 300), Vector3.ZERO);

        assertThrows(IllegalArgumentException.class, () -> CentreOfPressure.of(load, TOP, 0));
        assertThrows(IllegalArgumentException.class, () -> CentreOfPressure.of(load, TOP, Double.NaN));
    }
}
