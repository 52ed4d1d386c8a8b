package treadwork.solver.run;

import java.io.IOException;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import treadwork.fixtures.demo.DemoStudy;
import treadwork.fixtures.demo.DemoSubject;
import treadwork.fixtures.demo.DemoTrial;
import treadwork.fixtures.walker.ExactJoint;
import treadwork.fixtures.walker.ExactLoads;
import treadwork.fixtures.walker.Walk;
import treadwork.io.c3d.C3dEncoding;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.file.WholeFile;
import treadwork.io.result.LoadsCsv;
import treadwork.io.study.FolderName;
import treadwork.io.study.StudyWriter;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.JointLoads;
import treadwork.model.load.TrialResult;
import treadwork.model.study.LabAxis;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Study;

/**
 * Writes the built-in demo study: captures, study file, marker set, and the exact loads of every trial beside them.
 *
 * @param studyFile           the study that was written
 * @param exactPlantarflexors the true greatest plantarflexor moment of the right ankle, N·m/kg, by {@code SUBJECT/TRIAL}
 */
public record DemoFiles(Path studyFile, Map<String, Double> exactPlantarflexors) {

    private static final String STUDY_FILE = "study.json";
    private static final String EXACT_FOLDER = "exact";

    public DemoFiles {
        exactPlantarflexors = new LinkedHashMap<>(exactPlantarflexors);
    }

    /**
     * Writes the study into a folder that is empty, new, or holds the demo already.
     *
     * @throws UnusableInputException {@code demo-folder-foreign} where something else is in it, {@code
     *     results-not-writable} where the disk refuses
     */
    public static DemoFiles write(Path folder) {
        requireOwn(folder);
        Map<String, Double> peaks = new LinkedHashMap<>();
        for (DemoSubject subject : DemoStudy.subjects()) {
            write(subject.standing(), folder.resolve(subject.staticFile()));
            for (DemoTrial trial : subject.trials()) {
                Walk.Recording recording = trial.recording();
                write(recording.walking(), folder.resolve(trial.file()));
                String name = subject.id() + "/" + FolderName.ofTrial(trial.file());
                WholeFile.write(folder.resolve(EXACT_FOLDER).resolve(name + ".csv"), exactLoads(recording));
                peaks.put(
                        name, plantarflexor(recording.exact(), subject.subject().massKg()));
            }
        }
        Study study = DemoStudy.study();
        StudyWriter.write(study, folder.resolve(STUDY_FILE));
        return new DemoFiles(folder.resolve(STUDY_FILE), peaks);
    }

    private static void requireOwn(Path folder) {
        try {
            if (!Files.exists(folder) || isEmpty(folder) || holdsDemo(folder)) {
                return;
            }
        } catch (IOException unreadable) {
            throw refusal(folder, "the folder cannot be read (" + unreadable.getMessage() + ")");
        }
        throw refusal(folder, "there are files in it that are not the demo's");
    }

    private static UnusableInputException refusal(Path folder, String figure) {
        return new UnusableInputException(new Finding(
                "demo-folder-foreign",
                Severity.REFUSES,
                folder.toString(),
                figure,
                "The demo writes only into a folder of its own, so that nothing is lost",
                "Name a folder that is new or empty: treadwork demo DIR"));
    }

    private static boolean isEmpty(Path folder) throws IOException {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.findAny().isEmpty();
        }
    }

    private static boolean holdsDemo(Path folder) throws IOException {
        Path study = folder.resolve(STUDY_FILE);
        return Files.isRegularFile(study) && Files.readString(study).contains(DemoStudy.TITLE);
    }

    private static void write(Capture capture, Path file) {
        WholeFile.write(file, C3dWriter.bytes(capture, C3dEncoding.DEFAULT));
    }

    /** The exact loads in the columns of loads.csv. */
    private static String exactLoads(Walk.Recording recording) {
        Capture capture = recording.walking();
        ExactLoads exact = recording.exact();
        List<JointLoads> joints = exact.joints().stream()
                .map(joint -> new JointLoads(
                        joint.joint(), joint.angles(), joint.moment(), joint.forceInProximal(), joint.power()))
                .toList();
        LabAxis up = LabAxis.nearest(exact.gravity().negated());
        TrialResult result = new TrialResult(
                capture.firstFrame(),
                capture.frames(),
                capture.pointRate(),
                up,
                joints,
                exact.support(),
                List.of(),
                List.of(),
                List.of());
        StringWriter text = new StringWriter();
        try {
            LoadsCsv.write(result, ResultSettings.DEFAULT, text);
        } catch (IOException impossible) {
            throw new IllegalStateException("a text in memory cannot be written", impossible);
        }
        return text.toString();
    }

    private static double plantarflexor(ExactLoads exact, double massKg) {
        ExactJoint ankle = exact.joint(new Joint(Side.RIGHT, JointKind.ANKLE));
        double greatest = 0;
        for (int i = 0; i < ankle.moment().size(); i++) {
            greatest = Math.max(greatest, -ankle.moment().x(i) / massKg);
        }
        return greatest;
    }
}
