package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.capture.PlateType;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;

/**
 * Whether a channel shows nothing while the others of its plate show a load that comes or goes.
 *
 * @param unusable whether the plate's load cannot be known without the channel
 */
record DeadChannels(boolean unusable, Optional<Finding> finding) {

    /** Loads that a step makes and noise does not, N and N·m: a tenth of what walking adults reach. */
    private static final double FORCE = 50;

    private static final double MOMENT = 10;

    /** Below this a shear channel of coarse steps may well not move, N. */
    private static final double SHEAR = 15;

    /** As long as a contact has to be, s. */
    private static final double LONG_ENOUGH_S = 0.05;

    static DeadChannels of(MeasuredPlate plate) {
        List<Integer> flat = new ArrayList<>();
        for (int j = 0; j < plate.channels().count(); j++) {
            if (plate.channels().isFlat(j)) {
                flat.add(j);
            }
        }
        if (flat.isEmpty() || !(loadedFor(plate) >= LONG_ENOUGH_S)) {
            return new DeadChannels(false, Optional.empty());
        }
        boolean idle = flat.stream().allMatch(j -> isIdleShear(plate, j));
        return new DeadChannels(!idle, Optional.of(idle ? idle(plate, flat) : dead(plate, flat)));
    }

    /**
     * Some plates have no shear sensors, some sum theirs into one channel of a pair: what is not connected is stored as zeros.
     * Or there is no shear to show: a mass was put on the plate. A vertical channel that does not move is broken, and so is a
     * shear channel that keeps a level while others show shear.
     */
    private static boolean isIdleShear(MeasuredPlate plate, int j) {
        boolean four = plate.plate().type() == PlateType.FOUR_SENSORS;
        boolean shear = four ? j < 4 : j < 2 || j == plate.channels().count() - 1;
        return shear && (plate.channels().signal(j)[0] == 0 || !showsShear(plate));
    }

    private static boolean showsShear(MeasuredPlate plate) {
        return Math.max(away(plate, 0, SHEAR), away(plate, 1, SHEAR)) >= LONG_ENOUGH_S;
    }

    /** The longest time for which a force or a moment about a level axis is away from its usual value, s. */
    private static double loadedFor(MeasuredPlate plate) {
        double longest = 0;
        for (int row = 0; row < 5; row++) {
            longest = Math.max(longest, away(plate, row, row < 3 ? FORCE : MOMENT));
        }
        return longest;
    }

    /** How long a component is away from its usual value by more than {@code least}, s. */
    private static double away(MeasuredPlate plate, int row, double least) {
        double[] component = plate.channels().component(plate.matrix(), row);
        double usual = Medians.of(component);
        int away = 0;
        for (double value : component) {
            away += Math.abs(value - usual) > least ? 1 : 0;
        }
        return away / plate.rate();
    }

    private static Finding dead(MeasuredPlate plate, List<Integer> flat) {
        return new Finding(
                "plate-dead",
                Severity.REFUSES,
                plate.where(),
                figure(plate, flat),
                "A part of the load is missing, so a foot on this plate counts as not measured",
                "Check the channel's cable and amplifier; if another channel holds it, give the plate's channels in lab.plates"
                        + " of the study file");
    }

    private static Finding idle(MeasuredPlate plate, List<Integer> flat) {
        return new Finding(
                "plate-dead",
                Severity.NOTE,
                plate.where(),
                figure(plate, flat) + "; it is shear alone, and zero, or no shear is shown at all",
                "These channels seem not to be connected, so joint moments may lack what shear and the free moment add to them",
                "Nothing, if the plate has no such sensors or sums them in another channel; else check their cables");
    }

    private static String figure(MeasuredPlate plate, List<Integer> flat) {
        List<String> names = flat.stream().map(plate::named).toList();
        return String.format(
                Locale.ROOT,
                "%s %s exactly one value throughout while the plate's other channels show a load for %.2f s, limit %.2f s",
                String.join(", ", names),
                flat.size() == 1 ? "keeps" : "keep",
                loadedFor(plate),
                LONG_ENOUGH_S);
    }
}
