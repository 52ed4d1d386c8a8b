package treadwork.solver.proof;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import treadwork.model.body.Gravity;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateLoads;

/** Where a plate stands and how it lies, from a rod that was pressed on it and tilted. */
public final class RodTest {

    private RodTest() {}

    /**
     * Evaluates one capture.
     *
     * @param plates the capture's own, or those given in their place
     * @param number of the plate that the rod was pressed on, counted from 1
     * @throws treadwork.model.finding.UnusableInputException where the capture does not allow it
     */
    public static RodResult of(Capture capture, List<Plate> plates, int number, LabAxis up, Rod rod) {
        RodCourse course = RodCourse.of(capture, rod.markers());
        PlateLoads loads = ProvedLoad.resolve(capture, plates, up);
        PlateLoad load = ProvedLoad.of(loads, number, plates.size(), capture.name());
        PressedFrames pressed = PressedFrames.of(capture, load, course);
        RodTip tip = rod.tip().isPresent()
                ? RodTip.stated(course, pressed, rod.tip().getAsDouble())
                : RodTip.byTurning(course, pressed, capture.name() + ", plate " + number);
        List<RodFrame> frames = frames(capture, load, course, pressed, tip.distance());
        double lift = (1 - rod.centre()) * rod.massKg() * Gravity.ACCELERATION;
        PlacementFit.Model model = new PlacementFit.Model(plates.get(number - 1).centre(), up.direction(), lift);
        PlacementFit fit = PlacementFit.of(frames, model);
        return new RodResult(
                number,
                frames.size(),
                pressed.places().size(),
                tip.distance(),
                tip.error(),
                components(fit, fit.placement().moved(), 0),
                components(fit, fit.placement().turnVector(), 3),
                miss(RodMisfit.of(frames, model, Placement.NONE)),
                miss(RodMisfit.of(frames, model, fit.placement())),
                moved(plates.get(number - 1), fit.placement()),
                ProvedLoad.findings(loads, number));
    }

    private static List<RodFrame> frames(
            Capture capture, PlateLoad load, RodCourse course, PressedFrames pressed, double tip) {
        List<RodFrame> frames = new ArrayList<>();
        for (int i : pressed.all()) {
            int sample = i * capture.samplesPerFrame();
            Vector3 force = load.raw().force().at(sample);
            Vector3 moment = load.raw().moment().at(sample);
            if (!force.isGap() && !moment.isGap()) {
                frames.add(new RodFrame(course.tip(i, tip), course.axis().at(i), force, moment));
            }
        }
        return frames;
    }

    private static List<RodResult.Component> components(PlacementFit fit, Vector3 values, int from) {
        double[] three = {values.x(), values.y(), values.z()};
        List<RodResult.Component> components = new ArrayList<>();
        for (int k = 0; k < three.length; k++) {
            boolean known = fit.known().get(from + k);
            components.add(new RodResult.Component(
                    known ? OptionalDouble.of(three[k]) : OptionalDouble.empty(),
                    fit.errors().get(from + k)));
        }
        return components;
    }

    private static RodResult.Miss miss(RodMisfit misfit) {
        return new RodResult.Miss(misfit.distance(), misfit.angle());
    }

    private static Plate moved(Plate plate, Placement placement) {
        Vector3 centre = plate.centre();
        return new Plate(
                plate.type(),
                plate.corners().stream()
                        .map(corner -> placement.of(corner, centre))
                        .toList(),
                plate.origin(),
                plate.channels(),
                plate.calibration(),
                plate.channelUnit());
    }
}
