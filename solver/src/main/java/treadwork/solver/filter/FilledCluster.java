package treadwork.solver.filter;

import java.util.List;
import treadwork.model.space.VectorSeries;

/**
 * A segment's markers after filling.
 *
 * @param markers in the order given; a gap where a position cannot be known
 * @param gaps    all that was filled, by marker and frame
 */
public record FilledCluster(List<VectorSeries> markers, List<FilledGap> gaps) {

    public FilledCluster {
        markers = List.copyOf(markers);
        gaps = List.copyOf(gaps);
    }
}
