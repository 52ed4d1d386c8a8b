package treadwork.solver.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import treadwork.model.body.MassProperties;
import treadwork.model.space.Inertia;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/**
 * The planar examples of the chapter on kinetics of D. A. Winter, Biomechanics and Motor Control of Human Movement; inputs
 * and answers are from memory, the printed page was not seen. X forward, Y up, moments counter-clockwise.
 */
class TextbookExamplesTest {

    /** The answers are given to two decimals, from inputs that are given to two or three. */
    private static final double PRINTED = 0.011;

    private static final Vector3 GRAVITY = new Vector3(0, -9.8, 0);

    private static final Vector3 ANKLE = new Vector3(0.3, 0.1, 0);

    @Test
    void staticStanceOnOneFoot() {
        MovingSegment foot = segment(0.9, 0, ANKLE.plus(new Vector3(0.06, 0, 0)), new double[] {0, 0, 0});
        WrenchSeries ground =
                new WrenchSeries(ANKLE.plus(new Vector3(0.04, 0, 0)), one(new Vector3(0, 588, 0)), one(Vector3.ZERO));

        LoadSeries ankle = LimbLoads.of(List.of(foot), List.of(one(ANKLE)), ground, GRAVITY)
                .get(0);

        assertEquals(0, ankle.force().x(0), PRINTED, "ankle force forward, N");
        assertEquals(-579.18, ankle.force().y(0), PRINTED, "ankle force up, N");
        assertEquals(-22.99, ankle.moment().z(0), PRINTED, "ankle moment, N·m");
    }

    @Test
    void footAndLegInSwing() {
        MovingSegment foot =
                segment(1.16, 0.0105, ANKLE.plus(new Vector3(0.0195, -0.0985, 0)), new double[] {9.07, -6.62, 21.69});
        Vector3 legCentre = ANKLE.plus(new Vector3(0.185, 0.169, 0));
        MovingSegment leg = segment(3.72, 0.0638, legCentre, new double[] {-0.03, -4.21, 36.9});
        Vector3 knee = legCentre.plus(new Vector3(0.142, 0.129, 0));
        WrenchSeries air = new WrenchSeries(Vector3.ZERO, one(Vector3.ZERO), one(Vector3.ZERO));

        List<LoadSeries> loads = LimbLoads.of(List.of(foot, leg), List.of(one(ANKLE), one(knee)), air, GRAVITY);

        assertEquals(10.52, loads.get(0).force().x(0), PRINTED, "ankle force forward, N");
        assertEquals(3.69, loads.get(0).force().y(0), PRINTED, "ankle force up, N");
        assertEquals(1.34, loads.get(0).moment().z(0), PRINTED, "ankle moment, N·m");
        assertEquals(10.41, loads.get(1).force().x(0), PRINTED, "knee force forward, N");
        assertEquals(24.48, loads.get(1).force().y(0), PRINTED, "knee force up, N");
        assertEquals(2.65, loads.get(1).moment().z(0), PRINTED, "knee moment, N·m");
    }

    /** @param acceleration of the centre of mass along X and Y, m/s², and about Z, rad/s² */
    private static MovingSegment segment(double mass, double inertia, Vector3 centre, double[] acceleration) {
        PoseSeries.Builder pose = new PoseSeries.Builder(1);
        pose.set(0, centre, Rotation.IDENTITY);
        return new MovingSegment(
                new MassProperties(mass, Vector3.ZERO, Inertia.diagonal(0, 0, inertia)),
                pose.build(),
                one(Vector3.ZERO),
                one(new Vector3(0, 0, acceleration[2])),
                one(centre),
                one(new Vector3(acceleration[0], acceleration[1], 0)));
    }

    private static VectorSeries one(Vector3 value) {
        return VectorSeries.constant(value, 1);
    }
}
