package treadwork.solver.run;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.atomic.AtomicInteger;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.result.InputFile;
import treadwork.io.study.StudyDocument;
import treadwork.model.capture.Capture;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/**
 * Reads each subject's standing capture once for all of its trials, and lets go of it after the last.
 *
 * <p>Trials of many subjects run side by side, so the captures are held only while they can still be asked for.
 */
final class StandingCaptures {

    /** A capture and the hash of its file. */
    record Standing(Capture capture, InputFile input) {}

    private final StudyDocument document;
    private final Map<String, Standing> held = new ConcurrentHashMap<>();
    private final Map<String, AtomicInteger> left = new ConcurrentHashMap<>();

    StandingCaptures(StudyDocument document) {
        this.document = document;
        for (Subject subject : document.study().subjects()) {
            left.put(subject.id(), new AtomicInteger(subject.trials().size()));
        }
    }

    /** The standing capture of the subject, in the unit that the trial's settings state. */
    Standing of(Subject subject, Trial trial) {
        return held.computeIfAbsent(subject.id(), id -> read(subject, trial));
    }

    /** To be called once a trial, when it needs the standing capture no longer. */
    void release(Subject subject) {
        if (left.get(subject.id()).decrementAndGet() == 0) {
            held.remove(subject.id());
        }
    }

    private Standing read(Subject subject, Trial trial) {
        InputFile input = InputFile.of(subject.staticFile(), document.pathOf(subject.staticFile()));
        Capture capture = CaptureFiles.standing(document.pathOf(subject.staticFile()), trial.lab());
        return new Standing(capture, input);
    }
}
