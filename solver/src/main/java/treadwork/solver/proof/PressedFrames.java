package treadwork.solver.proof;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.ScalarSeries;
import treadwork.solver.plate.PlateLoad;

/**
 * The frames in which the rod is seen and pressed, place by place.
 *
 * @param places stretches without a break in which the tip stays where it is; frames counted from 0
 */
record PressedFrames(List<List<Integer>> places) {

    /** As for a contact, N. */
    static final double LEAST_PUSH = 20;

    private static final int FEWEST = 20;

    static PressedFrames of(Capture capture, PlateLoad plate, RodCourse rod) {
        ScalarSeries push = plate.rawPush();
        List<List<Integer>> places = new ArrayList<>();
        List<Integer> place = new ArrayList<>();
        int count = 0;
        for (int i = 0; i < capture.frames(); i++) {
            boolean pressed = push.at(i * capture.samplesPerFrame()) >= LEAST_PUSH;
            if (pressed && !rod.axis().isGap(i)) {
                place.add(i);
                count++;
            }
            if (!pressed && !place.isEmpty()) {
                places.add(List.copyOf(place));
                place.clear();
            }
        }
        if (!place.isEmpty()) {
            places.add(List.copyOf(place));
        }
        if (count < FEWEST) {
            throw new UnusableInputException(tooFew(capture, plate, count));
        }
        return new PressedFrames(places);
    }

    private static Finding tooFew(Capture capture, PlateLoad plate, int count) {
        return new Finding(
                "rod-load",
                Severity.REFUSES,
                capture.name() + ", plate " + plate.number(),
                "the rod is seen and pressed with " + (int) LEAST_PUSH + " N or more in " + count + " frames, limit "
                        + FEWEST,
                "So little does not tell where the plate is",
                "Choose the plate that was pressed, and press with 100 to 300 N for some seconds at each place");
    }

    List<Integer> all() {
        return places.stream().flatMap(List::stream).toList();
    }
}
