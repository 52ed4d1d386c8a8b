package treadwork.solver.plausible;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MarkerSet;

/** {@code static-moving}: a mapped marker does not keep still while the person should. */
public final class StandingStill {

    /** Adults who stand quietly sway by some 10 mm at the hips within half a minute (from memory), m. */
    private static final double LIMIT = 0.012;

    /** Of the known frames may be beyond that. */
    private static final double SHARE = 0.05;

    private StandingStill() {}

    public static List<Finding> of(Capture standing, MarkerSet set) {
        Set<String> labels = new LinkedHashSet<>(set.landmarks().values());
        set.clusters().values().forEach(labels::addAll);
        String worst = "";
        double most = 0;
        for (PointSeries point : standing.points()) {
            double beyond = labels.contains(point.label()) ? shareBeyond(point.positions()) : 0;
            if (beyond > most) {
                most = beyond;
                worst = point.label();
            }
        }
        return most > SHARE ? List.of(finding(standing, worst, most)) : List.of();
    }

    /** Of the known frames, in how many the marker is farther than the limit from its mean place. */
    private static double shareBeyond(VectorSeries course) {
        double x = 0;
        double y = 0;
        double z = 0;
        int known = 0;
        for (int i = 0; i < course.size(); i++) {
            if (!course.isGap(i)) {
                x += course.x(i);
                y += course.y(i);
                z += course.z(i);
                known++;
            }
        }
        int beyond = 0;
        for (int i = 0; i < course.size(); i++) {
            double dx = course.x(i) - x / known;
            double dy = course.y(i) - y / known;
            double dz = course.z(i) - z / known;
            beyond += dx * dx + dy * dy + dz * dz > LIMIT * LIMIT ? 1 : 0;
        }
        return known == 0 ? 0 : (double) beyond / known;
    }

    private static Finding finding(Capture standing, String label, double share) {
        return new Finding(
                "static-moving",
                Severity.WARNING,
                standing.name() + ", marker \"" + label + "\"",
                String.format(
                        Locale.ROOT,
                        "in %.0f %% of the frames it is more than %.0f mm from its mean place; limit %.0f %%",
                        100 * share,
                        1e3 * LIMIT,
                        100 * SHARE),
                "The body is built from where the markers are on average, and that is no posture the person was in",
                "Use a capture, or cut one, in which the person stands still");
    }
}
