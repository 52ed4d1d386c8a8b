package treadwork.solver.run;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.inertia.InertiaTables;
import treadwork.io.study.StudyDocument;
import treadwork.io.study.StudyReader;
import treadwork.io.study.StudyWriter;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.load.TrialResult;
import treadwork.model.study.LabSettings;
import treadwork.model.study.Processing;
import treadwork.model.study.Study;
import treadwork.model.study.Subject;
import treadwork.model.study.TextSettings;
import treadwork.model.study.Trial;

/** The same walk has the same loads through text and through C3D. */
class TextWalkTest {

    /**
     * What the 32-bit numbers of C3D lose, smoothed at 6 Hz and differentiated twice, as a share of the range; the text's
     * five decimals of a millimetre and ten digits of a channel lose less.
     */
    private static final double SINGLE_PRECISION = 1e-4;

    private static final Walk WALK = Walk.of(WalkerSettings.DEFAULT
            .with(Gait.DEFAULT.withDurationS(1.8))
            .with(Disturbance.NONE.withMarkerNoise(0.0005).withSkinMotion(0.002).withPlateNoise(1)));

    private static TrialResult throughC3d;

    @TempDir
    Path folder;

    @BeforeAll
    static void computeThroughC3d() {
        throughC3d = Walked.of(WALK, Processing.DEFAULT)
                .computedFrom(C3dEncoding.DEFAULT)
                .result();
    }

    @ParameterizedTest
    @CsvSource({"'\t',.", ";,','", "',',."})
    void textGivesTheLoadsOfC3d(char delimiter, char decimal) throws IOException {
        Files.writeString(folder.resolve("standing.txt"), points(WALK.standing(), delimiter, decimal));
        Files.writeString(folder.resolve("walking.txt"), points(WALK.walking(), delimiter, decimal));
        Files.writeString(folder.resolve("plates.txt"), channels(WALK.walking(), delimiter, decimal));
        StudyWriter.write(new Study("", List.of(subject())), folder.resolve("study.json"));

        TrialResult throughText = compute(StudyReader.read(folder.resolve("study.json")));

        Loads.assertSame(throughC3d, throughText, SINGLE_PRECISION);
    }

    private static TrialResult compute(StudyDocument document) {
        Subject subject = document.study().subjects().get(0);
        Trial trial = subject.trials().get(0);
        return TrialComputation.compute(new TrialInput(
                        CaptureFiles.standing(document.pathOf(subject.staticFile()), trial.lab()),
                        CaptureFiles.movement(
                                document.pathOf(trial.file()), trial.plateFile().map(document::pathOf), trial.lab()),
                        subject,
                        trial,
                        InertiaTables.load(trial.body().inertia())))
                .result();
    }

    private static Subject subject() {
        Walked walked = Walked.of(WALK, Processing.DEFAULT);
        Trial t = walked.trial();
        LabSettings lab = new LabSettings(
                Optional.empty(),
                Optional.empty(),
                Optional.of(WALK.walking().plates()),
                TextSettings.DEFAULT,
                List.of());
        Trial trial = new Trial(
                "walking.txt",
                "",
                t.markerSet(),
                lab,
                t.body(),
                t.processing(),
                t.results(),
                Optional.empty(),
                Optional.empty(),
                List.of(),
                List.of(),
                Optional.of("plates.txt"));
        Subject s = walked.subject();
        return new Subject(s.id(), s.massKg(), s.heightM(), s.sex(), "standing.txt", s.markerSet(), List.of(trial));
    }

    private static String points(Capture capture, char delimiter, char decimal) {
        StringBuilder text = new StringBuilder("time");
        for (PointSeries point : capture.points()) {
            text.append(",L_x,L_y,L_z".replace("L", point.label()));
        }
        for (int i = 0; i < capture.frames(); i++) {
            text.append(String.format(Locale.ROOT, "%n%.6f", capture.timeOf(i)));
            for (PointSeries point : capture.points()) {
                text.append(
                        point.positions().isGap(i)
                                ? ",,,"
                                : String.format(
                                        Locale.ROOT,
                                        ",%.5f,%.5f,%.5f",
                                        1e3 * point.positions().x(i),
                                        1e3 * point.positions().y(i),
                                        1e3 * point.positions().z(i)));
            }
        }
        return in(text, delimiter, decimal);
    }

    private static String channels(Capture capture, char delimiter, char decimal) {
        StringBuilder text = new StringBuilder("time");
        IntStream.rangeClosed(1, capture.analog().size()).forEach(j -> text.append(",channel " + j));
        for (int i = 0; i < capture.frames() * capture.samplesPerFrame(); i++) {
            text.append(String.format(Locale.ROOT, "%n%.8f", i / capture.analogRate()));
            for (AnalogChannel channel : capture.analog()) {
                text.append(String.format(Locale.ROOT, ",%.9e", channel.values().at(i)));
            }
        }
        return in(text, delimiter, decimal);
    }

    private static String in(CharSequence text, char delimiter, char decimal) {
        return text.toString().replace('.', '!').replace(',', delimiter).replace('!', decimal);
    }
}
