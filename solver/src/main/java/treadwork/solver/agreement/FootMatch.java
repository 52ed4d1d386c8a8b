package treadwork.solver.agreement;

import java.util.Optional;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.contact.FootOutline;
import treadwork.solver.plate.CentreOfPressure;
import treadwork.solver.plate.PlateLoad;

/**
 * How well a plate's centre of pressure goes with the feet.
 *
 * @param distance mean distance from the outline of the foot that is nearer on average, m; 0 inside
 * @param progress how far the centre of pressure runs along the way in a stance, from the mean of its first third of frames to
 *                 that of its last, m; 0 where the person stays in place
 */
record FootMatch(double distance, double progress) {

    /** Loads below this share of the plate's greatest are left out: their place is uncertain. */
    private static final double LEAST_SHARE = 0.25;

    private static final double LEAST_N = 50;

    /** More than this gained over the capture is walking or running, m. */
    private static final double TRAVELS = 1;

    /** Progress counts no further than that of a long foot, m. */
    private static final double LONGEST = 0.15;

    /** Smaller is better, m. */
    double cost() {
        return distance - Math.max(-LONGEST, Math.min(LONGEST, progress)) / 2;
    }

    /** Empty where the plate is not loaded, or no foot is known then. */
    static Optional<FootMatch> of(PlateLoad plate, Scene scene) {
        int frames = scene.capture().frames();
        double peak = 0;
        for (int i = 0; i < frames; i++) {
            double push = push(plate, scene.sample(i));
            peak = push > peak ? push : peak;
        }
        double least = Math.max(LEAST_N, LEAST_SHARE * peak);
        double best = Double.NaN;
        for (FootOutline foot : scene.feet()) {
            double mean = meanDistance(plate, foot, least, scene);
            best = Double.isNaN(best) || mean < best ? mean : best;
        }
        return Double.isNaN(best) ? Optional.empty() : Optional.of(new FootMatch(best, progress(plate, least, scene)));
    }

    private static double push(PlateLoad plate, int sample) {
        return plate.smooth().force().at(sample).dot(plate.surface().normal());
    }

    private static Optional<Vector3> place(PlateLoad plate, int sample, double least) {
        return CentreOfPressure.of(plate.smooth().at(sample), plate.surface(), least)
                .map(CentreOfPressure::point);
    }

    private static double meanDistance(PlateLoad plate, FootOutline foot, double least, Scene scene) {
        double sum = 0;
        int known = 0;
        for (int i = 0; i < scene.capture().frames(); i++) {
            Optional<Vector3> place = place(plate, scene.sample(i), least);
            double distance = place.map(Vector3.GAP::equals).orElse(true)
                    ? Double.NaN
                    : foot.distance(place.orElseThrow(), i, plate.surface().normal());
            if (!Double.isNaN(distance)) {
                sum += distance;
                known++;
            }
        }
        return known == 0 ? Double.NaN : sum / known;
    }

    private static double progress(PlateLoad plate, double least, Scene scene) {
        Vector3 way = travel(scene);
        if (way.isGap()) {
            return 0;
        }
        double sum = 0;
        int runs = 0;
        int from = -1;
        for (int i = 0; i <= scene.capture().frames(); i++) {
            boolean loaded = i < scene.capture().frames() && push(plate, scene.sample(i)) >= least;
            if (loaded && from < 0) {
                from = i;
            }
            if (!loaded && from >= 0) {
                double progress = progress(plate, from, i, way, scene);
                if (!Double.isNaN(progress)) {
                    sum += progress;
                    runs++;
                }
                from = -1;
            }
        }
        return runs == 0 ? 0 : sum / runs;
    }

    private static double progress(PlateLoad plate, int from, int end, Vector3 way, Scene scene) {
        int third = (end - from) / 3;
        if (third < 1) {
            return Double.NaN;
        }
        double early = 0;
        double late = 0;
        for (int i = 0; i < third; i++) {
            early += along(plate, scene.sample(from + i), way);
            late += along(plate, scene.sample(end - 1 - i), way);
        }
        return (late - early) / third;
    }

    private static double along(PlateLoad plate, int sample, Vector3 way) {
        return place(plate, sample, 1).orElse(Vector3.GAP).dot(way);
    }

    /** The level direction in which the feet get on; a gap where they stay. */
    static Vector3 travel(Scene scene) {
        Vector3 sum = Vector3.ZERO;
        for (FootOutline foot : scene.feet()) {
            VectorSeries heel = foot.heel();
            int first = 0;
            int last = heel.size() - 1;
            while (first < last && heel.isGap(first)) {
                first++;
            }
            while (last > first && heel.isGap(last)) {
                last--;
            }
            sum = sum.plus(heel.at(last).minus(heel.at(first)));
        }
        Vector3 level = sum.minus(scene.up().times(sum.dot(scene.up())))
                .times(1.0 / scene.feet().size());
        return level.norm() >= TRAVELS ? level.unit() : Vector3.GAP;
    }
}
