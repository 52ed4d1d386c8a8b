package treadwork.solver.agreement;

import java.util.BitSet;
import java.util.Optional;
import treadwork.model.body.Gravity;
import treadwork.model.space.Vector3;

/**
 * How heavy the body is by what the plates carry while it moves: mean vertical force over g plus the mean upward
 * acceleration of the body's centre, over all frames in which plates carry the whole body.
 *
 * @param kg            with all that is worn
 * @param standardError kg
 */
record CarriedMass(double kg, double standardError) {

    private static final double LEAST_S = 0.3;

    /** Of the vertical speed of the body's centre at either end of a stretch: hips stand for trunk and arms, m/s. */
    private static final double SPEED_ERROR = 0.05;

    /** Of plates' gain and of the masses' shares. */
    private static final double RELATIVE_ERROR = 0.01;

    static Optional<CarriedMass> of(BodyCentre body, GroundForce ground, Vector3 up, double rate) {
        int samplesPerFrame = ground.force().size() / body.acceleration().size();
        BitSet measured = ground.measured();
        double force = 0;
        double pull = 0;
        int frames = 0;
        int stretches = 0;
        int last = -2;
        for (int i = measured.nextSetBit(0); i >= 0; i = measured.nextSetBit(i + 1)) {
            double push = ground.force().at(i * samplesPerFrame).dot(up);
            double acceleration = body.acceleration().at(i).dot(up);
            if (!Double.isNaN(push + acceleration)) {
                force += push;
                pull += Gravity.ACCELERATION + acceleration;
                frames++;
                stretches += last == i - 1 ? 0 : 1;
                last = i;
            }
        }
        double duration = frames / rate;
        if (duration < LEAST_S) {
            return Optional.empty();
        }
        double kg = force / pull;
        double ofSpeed = SPEED_ERROR * Math.sqrt(2.0 * stretches) / duration / Gravity.ACCELERATION;
        return Optional.of(new CarriedMass(kg, kg * Math.hypot(ofSpeed, RELATIVE_ERROR)));
    }
}
