package treadwork.solver.faults;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.Figure;
import treadwork.fixtures.walker.Gait;
import treadwork.fixtures.walker.LabPlan;
import treadwork.fixtures.walker.Walk;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.io.inertia.InertiaTables;
import treadwork.model.capture.Capture;
import treadwork.model.study.InertiaTable;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MarkerSet;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;
import treadwork.solver.run.TrialInput;

/**
 * A walk with the noise of a good laboratory, in which a mistake can be planted: markers 0.5 mm, skin motion 4 mm, plates 1 N,
 * plate levels 5 N, filters of 6 Hz.
 *
 * @param standing   the captures as files would give them
 * @param processing of the trial
 * @param massKg     as stated
 * @param random     for what is drawn about the mistake
 */
record NoisyWalk(
        Walk walk,
        Capture standing,
        Capture walking,
        MarkerSet standingSet,
        MarkerSet walkingSet,
        Processing processing,
        double massKg,
        Random random) {

    private static final Disturbance NOISE = Disturbance.NONE
            .withMarkerNoise(0.0005)
            .withSkinMotion(0.004)
            .withPlateNoise(1)
            .withPlateBaseline(5);

    /** How a walk of that number is made: figure, gait and laboratory drawn from it. */
    static WalkerSettings settings(int seed) {
        Random random = new Random(7919L * seed + 1);
        Figure figure = Figure.DEFAULT
                .withMassKg(52 + 45 * random.nextDouble())
                .withHeightM(1.55 + 0.38 * random.nextDouble())
                .withMirrored(random.nextBoolean())
                .withSeed(seed);
        Gait gait = Gait.DEFAULT
                .withStrideS(0.98 + 0.25 * random.nextDouble())
                .withStrideRatio(0.68 + 0.11 * random.nextDouble())
                .withSeed(seed);
        LabPlan lab = LabPlan.DEFAULT.withHeadingRad(2 * Math.PI * random.nextDouble());
        return WalkerSettings.DEFAULT.with(figure).with(gait).with(lab).with(NOISE.withSeed(seed));
    }

    static NoisyWalk of(WalkerSettings settings) {
        Walk walk = Walk.of(settings);
        return new NoisyWalk(
                walk,
                walk.standing(),
                walk.walking(),
                walk.markerSet(),
                walk.markerSet(),
                Processing.DEFAULT,
                walk.massKg(),
                new Random(settings.figure().seed()));
    }

    NoisyWalk withWalking(Capture other) {
        return new NoisyWalk(walk, standing, other, standingSet, walkingSet, processing, massKg, random);
    }

    NoisyWalk withStanding(Capture other) {
        return new NoisyWalk(walk, other, walking, standingSet, walkingSet, processing, massKg, random);
    }

    NoisyWalk withMarkerSet(MarkerSet other) {
        return new NoisyWalk(walk, standing, walking, other, other, processing, massKg, random);
    }

    NoisyWalk withProcessing(Processing other) {
        return new NoisyWalk(walk, standing, walking, standingSet, walkingSet, other, massKg, random);
    }

    NoisyWalk withMassKg(double other) {
        return new NoisyWalk(walk, standing, walking, standingSet, walkingSet, processing, other, random);
    }

    TrialInput input() {
        Trial trial = new Trial(
                "walking.c3d",
                "",
                walkingSet,
                LabSettings.DEFAULT,
                walk.body(),
                processing,
                ResultSettings.DEFAULT,
                Optional.empty(),
                Optional.empty(),
                List.of());
        Subject subject = new Subject(
                "walker", massKg, Optional.empty(), Optional.empty(), "standing.c3d", standingSet, List.of(trial));
        return new TrialInput(standing, walking, subject, trial, InertiaTables.load(InertiaTable.DE_LEVA_1996));
    }
}
