package treadwork.solver.pose;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.BodySettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.MarkerSet;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.ShankAxis;

/** Each refusal's code, place and figure. */
class StandingRefusalsTest {

    private static final StandingModel MODEL = StandingModel.whole();

    @Test
    void namesFileLabelLandmarkAndTheNearestLabel() {
        Finding finding = refusal(MODEL.capture(), relabelled(Landmark.RIGHT_ASIS, "Right_Asi"), BodySettings.DEFAULT);

        assertEquals("label-missing", finding.code());
        assertEquals("S01/standing.c3d, label \"Right_Asi\"", finding.where());
        assertTrue(finding.figure().contains("landmark right_asis"), finding.figure());
        assertTrue(finding.figure().endsWith("\"RIGHT_ASIS\""), finding.figure());
    }

    @Test
    void matchesLabelsToTheLetterButNamesTheOneThatDiffersInCase() {
        Finding finding = refusal(MODEL.capture(), relabelled(Landmark.LEFT_HEEL, "left_heel"), BodySettings.DEFAULT);

        assertEquals("label-missing", finding.code());
        assertTrue(finding.figure().endsWith("\"LEFT_HEEL\""), finding.figure());
    }

    @Test
    void namesTheClusterOfAMissingLabel() {
        Map<Segment, List<String>> clusters = new EnumMap<>(MODEL.markerSet().clusters());
        clusters.put(Segment.LEFT_SHANK, List.of("left_shank 1", "left_shank 2", "left_shank 9"));
        MarkerSet set = new MarkerSet(MODEL.markerSet().landmarks(), clusters);

        Finding finding = refusal(MODEL.capture(), set, BodySettings.DEFAULT);

        assertEquals("label-missing", finding.code());
        assertTrue(finding.figure().contains("cluster of left_shank"), finding.figure());
    }

    @Test
    void refusesALabelWhosePointsDiffer() {
        List<PointSeries> points = new ArrayList<>(MODEL.capture().points());
        points.add(StandingModel.point("LEFT_HEEL", VectorSeries.constant(new Vector3(1, 2, 3), 5)));

        Finding finding = refusal(StandingModel.captureOf(points), MODEL.markerSet(), BodySettings.DEFAULT);

        assertEquals("label-repeated", finding.code());
        assertEquals("S01/standing.c3d, label \"LEFT_HEEL\"", finding.where());
    }

    @Test
    void refusesAMarkerThatIsNeverSeen() {
        List<PointSeries> points = MODEL.capture().points().stream()
                .map(point -> point.label().equals("RIGHT_MEDIAL_MALLEOLUS")
                        ? StandingModel.point(point.label(), VectorSeries.gaps(5))
                        : point)
                .toList();

        Finding finding = refusal(StandingModel.captureOf(points), MODEL.markerSet(), BodySettings.DEFAULT);

        assertEquals("label-never-seen", finding.code());
        assertEquals("S01/standing.c3d, label \"RIGHT_MEDIAL_MALLEOLUS\"", finding.where());
        assertTrue(finding.figure().contains("landmark right_medial_malleolus"), finding.figure());
    }

    /** In each row a landmark that the segment, or its neighbour's joint centre, cannot do without. */
    @ParameterizedTest
    @CsvSource({
        "LEFT_PSIS,pelvis",
        "RIGHT_ASIS,pelvis",
        "RIGHT_LATERAL_EPICONDYLE,right_thigh",
        "LEFT_MEDIAL_MALLEOLUS,left_thigh",
        "RIGHT_LATERAL_MALLEOLUS,right_shank",
        "LEFT_HEEL,left_foot",
        "RIGHT_FIRST_METATARSAL_HEAD,right_foot",
        "RIGHT_FIFTH_METATARSAL_HEAD,right_foot"
    })
    void namesTheLandmarkThatATrackedSegmentLacks(Landmark landmark, String segment) {
        StandingModel model = MODEL.without(landmark);

        Finding finding = refusal(model.capture(), model.markerSet(), BodySettings.DEFAULT);

        assertEquals("segment-incomplete", finding.code());
        assertEquals("S01/standing.c3d, segment " + segment, finding.where());
        assertTrue(finding.figure().contains(landmark.key()), finding.figure());
    }

    @Test
    void asksForTheHipMarkerWhereItIsToBeUsed() {
        StandingModel model = MODEL.without(Landmark.LEFT_HIP_CENTRE);

        Finding finding = refusal(model.capture(), model.markerSet(), settings(HipCentreRule.MARKER));

        assertEquals("segment-incomplete", finding.code());
        assertTrue(finding.figure().contains("left_hip_centre"), finding.figure());
    }

    @Test
    void refusesTheFunctionalHipCentre() {
        Finding finding = refusal(MODEL.capture(), MODEL.markerSet(), settings(HipCentreRule.FUNCTIONAL));

        assertEquals("hip-centre-not-offered", finding.code());
        assertEquals("S01/standing.c3d, segment right_thigh", finding.where());
    }

    @Test
    void refusesAClusterNearlyOnOneLine() {
        Vector3 knee = MODEL.poses().get(Segment.LEFT_SHANK).origin();
        Vector3 down = new Vector3(0, 0, -0.1);
        StandingModel model = MODEL.withCluster(
                Segment.LEFT_SHANK,
                List.of(knee, knee.plus(down).plus(new Vector3(0.003, 0, 0)), knee.plus(down.times(2))));

        Finding finding = refusal(model.capture(), model.markerSet(), BodySettings.DEFAULT);

        assertEquals("cluster-line", finding.code());
        assertTrue(finding.where().contains("left_shank, labels [left_shank 1, left_shank 2"), finding.where());
    }

    @Test
    void refusesAClusterOfTwoLabels() {
        Map<Segment, List<String>> clusters = new EnumMap<>(MODEL.markerSet().clusters());
        clusters.put(Segment.RIGHT_FOOT, List.of("right_foot 1", "right_foot 2", "right_foot 1"));
        MarkerSet set = new MarkerSet(MODEL.markerSet().landmarks(), clusters);

        Finding finding = refusal(MODEL.capture(), set, BodySettings.DEFAULT);

        assertEquals("cluster-small", finding.code());
        assertTrue(finding.where().endsWith("cluster of right_foot"), finding.where());
    }

    @Test
    void refusesAClusterThatListsAMarkerTwice() {
        Map<Segment, List<String>> clusters = new EnumMap<>(MODEL.markerSet().clusters());
        clusters.put(Segment.RIGHT_FOOT, List.of("right_foot 1", "right_foot 2", "right_foot 3", "right_foot 1"));
        MarkerSet set = new MarkerSet(MODEL.markerSet().landmarks(), clusters);

        Finding finding = refusal(MODEL.capture(), set, BodySettings.DEFAULT);

        assertEquals("cluster-small", finding.code());
        assertTrue(finding.figure().contains("right_foot 1, right_foot 2"), finding.figure());
    }

    @Test
    void refusesLandmarksThatCoincide() {
        MarkerSet set = relabelled(Landmark.RIGHT_LATERAL_MALLEOLUS, "RIGHT_MEDIAL_MALLEOLUS");

        Finding finding = refusal(MODEL.capture(), set, BodySettings.DEFAULT);

        assertEquals("landmark-line", finding.code());
        assertEquals("S01/standing.c3d, segment right_shank", finding.where());
        assertTrue(finding.figure().contains("0.0 mm apart"), finding.figure());
    }

    @Test
    void refusesLandmarksOnOneLine() {
        Vector3 knee = MODEL.poses().get(Segment.RIGHT_SHANK).origin();
        Vector3 along =
                MODEL.poses().get(Segment.RIGHT_THIGH).labFromBody().columnY().times(0.05);
        StandingModel model = MODEL.with(Landmark.RIGHT_LATERAL_EPICONDYLE, knee.plus(along))
                .with(Landmark.RIGHT_MEDIAL_EPICONDYLE, knee.minus(along));

        Finding finding = refusal(model.capture(), model.markerSet(), settings(HipCentreRule.MARKER));

        assertEquals("landmark-line", finding.code());
        assertEquals("S01/standing.c3d, segment right_thigh", finding.where());
        assertTrue(finding.figure().contains("0.0° between"), finding.figure());
    }

    @Test
    void refusesAStudyWithoutAnyJoint() {
        StandingModel model = MODEL.tracking(Set.of(Segment.RIGHT_FOOT, Segment.LEFT_SHANK));

        Finding finding = refusal(model.capture(), model.markerSet(), BodySettings.DEFAULT);

        assertEquals("joint-none", finding.code());
        assertTrue(finding.figure().contains("[left_shank, right_foot]"), finding.figure());
    }

    private static MarkerSet relabelled(Landmark landmark, String label) {
        Map<Landmark, String> labels = new EnumMap<>(MODEL.markerSet().landmarks());
        labels.put(landmark, label);
        return new MarkerSet(labels, MODEL.markerSet().clusters());
    }

    private static Finding refusal(Capture capture, MarkerSet set, BodySettings settings) {
        return assertThrows(UnusableInputException.class, () -> StandingBody.measure(capture, set, settings))
                .finding();
    }

    private static BodySettings settings(HipCentreRule rule) {
        return new BodySettings(
                BodySettings.DEFAULT.inertia(), rule, ShankAxis.MALLEOLI, PoseMethod.SEGMENT_FIT, Map.of());
    }
}
