package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.space.Vector3;

/**
 * The standing markers in the body's own axes.
 *
 * @param facing how it is known which way the body faces, so which side is right
 */
record StandingBody(List<Spot> spots, Facing facing) {

    /** The lowest markers, on the metatarsal heads, lie about so high above the floor, m (common practice). */
    private static final double LOWEST_MARKER = 0.025;

    /** Up to this height markers are on feet, m. */
    private static final double FOOT_HEIGHT = 0.06;

    /** Up to this height markers above {@link #FOOT_HEIGHT} are on ankles and shanks, m. */
    private static final double SHANK_HEIGHT = 0.35;

    /** The forefoot must lie so far ahead of the shanks to tell front from back, m. */
    private static final double LEAST_FOREFOOT = 0.02;

    /** How the front was told. */
    enum Facing {
        TRAVEL_AND_FEET,
        TRAVEL,
        FEET,
        CONTRADICTORY,
        UNKNOWN;

        boolean tellsSides() {
            return this == TRAVEL_AND_FEET || this == TRAVEL || this == FEET;
        }
    }

    StandingBody {
        spots = List.copyOf(spots);
    }

    static StandingBody of(Map<String, Vector3> places, Vector3 up, Optional<Vector3> travel) {
        double floor = places.values().stream()
                        .mapToDouble(place -> place.dot(up))
                        .min()
                        .orElse(0)
                - LOWEST_MARKER;
        Mirror mirror = Mirror.of(List.copyOf(places.values()), up, travel);
        List<Spot> spots = seen(places, up, mirror, floor);
        double forefoot = forefoot(spots);
        boolean feetBehind = forefoot < -LEAST_FOREFOOT;
        boolean feetAhead = forefoot > LEAST_FOREFOOT;
        if (travel.isPresent()) {
            return new StandingBody(
                    spots, feetBehind ? Facing.CONTRADICTORY : feetAhead ? Facing.TRAVEL_AND_FEET : Facing.TRAVEL);
        }
        List<Spot> turned = feetBehind ? seen(places, up, mirror.turnedRound(), floor) : spots;
        return new StandingBody(turned, feetBehind || feetAhead ? Facing.FEET : Facing.UNKNOWN);
    }

    private static List<Spot> seen(Map<String, Vector3> places, Vector3 up, Mirror mirror, double floor) {
        Vector3 right = mirror.ahead().cross(up);
        List<Spot> spots = new ArrayList<>();
        places.forEach((label, place) -> spots.add(new Spot(
                label,
                new Vector3(place.dot(mirror.ahead()), place.dot(up) - floor, place.dot(right) - mirror.middle()))));
        return spots;
    }

    private static double forefoot(List<Spot> spots) {
        return mean(spots, 0, FOOT_HEIGHT) - mean(spots, FOOT_HEIGHT, SHANK_HEIGHT);
    }

    private static double mean(List<Spot> spots, double above, double upTo) {
        return spots.stream()
                .map(Spot::at)
                .filter(at -> at.y() > above && at.y() <= upTo)
                .mapToDouble(Vector3::x)
                .average()
                .orElse(Double.NaN);
    }
}
