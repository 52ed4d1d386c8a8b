package treadwork.solver.faults;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.UnaryOperator;
import treadwork.fixtures.fault.MarkerFaults;
import treadwork.fixtures.fault.PlateFaults;
import treadwork.fixtures.fault.SetupFaults;
import treadwork.fixtures.walker.Disturbance;
import treadwork.fixtures.walker.WalkerSettings;
import treadwork.model.body.Landmark;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.capture.FrameRange;
import treadwork.model.space.Vector3;
import treadwork.model.study.FilterSettings;
import treadwork.model.study.Processing;

/** The mistakes that are planted, in the sizes that are swept; in the middle of the walk, where all is measured. */
final class FaultCatalogue {

    private FaultCatalogue() {}

    static List<PlantedFault> all() {
        List<PlantedFault> faults = new ArrayList<>();
        faults.addAll(clock());
        faults.addAll(place());
        faults.addAll(mass());
        faults.addAll(description());
        faults.addAll(channels());
        faults.addAll(markers());
        faults.addAll(body());
        faults.addAll(settings());
        return faults;
    }

    private static List<PlantedFault> clock() {
        List<PlantedFault> faults = new ArrayList<>();
        for (int ms : new int[] {10, 15, 20, 30, 60}) {
            faults.add(recorded("clock-shift", ms + " ms", ms == 20, (disturbance, random) -> {
                double sign = random.nextBoolean() ? 1 : -1;
                return disturbance.withClockShift(sign * 1e-3 * ms);
            }));
        }
        return faults;
    }

    private static List<PlantedFault> place() {
        List<PlantedFault> faults = new ArrayList<>();
        for (int mm : new int[] {10, 15, 20, 30}) {
            faults.add(recorded("plate-place", "one plate " + mm + " mm off", mm == 20, (disturbance, random) -> {
                double way = 2 * Math.PI * random.nextDouble();
                Vector3 off = new Vector3(Math.cos(way), Math.sin(way), 0).times(1e-3 * mm);
                return disturbance.withMisplaced(Map.of(middlePlate(random), off));
            }));
        }
        return faults;
    }

    private static List<PlantedFault> mass() {
        List<PlantedFault> faults = new ArrayList<>();
        for (int percent : new int[] {4, 6, 8, 15}) {
            faults.add(made("mass-mismatch", percent + " % of the mass", percent == 8, walk -> {
                double sign = walk.random().nextBoolean() ? 1 : -1;
                return walk.withMassKg(walk.massKg() * (1 + sign * percent / 100.0));
            }));
        }
        return faults;
    }

    private static List<PlantedFault> description() {
        return List.of(
                onPlate("plate-turned", "a quarter turn", (capture, plate) -> SetupFaults.turned(capture, plate, 1)),
                onPlate("plate-turned", "half a turn", (capture, plate) -> SetupFaults.turned(capture, plate, 2)),
                onPlate("plate-turned", "corners the other way round", SetupFaults::mirrored),
                onPlate("plate-origin", "sign of the sensors' depth lost", SetupFaults::originTurned),
                onPlate(
                        "plate-swapped",
                        "channels of two neighbours exchanged",
                        (capture, plate) -> SetupFaults.exchanged(capture, plate, plate + 1)),
                onPlate(
                        "foot-off-plate",
                        "plate stated at 0.3 of its sides",
                        (capture, plate) -> SetupFaults.shrunk(capture, plate, 0.3)));
    }

    private static List<PlantedFault> channels() {
        List<PlantedFault> faults = new ArrayList<>();
        faults.add(onPlate("plate-sign", "all channels of the other sign", (capture, plate) -> {
            Capture turned = capture;
            for (int channel : capture.plates().get(plate - 1).channels()) {
                turned = PlateFaults.signTurned(turned, channel);
            }
            return turned;
        }));
        faults.add(onPlate(
                "plate-dead",
                "vertical force dead",
                (capture, plate) -> PlateFaults.dead(capture, channel(capture, plate, 2))));
        faults.add(onPlate(
                "plate-clipped",
                "vertical force clipped at 500 N",
                (capture, plate) -> PlateFaults.clipped(capture, channel(capture, plate, 2), 500)));
        for (int newtons : new int[] {3, 5, 10}) {
            faults.add(made(
                    "plate-noise",
                    "vertical force with " + newtons + " N of noise",
                    newtons == 10,
                    walk -> walk.withWalking(PlateFaults.noisy(
                            walk.walking(),
                            channel(walk.walking(), middlePlate(walk.random()), 2),
                            newtons,
                            walk.random()))));
        }
        for (int newtons : new int[] {2, 5, 10}) {
            faults.add(made(
                    "plate-drift",
                    newtons + " N/s of vertical force",
                    newtons == 10,
                    walk -> walk.withWalking(
                            PlateFaults.drifting(walk.walking(), middlePlate(walk.random()), newtons))));
        }
        faults.add(onPlate(
                "unit-mismatch",
                "forces ten times too large",
                (capture, plate) -> PlateFaults.forcesScaled(capture, plate, 10)));
        faults.add(onPlate(
                "unit-mismatch",
                "moments a thousand times too small",
                (capture, plate) -> PlateFaults.momentsScaled(capture, plate, 1e-3)));
        return faults;
    }

    private static List<PlantedFault> markers() {
        List<PlantedFault> faults = new ArrayList<>();
        for (double seconds : new double[] {0.05, 0.2, 1}) {
            faults.add(made("marker-swap", "two shank markers for " + seconds + " s", seconds == 0.2, walk -> {
                List<String> shank = walk.walkingSet().clusters().get(segment(walk.random(), SegmentKind.SHANK));
                int first = walk.random().nextInt(shank.size());
                int other = (first + 1 + walk.random().nextInt(shank.size() - 1)) % shank.size();
                return walk.withWalking(MarkerFaults.swapped(
                        walk.walking(), shank.get(first), shank.get(other), stretch(walk, seconds)));
            }));
        }
        faults.add(made("marker-swap", "markers of both shanks, each for 0.2 s", true, walk -> {
            Capture swapped = walk.walking();
            for (Segment shank : List.of(Segment.RIGHT_SHANK, Segment.LEFT_SHANK)) {
                List<String> labels = walk.walkingSet().clusters().get(shank);
                swapped = MarkerFaults.swapped(swapped, labels.get(0), labels.get(2), stretch(walk, 0.2));
            }
            return walk.withWalking(swapped);
        }));
        faults.add(made("marker-swap", "a shank and a thigh marker for 0.2 s", true, walk -> {
            Side side = walk.random().nextBoolean() ? Side.RIGHT : Side.LEFT;
            List<String> shank = walk.walkingSet().clusters().get(Segment.of(SegmentKind.SHANK, side));
            List<String> thigh = walk.walkingSet().clusters().get(Segment.of(SegmentKind.THIGH, side));
            return walk.withWalking(MarkerFaults.swapped(
                    walk.walking(),
                    shank.get(walk.random().nextInt(shank.size())),
                    thigh.get(walk.random().nextInt(thigh.size())),
                    stretch(walk, 0.2)));
        }));
        for (int mm : new int[] {20, 40}) {
            faults.add(made(
                    "marker-noise",
                    "one frame " + mm + " mm off",
                    mm == 40,
                    walk -> walk.withWalking(
                            MarkerFaults.spiked(walk.walking(), anyMarker(walk), 300, 1e-3 * mm, walk.random()))));
        }
        for (int mm : new int[] {2, 4}) {
            faults.add(made(
                    "marker-noise",
                    mm + " mm of jitter",
                    mm == 4,
                    walk -> walk.withWalking(
                            MarkerFaults.jittering(walk.walking(), anyMarker(walk), 1e-3 * mm, walk.random()))));
        }
        for (int mm : new int[] {15, 20, 30}) {
            faults.add(made("cluster-shape", "a marker slipped by " + mm + " mm after standing", mm == 30, walk -> {
                double way = 2 * Math.PI * walk.random().nextDouble();
                Vector3 slip = new Vector3(0.5 * Math.cos(way), 0.5 * Math.sin(way), Math.sqrt(0.75));
                return walk.withStanding(
                        MarkerFaults.displaced(walk.standing(), anyMarker(walk), slip.times(1e-3 * mm)));
            }));
        }
        return faults;
    }

    private static List<PlantedFault> body() {
        List<PlantedFault> faults = new ArrayList<>();
        for (int mm : new int[] {15, 30, 50}) {
            faults.add(made(
                    "static-moving",
                    "standing person sways by " + mm + " mm",
                    mm == 30,
                    walk -> walk.withStanding(
                            MarkerFaults.swaying(walk.standing(), new Vector3(0.8, 0.6, 0).times(1e-3 * mm)))));
        }
        faults.add(made(
                "unit-mismatch",
                "lengths ten times too large",
                true,
                walk -> walk.withStanding(MarkerFaults.scaled(walk.standing(), 10))
                        .withWalking(MarkerFaults.scaled(walk.walking(), 10))));
        faults.add(made(
                "landmark-side",
                "left and right labels exchanged",
                true,
                walk -> walk.withMarkerSet(MarkerFaults.sidesExchanged(walk.standingSet()))));
        faults.add(made(
                "landmark-order",
                "inner and outer epicondyle exchanged",
                true,
                walk -> walk.withMarkerSet(MarkerFaults.landmarksExchanged(
                        walk.standingSet(), Landmark.RIGHT_LATERAL_EPICONDYLE, Landmark.RIGHT_MEDIAL_EPICONDYLE))));
        for (int mm : new int[] {50, 100}) {
            faults.add(made("joint-gap", "shank markers moved by " + mm + " mm", mm == 100, walk -> {
                Capture moved = walk.standing();
                for (String label : walk.standingSet().clusters().get(Segment.RIGHT_SHANK)) {
                    moved = MarkerFaults.displaced(moved, label, new Vector3(0, 0, 1e-3 * mm));
                }
                return walk.withStanding(moved);
            }));
        }
        faults.add(onPlate(
                "out-of-range",
                "forces and moments twice too large",
                (capture, plate) -> PlateFaults.momentsScaled(PlateFaults.forcesScaled(capture, plate, 2), plate, 2)));
        return faults;
    }

    private static List<PlantedFault> settings() {
        List<PlantedFault> faults = new ArrayList<>();
        for (int hz : new int[] {10, 50}) {
            faults.add(made("filter-unlike", "plates at " + hz + " Hz, markers at 6 Hz", true, walk -> {
                Processing like = walk.processing();
                FilterSettings plates = new FilterSettings(FilterSettings.Kind.BUTTERWORTH, hz, 4);
                return walk.withProcessing(new Processing(
                        like.markerFilter(), plates, like.longestGapS(), like.contactThresholdN(), like.plateZero()));
            }));
        }
        for (int hz : new int[] {60, 40, 25}) {
            faults.add(new PlantedFault(
                    "rate-low",
                    "recorded at " + hz + " Hz",
                    hz == 25,
                    settings -> settings.with(settings.gait().withPointRate(hz)),
                    UnaryOperator.identity()));
        }
        return faults;
    }

    private static Segment segment(Random random, SegmentKind kind) {
        return Segment.of(kind, random.nextBoolean() ? Side.RIGHT : Side.LEFT);
    }

    private static String anyMarker(NoisyWalk walk) {
        SegmentKind kind = walk.random().nextBoolean() ? SegmentKind.SHANK : SegmentKind.THIGH;
        List<String> cluster = walk.walkingSet().clusters().get(segment(walk.random(), kind));
        return cluster.get(walk.random().nextInt(cluster.size()));
    }

    private static FrameRange stretch(NoisyWalk walk, double seconds) {
        int frames = (int) Math.round(seconds * walk.walking().pointRate());
        int first = 200 + walk.random().nextInt(200);
        return new FrameRange(first, first + frames - 1);
    }

    private static int channel(Capture capture, int plate, int place) {
        return capture.plates().get(plate - 1).channels().get(place);
    }

    /** One of those that are stepped on from beginning to end. */
    private static int middlePlate(Random random) {
        return 3 + random.nextInt(3);
    }

    private interface OfDisturbance {
        Disturbance change(Disturbance disturbance, Random random);
    }

    private interface OfPlate {
        Capture change(Capture capture, int plate);
    }

    private static PlantedFault recorded(String code, String what, boolean matters, OfDisturbance change) {
        UnaryOperator<WalkerSettings> setting = settings -> settings.with(change.change(
                settings.disturbance(), new Random(settings.figure().seed())));
        return new PlantedFault(code, what, matters, setting, UnaryOperator.identity());
    }

    private static PlantedFault made(String code, String what, boolean matters, UnaryOperator<NoisyWalk> change) {
        return new PlantedFault(code, what, matters, UnaryOperator.identity(), change);
    }

    private static PlantedFault onPlate(String code, String what, OfPlate change) {
        return made(
                code, what, true, walk -> walk.withWalking(change.change(walk.walking(), middlePlate(walk.random()))));
    }
}
