package treadwork.solver.agreement;

import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;

/** {@code clock-shift}: plates and markers disagree in time. */
final class ClockCheck {

    /** A lag below this is not told from none; it changes peak joint moments of walking by a few per cent, s. */
    static final double LIMIT_S = 0.012;

    /** ... nor one below this many standard errors. */
    private static final double ERRORS = 3;

    private ClockCheck() {}

    static Optional<Finding> of(ClockLag lag, Scene scene) {
        double limit = lag.atLimit() ? ClockLag.REACH_S : Math.max(LIMIT_S, ERRORS * lag.standardError());
        if (!(Math.abs(lag.seconds()) >= limit)) {
            return Optional.empty();
        }
        double delay = scene.plateDelayS() + lag.seconds();
        String figure = lag.atLimit()
                ? String.format(
                        Locale.ROOT,
                        "the plates %s the markers by %.0f ms or more",
                        lag.seconds() > 0 ? "lag" : "lead",
                        1e3 * ClockLag.REACH_S)
                : String.format(
                        Locale.ROOT,
                        "the plates %s the markers by %.0f ms (standard error %.0f ms); limit %.0f ms",
                        lag.seconds() > 0 ? "lag" : "lead",
                        1e3 * Math.abs(lag.seconds()),
                        1e3 * lag.standardError(),
                        1e3 * limit);
        Finding finding = new Finding(
                "clock-shift",
                Severity.WARNING,
                scene.capture().name(),
                figure,
                "The ground reaction meets the foot where it was at another moment, which shows most in knee and hip moments at"
                        + " landing and push-off",
                lag.atLimit()
                        ? "Check how plates and cameras were started together"
                        : "Check how plates and cameras were started together, or take the delay out with"
                                + " processing.plateDelayS");
        return Optional.of(
                lag.atLimit()
                        ? finding
                        : finding.proposing(new Proposal(
                                Proposal.Scope.TRIAL,
                                String.format(Locale.ROOT, "{ \"processing\": { \"plateDelayS\": %.3f } }", delay))));
    }
}
