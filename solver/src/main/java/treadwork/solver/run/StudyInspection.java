package treadwork.solver.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.inertia.InertiaTables;
import treadwork.io.study.FolderName;
import treadwork.io.study.StudyDocument;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** Looks through the trials of a study without computing loads. */
public final class StudyInspection {

    private StudyInspection() {}

    /**
     * One trial, looked at.
     *
     * @param name       subject and trial, as results name them
     * @param inspection empty where the trial cannot be used
     * @param refusal    why not
     */
    public record Inspected(String name, Optional<Inspection> inspection, Optional<Finding> refusal) {}

    /** Every trial in the study's order, handed on as it is done. */
    public static void each(StudyDocument document, Consumer<Inspected> next) {
        for (Subject subject : document.study().subjects()) {
            of(document, subject).forEach(next);
        }
    }

    private static List<Inspected> of(StudyDocument document, Subject subject) {
        List<Inspected> inspected = new ArrayList<>();
        Optional<Capture> standing = Optional.empty();
        for (Trial trial : subject.trials()) {
            String name = subject.id() + "/" + FolderName.ofTrial(trial.file());
            try {
                Capture stood = standing.orElseGet(
                        () -> CaptureFiles.standing(document.pathOf(subject.staticFile()), trial.lab()));
                standing = Optional.of(stood);
                TrialInput input = new TrialInput(
                        stood,
                        CaptureFiles.movement(
                                document.pathOf(trial.file()), trial.plateFile().map(document::pathOf), trial.lab()),
                        subject,
                        trial,
                        InertiaTables.load(trial.body().inertia()));
                inspected.add(new Inspected(name, Optional.of(Inspection.of(input)), Optional.empty()));
            } catch (UnusableInputException refused) {
                inspected.add(new Inspected(name, Optional.empty(), Optional.of(refused.finding())));
            }
        }
        return inspected;
    }
}
