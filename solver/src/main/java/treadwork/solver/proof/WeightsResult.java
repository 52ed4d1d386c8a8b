package treadwork.solver.proof;

import java.util.List;
import java.util.OptionalDouble;
import treadwork.model.finding.Finding;

/**
 * What known masses say about a plate.
 *
 * @param plate    its number, counted from 1
 * @param masses   a row a mass, in their order
 * @param gain     what the plate shows for 1 N: slope through the origin, least squares
 * @param findings of the plates on the way
 */
public record WeightsResult(int plate, List<Row> masses, double gain, List<Finding> findings) {

    /** Of the force (common acceptance, from memory). */
    public static final double ACCEPTED_GAIN = 0.01;

    /** Of the centre of pressure, m: 2 to 3 mm (common acceptance, from memory). */
    public static final double ACCEPTED_PLACE = 0.003;

    public WeightsResult {
        masses = List.copyOf(masses);
        findings = List.copyOf(findings);
    }

    /**
     * One mass.
     *
     * @param expected weight, N
     * @param shown    mean vertical force, N
     * @param scatter  standard deviation of a sample of it, N
     * @param shear    mean level force, N; a weight has none
     * @param offX     of the centre of pressure from where the mass stands, plate x, m; empty where that is not known
     * @param offY     the same along plate y
     */
    public record Row(
            KnownMass mass,
            double expected,
            double shown,
            double scatter,
            double shear,
            OptionalDouble offX,
            OptionalDouble offY) {

        /** Of the force, as a share of the weight. */
        public double error() {
            return shown / expected - 1;
        }

        /** Of the centre of pressure, m; empty where the place is not known. */
        public OptionalDouble off() {
            return offX.isPresent()
                    ? OptionalDouble.of(Math.hypot(offX.getAsDouble(), offY.getAsDouble()))
                    : OptionalDouble.empty();
        }
    }

    /** Whether every mass shows within 1 %, and stands within 3 mm of its place where that is known. */
    public boolean isAccepted() {
        return masses.stream()
                .allMatch(row ->
                        Math.abs(row.error()) <= ACCEPTED_GAIN && row.off().orElse(0) <= ACCEPTED_PLACE);
    }
}
