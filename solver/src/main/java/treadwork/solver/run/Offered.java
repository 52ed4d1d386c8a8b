package treadwork.solver.run;

import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.PoseMethod;
import treadwork.model.study.Trial;

/** What a study file may name but this version does not compute: said at once, never passed over. */
final class Offered {

    private Offered() {}

    /** @throws UnusableInputException {@code not-offered} */
    static void check(Trial trial) {
        if (trial.body().pose() != PoseMethod.SEGMENT_FIT) {
            throw refusal(trial, "body.pose \"" + trial.body().pose().key() + "\"", "Set body.pose to \"segment-fit\"");
        }
        if (trial.results().draws() > 0) {
            throw refusal(
                    trial,
                    "results.uncertainty.draws " + trial.results().draws(),
                    "Set results.uncertainty.draws to 0, or leave it out");
        }
    }

    private static UnusableInputException refusal(Trial trial, String what, String mend) {
        return new UnusableInputException(new Finding(
                "not-offered",
                Severity.REFUSES,
                trial.file(),
                what + " is not offered by this version",
                "Computing without it would not be what the study file asks for",
                mend));
    }
}
