package treadwork.solver.draft;

import java.util.List;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;

/** Which capture of several is the standing one. */
public final class Stillness {

    /** Who stands quietly sways by less than this, root mean square, m (common practice: about 5 mm). */
    public static final double LIMIT = 0.03;

    /** So many markers with a name are needed at least. */
    private static final int LEAST_MARKERS = 8;

    private Stillness() {}

    /** How far the markers go from their mean place: the median over the markers of the root mean square, m. */
    public static double motion(Capture capture) {
        return Places.median(Places.courses(capture).values().stream()
                .mapToDouble(Stillness::motion)
                .toArray());
    }

    /** Whether the markers keep still. */
    public static boolean isStanding(Capture capture) {
        return markers(capture) >= LEAST_MARKERS && motion(capture) < LIMIT;
    }

    /** How many named markers are seen at all. */
    public static int markers(Capture capture) {
        return Places.courses(capture).size();
    }

    /** Of those that keep still the one with the most markers, and of several the first. */
    public static Optional<Capture> standing(List<Capture> captures) {
        Capture best = null;
        for (Capture capture : captures) {
            if (isStanding(capture) && (best == null || markers(capture) > markers(best))) {
                best = capture;
            }
        }
        return Optional.ofNullable(best);
    }

    /** How many of a movement's markers have a namesake in the standing capture, from 0 to 1. */
    public static double shared(Capture movement, Capture standing) {
        var there = Places.courses(standing).keySet();
        var here = Places.courses(movement).keySet();
        return here.isEmpty()
                ? 0
                : (double) here.stream().filter(there::contains).count() / here.size();
    }

    private static double motion(VectorSeries course) {
        Vector3 sum = Vector3.ZERO;
        double squares = 0;
        int seen = 0;
        Vector3 first = Vector3.GAP;
        for (int i = 0; i < course.size(); i++) {
            if (!course.isGap(i)) {
                first = first.isGap() ? course.at(i) : first;
                Vector3 off = course.at(i).minus(first);
                sum = sum.plus(off);
                squares += off.dot(off);
                seen++;
            }
        }
        double mean = sum.norm() / seen;
        return Math.sqrt(Math.max(0, squares / seen - mean * mean));
    }
}
