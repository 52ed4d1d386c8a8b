package treadwork.model.study;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;

/**
 * Which label of the capture is which landmark, and which labels move with which segment.
 *
 * @param landmarks read from the standing capture
 * @param clusters  three or more labels a segment, not on one line, tracked in the trials
 */
public record MarkerSet(Map<Landmark, String> landmarks, Map<Segment, List<String>> clusters) {

    public MarkerSet {
        landmarks = ordered(Landmark.class, landmarks);
        clusters = ordered(Segment.class, clusters);
    }

    private static <K extends Enum<K>, V> Map<K, V> ordered(Class<K> keys, Map<K, V> map) {
        EnumMap<K, V> copy = new EnumMap<>(keys);
        copy.putAll(map);
        return Collections.unmodifiableMap(copy);
    }
}
