package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import treadwork.fixtures.plate.ChannelSign;
import treadwork.fixtures.plate.PlateDesign;
import treadwork.fixtures.walker.ExactJoint;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.LabPlan;
import treadwork.fixtures.walker.PlatePlan;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.Processor;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PlateType;
import treadwork.model.load.JointLoads;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;

/**
 * From files to loads for a walker whose loads are known by construction: whatever the plates, the lab and the file are
 * like, no filter and no noise leave only the error of storing 32-bit numbers and of differentiating samples. In 128
 * laboratories, each written in three byte orders, the largest error found was 0.04 % of range (rms).
 */
class ExactWalkerTest {

    /** Root mean square error of a moment, force or power over its range. */
    private static final double SHARE_OF_RANGE = 0.003;

    private static final double ANGLE_DEG = 0.01;

    /** Every plate type, vertical axis, unit, quarter turn and channel sign, in all combinations. */
    static Stream<Arguments> laboratories() {
        return Arrays.stream(PlateType.values())
                .flatMap(type ->
                        Stream.of(0, 1, 2, 3).map(turns -> PlateDesign.of(type).withQuarterTurns(turns)))
                .flatMap(design -> Arrays.stream(ChannelSign.values()).map(design::withSign))
                .flatMap(design -> Stream.of(LengthUnit.MM, LengthUnit.M)
                        .flatMap(unit -> Stream.of(LabAxis.PLUS_Y, LabAxis.PLUS_Z)
                                .map(up -> LabPlan.DEFAULT.withUp(up).withUnit(unit)))
                        .map(lab -> Arguments.of(design, lab)));
    }

    @ParameterizedTest
    @MethodSource("laboratories")
    void findsTheExactLoads(PlateDesign design, LabPlan lab) {
        Walk walk = Walk.of(WalkerSettings.DEFAULT
                .with(Gait.DEFAULT.withDurationS(1.8))
                .with(lab)
                .with(PlatePlan.DEFAULT.withDesigns(design)));

        for (Processor processor : Processor.values()) {
            C3dEncoding encoding = new C3dEncoding(processor, C3dEncoding.Storage.REAL, false);
            List<JointLoads> joints = Walked.of(walk, Walked.UNFILTERED)
                    .computedFrom(encoding)
                    .result()
                    .joints();

            assertEquals(6, joints.size(), "solved joints");
            joints.forEach(joint -> assertExact(walk.exact().joint(joint.joint()), joint));
        }
    }

    private static void assertExact(ExactJoint exact, JointLoads found) {
        String joint = exact.joint().key();
        assertAngles(joint, exact.angles(), found.angles());
        assertShare(joint + " moment", exact.moment(), found.moment());
        assertShare(joint + " force", exact.forceInProximal(), found.force());
        assertShare(joint + " power", exact.power(), found.power());
    }

    private static void assertAngles(String joint, VectorSeries exact, VectorSeries found) {
        for (int i = 0; i < exact.size(); i++) {
            double off = Math.toDegrees(found.at(i).minus(exact.at(i)).norm());
            assertTrue(off <= ANGLE_DEG, joint + " angles are off by " + off + "° in frame " + i);
        }
    }

    private static void assertShare(String what, VectorSeries exact, VectorSeries found) {
        assertShare(what + " 1", exact.componentX(), found.componentX());
        assertShare(what + " 2", exact.componentY(), found.componentY());
        assertShare(what + " 3", exact.componentZ(), found.componentZ());
    }

    /** A gap would not be seen in a root mean square of what is known, so there must be none. */
    private static void assertShare(String what, ScalarSeries exact, ScalarSeries found) {
        assertTrue(Arrays.stream(found.toArray()).noneMatch(Double::isNaN), what + " has gaps");
        Loads.assertShare(what, exact, found, SHARE_OF_RANGE);
    }
}
