package treadwork.io.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import treadwork.model.body.Landmark;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.Sex;
import treadwork.model.body.Side;
import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.FrameRange;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;
import treadwork.model.study.BodySettings;
import treadwork.model.study.ContactRule;
import treadwork.model.study.Exchange;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.HipCentreRule;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.LabAxis;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.Normalisation;
import treadwork.model.study.Orthosis;
import treadwork.model.study.PlateZero;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.ShankAxis;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** Expected values stand in the study text beside them. */
class StudyReaderTest {

    private static final String FIRST_TRIAL = "\"condition\": \"brace off\"";

    @TempDir
    Path folder;

    @Test
    void readsSubjectAndTrials() throws IOException {
        StudyDocument document = new StudyFolder(folder).read();

        Subject subject = document.study().subjects().get(0);
        assertEquals("two conditions", document.study().title());
        assertEquals("S01", subject.id());
        assertEquals(72.4, subject.massKg());
        assertEquals(Optional.of(1.76), subject.heightM());
        assertEquals(Optional.of(Sex.FEMALE), subject.sex());
        assertEquals("S01/standing.c3d", subject.staticFile());
        assertEquals(
                List.of("brace off", "brace on"),
                subject.trials().stream().map(Trial::condition).toList());
        assertEquals(
                folder.resolve("S01/walk-01.c3d"),
                document.pathOf(first(document).file()));
        assertEquals(List.of(), document.findings());
    }

    @Test
    void fillsEveryDefaultOfAStudyThatSetsNothing() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with("\"lab\": { \"up\": \"+z\" },", "")
                .with("\"body\": { \"inertia\": \"dumas-2007\", \"hipCentre\": \"bell-1989\" },", "")
                .with("\"processing\": { \"markerFilter\": { \"cutoffHz\": 8 }, \"longestGapS\": 0.2 },", "")
                .with("\"results\": { \"momentAxes\": \"distal\" },", "")
                .read();

        Trial trial = first(document);
        assertEquals(LabSettings.DEFAULT, trial.lab());
        assertEquals(BodySettings.DEFAULT, trial.body());
        assertEquals(Processing.DEFAULT, trial.processing());
        assertEquals(ResultSettings.DEFAULT, trial.results());
        assertEquals(Optional.empty(), trial.contacts());
        assertEquals(Optional.empty(), trial.frames());
    }

    @Test
    void aKeyOfTheStudyHoldsBesideTheDefaultsOfTheOthers() throws IOException {
        Trial trial = first(new StudyFolder(folder).read());

        assertEquals(
                new FilterSettings(FilterSettings.Kind.BUTTERWORTH, 8, 4),
                trial.processing().markerFilter());
        assertEquals(FilterSettings.DEFAULT, trial.processing().plateFilter());
        assertEquals(0.2, trial.processing().longestGapS());
        assertEquals(InertiaTable.DUMAS_2007, trial.body().inertia());
        assertEquals(ShankAxis.MALLEOLI, trial.body().shankAxis());
        assertEquals(Optional.of(LabAxis.PLUS_Z), trial.lab().up());
        assertEquals(MomentAxes.DISTAL, trial.results().momentAxes());
    }

    @Test
    void theNearestWinsKeyByKey() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with(
                        "\"static\":",
                        "\"processing\": { \"markerFilter\": { \"order\": 2 } }, "
                                + "\"body\": { \"hipCentre\": \"hara-2016\", \"shankAxis\": \"epicondyles\" }, \"static\":")
                .with(
                        FIRST_TRIAL,
                        FIRST_TRIAL + ", \"processing\": { \"contactThresholdN\": 35, \"plateDelayS\": -0.01 }, "
                                + "\"exchanged\": [{ \"labels\": [\"A\", \" B \"], \"frames\": [3, 9] }], "
                                + "\"body\": { \"hipCentre\": \"leardini-1999\" }")
                .read();

        Trial nearest = first(document);
        Trial other = document.study().subjects().get(0).trials().get(1);
        FilterSettings markers = new FilterSettings(FilterSettings.Kind.BUTTERWORTH, 8, 2);
        assertEquals(markers, nearest.processing().markerFilter());
        assertEquals(35, nearest.processing().contactThresholdN());
        assertEquals(0.2, nearest.processing().longestGapS());
        assertEquals(-0.01, nearest.processing().plateDelayS());
        assertEquals(List.of(new Exchange("A", "B", new FrameRange(3, 9))), nearest.exchanged());
        assertEquals(List.of(), other.exchanged());
        assertEquals(HipCentreRule.LEARDINI_1999, nearest.body().hipCentre());
        assertEquals(ShankAxis.EPICONDYLES, nearest.body().shankAxis());
        assertEquals(InertiaTable.DUMAS_2007, nearest.body().inertia());
        assertEquals(markers, other.processing().markerFilter());
        assertEquals(20, other.processing().contactThresholdN());
        assertEquals(HipCentreRule.HARA_2016, other.body().hipCentre());
    }

    @Test
    void labelsAreReadWithoutTheirBlanks() throws IOException {
        StudyDocument document = new StudyFolder(folder).read();

        Subject subject = document.study().subjects().get(0);
        assertEquals(List.of("RH", "R1", "R5"), subject.markerSet().clusters().get(Segment.RIGHT_FOOT));
        assertEquals("SA", subject.markerSet().landmarks().get(Landmark.SACRUM));
        assertEquals(subject.markerSet(), first(document).markerSet());
    }

    @Test
    void aTrialsMarkerSetIsLaidOverTheSubjects() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with(
                        FIRST_TRIAL,
                        FIRST_TRIAL + ", \"markerSet\": { \"clusters\": { \"right_thigh\": [\"A\", \"B\", \"C\"] } }")
                .read();

        Subject subject = document.study().subjects().get(0);
        assertEquals(List.of("T1", "T2", "T3"), subject.markerSet().clusters().get(Segment.RIGHT_THIGH));
        assertEquals(
                List.of("A", "B", "C"), first(document).markerSet().clusters().get(Segment.RIGHT_THIGH));
        assertEquals(
                List.of("S1", "S2", "S3"),
                first(document).markerSet().clusters().get(Segment.RIGHT_SHANK));
    }

    @Test
    void aMarkerSetFileOfASubjectReplacesTheStudysAsAWhole() throws IOException {
        StudyFolder study = new StudyFolder(folder).with("\"static\":", "\"markerSet\": \"S01/own.json\", \"static\":");
        Files.writeString(folder.resolve("S01/own.json"), """
                { "landmarks": { "right_asis": "a", "left_asis": "b", "right_psis": "c", "left_psis": "d" },
                  "clusters": { "pelvis": ["a", "b", "c", "d"] } }
                """);

        StudyDocument document = study.read();

        assertEquals(
                List.of(Segment.PELVIS),
                List.copyOf(document.study()
                        .subjects()
                        .get(0)
                        .markerSet()
                        .clusters()
                        .keySet()));
    }

    @Test
    void onlyTheDeviceOfTheTrialsConditionIsWorn() throws IOException {
        StudyDocument document = new StudyFolder(folder).read();

        List<Trial> trials = document.study().subjects().get(0).trials();
        assertEquals(List.of(), trials.get(0).orthoses());
        assertEquals(
                List.of(new Orthosis("brace on", Segment.RIGHT_SHANK, 0.42, new Vector3(0.02, -0.2, 0))),
                trials.get(1).orthoses());
    }

    @Test
    void readsContactsFramesAndZeroRange() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with(
                        FIRST_TRIAL,
                        FIRST_TRIAL + ", \"frames\": [10, 400], \"processing\": { \"plateZero\": [1, 50] }, "
                                + "\"contacts\": [{ \"plate\": 2, \"foot\": \"left\" }, "
                                + "{ \"plate\": 1, \"foot\": \"right\", \"frames\": [20, 90] }]")
                .read();

        Trial trial = first(document);
        assertEquals(Optional.of(new FrameRange(10, 400)), trial.frames());
        assertEquals(
                new PlateZero.Frames(new FrameRange(1, 50)), trial.processing().plateZero());
        assertEquals(
                Optional.of(List.of(
                        new ContactRule(2, Side.LEFT, Optional.empty()),
                        new ContactRule(1, Side.RIGHT, Optional.of(new FrameRange(20, 90))))),
                trial.contacts());
    }

    @Test
    void readsPlatesWithChannelsCountedFromZeroInside() throws IOException {
        String matrix = "[[1,0,0,0,0,0],[0,2,0,0,0,0],[0,0,3,0,0,0],[0,0,0,4,0,0],[0,0,0,0,5,0],[7,0,0,0,0,6]]";
        StudyDocument document = new StudyFolder(folder)
                .with(
                        "\"up\": \"+z\"",
                        "\"up\": \"-y\", \"pointUnit\": \"cm\", \"plates\": [ { \"type\": 4, "
                                + "\"cornersM\": [[0.4,0.6,0],[0,0.6,0],[0,0,0],[0.4,0,0]], \"originM\": [0.001,0.002,-0.04], "
                                + "\"channels\": [7,8,9,10,11,12], \"channelUnit\": \"m\", \"calibration\": " + matrix
                                + " } ]")
                .read();

        LabSettings lab = first(document).lab();
        assertEquals(Optional.of(LabAxis.MINUS_Y), lab.up());
        assertEquals(Optional.of(LengthUnit.CM), lab.pointUnit());
        Plate plate = lab.plates().orElseThrow().get(0);
        assertEquals(PlateType.CALIBRATED, plate.type());
        assertEquals(new Vector3(0, 0.6, 0), plate.corners().get(1));
        assertEquals(new Vector3(0.001, 0.002, -0.04), plate.origin());
        assertEquals(List.of(6, 7, 8, 9, 10, 11), plate.channels());
        assertEquals(LengthUnit.M, plate.channelUnit());
        CalibrationMatrix calibration = plate.calibration().orElseThrow();
        assertEquals(7, calibration.at(5, 0));
        assertEquals(0, calibration.at(0, 5));
    }

    @Test
    void readsMassPropertiesGivenForASegment() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with(
                        "\"inertia\": \"dumas-2007\"",
                        "\"segments\": { \"right_shank\": { \"massKg\": 3.1, "
                                + "\"comM\": [0, -0.18, 0.01], \"inertiaKgm2\": [0.04, 0.005, 0.041, 0.001, -0.002, 0.0005] } }")
                .read();

        assertEquals(
                new MassProperties(
                        3.1, new Vector3(0, -0.18, 0.01), new Inertia(0.04, 0.005, 0.041, 0.001, -0.002, 0.0005)),
                first(document).body().overrides().get(Segment.RIGHT_SHANK));
    }

    @Test
    void readsWhatThisVersionDoesNotCompute() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with("\"hipCentre\": \"bell-1989\"", "\"hipCentre\": \"functional\", \"pose\": \"linked\"")
                .with(
                        "\"momentAxes\": \"distal\"",
                        "\"momentConvention\": \"external\", \"normalise\": \"mass\", "
                                + "\"uncertainty\": { \"draws\": 200, \"seed\": 9007199254740991 }")
                .read();

        Trial trial = first(document);
        assertEquals(HipCentreRule.FUNCTIONAL, trial.body().hipCentre());
        assertEquals(PoseMethod.LINKED, trial.body().pose());
        assertEquals(
                new ResultSettings(
                        MomentConvention.EXTERNAL, MomentAxes.JOINT, Normalisation.MASS, 200, 9007199254740991L),
                trial.results());
    }

    @Test
    void aByteOrderMarkAtTheStartIsPassedOver() throws IOException {
        Path file = new StudyFolder(folder).write();
        Files.writeString(file, "\uFEFF" + Files.readString(file), StandardCharsets.UTF_8);

        StudyDocument document = StudyReader.read(file);

        assertEquals("S01", document.study().subjects().get(0).id());
    }

    @Test
    void tellsOfALimbThatIsMappedInPart() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .withMarkers(",\n    \"right_foot\": [\" RH \", \"R1\", \"R5\"]", "")
                .read();

        assertEquals(1, document.findings().size());
        assertEquals("marker-set-limb-partial", document.findings().get(0).code());
        assertEquals(
                "the right limb has no cluster for right_foot",
                document.findings().get(0).figure());
        assertTrue(document.findings().get(0).where().contains("markers.json, line 1"));
    }

    @Test
    void tellsOfADeviceThatNoTrialWears() throws IOException {
        StudyDocument document = new StudyFolder(folder)
                .with("{ \"condition\": \"brace on\"", "{ \"condition\": \"brace  on\"")
                .read();

        assertEquals("orthosis-unused", document.findings().get(0).code());
        assertTrue(
                document.findings().get(0).where().contains("line 14, column 11, subjects[0].orthoses[0].condition"));
        assertTrue(document.findings().get(0).figure().endsWith("nearest is \"brace on\""));
    }

    private static Trial first(StudyDocument document) {
        return document.study().subjects().get(0).trials().get(0);
    }
}
