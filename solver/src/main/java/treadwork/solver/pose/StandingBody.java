package treadwork.solver.pose;

import java.util.Collections;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Joint;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Vector3;
import treadwork.model.study.BodySettings;
import treadwork.model.study.MarkerSet;

/**
 * The subject's segments and joint centres, measured in a standing capture.
 *
 * @param segments   those whose cluster is mapped
 * @param joints     those of which both segments are, right before left, from ankle to hip; the centre in axes of the
 *                   proximal segment, m: it is a landmark of that bone
 * @param pelvis     where a hip centre was regressed or the pelvis is tracked
 * @param legLengths of the sides whose hip regression used one, as the rule defines it, m
 * @param hipCentre  where the hip centres come from, for the result sheet; empty where no thigh is built
 * @param findings   what was noticed
 */
public record StandingBody(
        Map<Segment, SegmentGeometry> segments,
        Map<Joint, Vector3> joints,
        Optional<PelvisSize> pelvis,
        Map<Side, Double> legLengths,
        String hipCentre,
        List<Finding> findings) {

    public StandingBody {
        segments = ordered(Segment.class, segments);
        joints = Collections.unmodifiableMap(new LinkedHashMap<>(joints));
        legLengths = ordered(Side.class, legLengths);
        findings = List.copyOf(findings);
    }

    /**
     * Builds every segment that the marker set gives a cluster. Each landmark and cluster marker stands at its median over
     * the frames, gaps left out.
     *
     * @throws UnusableInputException where a label, a landmark or a cluster that a segment needs is missing or does not fix
     *     it; the finding names file, label and segment
     */
    public static StandingBody measure(Capture standing, MarkerSet set, BodySettings settings) {
        return new StandingMeasurement(new StandingMarkers(standing, set), settings).body();
    }

    private static <K extends Enum<K>, V> Map<K, V> ordered(Class<K> keys, Map<K, V> map) {
        EnumMap<K, V> copy = new EnumMap<>(keys);
        copy.putAll(map);
        return Collections.unmodifiableMap(copy);
    }
}
