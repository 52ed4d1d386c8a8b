package treadwork.io.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.api.io.TempDir;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;

/** One test a kind of fault: its code, its place (line and path), and its figure. */
class StudyFaultTest {

    private static final String FIRST_TRIAL = "\"condition\": \"brace off\"";
    private static final String MASS = "\"massKg\": 72.4";

    @TempDir
    Path folder;

    private StudyFolder study;

    @BeforeEach
    void writeTheStudy() throws IOException {
        study = new StudyFolder(folder);
    }

    @Test
    void aStudyThatIsNotThere() {
        Finding finding = fault(() -> StudyReader.read(folder.resolve("other.json")));

        assertEquals("study-file-missing", finding.code());
        assertTrue(finding.where().endsWith("other.json"), finding.where());
    }

    @Test
    void aFolderInPlaceOfAStudy() {
        Finding finding = fault(() -> StudyReader.read(folder));

        assertEquals("study-file-missing", finding.code());
        assertEquals("this is a folder", finding.figure());
    }

    @Test
    void anEmptyFile() throws IOException {
        Path file = Files.createFile(folder.resolve("study.json"));

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(finding.figure().contains("empty"), finding.figure());
    }

    @Test
    void aFileOfBytesThatAreNotText() throws IOException {
        Path file = Files.write(folder.resolve("study.json"), new byte[] {2, 80, (byte) 0xC3, 0x28});

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(finding.figure().contains("UTF-8"), finding.figure());
    }

    @Test
    void aCommaTooMany() {
        study.with("\"+z\" },", "\"+z\", },");

        assertFault("study-not-json", "line 5, column 24", "'}'");
    }

    @Test
    void aFileCutShort() throws IOException {
        Path file = study.write();
        Files.writeString(file, StudyFolder.STUDY.substring(0, StudyFolder.STUDY.indexOf("\"momentAxes\"")));

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(finding.where().contains("line 8"), finding.where());
        assertEquals("the file ends before the document does", finding.figure());
    }

    @Test
    void textAfterTheDocument() throws IOException {
        Path file = study.write();
        Files.writeString(file, Files.readString(file) + "{ }", StandardCharsets.UTF_8);

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(finding.where().contains("line 23, column 1"), finding.where());
    }

    @Test
    void nestingWithoutEnd() throws IOException {
        Path file = Files.writeString(folder.resolve("study.json"), "[".repeat(200_000));

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(finding.figure().contains("nesting depth"), finding.figure());
    }

    @Test
    void aNameThatNobodyTyped() throws IOException {
        Path file = Files.writeString(folder.resolve("study.json"), "{ \"" + "k".repeat(1 << 20) + "\": 1 }");

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(
                finding.line().length() < 500, "a message of " + finding.line().length() + " characters");
    }

    @Test
    void moreValuesThanAnyStudyHas() throws IOException {
        Path file = Files.writeString(folder.resolve("study.json"), "[" + "0,".repeat(600_000) + "0]");

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertTrue(finding.figure().contains("at most 500000"), finding.figure());
    }

    @Test
    void aFileLargerThanAnyStudy() throws IOException {
        Path file = Files.write(folder.resolve("study.json"), new byte[9 << 20]);

        Finding finding = fault(() -> StudyReader.read(file));

        assertEquals("study-not-json", finding.code());
        assertEquals("the file is larger than 8 MB", finding.figure());
    }

    @Test
    void aKeyThatStandsTwice() {
        study.with("\"title\": \"two conditions\",", "\"title\": \"two\",\n  \"title\": \"conditions\",");

        assertFault("study-key-twice", "line 4, column 3, title", "\"title\" stands here and in line 3");
    }

    @Test
    void aNumberThatNoDoubleHolds() {
        study.with(MASS, "\"massKg\": 1e999");

        assertFault("study-value", "line 11, column 20, subjects[0].massKg", "1e999");
    }

    @Test
    void anUnknownKeyNamesTheNearest() {
        study.with("\"longestGapS\"", "\"longestGap\"");

        assertFault("study-key-unknown", "line 7, column 54, processing.longestGap", "nearest is \"longestGapS\"");
    }

    @Test
    void anUnknownKeyFarFromAllNamesThoseThatAreKnown() throws IOException {
        study.with("\"up\"", "\"vertical direction\"");

        Finding finding = assertFault("study-key-unknown", "line 5, column 12, lab.vertical direction", "is no key");
        assertTrue(finding.mend().contains("up, pointUnit, plates"), finding.mend());
    }

    @Test
    void theFirstOfSeveralFaultsIsTold() {
        study.with("\"sex\": \"female\"", "\"sex\": \"woman\"").with("\"+z\"", "\"z\"");

        assertFault("study-value", "line 5, column 12, lab.up", "\"z\"");
    }

    @Test
    void anotherVersionOfTheLayout() {
        study.with("\"treadwork\": 1", "\"treadwork\": 2");

        assertFault("study-version", "line 2, column 3, treadwork", "the value is 2, expected is 1");
    }

    @Test
    void aMissingVersion() {
        study.with("\"treadwork\": 1, ", "");

        assertFault("study-key-missing", "line 1, column 1", "\"treadwork\"");
    }

    @Test
    void aMistypedKeyIsToldBeforeTheMissingOne() {
        study.with("\"subjects\"", "\"subject\"");

        assertFault("study-key-unknown", "line 9, column 3, subject", "nearest is \"subjects\"");
    }

    @Test
    void theDefaultIsTheWayOutOfABadValue() throws IOException {
        study.with("\"cutoffHz\": 8", "\"cutoffHz\": -8");

        Finding finding = assertFault("study-value", "processing.markerFilter.cutoffHz", "-8");
        assertTrue(finding.mend().contains("the default is 6 Hz"), finding.mend());
    }

    @Test
    void aMissingMass() {
        study.with(MASS + ", ", "");

        Finding finding = assertFault("study-key-missing", "line 10, column 5, subjects[0]", "\"massKg\"");
        assertTrue(finding.mend().contains("above 0 kg and at most 500 kg"), finding.mend());
    }

    @Test
    void aMassOfZero() {
        study.with(MASS, "\"massKg\": 0");

        assertFault(
                "mass-zero",
                "line 11, column 20, subjects[0].massKg",
                "the value is 0, expected is a number above 0 kg and at most 500 kg");
    }

    @Test
    void aMassInGrams() {
        study.with(MASS, "\"massKg\": 72400");

        assertFault("study-value", "line 11, column 20, subjects[0].massKg", "72400, expected is a number above 0 kg");
    }

    @Test
    void aHeightInCentimetres() {
        study.with("1.76", "176");

        assertFault(
                "study-value", "subjects[0].heightM", "176, expected is a number of at least 0.3 m and at most 2.8 m");
    }

    @Test
    void aNumberWrittenAsText() {
        study.with(MASS, "\"massKg\": \"72,4\"");

        assertFault("study-value", "line 11, column 20, subjects[0].massKg", "\"72,4\", expected is a number");
    }

    @Test
    void anUnknownWordNamesTheNearest() {
        study.with("\"dumas-2007\"", "\"dumas-2006\"");

        assertFault("study-value", "line 6, column 13, body.inertia", "nearest is \"dumas-2007\"");
    }

    @Test
    void aCutOffOfZero() {
        study.with("\"cutoffHz\": 8", "\"cutoffHz\": 0");

        assertFault("study-value", "line 7, column 37, processing.markerFilter.cutoffHz", "above 0 Hz");
    }

    @Test
    void anOddOrder() {
        study.with("\"cutoffHz\": 8", "\"order\": 3");

        assertFault(
                "study-value",
                "line 7, column 37, processing.markerFilter.order",
                "3, expected is an even whole number");
    }

    @Test
    void aNegativeGap() {
        study.with("0.2 }", "-0.1 }");

        assertFault("study-value", "processing.longestGapS", "-0.1, expected is a number of at least 0 s");
    }

    @Test
    void aThresholdOfZero() {
        study.with("\"longestGapS\": 0.2", "\"contactThresholdN\": 0");

        assertFault("study-value", "processing.contactThresholdN", "0, expected is a number above 0 N");
    }

    @Test
    void framesThatRunBackwards() {
        study.with(FIRST_TRIAL, "\"frames\": [400, 1]");

        assertFault(
                "study-value",
                "line 17, column 38, subjects[0].trials[0].frames",
                "last frame, 1, is before the first, 400");
    }

    @Test
    void aZeroRangeThatRunsBackwards() {
        study.with("\"longestGapS\": 0.2", "\"plateZero\": [9, 3]");

        assertFault("study-value", "line 7, column 54, processing.plateZero", "3, is before the first, 9");
    }

    @Test
    void anUnknownWordWhereAListMayStandToo() {
        study.with("\"longestGapS\": 0.2", "\"plateZero\": \"autom\"");

        assertFault("study-value", "line 7, column 54, processing.plateZero", "one of auto, none, file, or a list");
    }

    @Test
    void anInertiaThatNoBodyHas() {
        study.with(
                "\"inertia\": \"dumas-2007\"",
                "\"segments\": { \"pelvis\": { \"massKg\": 9, \"comM\": [0, 0, 0], "
                        + "\"inertiaKgm2\": [0.1, 0.05, 0.2, 0, 0, 0] } }");

        assertFault("study-value", "body.segments.pelvis.inertiaKgm2", "[0.1,0.05,0.2,0,0,0] kg·m²");
    }

    @Test
    void aPlateWithTooFewChannelsForItsType() {
        study.with("\"up\": \"+z\"", plate(3, ""));

        assertFault("study-value", "line 5", "type 3 has 8 channels, not 6");
    }

    @Test
    void aPlateOfTypeFourWithoutItsMatrix() {
        study.with("\"up\": \"+z\"", plate(4, ""));

        assertFault("study-key-missing", "line 5, column 24, lab.plates[0]", "\"calibration\"");
    }

    @Test
    void aMatrixOfAPlateThatHasNone() {
        String row = "[0,0,0,0,0,0]";
        study.with("\"up\": \"+z\"", plate(2, ", \"calibration\": [" + (row + ",").repeat(5) + row + "]"));

        assertFault("study-value", "lab.plates[0].calibration", "type 2 has no calibration matrix");
    }

    @Test
    void aPlateOfTypeTwoInLabAxes() {
        study.with("\"up\": \"+z\"", plate(2, ", \"axes\": \"lab\""));

        assertFault("study-value", "lab.plates[0].axes", "type 2 cannot be stated in lab axes");
    }

    @Test
    void aPlateInLabAxesWithoutItsSevenChannels() {
        study.with("\"up\": \"+z\"", plate(1, ", \"axes\": \"lab\""));

        assertFault("study-value", "lab.plates[0].channels", "type 1 in lab axes has 7 channels, not 6");
    }

    @Test
    void aPlateInLabAxesWithChannelNumbers() {
        String plate = plate(1, ", \"axes\": \"lab\"").replace("5,6]", "5,6,7]");
        study.with("\"up\": \"+z\"", plate);

        assertFault("study-value", "lab.plates[0].channels[0]", "by its number");
    }

    @Test
    void channelNumbersAndNamesMixed() {
        study.with("\"up\": \"+z\"", plate(2, "").replace("5,6]", "5,\"Mz\"]"));

        assertFault("study-value", "lab.plates[0].channels[0]", "by its number");
    }

    @Test
    void aPlateWithoutItsOrigin() {
        study.with("\"up\": \"+z\"", plate(2, "").replace("\"originM\": [0,0,0], ", ""));

        assertFault("study-key-missing", "lab.plates[0]", "\"originM\"");
    }

    @Test
    void anAbsolutePath() {
        study.with("\"S01/standing.c3d\"", "\"/S01/standing.c3d\"");

        assertFault("study-path-outside", "line 12, column 7, subjects[0].static", "\"/S01/standing.c3d\"");
    }

    @Test
    void aPathWithADriveLetter() {
        study.with("\"S01/standing.c3d\"", "\"C:/S01/standing.c3d\"");

        assertFault("study-path-outside", "subjects[0].static", "\"C:/S01/standing.c3d\"");
    }

    @Test
    void aPathThatClimbsOut() throws IOException {
        study.with("\"S01/walk-01.c3d\"", "\"S01/../../walk-01.c3d\"");

        assertFault(
                "study-path-outside", "line 17, column 11, subjects[0].trials[0].file", "leaves the study's folder");
    }

    @Test
    void aLinkThatLeadsOut(@TempDir Path elsewhere) throws IOException {
        Path outside = Files.createFile(elsewhere.resolve("capture.c3d"));
        Files.createSymbolicLink(folder.resolve("S01/link.c3d"), outside);
        study.with("\"S01/walk-01.c3d\"", "\"S01/link.c3d\"");

        assertFault("study-path-outside", "line 17, column 11, subjects[0].trials[0].file", "through a link");
    }

    @Test
    void aLinkedFolderThatLeadsOut(@TempDir Path elsewhere) throws IOException {
        Files.createFile(elsewhere.resolve("walk-09.c3d"));
        Files.createSymbolicLink(folder.resolve("linked"), elsewhere);
        study.with("\"S01/walk-01.c3d\"", "\"linked/walk-09.c3d\"");

        assertFault("study-path-outside", "subjects[0].trials[0].file", "through a link");
    }

    @Test
    void aPathWithBackslashes() {
        study.with("\"S01/walk-01.c3d\"", "\"S01\\\\walk-01.c3d\"");

        assertFault("study-value", "subjects[0].trials[0].file", "holds a \\");
    }

    @Test
    void aCaptureThatIsMissingNamesTheNearest() {
        study.with("\"S01/walk-02.c3d\"", "\"S01/wlak-02.c3d\"");

        assertFault(
                "study-file-missing", "line 18, column 11, subjects[0].trials[1].file", "nearest is \"walk-02.c3d\"");
    }

    @Test
    void aFolderThatIsMissingNamesTheNearest() {
        study.with("\"S01/walk-02.c3d\"", "\"s01b/walk-02.c3d\"");

        assertFault(
                "study-file-missing",
                "subjects[0].trials[1].file",
                "no \"s01b\" in " + folder + ", nearest is \"S01\"");
    }

    @Test
    void aFolderInPlaceOfACapture() {
        study.with("\"S01/walk-02.c3d\"", "\"S01\"");

        assertFault("study-file-missing", "subjects[0].trials[1].file", "\"S01\" is a folder");
    }

    @Test
    void aMarkerFileThatIsMissing() {
        study.with("\"markers.json\"", "\"marker.json\"");

        assertFault("study-file-missing", "line 4, column 3, markerSet", "nearest is \"markers.json\"");
    }

    @Test
    void noMarkerSetAtAll() {
        study.with("\"markerSet\": \"markers.json\",", "");

        assertFault("marker-set-missing", "line 10, column 5, subjects[0]", "markerSet");
    }

    @Test
    void aMarkerSetWithoutClusters() {
        study.with("\"markers.json\"", "{ \"landmarks\": { \"right_heel\": \"H\" } }");

        assertFault("marker-set-missing", "line 4, column 3, markerSet", "no segment");
    }

    @Test
    void anUnknownLandmark() throws IOException {
        study.withMarkers("\"right_heel\"", "\"right_heal\"");

        assertFault(
                "marker-set-landmark",
                "markers.json, line 5, column 72, landmarks.right_heal",
                "nearest is \"right_heel\"");
    }

    @Test
    void anUnknownSegment() throws IOException {
        study.withMarkers("\"right_thigh\"", "\"thigh_right\"");

        assertFault("marker-set-segment", "markers.json, line 10, column 5, clusters.thigh_right", "\"thigh_right\"");
    }

    @Test
    void anUnknownLandmarkInTheStudyFileItself() {
        study.with("\"markers.json\"", "{ \"landmarks\": { \"sacrun\": \"S\" } }");

        assertFault("marker-set-landmark", "line 4, column 33, markerSet.landmarks.sacrun", "nearest is \"sacrum\"");
    }

    @Test
    void aClusterOfTwo() throws IOException {
        study.withMarkers("[\"T1\", \"T2\", \"T3\"]", "[\"T1\", \"T2\"]");

        assertFault(
                "marker-set-cluster-small", "markers.json, line 10, column 5, clusters.right_thigh", "has 2 labels");
    }

    @Test
    void aLabelTwiceInACluster() throws IOException {
        study.withMarkers("[\"T1\", \"T2\", \"T3\"]", "[\"T1\", \"T2\", \"T1\"]");

        assertFault("marker-set-label-twice", "markers.json, line 10, column 5, clusters.right_thigh", "\"T1\"");
    }

    @Test
    void aLabelTwiceButForBlanks() throws IOException {
        study.withMarkers("[\"T1\", \"T2\", \"T3\"]", "[\"T1\", \"T2\", \" T1\"]");

        assertFault("marker-set-label-twice", "markers.json, line 10, column 5, clusters.right_thigh", "\"T1\"");
    }

    @Test
    void oneLabelOnBothSides() throws IOException {
        study.withMarkers("\"left_asis\": \"LA\"", "\"left_asis\": \"RA\"");

        assertFault(
                "marker-set-label-sides",
                "markers.json, line 3, column 25, landmarks.left_asis",
                "both right_asis and left_asis");
    }

    @Test
    void aSegmentWithoutALandmarkOfItsAxes() throws IOException {
        study.withMarkers("\"right_medial_malleolus\": \"RMM\", ", "");

        assertFault(
                "marker-set-landmark-missing",
                "markers.json, line 11, column 5, clusters.right_shank",
                "right_shank lacks the landmarks right_medial_malleolus");
    }

    @Test
    void aPelvisWithoutItsBack() throws IOException {
        study.withMarkers(", \"sacrum\": \"SA\"", "");

        assertFault("marker-set-landmark-missing", "clusters.pelvis", "lacks the landmarks right_psis, left_psis");
    }

    @Test
    void aTrialWhoseClusterDiffersInNumber() {
        study.with(FIRST_TRIAL, "\"markerSet\": { \"clusters\": { \"right_shank\": [\"a\", \"b\", \"c\", \"d\"] } }");

        assertFault(
                "marker-set-cluster-differs",
                "line 17, column 67, subjects[0].trials[0].markerSet.clusters.right_shank",
                "has 4 labels in this trial and 3 in the standing capture");
    }

    @Test
    void oneIdForTwoSubjects() {
        study.with(
                "    }\n  ]\n}",
                "    },\n    { \"id\": \"s01\", \"massKg\": 60, \"static\": \"S01/standing.c3d\", \"trials\": [] }\n  ]\n}");

        assertFault("subject-twice", "line 21, column 7, subjects[1].id", "\"s01\" stands twice, first as \"S01\"");
    }

    @Test
    void anIdThatCannotNameAFolder() {
        study.with("\"id\": \"S01\"", "\"id\": \"../S01\"");

        assertFault("subject-id-unsafe", "line 11, column 7, subjects[0].id", "\"../S01\"");
    }

    @Test
    void twoTrialsOfOneName() throws IOException {
        Files.createFile(Files.createDirectories(folder.resolve("S01/again")).resolve("Walk-01.c3d"));
        study.with("\"S01/walk-02.c3d\"", "\"S01/again/Walk-01.c3d\"");

        assertFault("trial-name-twice", "line 18, column 11, subjects[0].trials[1].file", "\"S01/walk-01.c3d\"");
    }

    @Test
    void aCaptureWhoseNameCannotNameAFolder() throws IOException {
        Files.createFile(folder.resolve("S01/walk .c3d"));
        study.with("\"S01/walk-02.c3d\"", "\"S01/walk .c3d\"");

        assertFault("trial-name-unsafe", "line 18, column 11, subjects[0].trials[1].file", "\"walk \"");
    }

    @Test
    void normalisingByAHeightThatIsNotGiven() {
        study.with("\"momentAxes\": \"distal\"", "\"normalise\": \"mass-height\"")
                .with("\"heightM\": 1.76, ", "");

        assertFault("study-key-missing", "line 10, column 5, subjects[0]", "\"heightM\"");
    }

    private static String plate(int type, String more) {
        return "\"plates\": [ { \"type\": " + type + ", \"cornersM\": [[1,1,0],[0,1,0],[0,0,0],[1,0,0]], "
                + "\"originM\": [0,0,0], \"channels\": [1,2,3,4,5,6]" + more + " } ]";
    }

    private Finding assertFault(String code, String where, String figure) {
        Finding finding = fault(() -> study.read());

        assertEquals(code, finding.code(), finding.line());
        assertTrue(finding.where().contains(where), finding.line());
        assertTrue(finding.figure().contains(figure), finding.line());
        return finding;
    }

    private static Finding fault(Executable reading) {
        return assertThrows(UnusableInputException.class, reading).finding();
    }
}
