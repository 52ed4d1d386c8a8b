package treadwork.solver.marker;

import java.util.List;
import treadwork.model.body.Segment;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/**
 * A segment's tracked markers.
 *
 * @param labels   in the order of the marker set
 * @param template their places as measured standing, segment axes, m
 * @param courses  in the movement, as recorded, lab axes, m
 */
public record MarkerCluster(Segment segment, List<String> labels, List<Vector3> template, List<VectorSeries> courses) {

    public MarkerCluster {
        labels = List.copyOf(labels);
        template = List.copyOf(template);
        courses = List.copyOf(courses);
    }

    int size() {
        return labels.size();
    }

    int frames() {
        return courses.get(0).size();
    }

    /** Between two markers in a frame, m; NaN where either is missing. */
    double distance(int one, int other, int frame) {
        VectorSeries a = courses.get(one);
        VectorSeries b = courses.get(other);
        double x = a.x(frame) - b.x(frame);
        double y = a.y(frame) - b.y(frame);
        double z = a.z(frame) - b.z(frame);
        return Math.sqrt(x * x + y * y + z * z);
    }

    /** The same as measured standing. */
    double standingDistance(int one, int other) {
        return template.get(one).minus(template.get(other)).norm();
    }

    MarkerCluster withCourses(List<VectorSeries> other) {
        return new MarkerCluster(segment, labels, template, other);
    }
}
