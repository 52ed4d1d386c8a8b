package treadwork.solver.plate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.fixtures.fault.PlateFaults;
import treadwork.fixtures.plate.PlateChannels;
import treadwork.fixtures.plate.PlateDesign;
import treadwork.fixtures.rod.ProvedPlate;
import treadwork.fixtures.rod.WeightsCapture;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.LengthUnit;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;

/**
 * Faults planted in walks at the noise of a good laboratory, and the same walks without. The system property {@code walks}
 * says how many are looked at.
 */
class ChannelChecksTest {

    /** Of planted faults of a size that matters; the clean walks may not be accused at all. */
    private static final double FOUND = 0.98;

    private static final int PLATE = 2;

    private interface Fault {
        Capture in(Capture capture, int seed);
    }

    @Test
    void leavesCleanWalksAlone() {
        List<String> accused = new ArrayList<>();
        for (int seed = 0; seed < RecordedWalks.count(); seed++) {
            List<Capture> clean = List.of(
                    RecordedWalks.walk(seed),
                    inWholeSteps(RecordedWalks.walk(seed)),
                    RecordedWalks.standing(seed),
                    inWholeSteps(RecordedWalks.standing(seed)),
                    RecordedWalks.exact(seed),
                    inWholeSteps(RecordedWalks.exact(seed)));
            for (Capture walk : clean) {
                warnings(walk).forEach(finding -> accused.add(finding.line()));
            }
        }

        assertEquals(List.of(), accused);
    }

    @Test
    void findsAVerticalChannelThatIsClipped() {
        assertFound("plate-clipped", (walk, seed) -> clipped(walk, vertical(seed)));
    }

    @Test
    void findsAShearChannelThatIsClipped() {
        assertFound("plate-clipped", (walk, seed) -> clipped(walk, 0));
    }

    @Test
    void findsAClippedChannelOfWholeSteps() {
        assertFound("plate-clipped", (walk, seed) -> inWholeSteps(clipped(walk, vertical(seed))));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 5})
    void findsADeadChannel(int channel) {
        assertFound("plate-dead", (walk, seed) -> PlateFaults.dead(walk, place(walk, channel)));
    }

    /** Ten times what the other channels scatter by. */
    @ParameterizedTest
    @ValueSource(ints = {0, 2, 5})
    void findsANoisyChannel(int channel) {
        assertFound(
                "plate-noise",
                (walk, seed) -> PlateFaults.noisy(
                        walk,
                        place(walk, channel),
                        10
                                * new PlateChannels(PlateDesign.of(RecordedWalks.type(seed)), LengthUnit.MM)
                                        .disturbancePerNewton(channel),
                        new Random(seed)));
    }

    /** 10 N within the 3.3 s of a walk. */
    @ParameterizedTest
    @ValueSource(doubles = {3, -3})
    void findsADriftingPlate(double newtonsPerSecond) {
        assertFound("plate-drift", (walk, seed) -> PlateFaults.drifting(walk, PLATE, newtonsPerSecond));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.001, 0.01, 0.1, 10, 100, 1000})
    void findsForcesOutByAPowerOfTen(double factor) {
        assertFound("unit-mismatch", (walk, seed) -> PlateFaults.forcesScaled(walk, PLATE, factor));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.001, 10, 100, 1000})
    void findsMomentsOutByAPowerOfTen(double factor) {
        assertFound(
                "unit-mismatch",
                (walk, seed) -> RecordedWalks.type(seed) == PlateType.FOUR_SENSORS
                        ? PlateFaults.forcesScaled(walk, PLATE, 10)
                        : PlateFaults.momentsScaled(walk, PLATE, factor));
    }

    @Test
    void proposesTheUnitThatMomentsReallyHave() {
        Capture walk = PlateFaults.momentsScaled(RecordedWalks.walk(0), PLATE, 1e-3);

        Finding finding = only("unit-mismatch", walk);

        Proposal proposal = finding.proposal().orElseThrow();
        assertEquals(Proposal.Scope.STUDY, proposal.scope());
        assertEquals(1, occurrences(proposal.json(), "\"channelUnit\": \"m\""), proposal.json());
        assertEquals(walk.plates().size(), occurrences(proposal.json(), "\"type\": 2"), "plates in it");
    }

    /** Plate z points down, so what creeps up along it is a reaction that falls. */
    @Test
    void saysHowFastAPlateDrifts() {
        Finding finding = only("plate-drift", PlateFaults.drifting(RecordedWalks.exact(0), PLATE, 5));

        assertTrue(finding.figure().contains("force z (lab axes)"), finding.figure());
        assertTrue(finding.figure().contains("-5.00 N a second"), finding.figure());
    }

    @Test
    void saysByWhichFactorForcesAreOut() {
        Finding finding = only("unit-mismatch", PlateFaults.forcesScaled(RecordedWalks.walk(0), PLATE, 0.1));

        assertTrue(finding.figure().contains("10 times as much"), finding.figure());
    }

    @Test
    void leavesAPlateOutWhoseChannelIsDead() {
        Capture walk = RecordedWalks.walk(0);

        PlateLoads loads = RecordedWalks.resolve(PlateFaults.dead(walk, place(walk, 2)));

        assertEquals(
                List.of(1, 3, 4), loads.plates().stream().map(PlateLoad::number).toList());
        assertEquals(Severity.REFUSES, loads.findings().get(0).severity());
    }

    /** A plate without shear sensors stores zeros for them. */
    @Test
    void onlyNotesShearChannelsThatAreNotConnected() {
        Capture walk = RecordedWalks.walk(0);
        for (int channel : new int[] {0, 1, 5}) {
            int place = place(walk, channel);
            walk = PlateFaults.dead(PlateFaults.clipped(walk, place, 0), place);
        }

        PlateLoads loads = RecordedWalks.resolve(walk);

        assertEquals(4, loads.plates().size());
        assertEquals(
                List.of(Severity.NOTE),
                loads.findings().stream()
                        .filter(finding -> finding.code().equals("plate-dead"))
                        .map(Finding::severity)
                        .toList());
    }

    /** A mass has no shear, and channels of coarse steps may keep a level under it. */
    @Test
    void doesNotMissShearUnderAMass() {
        List<WeightsCapture.Mass> masses = List.of(new WeightsCapture.Mass(20, 0.1, 0.05));
        Capture capture = new WeightsCapture(ProvedPlate.of(PlateType.FORCE_AND_MOMENT), masses, 1, 1).capture();
        List<AnalogChannel> offset = capture.analog().stream()
                .map(channel -> new AnalogChannel(
                        channel.label(),
                        channel.unit(),
                        channel.values()
                                .map(values ->
                                        Arrays.stream(values).map(v -> v + 3).toArray())))
                .toList();

        PlateLoads loads = RecordedWalks.resolve(with(capture, offset));

        assertEquals(1, loads.plates().size());
    }

    /** The channel's own samples at its rail tell what must be blank. */
    @Test
    void blanksTheSamplesAtTheRailAndNoOthers() {
        Capture walk = clipped(RecordedWalks.walk(4), 2);
        double[] signal = walk.analog().get(place(walk, 2)).values().toArray();
        double rail = Arrays.stream(signal).min().orElseThrow();

        PlateLoad load = RecordedWalks.resolve(walk).plates().get(PLATE - 1);

        for (int i = 0; i < signal.length; i++) {
            boolean alone = signal[i] == rail && signal[i - 1] != rail && signal[i + 1] != rail;
            if (!alone) {
                assertEquals(signal[i] == rail, load.raw().force().isGap(i), "sample " + i);
            }
        }
    }

    private static void assertFound(String code, Fault fault) {
        int count = RecordedWalks.count();
        int found = 0;
        for (int seed = 0; seed < count; seed++) {
            Capture faulty = fault.in(RecordedWalks.walk(seed), seed);
            found += warnings(faulty).stream()
                            .anyMatch(finding -> finding.code().equals(code)
                                    && finding.where().contains("plate " + PLATE))
                    ? 1
                    : 0;
        }

        assertTrue(found >= FOUND * count, code + " found in " + found + " of " + count);
    }

    private static Finding only(String code, Capture capture) {
        List<Finding> found = warnings(capture).stream()
                .filter(finding -> finding.code().equals(code))
                .toList();
        assertEquals(1, found.size(), found.toString());
        return found.get(0);
    }

    private static List<Finding> warnings(Capture capture) {
        return RecordedWalks.resolve(capture).findings().stream()
                .filter(finding -> finding.severity() != Severity.NOTE)
                .toList();
    }

    /** A channel that bears much of the weight. */
    private static int vertical(int seed) {
        return RecordedWalks.type(seed) == PlateType.FOUR_SENSORS ? 5 : 2;
    }

    private static int place(Capture walk, int channel) {
        return walk.plates().get(PLATE - 1).channels().get(channel);
    }

    /** At four fifths of the channel's greatest value. */
    private static Capture clipped(Capture walk, int channel) {
        int place = place(walk, channel);
        double greatest = Arrays.stream(walk.analog().get(place).values().toArray())
                .map(Math::abs)
                .max()
                .orElseThrow();
        return PlateFaults.clipped(walk, place, 0.8 * greatest);
    }

    /** As a converter of 11 bits and a sign stores the channels, each over twice its range. */
    private static Capture inWholeSteps(Capture walk) {
        return with(
                walk,
                walk.analog().stream().map(ChannelChecksTest::inWholeSteps).toList());
    }

    private static Capture with(Capture walk, List<AnalogChannel> analog) {
        return new Capture(
                walk.name(),
                walk.firstFrame(),
                walk.frames(),
                walk.pointRate(),
                walk.points(),
                walk.samplesPerFrame(),
                analog,
                walk.plates(),
                walk.plateZero(),
                walk.events(),
                walk.pointUnit(),
                walk.storage(),
                walk.findings());
    }

    private static AnalogChannel inWholeSteps(AnalogChannel channel) {
        double[] values = channel.values().toArray();
        double step = Arrays.stream(values).map(Math::abs).max().orElseThrow() / 1024;
        return new AnalogChannel(
                channel.label(),
                channel.unit(),
                channel.values()
                        .map(all -> IntStream.range(0, all.length)
                                .mapToDouble(i -> step * Math.rint(all[i] / step))
                                .toArray()));
    }

    private static int occurrences(String text, String part) {
        return (text.length() - text.replace(part, "").length()) / part.length();
    }
}
