package treadwork.solver.draft;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** The direction of travel, as the standing body would have to face for it. */
final class Travel {

    /** A shorter way says nothing of where the body faces, m. */
    private static final double LEAST_WAY = 0.4;

    /** Of a record about this many frames are looked at. */
    private static final int FRAMES = 60;

    /** Trials whose directions cancel to less than this share contradict each other. */
    private static final double LEAST_AGREEMENT = 0.5;

    private Travel() {}

    /** Horizontal, of length one, lab axes; empty where nothing travels, or trials contradict each other. */
    static Optional<Vector3> inStanding(Map<String, Vector3> standing, List<Capture> movements, Vector3 up) {
        Vector3 sum = Vector3.ZERO;
        int trials = 0;
        for (Capture movement : movements) {
            Vector3 way = level(way(Places.courses(movement)), up);
            if (way.norm() > LEAST_WAY) {
                double turn = turn(standing, Places.courses(movement), up);
                sum = sum.plus(Rotation.about(up, -turn).times(way.unit()));
                trials++;
            }
        }
        return trials > 0 && sum.norm() > LEAST_AGREEMENT * trials ? Optional.of(sum.unit()) : Optional.empty();
    }

    private static Vector3 level(Vector3 vector, Vector3 up) {
        return vector.minus(up.times(vector.dot(up)));
    }

    /** The mean speed of all points times the record's length: the sum of all their steps that are known. */
    private static Vector3 way(Map<String, VectorSeries> courses) {
        Vector3 way = Vector3.ZERO;
        int frames =
                courses.values().stream().mapToInt(VectorSeries::size).max().orElse(0);
        for (int i = 1; i < frames; i++) {
            Vector3 sum = Vector3.ZERO;
            int known = 0;
            for (VectorSeries course : courses.values()) {
                if (!course.isGap(i) && !course.isGap(i - 1)) {
                    sum = sum.plus(course.at(i).minus(course.at(i - 1)));
                    known++;
                }
            }
            way = known == 0 ? way : way.plus(sum.times(1.0 / known));
        }
        return way;
    }

    /** The turn about up, rad, that carries the standing body nearest to the moving one, over all frames. */
    private static double turn(Map<String, Vector3> standing, Map<String, VectorSeries> courses, Vector3 up) {
        double sine = 0;
        double cosine = 0;
        int frames =
                courses.values().stream().mapToInt(VectorSeries::size).max().orElse(0);
        for (int i = 0; i < frames; i += Math.max(1, frames / FRAMES)) {
            int frame = i;
            List<String> seen = courses.keySet().stream()
                    .filter(standing::containsKey)
                    .filter(label -> !courses.get(label).isGap(frame))
                    .toList();
            Vector3 here = Vector3.ZERO;
            Vector3 there = Vector3.ZERO;
            for (String label : seen) {
                here = here.plus(courses.get(label).at(i).times(1.0 / seen.size()));
                there = there.plus(standing.get(label).times(1.0 / seen.size()));
            }
            for (String label : seen) {
                Vector3 from = level(standing.get(label).minus(there), up);
                Vector3 to = level(courses.get(label).at(i).minus(here), up);
                sine += from.cross(to).dot(up);
                cosine += from.dot(to);
            }
        }
        return Math.atan2(sine, cosine);
    }
}
