package treadwork.solver.plate;

import java.util.Random;
import treadwork.fixtures.plate.PlateDesign;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Figure;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.PlatePlan;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PlateType;
import treadwork.model.study.LabAxis;
import treadwork.model.study.Processing;

/** Invented walks with the noise of a good laboratory, each another figure, gait and kind of plate. */
final class RecordedWalks {

    private static final PlateType[] TYPES = {
        PlateType.FORCE_AND_MOMENT, PlateType.FOUR_SENSORS, PlateType.CALIBRATED, PlateType.FORCE_AND_CENTRE_OF_PRESSURE
    };

    private RecordedWalks() {}

    /** How many a test looks at: the system property {@code walks}, or 24. */
    static int count() {
        return Integer.getInteger("walks", 24);
    }

    static PlateType type(int seed) {
        return TYPES[seed % TYPES.length];
    }

    static Capture walk(int seed) {
        return Walk.recording(settings(seed)).walking();
    }

    static Capture standing(int seed) {
        return Walk.standing(settings(seed));
    }

    /** Without noise and without levels. */
    static Capture exact(int seed) {
        return Walk.recording(settings(seed).with(Disturbance.NONE)).walking();
    }

    private static WalkerSettings settings(int seed) {
        Random random = new Random(seed);
        Figure figure = Figure.DEFAULT
                .withMassKg(52 + 45 * random.nextDouble())
                .withHeightM(1.55 + 0.38 * random.nextDouble())
                .withSeed(seed)
                .withMirrored(seed % 2 == 0);
        Gait gait = Gait.DEFAULT
                .withStrideS(0.95 + 0.4 * random.nextDouble())
                .withStrideRatio(0.66 + 0.13 * random.nextDouble())
                .withSeed(seed);
        PlatePlan plates = PlatePlan.DEFAULT
                .withDesigns(PlateDesign.of(type(seed)))
                .withSamplesPerFrame(seed % 3 == 0 ? 1 : 5)
                .withMost(4);
        Disturbance disturbance = Disturbance.NONE
                .withMarkerNoise(0.0005)
                .withSkinMotion(0.004)
                .withPlateNoise(1)
                .withPlateBaseline(5)
                .withSeed(seed);
        return WalkerSettings.DEFAULT.with(figure).with(gait).with(plates).with(disturbance);
    }

    static PlateLoads resolve(Capture capture) {
        return PlateLoads.resolve(capture, capture.plates(), LabAxis.PLUS_Z, Processing.DEFAULT);
    }
}
