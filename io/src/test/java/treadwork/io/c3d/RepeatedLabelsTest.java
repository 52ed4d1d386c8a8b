package treadwork.io.c3d;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import treadwork.model.capture.Capture;

/** Names that do not say which point is meant. In the built file the two points differ in y, unless a test makes them alike. */
class RepeatedLabelsTest {

    @Test
    void theSamePositionsStoredTwiceUnderOneNameAreOnePoint() {
        Capture capture = read(alike().with("POINT", "LABELS", all -> all.texts("LABELS", List.of("HEEL", "HEEL"))));

        assertEquals(List.of("HEEL"), labels(capture));
        assertEquals(List.of("label-same-twice"), Shared.codes(capture));
    }

    @Test
    void differentPositionsUnderOneNameAreAllKeptAndSaidToBeAmbiguous() {
        Capture capture =
                read(new FileBuilder().with("POINT", "LABELS", all -> all.texts("LABELS", List.of("HEEL", "HEEL"))));

        assertEquals(List.of("HEEL", "HEEL"), labels(capture));
        assertEquals(List.of("label-ambiguous"), Shared.codes(capture));
        assertEquals(
                "odd.c3d, points HEEL",
                Shared.finding(capture, "label-ambiguous").where());
    }

    @Test
    void pointsWithoutANameAreNeverTakenForOneAnother() {
        Capture capture = read(alike().with("POINT", "LABELS", all -> all.texts("LABELS", List.of("", ""))));

        assertEquals(List.of("", ""), labels(capture));
        assertEquals(List.of(), Shared.codes(capture));
    }

    @Test
    void severalSubjectsKeepTheirPrefixesAndAreSaid() {
        Capture capture = read(new FileBuilder()
                .with("POINT", "LABELS", all -> all.texts("LABELS", List.of("ann:HEEL", "box:A"))));

        assertEquals(List.of("ann:HEEL", "box:A"), labels(capture));
        assertEquals(
                "the points belong to 2 subjects or objects: ann, box",
                Shared.finding(capture, "subjects-several").figure());
    }

    @Test
    void nothingOfASubjectsDataIsKept() {
        byte[] file = new FileBuilder()
                .text("SUBJECTS", "NAMES", "Jane Roe")
                .text("SUBJECT", "DIAGNOSIS", "paresis")
                .build();

        Capture capture = C3dReader.read(FileBuilder.NAME, file, ReadOptions.DEFAULT);
        String written = new String(C3dWriter.bytes(capture, C3dEncoding.DEFAULT), StandardCharsets.ISO_8859_1);

        assertFalse(capture.toString().contains("Jane") || capture.toString().contains("paresis"));
        assertFalse(written.contains("Jane") || written.contains("paresis") || written.contains("SUBJECT"));
    }

    /** Both points at (100 + frame, 201, 300) in every frame. */
    private static FileBuilder alike() {
        FileBuilder file = new FileBuilder();
        for (int frame = 0; frame < FileBuilder.FRAMES; frame++) {
            file.sample(frame, 100 + frame, 201, 300, 0);
        }
        return file;
    }

    private static Capture read(FileBuilder file) {
        return C3dReader.read(FileBuilder.NAME, file.build(), ReadOptions.DEFAULT);
    }

    private static List<String> labels(Capture capture) {
        return capture.points().stream().map(each -> each.label()).toList();
    }
}
