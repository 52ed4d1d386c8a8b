package treadwork.model.load;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.model.finding.Finding;
import treadwork.model.study.LabAxis;

/**
 * Everything that was computed for one trial.
 *
 * @param firstFrame the capture's own number of the first frame
 * @param frames     how many; every series has this length
 * @param pointRate  Hz
 * @param up         the lab axis that points up
 * @param joints     the solved joints, right before left, from ankle to hip
 * @param support    a frame, for each solved side
 * @param contacts   in the order of their beginning
 * @param segments   the solved segments
 */
public record TrialResult(
        int firstFrame,
        int frames,
        double pointRate,
        LabAxis up,
        List<JointLoads> joints,
        Map<Side, List<Support>> support,
        List<ContactSeries> contacts,
        List<SegmentSheet> segments,
        List<Finding> findings) {

    public TrialResult {
        joints = List.copyOf(joints);
        EnumMap<Side, List<Support>> copy = new EnumMap<>(Side.class);
        support.forEach((side, series) -> copy.put(side, List.copyOf(series)));
        support = Collections.unmodifiableMap(copy);
        contacts = List.copyOf(contacts);
        segments = List.copyOf(segments);
        findings = List.copyOf(findings);
    }

    /** Seconds from the capture's first frame to that with index {@code i}, counted from 0. */
    public double timeOf(int i) {
        return i / pointRate;
    }
}
