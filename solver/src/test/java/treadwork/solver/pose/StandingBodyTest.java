package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.space.Pose;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.BodySettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.ShankAxis;

class StandingBodyTest {

    /** Rounding: some hundred operations on lengths near 1 m, each good to 1e-16. */
    private static final double ROUNDING = 1e-13;

    private static final StandingModel MODEL = StandingModel.whole();
    private static final BodySettings BY_MARKER = settings(HipCentreRule.MARKER, ShankAxis.MALLEOLI);

    /** By construction: the landmarks are placed from these poses. */
    @ParameterizedTest
    @EnumSource(Segment.class)
    void findsTheAxesThatTheLandmarksWerePlacedFrom(Segment segment) {
        StandingBody body = measure(MODEL, BY_MARKER);

        Pose pose = body.segments().get(segment).standing();
        assertSame(MODEL.poses().get(segment), pose);
        assertEquals(1, pose.labFromBody().determinant(), ROUNDING);
    }

    @ParameterizedTest
    @EnumSource(Segment.class)
    void keepsClusterAndLandmarksInSegmentAxes(Segment segment) {
        StandingBody body = measure(MODEL, BY_MARKER);

        SegmentGeometry geometry = body.segments().get(segment);
        for (int m = 0; m < 4; m++) {
            Vector3 expected = StandingModel.clusterInSegment(segment).get(m);
            assertEquals(0, expected.minus(geometry.cluster().get(m)).norm(), ROUNDING);
        }
        geometry.landmarks()
                .forEach((landmark, place) -> assertEquals(
                        0,
                        MODEL.landmarks()
                                .get(landmark)
                                .minus(geometry.standing().toLab(place))
                                .norm(),
                        ROUNDING,
                        landmark.key()));
    }

    /** By construction. */
    @ParameterizedTest
    @EnumSource(Side.class)
    void givesJointCentresInTheProximalSegment(Side side) {
        StandingBody body = measure(MODEL, BY_MARKER);

        Vector3 ankle = body.joints().get(new Joint(side, JointKind.ANKLE));
        assertEquals(
                0, ankle.minus(new Vector3(0, -StandingModel.SHANK_LENGTH, 0)).norm(), ROUNDING);
        Vector3 knee = body.joints().get(new Joint(side, JointKind.KNEE));
        assertEquals(
                0, knee.minus(new Vector3(0, -StandingModel.THIGH_LENGTH, 0)).norm(), ROUNDING);
        Vector3 hip = body.joints().get(new Joint(side, JointKind.HIP));
        assertEquals(0, hip.minus(new Vector3(-0.05, -0.08, 0.09 * side.sign())).norm(), ROUNDING);
    }

    @Test
    void listsTheJointsRightBeforeLeftFromAnkleToHip() {
        StandingBody body = measure(MODEL, BY_MARKER);

        assertEquals(
                List.of("right_ankle", "right_knee", "right_hip", "left_ankle", "left_knee", "left_hip"),
                body.joints().keySet().stream().map(Joint::key).toList());
    }

    /** By construction: width, depth and lengths of the model; leg length as the straight line. */
    @Test
    void measuresPelvisAndLegs() {
        StandingBody body = measure(MODEL, BodySettings.DEFAULT);

        PelvisSize pelvis = body.pelvis().orElseThrow();
        assertEquals(StandingModel.PELVIS_WIDTH, pelvis.width(), ROUNDING);
        assertEquals(StandingModel.PELVIS_DEPTH, pelvis.depth(), ROUNDING);
        double straight = MODEL.landmarks()
                .get(Landmark.LEFT_ASIS)
                .minus(MODEL.landmarks().get(Landmark.LEFT_MEDIAL_MALLEOLUS))
                .norm();
        assertEquals(straight, body.legLengths().get(Side.LEFT), ROUNDING);
        assertEquals(
                StandingModel.SHANK_LENGTH,
                body.segments().get(Segment.RIGHT_SHANK).length(),
                ROUNDING);
        assertEquals(0.26, body.segments().get(Segment.RIGHT_FOOT).length(), 0.005, "heel to toe tip, m");
    }

    @Test
    void placesTheHipByTheRegressionInPelvisAxes() {
        StandingBody body = measure(MODEL, BodySettings.DEFAULT);

        PelvisSize size = new PelvisSize(StandingModel.PELVIS_WIDTH, StandingModel.PELVIS_DEPTH);
        double leg = body.legLengths().get(Side.LEFT);
        Vector3 expected = HipCentres.inPelvis(HipCentreRule.HARRINGTON_2007, size, leg, Side.LEFT);
        assertEquals(
                0,
                expected.minus(body.joints().get(new Joint(Side.LEFT, JointKind.HIP)))
                        .norm(),
                ROUNDING);
        assertEquals(HipCentres.source(HipCentreRule.HARRINGTON_2007), body.hipCentre());
    }

    @Test
    void measuresTheLegByWayOfTheKneeForTheRuleThatAsksForIt() {
        StandingBody body = measure(MODEL, settings(HipCentreRule.LEARDINI_1999, ShankAxis.MALLEOLI));

        Vector3 asis = MODEL.landmarks().get(Landmark.RIGHT_ASIS);
        Vector3 knee = MODEL.poses().get(Segment.RIGHT_SHANK).origin();
        double expected = asis.minus(knee).norm() + StandingModel.SHANK_LENGTH;
        assertEquals(expected, body.legLengths().get(Side.RIGHT), ROUNDING);
    }

    /** By construction: the epicondyles' line, turned into the plane perpendicular to the shank's Y, is its Z. */
    @Test
    void turnsTheShankByTheEpicondylesOnRequest() {
        StandingBody body = measure(MODEL, settings(HipCentreRule.MARKER, ShankAxis.EPICONDYLES));

        Rotation shank = body.segments().get(Segment.LEFT_SHANK).standing().labFromBody();
        Vector3 line = MODEL.landmarks()
                .get(Landmark.LEFT_MEDIAL_EPICONDYLE)
                .minus(MODEL.landmarks().get(Landmark.LEFT_LATERAL_EPICONDYLE));
        assertEquals(0, shank.columnX().dot(line), ROUNDING);
        assertTrue(shank.columnZ().dot(line) > 0, "Z towards the subject's right");
    }

    @Test
    void takesTheSacrumInPlaceOfBothPsis() {
        Vector3 middle = MODEL.landmarks()
                .get(Landmark.RIGHT_PSIS)
                .midpoint(MODEL.landmarks().get(Landmark.LEFT_PSIS));
        StandingModel model = MODEL.without(Landmark.LEFT_PSIS).with(Landmark.SACRUM, middle);

        StandingBody body = measure(model, BY_MARKER);

        assertSame(
                MODEL.poses().get(Segment.PELVIS),
                body.segments().get(Segment.PELVIS).standing());
    }

    @Test
    void solvesOneLegAlone() {
        Set<Segment> tracked = Set.of(Segment.PELVIS, Segment.LEFT_THIGH, Segment.LEFT_SHANK, Segment.LEFT_FOOT);

        StandingBody body = measure(MODEL.tracking(tracked), BodySettings.DEFAULT);

        assertEquals(tracked, body.segments().keySet());
        assertEquals(3, body.joints().size());
        assertEquals(Set.of(Side.LEFT), body.legLengths().keySet());
    }

    @Test
    void solvesTheAnkleOfFootAndShankWithoutAnyPelvis() {
        StandingModel model = MODEL.tracking(Set.of(Segment.RIGHT_SHANK, Segment.RIGHT_FOOT))
                .without(Landmark.RIGHT_ASIS)
                .without(Landmark.LEFT_ASIS)
                .without(Landmark.RIGHT_PSIS)
                .without(Landmark.LEFT_PSIS);

        StandingBody body = measure(model, BodySettings.DEFAULT);

        assertEquals(
                Set.of(new Joint(Side.RIGHT, JointKind.ANKLE)), body.joints().keySet());
        assertEquals("", body.hipCentre());
    }

    @Test
    void doesNotDependOnHowTheLabIsTurned() {
        Rotation turn = Rotation.about(new Vector3(0.48, -0.6, 0.64), 2.2);
        UnaryOperator<Vector3> move = p -> turn.times(p).plus(new Vector3(3, -2, 0.7));

        StandingBody still = measure(MODEL, BodySettings.DEFAULT);
        StandingBody turned = measure(MODEL.moved(move), BodySettings.DEFAULT);

        assertEquals(List.of(), turned.findings());
        still.joints()
                .forEach((joint, centre) ->
                        assertEquals(0, centre.minus(turned.joints().get(joint)).norm(), 10 * ROUNDING, joint.key()));
        still.segments().forEach((segment, geometry) -> {
            for (int m = 0; m < geometry.cluster().size(); m++) {
                Vector3 other = turned.segments().get(segment).cluster().get(m);
                assertEquals(0, geometry.cluster().get(m).minus(other).norm(), 10 * ROUNDING, segment.key());
            }
        });
    }

    /** The model's left limb is its right one mirrored, so every Z swaps its sign. */
    @Test
    void givesMirroredLimbsMirroredGeometry() {
        StandingBody body = measure(MODEL, BodySettings.DEFAULT);

        for (JointKind kind : JointKind.values()) {
            Vector3 right = body.joints().get(new Joint(Side.RIGHT, kind));
            Vector3 left = body.joints().get(new Joint(Side.LEFT, kind));
            assertEquals(
                    0, left.minus(new Vector3(right.x(), right.y(), -right.z())).norm(), ROUNDING, kind.key());
        }
    }

    @Test
    void findsNothingInASoundBody() {
        StandingBody body = measure(MODEL, BodySettings.DEFAULT);

        assertEquals(List.of(), body.findings());
    }

    @Test
    void noticesThatTheAsisAreExchanged() {
        StandingModel model = MODEL.with(Landmark.RIGHT_ASIS, MODEL.landmarks().get(Landmark.LEFT_ASIS))
                .with(Landmark.LEFT_ASIS, MODEL.landmarks().get(Landmark.RIGHT_ASIS));

        StandingBody body = measure(model, BY_MARKER);

        Finding finding = body.findings().get(0);
        assertEquals("landmark-side", finding.code());
        assertTrue(finding.where().contains("right_asis"), finding.where());
        assertEquals(1, body.findings().size());
    }

    @Test
    void noticesThatTheLegsAreExchanged() {
        StandingModel model = MODEL.moved(StandingModel::mirrored);
        model = model.with(Landmark.RIGHT_ASIS, MODEL.landmarks().get(Landmark.RIGHT_ASIS))
                .with(Landmark.LEFT_ASIS, MODEL.landmarks().get(Landmark.LEFT_ASIS));

        StandingBody body = measure(model, BY_MARKER);

        assertEquals(
                List.of("landmark-side", "landmark-side", "landmark-side"),
                body.findings().stream().map(Finding::code).toList());
        assertTrue(body.findings().get(2).where().contains("right_foot"));
    }

    @Test
    void noticesThatMedialAndLateralAreExchanged() {
        Vector3 lateral = MODEL.landmarks().get(Landmark.LEFT_LATERAL_EPICONDYLE);
        Vector3 medial = MODEL.landmarks().get(Landmark.LEFT_MEDIAL_EPICONDYLE);
        StandingModel model =
                MODEL.with(Landmark.LEFT_LATERAL_EPICONDYLE, medial).with(Landmark.LEFT_MEDIAL_EPICONDYLE, lateral);

        StandingBody body = measure(model, BY_MARKER);

        assertEquals(1, body.findings().size());
        assertEquals("landmark-order", body.findings().get(0).code());
        assertTrue(body.findings().get(0).where().endsWith("segment left_thigh"));
    }

    /** Forward and up nearly on one line: their cross product points anywhere, here to the subject's left. */
    @Test
    void saysNothingAboutSidesWhenTheFeetPointDown() {
        Rotation toesDown = Rotation.ofColumns(
                new Vector3(-0.1, -1, 0).unit(), new Vector3(1, -0.1, 0).unit(), new Vector3(0, 0, 1));
        Map<Segment, SegmentGeometry> segments = Map.of(
                Segment.RIGHT_SHANK, geometry(Segment.RIGHT_SHANK, Rotation.IDENTITY),
                Segment.RIGHT_FOOT, geometry(Segment.RIGHT_FOOT, toesDown));

        List<Finding> findings = SideCheck.of("standing.c3d", segments);

        assertEquals(List.of(), findings);
    }

    /** The share of the metatarsal heads is ours; the estimate lies on the line from the heel through their midpoint. */
    @Test
    void estimatesTheToeTipWhereItIsNotMapped() {
        StandingBody body = measure(MODEL.without(Landmark.RIGHT_TOE_TIP), BY_MARKER);

        SegmentGeometry foot = body.segments().get(Segment.RIGHT_FOOT);
        FootPoints points = FootPoints.of(foot);
        assertTrue(points.toeEstimated());
        Vector3 expected = new Vector3(-0.05 + 0.185 / 0.68, -0.05, -0.004);
        assertEquals(0, points.toeTip().minus(expected).norm(), ROUNDING);
        assertEquals(0.185 / 0.68, foot.length(), ROUNDING);
    }

    @Test
    void takesTheToeTipWhereItIsMapped() {
        StandingBody body = measure(MODEL, BY_MARKER);

        FootPoints points = FootPoints.of(body.segments().get(Segment.LEFT_FOOT));

        assertEquals(0, points.toeTip().minus(new Vector3(0.21, -0.055, 0.02)).norm(), ROUNDING);
        assertEquals(
                0, points.fifthHead().minus(new Vector3(0.123, -0.05, -0.036)).norm(), ROUNDING);
    }

    /** A label that stands twice with one and the same course, and once more never seen, is no doubt. */
    @Test
    void acceptsRepeatedLabelsWithoutADoubt() {
        Capture capture = MODEL.capture();
        List<PointSeries> points = new ArrayList<>(capture.points());
        points.add(points.get(0));
        points.add(0, StandingModel.point(points.get(0).label(), VectorSeries.gaps(5)));

        StandingBody body = StandingBody.measure(StandingModel.captureOf(points), MODEL.markerSet(), BY_MARKER);

        assertSame(
                MODEL.poses().get(Segment.PELVIS),
                body.segments().get(Segment.PELVIS).standing());
    }

    private static SegmentGeometry geometry(Segment segment, Rotation rotation) {
        return new SegmentGeometry(segment, new Pose(Vector3.ZERO, rotation), List.of(), Map.of(), 0.3);
    }

    private static StandingBody measure(StandingModel model, BodySettings settings) {
        return StandingBody.measure(model.capture(), model.markerSet(), settings);
    }

    private static BodySettings settings(HipCentreRule rule, ShankAxis axis) {
        return new BodySettings(BodySettings.DEFAULT.inertia(), rule, axis, PoseMethod.SEGMENT_FIT, Map.of());
    }

    private static void assertSame(Pose expected, Pose pose) {
        assertEquals(0, expected.origin().minus(pose.origin()).norm(), ROUNDING);
        assertEquals(
                0,
                expected.labFromBody()
                        .columnX()
                        .minus(pose.labFromBody().columnX())
                        .norm(),
                ROUNDING);
        assertEquals(
                0,
                expected.labFromBody()
                        .columnY()
                        .minus(pose.labFromBody().columnY())
                        .norm(),
                ROUNDING);
        assertEquals(
                0,
                expected.labFromBody()
                        .columnZ()
                        .minus(pose.labFromBody().columnZ())
                        .norm(),
                ROUNDING);
    }
}
