package treadwork.solver.run;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import treadwork.io.capture.CaptureFiles;
import treadwork.io.inertia.InertiaTables;
import treadwork.io.result.InputFile;
import treadwork.io.result.ResultCapture;
import treadwork.io.result.TrialFiles;
import treadwork.io.result.TrialRecord;
import treadwork.io.study.FolderName;
import treadwork.io.study.StudyDocument;
import treadwork.model.capture.Capture;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** The main job from files to files: every trial of a study, several at a time. */
public final class StudyRun {

    private final StudyDocument document;
    private final RunSettings settings;
    private final StandingCaptures standing;

    private StudyRun(StudyDocument document, RunSettings settings) {
        this.document = document;
        this.settings = settings;
        this.standing = new StandingCaptures(document);
    }

    /** One trial and whose it is. */
    private record Job(Subject subject, Trial trial) {

        String name() {
            return subject.id() + "/" + FolderName.ofTrial(trial.file());
        }
    }

    /**
     * Computes and writes the trials. A trial whose input cannot be used ends as failed and keeps no other from being
     * computed.
     *
     * @param progress told of each trial as it ends, from any thread
     * @return an outcome a trial, in the study's order
     * @throws UnusableInputException where the selection names nothing
     */
    public static List<TrialOutcome> run(
            StudyDocument document, RunSettings settings, Consumer<TrialOutcome> progress) {
        settings.only().ifPresent(only -> only.requireIn(document.study()));
        return new StudyRun(document, settings).all(progress);
    }

    /** How many trials a run would go through. */
    public static int count(StudyDocument document, RunSettings settings) {
        return new StudyRun(document, settings).jobs().size();
    }

    private List<TrialOutcome> all(Consumer<TrialOutcome> progress) {
        ExecutorService workers = Executors.newFixedThreadPool(settings.threads());
        try {
            List<Future<TrialOutcome>> running = new ArrayList<>();
            for (Job job : jobs()) {
                running.add(workers.submit(() -> {
                    TrialOutcome outcome = outcome(job);
                    progress.accept(outcome);
                    return outcome;
                }));
            }
            List<TrialOutcome> outcomes = new ArrayList<>();
            for (Future<TrialOutcome> trial : running) {
                outcomes.add(finished(trial));
            }
            return outcomes;
        } finally {
            workers.shutdownNow();
        }
    }

    private static TrialOutcome finished(Future<TrialOutcome> trial) {
        try {
            return trial.get();
        } catch (InterruptedException stopped) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("the run was interrupted", stopped);
        } catch (ExecutionException fault) {
            throw new IllegalStateException("a trial could not be computed: " + fault.getCause(), fault.getCause());
        }
    }

    private List<Job> jobs() {
        List<Job> jobs = new ArrayList<>();
        for (Subject subject : document.study().subjects()) {
            for (Trial trial : subject.trials()) {
                if (settings.only().map(only -> only.includes(subject, trial)).orElse(true)) {
                    jobs.add(new Job(subject, trial));
                }
            }
        }
        return jobs;
    }

    private TrialOutcome outcome(Job job) {
        Path folder = TrialFiles.folder(settings.results(), job.subject(), job.trial());
        try {
            return outcome(job, folder);
        } catch (UnusableInputException unusable) {
            return new TrialOutcome(
                    job.name(),
                    job.trial().condition(),
                    TrialOutcome.Status.FAILED,
                    folder,
                    Optional.empty(),
                    List.of(unusable.finding()));
        } finally {
            standing.release(job.subject());
        }
    }

    private TrialOutcome outcome(Job job, Path folder) {
        Trial trial = job.trial();
        StandingCaptures.Standing stood = standing.of(job.subject(), trial);
        TrialRecord record = new TrialRecord(ProgramVersion.TEXT, job.subject(), trial, inputs(stood, trial));
        boolean complete = !settings.c3d() || TrialFiles.holdsCapture(folder);
        if (!settings.again() && TrialFiles.isUpToDate(folder, record.key()) && complete) {
            return new TrialOutcome(
                    job.name(), trial.condition(), TrialOutcome.Status.UP_TO_DATE, folder, Optional.empty(), List.of());
        }
        Capture movement = movement(trial);
        ComputedTrial computed = TrialComputation.compute(new TrialInput(
                stood.capture(),
                movement,
                job.subject(),
                trial,
                InertiaTables.load(trial.body().inertia())));
        Optional<ResultCapture> capture =
                settings.c3d() ? Optional.of(new ResultCapture(movement, computed.centres())) : Optional.empty();
        TrialFiles.write(folder, record, computed.result(), capture);
        return new TrialOutcome(
                job.name(),
                trial.condition(),
                TrialOutcome.Status.COMPUTED,
                folder,
                Optional.of(computed.summary()),
                computed.result().findings());
    }

    private List<InputFile> inputs(StandingCaptures.Standing stood, Trial trial) {
        List<InputFile> inputs = new ArrayList<>();
        inputs.add(stood.input());
        inputs.add(InputFile.of(trial.file(), document.pathOf(trial.file())));
        trial.plateFile().ifPresent(plates -> inputs.add(InputFile.of(plates, document.pathOf(plates))));
        return inputs;
    }

    private Capture movement(Trial trial) {
        return CaptureFiles.movement(
                document.pathOf(trial.file()), trial.plateFile().map(document::pathOf), trial.lab());
    }
}
