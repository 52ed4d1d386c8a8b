package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.VectorSeries;

/**
 * Points that bear the same label: the very same course stored again is one point; courses that differ, such as a measured and a
 * processed copy, are all kept, and said to be ambiguous.
 */
final class RepeatedLabels {

    private RepeatedLabels() {}

    static List<PointSeries> resolve(List<PointSeries> points, Reading reading) {
        Map<String, List<PointSeries>> named = new LinkedHashMap<>();
        Set<String> collapsed = new LinkedHashSet<>();
        Set<String> ambiguous = new LinkedHashSet<>();
        List<PointSeries> kept = new ArrayList<>();
        for (PointSeries point : points) {
            List<PointSeries> before = named.computeIfAbsent(point.label(), label -> new ArrayList<>());
            if (!point.label().isEmpty() && !before.isEmpty()) {
                if (before.stream().anyMatch(other -> same(other.positions(), point.positions()))) {
                    collapsed.add(point.label());
                    continue;
                }
                ambiguous.add(point.label());
            }
            before.add(point);
            kept.add(point);
        }
        if (!collapsed.isEmpty()) {
            reading.note(Notices.labelCollapsed(reading.file(), List.copyOf(collapsed)));
        }
        if (!ambiguous.isEmpty()) {
            reading.note(Notices.labelAmbiguous(reading.file(), List.copyOf(ambiguous)));
        }
        return kept;
    }

    /** The same numbers and gaps; courses that were never seen show nothing that could be the same. */
    private static boolean same(VectorSeries one, VectorSeries other) {
        boolean seen = false;
        for (int i = 0; i < one.size(); i++) {
            boolean gap = one.isGap(i);
            boolean equal = one.x(i) == other.x(i) && one.y(i) == other.y(i) && one.z(i) == other.z(i);
            if (gap != other.isGap(i) || (!gap && !equal)) {
                return false;
            }
            seen |= !gap;
        }
        return seen;
    }
}
