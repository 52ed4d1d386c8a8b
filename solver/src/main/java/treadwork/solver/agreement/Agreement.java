package treadwork.solver.agreement;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import treadwork.model.finding.Finding;

/** All checks of plates against markers. */
public final class Agreement {

    private Agreement() {}

    /** What does not agree, and what would mend it. A plate that is turned or swapped is judged for nothing else. */
    public static List<Finding> check(Scene scene) {
        List<Finding> findings = new ArrayList<>(TurnCheck.of(scene));
        if (!findings.isEmpty()) {
            return findings;
        }
        findings.addAll(OriginProof.of(scene));
        Optional<BodyCentre> centre = BodyCentre.of(scene);
        GroundForce ground = GroundForce.of(scene);
        double rate = scene.capture().pointRate();
        centre.flatMap(body -> ClockLag.of(body, ground, scene.capture().samplesPerFrame(), rate))
                .flatMap(lag -> ClockCheck.of(lag, scene))
                .ifPresent(findings::add);
        centre.flatMap(body -> CarriedMass.of(body, ground, scene.up(), rate))
                .flatMap(mass -> MassCheck.of(mass, scene))
                .ifPresent(findings::add);
        findings.addAll(PlaceCheck.of(scene));
        return findings;
    }
}
