package treadwork.solver.proof;

import java.util.Optional;

/**
 * A mass that is put on a plate.
 *
 * @param massKg above 0
 * @param place  where on the plate, if known
 */
public record KnownMass(double massKg, Optional<Place> place) {

    public KnownMass {
        if (!(massKg > 0 && massKg <= 2000)) {
            throw new IllegalArgumentException(
                    "a mass to put on a plate is above 0 and up to 2000 kg, not " + massKg + " kg");
        }
    }

    /** Where a mass stands. */
    public sealed interface Place {}

    /** Below a marker that is on top of it. */
    public record BelowMarker(String label) implements Place {}

    /** At these plate coordinates, from the middle of the surface, m. */
    public record OnPlate(double x, double y) implements Place {}
}
