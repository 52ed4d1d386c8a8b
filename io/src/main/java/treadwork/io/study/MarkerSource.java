package treadwork.io.study;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.study.MarkerSet;

/**
 * What a marker set is put together from: objects laid over one another, key by key.
 *
 * @param layers the nearest first
 */
record MarkerSource(List<MarkerLayer> layers) {

    static final MarkerSource NONE = new MarkerSource(List.of());

    MarkerSource {
        layers = List.copyOf(layers);
    }

    MarkerSource under(MarkerLayer nearest) {
        List<MarkerLayer> all = new ArrayList<>();
        all.add(nearest);
        all.addAll(layers);
        return new MarkerSource(all);
    }

    /** The set, blanks at the ends of labels taken off. */
    MarkerSet set() {
        Map<Landmark, String> landmarks = new EnumMap<>(Landmark.class);
        Map<Segment, List<String>> clusters = new EnumMap<>(Segment.class);
        for (int i = layers.size() - 1; i >= 0; i--) {
            JsonNode marks = layers.get(i).part("landmarks");
            marks.fieldNames()
                    .forEachRemaining(key -> landmarks.put(
                            Landmark.ofKey(key).orElseThrow(),
                            marks.get(key).textValue().strip()));
            JsonNode groups = layers.get(i).part("clusters");
            groups.fieldNames()
                    .forEachRemaining(key -> clusters.put(Segment.ofKey(key).orElseThrow(), labels(groups.get(key))));
        }
        return new MarkerSet(landmarks, clusters);
    }

    Place landmark(Landmark landmark) {
        return at("/landmarks/" + landmark.key());
    }

    Place cluster(Segment segment) {
        return at("/clusters/" + segment.key());
    }

    /** Where the nearest layer stands. */
    Place place() {
        return layers.get(0).at("");
    }

    private Place at(String key) {
        return layers.stream()
                .filter(layer -> layer.has(key))
                .findFirst()
                .orElse(layers.get(0))
                .at(key);
    }

    private static List<String> labels(JsonNode cluster) {
        List<String> labels = new ArrayList<>();
        cluster.forEach(label -> labels.add(label.textValue().strip()));
        return labels;
    }
}
