package treadwork.solver.run;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Segment;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.Trial;
import treadwork.solver.filter.ClusterFilling;
import treadwork.solver.filter.FilledCluster;
import treadwork.solver.filter.FilledGap;
import treadwork.solver.filter.RunEnds;
import treadwork.solver.filter.Smoothed;
import treadwork.solver.filter.Smoothing;
import treadwork.solver.marker.MarkerCluster;
import treadwork.solver.marker.MarkerScreen;
import treadwork.solver.pose.MarkerCourses;
import treadwork.solver.pose.SegmentGeometry;
import treadwork.solver.pose.SegmentMotion;
import treadwork.solver.pose.StandingBody;

/**
 * The subject's segments in motion: gaps filled, markers smoothed, segments fitted to them.
 *
 * @param courses   of each segment's markers, as recorded but for what is surely not their own place
 * @param motions   of every segment of the standing body
 * @param endFrames how many frames next to a gap or an end of the record have no sound acceleration, by segment
 * @param findings  what was filled, what stays blank
 */
record TrackedBody(
        Map<Segment, List<VectorSeries>> courses,
        Map<Segment, SegmentMotion> motions,
        Map<Segment, Integer> endFrames,
        List<Finding> findings) {

    TrackedBody {
        motions = Collections.unmodifiableMap(new EnumMap<>(motions));
        endFrames = Collections.unmodifiableMap(new EnumMap<>(endFrames));
        findings = List.copyOf(findings);
    }

    static TrackedBody track(Capture movement, Trial trial, StandingBody body) {
        Map<Segment, SegmentMotion> motions = new EnumMap<>(Segment.class);
        Map<Segment, Integer> endFrames = new EnumMap<>(Segment.class);
        List<Finding> findings = new ArrayList<>();
        MarkerScreen screen = screened(movement, trial, body);
        findings.addAll(screen.findings());
        for (SegmentGeometry geometry : body.segments().values()) {
            Segment segment = geometry.segment();
            FilledCluster filled = filled(screen.courses().get(segment), trial, movement);
            report(filled, movement, segment, trial.markerSet().clusters().get(segment), findings);
            List<Smoothed> smoothed = filled.markers().stream()
                    .map(marker -> Smoothing.smooth(marker, trial.processing().markerFilter(), movement.pointRate()))
                    .toList();
            List<VectorSeries> markers = smoothed.stream().map(Smoothed::series).toList();
            motions.put(segment, SegmentMotion.of(geometry, markers, movement.pointRate()));
            endFrames.put(segment, endFrames(smoothed, movement.pointRate()));
        }
        ends(movement, endFrames).ifPresent(findings::add);
        return new TrackedBody(screen.courses(), motions, endFrames, findings);
    }

    private static MarkerScreen screened(Capture movement, Trial trial, StandingBody body) {
        List<MarkerCluster> clusters = new ArrayList<>();
        for (SegmentGeometry geometry : body.segments().values()) {
            Segment segment = geometry.segment();
            List<String> labels = trial.markerSet().clusters().get(segment);
            List<VectorSeries> courses = labels.stream()
                    .map(label -> MarkerCourses.find(movement, label, "cluster " + segment.key()))
                    .toList();
            clusters.add(new MarkerCluster(segment, labels, geometry.cluster(), courses));
        }
        return MarkerScreen.of(
                clusters,
                new MarkerScreen.Recording(
                        movement.name(), movement.firstFrame(), movement.pointRate(), trial.exchanged()));
    }

    private static FilledCluster filled(List<VectorSeries> markers, Trial trial, Capture movement) {
        long longestGap = Math.round(trial.processing().longestGapS() * movement.pointRate());
        return ClusterFilling.fill(markers, (int) Math.min(longestGap, movement.frames()));
    }

    private static int endFrames(List<Smoothed> markers, double rate) {
        return markers.stream()
                .mapToInt(marker -> RunEnds.frames(marker.cutoffHz(), rate))
                .max()
                .orElse(0);
    }

    private static Optional<Finding> ends(Capture movement, Map<Segment, Integer> endFrames) {
        int most = Collections.max(endFrames.values());
        if (most == 0) {
            return Optional.empty();
        }
        return Optional.of(new Finding(
                "filter-ends",
                Severity.NOTE,
                movement.name(),
                "up to " + most + " frames at both ends of the record and of each stretch with markers have no loads",
                "Accelerations there would rest on what the filter makes up beyond the end",
                "Record a moment more before and after the movement if these frames matter"));
    }

    private static void report(
            FilledCluster filled, Capture movement, Segment segment, List<String> labels, List<Finding> findings) {
        for (int marker = 0; marker < labels.size(); marker++) {
            int place = marker;
            List<FilledGap> gaps = filled.gaps().stream()
                    .filter(gap -> gap.marker() == place && gap.kind() == FilledGap.Kind.CLUSTER)
                    .toList();
            if (!gaps.isEmpty()) {
                findings.add(bridged(movement, segment, labels.get(marker), gaps));
            }
        }
    }

    private static Finding bridged(Capture movement, Segment segment, String label, List<FilledGap> gaps) {
        int frames = gaps.stream().mapToInt(FilledGap::length).sum();
        FilledGap longest = Collections.max(gaps, Comparator.comparingInt(FilledGap::length));
        return new Finding(
                "marker-gap",
                Severity.NOTE,
                movement.name() + ", marker \"" + label + "\", " + segment.key(),
                String.format(
                        Locale.ROOT,
                        "%d frames in %d gaps are longer than processing.longestGapS or at an end; the longest is frames"
                                + " %d to %d",
                        frames,
                        gaps.size(),
                        movement.firstFrame() + longest.from(),
                        movement.firstFrame() + longest.to() - 1),
                "They are filled from the other markers of the segment, so skin motion of this marker is not seen there",
                "Nothing needs mending, unless the marker could have been tracked",
                true);
    }
}
