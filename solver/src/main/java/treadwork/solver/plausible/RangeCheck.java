package treadwork.solver.plausible;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/**
 * {@code out-of-range}: a peak of level walking beyond what any published group of walkers comes near.
 *
 * <p>Means of healthy adults are about 1.4 to 1.6 N·m/kg of plantarflexor, 0.4 to 0.8 of knee extensor, 0.6 to 1.2 of hip
 * extensor and 0.7 to 1.0 of hip abductor moment and 2 to 4.5 W/kg at the ankle (Winter 1991, from memory; the walking trial of
 * Winter 2009, appendix, has 1.58, 0.67 and 0.96). Limits are about twice the greatest of these: what is looked for is a
 * mistake, not an unusual walker.
 */
public final class RangeCheck {

    /** Between these speeds the ranges hold, m/s. */
    private static final double SLOWEST = 0.4;

    private static final double FASTEST = 2.2;

    private RangeCheck() {}

    /**
     * The greatest loads of one side.
     *
     * @param plantarflexor to {@code hipAbductor} in N·m/kg
     * @param anklePower    W/kg
     */
    public record Peaks(
            Side side,
            double plantarflexor,
            double kneeExtensor,
            double hipExtensor,
            double hipAbductor,
            double anklePower) {}

    /**
     * @param speed of the walk, m/s; NaN where the movement is no walk
     */
    public static List<Finding> of(String name, double speed, List<Peaks> sides) {
        List<Finding> findings = new ArrayList<>();
        if (speed >= SLOWEST && speed <= FASTEST) {
            for (Peaks peaks : sides) {
                String leg = name + ", " + peaks.side().key() + " ";
                check(findings, leg + "ankle plantarflexor moment", peaks.plantarflexor(), new Limit(2.8, "N·m/kg"));
                check(findings, leg + "knee extensor moment", peaks.kneeExtensor(), new Limit(2.4, "N·m/kg"));
                check(findings, leg + "hip extensor moment", peaks.hipExtensor(), new Limit(2.4, "N·m/kg"));
                check(findings, leg + "hip abductor moment", peaks.hipAbductor(), new Limit(2.0, "N·m/kg"));
                check(findings, leg + "ankle power", peaks.anklePower(), new Limit(10, "W/kg"));
            }
        }
        return findings;
    }

    private record Limit(double most, String unit) {}

    private static void check(List<Finding> findings, String where, double peak, Limit limit) {
        if (peak > limit.most) {
            findings.add(new Finding(
                    "out-of-range",
                    Severity.WARNING,
                    where,
                    String.format(
                            Locale.ROOT,
                            "the greatest is %.2f %s; limit for walking %.1f %s, about twice the means that Winter (1991) gives",
                            peak,
                            limit.unit,
                            limit.most,
                            limit.unit),
                    "A healthy or impaired walker hardly comes there, so a mistake in the set-up is likely",
                    "Look at the other findings, the plates' scale and place, and the stated mass"));
        }
    }
}
