package treadwork.solver.draft;

import java.util.List;
import treadwork.model.body.Segment;

/**
 * Markers that may move with a segment.
 *
 * @param isSure whether they are to be used unless a person objects
 * @param why    for a person, without a full stop
 */
public record ClusterGuess(Segment segment, List<String> labels, boolean isSure, String why) {

    public ClusterGuess {
        labels = List.copyOf(labels);
    }
}
