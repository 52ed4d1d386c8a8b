package treadwork.solver.run;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import treadwork.model.finding.Finding;

/**
 * How the run of one trial ended.
 *
 * @param name      {@code SUBJECT/TRIAL}
 * @param condition as the study file names it
 * @param folder    of its results
 * @param summary   of a trial that was computed
 * @param findings  of the computation; of a failed trial what kept it from being computed
 */
public record TrialOutcome(
        String name,
        String condition,
        Status status,
        Path folder,
        Optional<TrialSummary> summary,
        List<Finding> findings) {

    public TrialOutcome {
        findings = List.copyOf(findings);
    }

    /** What happened. */
    public enum Status {
        COMPUTED,
        /** Its results were already there, from just these inputs and settings. */
        UP_TO_DATE,
        FAILED
    }
}
