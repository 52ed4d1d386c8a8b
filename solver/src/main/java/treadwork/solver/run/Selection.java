package treadwork.solver.run;

import java.util.List;
import java.util.Optional;
import treadwork.io.study.FolderName;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.Study;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/**
 * One subject of a study, or one trial of it.
 *
 * @param trial the name of its file without folder and ending; empty: all trials of the subject
 */
public record Selection(String subject, Optional<String> trial) {

    /** Reads {@code SUBJECT} or {@code SUBJECT/TRIAL}. */
    public static Selection parse(String text) {
        int slash = text.indexOf('/');
        return slash < 0
                ? new Selection(text, Optional.empty())
                : new Selection(text.substring(0, slash), Optional.of(text.substring(slash + 1)));
    }

    boolean includes(Subject candidate, Trial its) {
        return subject.equals(candidate.id())
                && trial.map(name -> name.equals(FolderName.ofTrial(its.file())))
                        .orElse(true);
    }

    /** @throws UnusableInputException {@code selection-unknown} where the study has no such subject or trial */
    void requireIn(Study study) {
        boolean found = study.subjects().stream()
                .anyMatch(candidate -> candidate.trials().stream().anyMatch(its -> includes(candidate, its)));
        if (!found) {
            throw new UnusableInputException(new Finding(
                    "selection-unknown",
                    Severity.REFUSES,
                    "--only " + this,
                    "the study has no such subject or trial; it has " + String.join(", ", names(study)),
                    "There is nothing to compute",
                    "Give one of these, or leave --only out"));
        }
    }

    private static List<String> names(Study study) {
        return study.subjects().stream()
                .flatMap(subject ->
                        subject.trials().stream().map(trial -> subject.id() + "/" + FolderName.ofTrial(trial.file())))
                .toList();
    }

    @Override
    public String toString() {
        return subject + trial.map(name -> "/" + name).orElse("");
    }
}
