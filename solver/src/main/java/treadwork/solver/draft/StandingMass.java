package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import treadwork.model.body.Gravity;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Processing;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateLoads;

/** The body's mass from plates that carry all of it. */
public final class StandingMass {

    /** A plate that carries less is not stood on, N. */
    private static final double LEAST_LOAD = 50;

    private static final double LEAST_MASS = 15;
    private static final double GREATEST_MASS = 250;

    private StandingMass() {}

    /**
     * The median of the plates' vertical forces over gravity, kg; empty unless every foot marker is over a loaded plate.
     *
     * @param footMarkers of both feet, labels of the capture
     */
    public static OptionalDouble of(Capture standing, LabAxis up, List<String> footMarkers) {
        double newtons = 0;
        List<PlateLoad> loads = PlateLoads.resolve(standing, standing.plates(), up, Processing.DEFAULT)
                .plates();
        List<Plate> loaded = new ArrayList<>();
        for (PlateLoad load : loads) {
            double push = Places.median(load.rawPush().toArray());
            if (push > LEAST_LOAD) {
                newtons += push;
                loaded.add(standing.plates().get(load.number() - 1));
            }
        }
        double mass = newtons / Gravity.ACCELERATION;
        boolean stands = !footMarkers.isEmpty()
                && footMarkers.stream().allMatch(label -> isOverAny(loaded, standing, label, up.direction()));
        return stands && mass > LEAST_MASS && mass < GREATEST_MASS ? OptionalDouble.of(mass) : OptionalDouble.empty();
    }

    private static boolean isOverAny(List<Plate> plates, Capture standing, String label, Vector3 up) {
        Optional<Vector3> place = Optional.ofNullable(Places.medians(standing).get(label));
        return place.isPresent() && plates.stream().anyMatch(plate -> isOver(plate, place.orElseThrow(), up));
    }

    /** On the same side of all four edges. */
    private static boolean isOver(Plate plate, Vector3 place, Vector3 up) {
        int positive = 0;
        for (int i = 0; i < Plate.CORNERS; i++) {
            Vector3 from = plate.corners().get(i);
            Vector3 edge = plate.corners().get((i + 1) % Plate.CORNERS).minus(from);
            positive += edge.cross(place.minus(from)).dot(up) > 0 ? 1 : 0;
        }
        return positive == 0 || positive == Plate.CORNERS;
    }
}
