package treadwork.solver.contact;

import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.space.Axes;
import treadwork.model.space.Plane;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.Wrench;
import treadwork.model.space.WrenchSeries;
import treadwork.model.study.ContactRule;
import treadwork.model.study.LabAxis;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlateTop;

/** Feet that a test sets down and lifts, and plates whose loads it writes. 2 s at 100 Hz, 10 samples a frame, z up, frames from 21. */
final class Stage {

    static final int FIRST_FRAME = 21;
    static final int FRAMES = 200;
    static final int SAMPLES_PER_FRAME = 10;
    static final Vector3 UP = new Vector3(0, 0, 1);

    /** Where the lab's floor is, m: not at zero. */
    static final double FLOOR = -0.023;

    private Stage() {}

    static Capture capture() {
        return new Capture(
                "stage.c3d",
                FIRST_FRAME,
                FRAMES,
                100,
                List.of(),
                SAMPLES_PER_FRAME,
                List.of(),
                List.of(),
                Optional.empty(),
                List.of(),
                LengthUnit.M,
                "made by the test",
                List.of());
    }

    /**
     * A foot 250 mm long that points along x. Its heel is where {@code heel} says, a frame; the other points keep level.
     */
    static FootOutline foot(Side side, IntFunction<Vector3> heel) {
        double out = side == Side.RIGHT ? -1 : 1;
        return new FootOutline(
                side,
                moved(heel, new Vector3(0, 0, 0.03)),
                moved(heel, new Vector3(0.17, 0.05 * out, 0.015)),
                moved(heel, new Vector3(0.25, 0, 0.02)),
                moved(heel, new Vector3(0.18, -0.04 * out, 0.02)));
    }

    private static VectorSeries moved(IntFunction<Vector3> heel, Vector3 offset) {
        VectorSeries.Builder course = new VectorSeries.Builder(FRAMES);
        for (int i = 0; i < FRAMES; i++) {
            course.set(i, heel.apply(i).plus(offset));
        }
        return course.build();
    }

    /** Stands at (x, y) on the floor throughout. */
    static IntFunction<Vector3> standingAt(double x, double y) {
        return i -> new Vector3(x, y, FLOOR);
    }

    /** Stands at one place until frame {@code from}, and from frame {@code to} on at another; between it swings, 60 mm high. */
    static IntFunction<Vector3> swingingFrom(
            IntFunction<Vector3> before, IntFunction<Vector3> after, int from, int to) {
        return i -> {
            if (i <= from || i >= to) {
                return i <= from ? before.apply(i) : after.apply(i);
            }
            double share = (double) (i - from) / (to - from);
            Vector3 lift = UP.times(0.06 * Math.sin(Math.PI * share));
            return before.apply(i)
                    .times(1 - share)
                    .plus(after.apply(i).times(share))
                    .plus(lift);
        };
    }

    /** A plate 0.5 m by 0.4 m with its middle at (x, y). */
    static PlateLoad plate(int number, double x, double y, IntFunction<Wrench> load) {
        return plate(number, new Vector3(x, y, FLOOR), load, Double.NaN);
    }

    static PlateLoad plate(int number, Vector3 centre, IntFunction<Wrench> load, double cutoffHz) {
        PlateTop top = new PlateTop(
                List.of(
                        centre.plus(new Vector3(0.25, 0.2, 0)),
                        centre.plus(new Vector3(-0.25, 0.2, 0)),
                        centre.plus(new Vector3(-0.25, -0.2, 0)),
                        centre.plus(new Vector3(0.25, -0.2, 0))),
                new Plane(centre, UP));
        VectorSeries.Builder force = new VectorSeries.Builder(FRAMES * SAMPLES_PER_FRAME);
        VectorSeries.Builder moment = new VectorSeries.Builder(FRAMES * SAMPLES_PER_FRAME);
        for (int i = 0; i < FRAMES * SAMPLES_PER_FRAME; i++) {
            Wrench about = load.apply(i).about(centre);
            force.set(i, about.force());
            moment.set(i, about.moment());
        }
        WrenchSeries raw = new WrenchSeries(centre, force.build(), moment.build());
        return new PlateLoad(number, top, raw, raw, cutoffHz);
    }

    /** 700 N up, some shear and a free moment, at (x, y) on the floor. */
    static Wrench loadAt(double x, double y) {
        return new Wrench(Axes.LAB, new Vector3(x, y, FLOOR), new Vector3(40, -25, 700), UP.times(2.5));
    }

    static Wrench nothing() {
        return new Wrench(Axes.LAB, Vector3.ZERO, Vector3.ZERO, Vector3.ZERO);
    }

    /** {@code load} in the samples of these frames, counted from 0, both included. */
    static IntFunction<Wrench> during(int from, int to, Wrench load) {
        return i -> i >= from * SAMPLES_PER_FRAME && i < (to + 1) * SAMPLES_PER_FRAME ? load : nothing();
    }

    static Contacts find(List<PlateLoad> plates, FootOutline... feet) {
        return find(plates, Optional.empty(), feet);
    }

    static Contacts find(List<PlateLoad> plates, Optional<List<ContactRule>> rules, FootOutline... feet) {
        return Contacts.find(capture(), plates, List.of(feet), new ContactSettings(LabAxis.PLUS_Z, 20, rules));
    }
}
