package treadwork.solver.draft;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.capture.Capture;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.model.study.MarkerSet;

/**
 * A first marker map, for a person to correct.
 *
 * @param up        which axis of the lab
 * @param remarks   on up, front and sides, a sentence each
 * @param statureM  of the body that fits best; a rough guess, m
 * @param landmarks those that a marker was found for
 * @param clusters  those with three markers or more
 * @param unmapped  labels of the standing capture that are neither
 */
public record MarkerDraft(
        LabAxis up,
        boolean isUpFromPlates,
        List<String> remarks,
        double statureM,
        List<Guess> landmarks,
        List<ClusterGuess> clusters,
        List<String> unmapped) {

    public MarkerDraft {
        remarks = List.copyOf(remarks);
        landmarks = List.copyOf(landmarks);
        clusters = List.copyOf(clusters);
        unmapped = List.copyOf(unmapped);
    }

    /**
     * From geometry alone.
     *
     * @param movements of the same person; those that share the standing capture's labels count
     */
    public static MarkerDraft of(Capture standing, List<Capture> movements) {
        Upright upright = Upright.of(standing, movements);
        Vector3 up = upright.axis().direction();
        Map<String, Vector3> places = Places.medians(standing);
        Optional<Vector3> travel = Travel.inStanding(places, movements, up);
        StandingBody body = StandingBody.of(places, up, travel);
        Anatomy anatomy = Anatomy.of(body.spots());
        boolean tellsSides = body.facing().tellsSides();
        List<Guess> landmarks = new LandmarkGuesses(anatomy, tellsSides).all();
        List<ClusterGuess> clusters = new ClusterGuesses(anatomy, new Rigidity(movements), landmarks).all();
        return new MarkerDraft(
                upright.axis(),
                upright.isFromPlates(),
                List.of(remark(upright), remark(body.facing())),
                anatomy.stature(),
                landmarks,
                clusters,
                unmapped(standing, landmarks, clusters));
    }

    /** What is sure of it. */
    public MarkerSet sure() {
        Map<Landmark, String> marks =
                landmarks.stream().filter(Guess::isSure).collect(Collectors.toMap(Guess::landmark, Guess::label));
        Map<Segment, List<String>> sets = clusters.stream()
                .filter(ClusterGuess::isSure)
                .collect(Collectors.toMap(ClusterGuess::segment, ClusterGuess::labels));
        return new MarkerSet(marks, sets);
    }

    private static List<String> unmapped(Capture standing, List<Guess> landmarks, List<ClusterGuess> clusters) {
        Set<String> left = new LinkedHashSet<>();
        standing.points().forEach(point -> left.add(point.label()));
        landmarks.forEach(guess -> left.remove(guess.label()));
        clusters.forEach(guess -> guess.labels().forEach(left::remove));
        return new ArrayList<>(left);
    }

    private static String remark(Upright upright) {
        return upright.isFromPlates()
                ? "Up is " + upright.axis().key() + ", since the markers are above the plates."
                : "Up is taken to be " + upright.axis().key()
                        + ", the way in which the standing body is tallest and away from what stops and goes.";
    }

    private static String remark(StandingBody.Facing facing) {
        return switch (facing) {
            case TRAVEL_AND_FEET ->
                "Right and left are told from the direction of travel; the feet point the same way.";
            case TRAVEL -> "Right and left are told from the direction of travel; the feet do not show it.";
            case FEET ->
                "Right and left are told from the way the feet point; nothing travels far enough to confirm it.";
            case CONTRADICTORY ->
                "The feet point against the direction of travel, so right and left are not told apart: is it a walk"
                        + " backwards? Then exchange them before use.";
            case UNKNOWN ->
                "Neither travel nor feet show which way the body faces, so right and left are not told apart.";
        };
    }
}
