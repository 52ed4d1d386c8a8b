package treadwork.solver.agreement;

import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;

/** {@code mass-mismatch}: what the plates carry against the stated mass. */
final class MassCheck {

    /** Of the stated mass: clothing and a meal are below, and joint moments change by less than others' errors. */
    static final double LIMIT = 0.05;

    private static final double ERRORS = 3;

    private MassCheck() {}

    static Optional<Finding> of(CarriedMass carried, Scene scene) {
        double stated = scene.massKg();
        double limit = Math.max(LIMIT * stated, ERRORS * carried.standardError());
        double difference = carried.kg() - stated;
        if (!(Math.abs(difference) >= limit)) {
            return Optional.empty();
        }
        double bare = carried.kg() - scene.wornKg();
        Finding finding = new Finding(
                "mass-mismatch",
                Severity.WARNING,
                scene.capture().name(),
                String.format(
                        Locale.ROOT,
                        "the plates carry %.1f kg (standard error %.1f kg) where %.1f kg are stated, %+.0f %%; limit %.0f %%",
                        carried.kg(),
                        carried.standardError(),
                        stated,
                        100 * difference / stated,
                        100 * limit / stated),
                "Segment masses follow the stated mass, and so do loads that are given per kilogram; or the plates' gain is off",
                "Check the stated mass, what the person carried, and the plates' calibration");
        return Optional.of(finding.proposing(
                new Proposal(Proposal.Scope.SUBJECT, String.format(Locale.ROOT, "{ \"massKg\": %.1f }", bare))));
    }
}
