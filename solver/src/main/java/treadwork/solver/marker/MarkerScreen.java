package treadwork.solver.marker;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Segment;
import treadwork.model.finding.Finding;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.Exchange;

/**
 * The movement's markers, with what is surely not the marker's own place taken as missing.
 *
 * @param courses  of each segment's cluster, in its order
 * @param findings what was taken out, and what is left doubtful
 */
public record MarkerScreen(Map<Segment, List<VectorSeries>> courses, List<Finding> findings) {

    public MarkerScreen {
        courses = Collections.unmodifiableMap(new EnumMap<>(courses));
        findings = List.copyOf(findings);
    }

    /** @param clusters of all tracked segments, from one capture */
    public static MarkerScreen of(List<MarkerCluster> clusters, Recording record) {
        List<Finding> findings = new ArrayList<>();
        Blanks blanks = new Blanks(clusters);
        List<Swap> swaps = SwapSearch.in(clusters);
        List<Exchange> exchanges = new ArrayList<>(record.exchanged());
        swaps.forEach(swap -> exchanges.addAll(swap.exchanges(record.firstFrame())));
        for (Swap swap : swaps) {
            findings.add(swap.finding(record, exchanges));
            blanks.add(swap.first(), swap.frames());
            blanks.add(swap.second(), swap.frames());
        }
        List<MarkerCluster> unswapped = blanks.applied();
        Blanks spikes = new Blanks(unswapped);
        for (MarkerCluster cluster : unswapped) {
            SpikeSearch.in(cluster, record, findings).forEach((place, frames) -> spikes.add(place, frames));
        }
        List<MarkerCluster> clean = spikes.applied();
        Map<Segment, List<VectorSeries>> courses = new EnumMap<>(Segment.class);
        for (MarkerCluster cluster : clean) {
            findings.addAll(JitterCheck.of(cluster, record));
            findings.addAll(ShapeCheck.of(cluster, record));
            courses.put(cluster.segment(), cluster.courses());
        }
        return new MarkerScreen(courses, findings);
    }

    /**
     * Which record the markers are of.
     *
     * @param rate      frames a second
     * @param exchanged what the study file has put right already
     */
    public record Recording(String name, int firstFrame, double rate, List<Exchange> exchanged) {

        public Recording {
            exchanged = List.copyOf(exchanged);
        }

        String where(MarkerCluster cluster, int marker) {
            return name + ", marker \"" + cluster.labels().get(marker) + "\", "
                    + cluster.segment().key();
        }
    }

    /** A marker's place in its cluster. */
    record MarkerPlace(MarkerCluster cluster, int marker) {

        String label() {
            return cluster.labels().get(marker);
        }
    }

    /** Frames that are taken out of markers. */
    private static final class Blanks {

        private final List<MarkerCluster> clusters;
        private final Map<Segment, BitSet[]> frames = new EnumMap<>(Segment.class);

        Blanks(List<MarkerCluster> clusters) {
            this.clusters = clusters;
        }

        void add(MarkerPlace place, BitSet more) {
            BitSet[] ofCluster = frames.computeIfAbsent(
                    place.cluster().segment(),
                    segment -> new BitSet[place.cluster().size()]);
            if (ofCluster[place.marker()] == null) {
                ofCluster[place.marker()] = new BitSet();
            }
            ofCluster[place.marker()].or(more);
        }

        List<MarkerCluster> applied() {
            return clusters.stream()
                    .map(cluster -> frames.containsKey(cluster.segment())
                            ? applied(cluster, frames.get(cluster.segment()))
                            : cluster)
                    .toList();
        }

        private static MarkerCluster applied(MarkerCluster cluster, BitSet[] out) {
            List<VectorSeries> courses = new ArrayList<>();
            for (int marker = 0; marker < cluster.size(); marker++) {
                VectorSeries course = cluster.courses().get(marker);
                BitSet frames = out[marker];
                courses.add(
                        frames == null
                                ? course
                                : course.eachComponent(values -> {
                                    frames.stream().forEach(i -> values[i] = Double.NaN);
                                    return values;
                                }));
            }
            return cluster.withCourses(courses);
        }
    }
}
