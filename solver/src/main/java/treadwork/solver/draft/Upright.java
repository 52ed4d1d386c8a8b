package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.LabAxis;
import treadwork.solver.plate.LabUp;

/**
 * Which way is up.
 *
 * @param isFromPlates else from the shape and motion of the body alone
 */
record Upright(LabAxis axis, boolean isFromPlates) {

    /** From the plates of any capture; else along the standing body's greatest extent, away from what stops and goes. */
    static Upright of(Capture standing, List<Capture> movements) {
        List<Capture> all = new ArrayList<>(List.of(standing));
        all.addAll(movements);
        for (Capture capture : all) {
            Optional<LabAxis> up =
                    LabUp.find(capture, capture.plates(), Optional.empty()).axis();
            if (up.isPresent()) {
                return new Upright(up.orElseThrow(), true);
            }
        }
        return new Upright(tallest(Places.medians(standing), movements), false);
    }

    private static LabAxis tallest(Map<String, Vector3> places, List<Capture> movements) {
        LabAxis best = LabAxis.PLUS_Z;
        double tallest = -1;
        for (LabAxis axis : List.of(LabAxis.PLUS_X, LabAxis.PLUS_Y, LabAxis.PLUS_Z)) {
            double extent =
                    -lowest(places.values(), axis.direction().negated()) - lowest(places.values(), axis.direction());
            if (extent > tallest) {
                tallest = extent;
                best = axis;
            }
        }
        return isUpsideDown(best, places, movements)
                ? LabAxis.nearest(best.direction().negated())
                : best;
    }

    private static double lowest(Collection<Vector3> places, Vector3 along) {
        return places.stream().mapToDouble(place -> place.dot(along)).min().orElse(0);
    }

    /** The feet stop and go, so the end whose markers' speeds vary more is the lower; without motion the floor is near 0. */
    private static boolean isUpsideDown(LabAxis axis, Map<String, Vector3> places, List<Capture> movements) {
        double low = lowest(places.values(), axis.direction());
        double high = -lowest(places.values(), axis.direction().negated());
        double below = 0;
        double above = 0;
        for (Capture movement : movements) {
            for (Map.Entry<String, VectorSeries> course :
                    Places.courses(movement).entrySet()) {
                Vector3 place = places.get(course.getKey());
                if (place != null) {
                    double height = (place.dot(axis.direction()) - low) / (high - low);
                    double unsteadiness = unsteadiness(course.getValue());
                    below += height < 1.0 / 4 ? unsteadiness : 0;
                    above += height > 3.0 / 4 ? unsteadiness : 0;
                }
            }
        }
        return below + above > 0 ? above > below : Math.abs(high) < Math.abs(low);
    }

    /** Root mean square change of a marker's step from its mean step, over a fifteenth of the record. */
    private static double unsteadiness(VectorSeries course) {
        int lag = Math.max(1, course.size() / 15);
        Vector3 sum = Vector3.ZERO;
        double squares = 0;
        int steps = 0;
        for (int i = lag; i < course.size(); i += lag) {
            Vector3 step = course.at(i).minus(course.at(i - lag));
            if (!step.isGap()) {
                sum = sum.plus(step);
                squares += step.dot(step);
                steps++;
            }
        }
        double mean = steps == 0 ? 0 : sum.norm() / steps;
        return steps == 0 ? 0 : Math.sqrt(Math.max(0, squares / steps - mean * mean));
    }
}
