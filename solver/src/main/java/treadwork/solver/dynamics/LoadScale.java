package treadwork.solver.dynamics;

import java.util.Optional;
import treadwork.model.body.Gravity;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.study.Normalisation;

/**
 * By what moments, forces and powers are multiplied to scale them to the subject.
 *
 * <p>With {@code weight-height-percent} moments are per cent of weight × height, forces per cent of weight, and powers,
 * which weight × height does not make free of units, are W/kg.
 */
public record LoadScale(double moment, double force, double power) {

    /**
     * @param massKg  without device
     * @param heightM needed where the height enters
     * @throws UnusableInputException {@code height-missing} where it is needed and not stated
     */
    public static LoadScale of(Normalisation choice, double massKg, Optional<Double> heightM) {
        return switch (choice) {
            case NONE -> new LoadScale(1, 1, 1);
            case MASS -> new LoadScale(1 / massKg, 1 / massKg, 1 / massKg);
            case MASS_HEIGHT -> {
                double factor = 1 / (massKg * required(heightM, choice));
                yield new LoadScale(factor, factor, factor);
            }
            case WEIGHT_HEIGHT_PERCENT -> {
                double weight = massKg * Gravity.ACCELERATION;
                yield new LoadScale(100 / (weight * required(heightM, choice)), 100 / weight, 1 / massKg);
            }
        };
    }

    private static double required(Optional<Double> heightM, Normalisation choice) {
        return heightM.orElseThrow(() -> new UnusableInputException(new Finding(
                "height-missing",
                Severity.REFUSES,
                "the subject's entry in the study file",
                "results.normalise is \"" + choice.key() + "\", but heightM is not stated",
                "The loads cannot be divided by a height that is not known",
                "State heightM, or normalise by \"mass\" or \"none\"")));
    }
}
