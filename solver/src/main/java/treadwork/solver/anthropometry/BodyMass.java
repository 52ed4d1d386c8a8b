package treadwork.solver.anthropometry;

import java.util.Optional;
import treadwork.model.body.Sex;

/**
 * The subject as an inertia table asks for it.
 *
 * @param subject id, for messages
 * @param kg      without device
 * @param sex     empty where the study does not state it
 */
public record BodyMass(String subject, double kg, Optional<Sex> sex) {

    public BodyMass {
        if (!(kg > 0) || Double.isInfinite(kg)) {
            throw new IllegalArgumentException("body mass must be above 0 kg, is " + kg + " kg");
        }
    }
}
