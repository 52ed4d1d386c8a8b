package treadwork.io.study;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** A whole valid study on disk, in which a test changes the one thing it is about. The captures are empty files. */
final class StudyFolder {

    /** Line numbers in the tests count from the first line here. */
    static final String STUDY = """
            {
              "treadwork": 1, // the version
              "title": "two conditions",
              "markerSet": "markers.json",
              "lab": { "up": "+z" },
              "body": { "inertia": "dumas-2007", "hipCentre": "bell-1989" },
              "processing": { "markerFilter": { "cutoffHz": 8 }, "longestGapS": 0.2 },
              "results": { "momentAxes": "distal" },
              "subjects": [
                {
                  "id": "S01", "massKg": 72.4, "heightM": 1.76, "sex": "female",
                  "static": "S01/standing.c3d",
                  "orthoses": [
                    { "condition": "brace on", "segment": "right_shank", "massKg": 0.42, "comM": [0.02, -0.2, 0] }
                  ],
                  "trials": [
                    { "file": "S01/walk-01.c3d", "condition": "brace off" },
                    { "file": "S01/walk-02.c3d", "condition": "brace on" }
                  ]
                }
              ]
            }
            """;

    static final String MARKERS = """
            {
              "landmarks": {
                "right_asis": "RA", "left_asis": "LA", "sacrum": "SA",
                "right_lateral_epicondyle": "RKL", "right_medial_epicondyle": "RKM",
                "right_lateral_malleolus": "RML", "right_medial_malleolus": "RMM", "right_heel": "RH",
                "right_first_metatarsal_head": "R1", "right_fifth_metatarsal_head": "R5"
              },
              "clusters": {
                "pelvis": ["RA", "LA", "SA"],
                "right_thigh": ["T1", "T2", "T3"],
                "right_shank": ["S1", "S2", "S3"],
                "right_foot": [" RH ", "R1", "R5"]
              }
            }
            """;

    final Path folder;
    private String study = STUDY;

    StudyFolder(Path folder) throws IOException {
        this.folder = folder;
        Files.createDirectories(folder.resolve("S01"));
        for (String name : new String[] {"standing", "walk-01", "walk-02"}) {
            Files.createFile(folder.resolve("S01").resolve(name + ".c3d"));
        }
        Files.writeString(folder.resolve("markers.json"), MARKERS);
    }

    /** Changes the study file; what is to be changed must stand in it. */
    StudyFolder with(String old, String other) {
        study = changed(study, old, other);
        return this;
    }

    /** Changes the marker file. */
    StudyFolder withMarkers(String old, String other) throws IOException {
        Path markers = folder.resolve("markers.json");
        Files.writeString(markers, changed(Files.readString(markers), old, other));
        return this;
    }

    StudyDocument read() throws IOException {
        return StudyReader.read(write());
    }

    Path write() throws IOException {
        return Files.writeString(folder.resolve("study.json"), study);
    }

    private static String changed(String text, String old, String other) {
        if (!text.contains(old)) {
            throw new IllegalArgumentException("the study of the test has no " + old);
        }
        return text.replace(old, other);
    }
}
