package treadwork.solver.pose;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.space.Pose;
import treadwork.model.space.Vector3;

/**
 * A segment as measured in the standing capture.
 *
 * @param standing  its pose there, lab axes, m
 * @param cluster   its tracked markers, segment axes, m, in the order of the marker set
 * @param landmarks those mapped ones that belong to it, the ends of its neighbours at its joints among them, segment axes, m
 * @param length    between its joint centres, m; of the foot from heel to toe tip; NaN for the pelvis
 */
public record SegmentGeometry(
        Segment segment, Pose standing, List<Vector3> cluster, Map<Landmark, Vector3> landmarks, double length) {

    public SegmentGeometry {
        cluster = List.copyOf(cluster);
        EnumMap<Landmark, Vector3> copy = new EnumMap<>(Landmark.class);
        copy.putAll(landmarks);
        landmarks = Collections.unmodifiableMap(copy);
    }

    /** The landmark of that name on the segment's own side, segment axes, m: {@code landmark("heel")}. Not for the pelvis. */
    public Optional<Vector3> landmark(String name) {
        return Optional.ofNullable(landmarks.get(Landmark.of(segment.side().orElseThrow(), name)));
    }
}
