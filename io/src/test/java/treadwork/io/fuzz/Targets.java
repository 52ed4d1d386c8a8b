package treadwork.io.fuzz;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.fixtures.sample.SmallCapture;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dReader;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.c3d.Processor;
import treadwork.io.c3d.ReadOptions;
import treadwork.io.study.StudyReader;
import treadwork.io.text.TextFile;
import treadwork.io.text.TextReader;
import treadwork.model.capture.Capture;
import treadwork.model.study.LabSettings;

/** The readers of the program. */
final class Targets {

    private Targets() {}

    /** @param work a folder for files that must lie on a disk */
    static List<Target> all(Path work) throws IOException {
        return List.of(new CaptureTarget(), new TextTarget(), new StudyTarget(work));
    }

    /** C3D files. */
    private record CaptureTarget() implements Target {

        @Override
        public String name() {
            return "c3d";
        }

        @Override
        public List<byte[]> seeds() {
            List<byte[]> seeds = new ArrayList<>();
            for (Processor processor : Processor.values()) {
                for (C3dEncoding.Storage storage : C3dEncoding.Storage.values()) {
                    C3dEncoding encoding = new C3dEncoding(processor, storage, false);
                    seeds.add(C3dWriter.bytes(SmallCapture.withOnePlate(), encoding));
                    seeds.add(C3dWriter.bytes(SmallCapture.withoutPlates(), encoding));
                }
            }
            Capture walk = Walk.recording(WalkerSettings.DEFAULT.with(Gait.DEFAULT.withDurationS(1)))
                    .walking();
            seeds.add(C3dWriter.bytes(walk, C3dEncoding.DEFAULT));
            seeds.add(C3dWriter.bytes(
                    SmallCapture.withOnePlate(), new C3dEncoding(Processor.INTEL, C3dEncoding.Storage.INTEGER, true)));
            return seeds;
        }

        @Override
        public List<String> words() {
            return List.of(
                    "POINT",
                    "ANALOG",
                    "FORCE_PLATFORM",
                    "EVENT",
                    "LABELS",
                    "LABELS2",
                    "USED",
                    "RATE",
                    "SCALE",
                    "UNITS",
                    "FRAMES",
                    "DATA_START",
                    "GEN_SCALE",
                    "OFFSET",
                    "FORMAT",
                    "UNSIGNED",
                    "TYPE",
                    "CHANNEL",
                    "CORNERS",
                    "ORIGIN",
                    "ZERO",
                    "CAL_MATRIX",
                    "CONTEXTS",
                    "TIMES",
                    "TRIAL",
                    "ACTUAL_END_FIELD",
                    "mm",
                    "m",
                    "\u0001");
        }

        @Override
        public String read(byte[] input) {
            return Results.kind(C3dReader.read("fuzz.c3d", input, ReadOptions.DEFAULT));
        }
    }

    /** Delimited text. */
    private record TextTarget() implements Target {

        @Override
        public String name() {
            return "text";
        }

        @Override
        public List<byte[]> seeds() {
            List<byte[]> seeds = new ArrayList<>();
            for (String delimiter : new String[] {"\t", ",", ";"}) {
                seeds.add(table(delimiter, '.', "A x,A y,A z,B x,B y,B z", 30).getBytes(StandardCharsets.UTF_8));
            }
            seeds.add(table(";", ',', "A_x,A_y,A_z,B_x,B_y,B_z", 30).getBytes(StandardCharsets.ISO_8859_1));
            seeds.add(table("\t", '.', "A.X,A.Y,A.Z,Fx1,Fy1,Fz1", 30).getBytes(StandardCharsets.UTF_16));
            seeds.add(table(",", '.', "A x,A y,A z,B x,B y,B z", 5000).getBytes(StandardCharsets.UTF_8));
            return seeds;
        }

        private static String table(String delimiter, char point, String columns, int rows) {
            StringBuilder text = new StringBuilder("time");
            for (String column : columns.split(",", -1)) {
                text.append(delimiter).append(column);
            }
            text.append("\ns").append((delimiter + "mm").repeat(6)).append('\n');
            for (int i = 0; i < rows; i++) {
                text.append(String.valueOf(i / 100.0).replace('.', point));
                for (int k = 0; k < 6; k++) {
                    text.append(delimiter)
                            .append(String.valueOf(400 + 7.25 * i - k).replace('.', point));
                }
                text.append("\r\n");
            }
            return text.toString();
        }

        @Override
        public List<String> words() {
            return List.of(
                    "\t", ",", ";", "\n", "\r\n", "\"", "\u0000", "\uFEFF", "time", "frame", "x", "y", "z", "mm", "m",
                    "N", "rate", "Hz", "NA", "NaN", "-", "#", "Fx", "COPx", " ", "A x", "100 Hz");
        }

        @Override
        public String read(byte[] input) {
            return Results.kind(TextReader.read(TextFile.of("fuzz.txt", input), Optional.empty(), LabSettings.DEFAULT));
        }
    }

    /** Study files; the captures that they name lie beside them. */
    private record StudyTarget(Path work) implements Target {

        private static final String STUDY = """
                { "treadwork": 1, "title": "t", // a comment
                  "markerSet": { "landmarks": { "right_asis": "RA", "left_asis": "LA", "sacrum": "SA",
                      "right_lateral_epicondyle": "RKL", "right_medial_epicondyle": "RKM",
                      "right_lateral_malleolus": "RML", "right_medial_malleolus": "RMM", "right_heel": "RH",
                      "right_first_metatarsal_head": "R1", "right_fifth_metatarsal_head": "R5" },
                    "clusters": { "pelvis": ["RA", "LA", "SA"], "right_thigh": ["T1", "T2", "T3"],
                      "right_shank": ["S1", "S2", "S3"], "right_foot": ["RH", "R1", "R5"] } },
                  "lab": { "up": "+z", "plates": [ { "type": 2, "channels": [1, 2, 3, 4, 5, 6],
                      "cornersM": [[1, 1, 0], [0, 1, 0], [0, 0, 0], [1, 0, 0]], "originM": [0, 0, -0.04] } ] },
                  "processing": { "markerFilter": { "cutoffHz": 8 }, "plateZero": [1, 5], "plateDelayS": 0.01 },
                  "subjects": [ { "id": "S01", "massKg": 72.4, "heightM": 1.76, "sex": "female", "static": "a.c3d",
                    "orthoses": [ { "condition": "on", "segment": "right_shank", "massKg": 0.4, "comM": [0, 0, 0] } ],
                    "trials": [ { "file": "b.c3d", "condition": "on", "frames": [1, 9],
                      "contacts": [ { "plate": 1, "foot": "right" } ],
                      "exchanged": [ { "labels": ["S1", "S2"], "frames": [2, 3] } ] } ] } ] }
                """;

        @Override
        public String name() {
            return "study";
        }

        @Override
        public List<byte[]> seeds() {
            return List.of(STUDY.getBytes(StandardCharsets.UTF_8));
        }

        @Override
        public List<String> words() {
            return List.of(
                    "{",
                    "}",
                    "[",
                    "]",
                    "\"",
                    ":",
                    ",",
                    "//",
                    "null",
                    "true",
                    "\"lab\"",
                    "\"trials\"",
                    "\"subjects\"",
                    "\"static\"",
                    "\"../a.c3d\"",
                    "\"file\"",
                    "\"markerSet\"",
                    "\"clusters\"",
                    "\"body\"",
                    "\"segments\"",
                    "\"right_foot\"",
                    "1e400",
                    "\\u0000",
                    "[[[[[[[[",
                    "{\"a\":",
                    "\"id\"",
                    "\"b.c3d\"",
                    "/");
        }

        @Override
        public String read(byte[] input) throws IOException {
            Files.createDirectories(work);
            for (String capture : new String[] {"a.c3d", "b.c3d"}) {
                if (!Files.exists(work.resolve(capture))) {
                    Files.createFile(work.resolve(capture));
                }
            }
            Path file = work.resolve("study.json");
            Files.write(file, input);
            return "read " + StudyReader.read(file).findings().size();
        }
    }
}
