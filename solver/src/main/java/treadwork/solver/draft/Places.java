package treadwork.solver.draft;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.Map;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** Where the named points of a capture are, lab axes, m. */
final class Places {

    private Places() {}

    /** The median of each point over the frames in which it was seen; of repeated labels the first that was ever seen. */
    static Map<String, Vector3> medians(Capture capture) {
        Map<String, Vector3> places = new LinkedHashMap<>();
        for (PointSeries point : capture.points()) {
            VectorSeries course = point.positions();
            Vector3 middle = new Vector3(
                    median(course.componentX().toArray()),
                    median(course.componentY().toArray()),
                    median(course.componentZ().toArray()));
            if (isNamed(point.label()) && !middle.isGap()) {
                places.putIfAbsent(point.label(), middle);
            }
        }
        return places;
    }

    /** The courses by label, as {@link #medians} takes them. */
    static Map<String, VectorSeries> courses(Capture capture) {
        Map<String, VectorSeries> courses = new LinkedHashMap<>();
        for (PointSeries point : capture.points()) {
            if (isNamed(point.label()) && isEverSeen(point.positions())) {
                courses.putIfAbsent(point.label(), point.positions());
            }
        }
        return courses;
    }

    private static boolean isNamed(String label) {
        return !label.isBlank() && !label.startsWith("*");
    }

    private static boolean isEverSeen(VectorSeries course) {
        for (int i = 0; i < course.size(); i++) {
            if (!course.isGap(i)) {
                return true;
            }
        }
        return false;
    }

    static double median(double[] values) {
        double[] known = Arrays.stream(values).filter(Double::isFinite).sorted().toArray();
        return known.length == 0 ? Double.NaN : known[known.length / 2];
    }
}
