package treadwork.solver.run;

import java.util.Optional;
import treadwork.io.c3d.ReadOptions;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.study.StudyDocument;
import treadwork.model.capture.Capture;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** Reads the captures that a study names, with the settings that it states. */
record TrialCaptures(StudyDocument document) {

    Capture movement(Trial trial) {
        ReadOptions options =
                new ReadOptions(trial.lab().pointUnit(), trial.lab().plates().isEmpty());
        return CaptureFiles.read(
                document.pathOf(trial.file()),
                trial.plateFile().map(document::pathOf),
                options,
                trial.lab().text());
    }

    /** The subject's standing capture, in the unit that the trial's settings state. */
    Capture standing(Subject subject, Trial trial) {
        return CaptureFiles.read(
                document.pathOf(subject.staticFile()),
                Optional.empty(),
                new ReadOptions(trial.lab().pointUnit(), false),
                trial.lab().text());
    }
}
