package treadwork.io.study;

import java.util.List;

/**
 * A marker map as it was guessed, for a person to correct.
 *
 * @param remarks   on the whole
 * @param landmarks a label each
 * @param clusters  labels each
 * @param unmapped  labels that are neither
 */
public record MarkersDraft(List<String> remarks, List<Line> landmarks, List<Line> clusters, List<String> unmapped) {

    public MarkersDraft {
        remarks = List.copyOf(remarks);
        landmarks = List.copyOf(landmarks);
        clusters = List.copyOf(clusters);
        unmapped = List.copyOf(unmapped);
    }

    /**
     * A key and the labels guessed for it.
     *
     * @param isUsed  else written commented out
     * @param comment what was guessed, why, how sure
     */
    public record Line(String key, List<String> labels, boolean isUsed, String comment) {

        public Line {
            labels = List.copyOf(labels);
        }
    }
}
