package treadwork.solver.contact;

import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.space.Vector3;
import treadwork.solver.plate.CentreOfPressure;
import treadwork.solver.plate.PlateLoad;

/**
 * The foot that a spell of load belongs to: the one whose outline the centre of pressure lies in or nearest to, averaged
 * over the frames in which both are known.
 *
 * @param foot     empty where neither is near, or nothing is known
 * @param distance of the nearest foot, m; NaN where nothing is known
 * @param words    how it was found
 */
record Attribution(Optional<FootOutline> foot, double distance, String words) {

    /** A centre of pressure farther than this from a foot on average, half a foot's length, is not that foot's, m. */
    static final double FARTHEST = 0.15;

    static Attribution of(BitSet frames, PlateLoad plate, List<FootOutline> feet, Finder finder) {
        Optional<FootOutline> nearest = Optional.empty();
        double least = Double.NaN;
        StringBuilder words = new StringBuilder("centre of pressure on average");
        for (FootOutline foot : feet) {
            double distance = finder.meanDistance(frames, plate, foot);
            words.append(
                    Double.isNaN(distance)
                            ? String.format(
                                    Locale.ROOT,
                                    ", %s foot not known",
                                    foot.side().key())
                            : String.format(
                                    Locale.ROOT,
                                    ", %.0f mm from the %s foot",
                                    1e3 * distance,
                                    foot.side().key()));
            if (!Double.isNaN(distance) && !(distance >= least)) {
                least = distance;
                nearest = Optional.of(foot);
            }
        }
        double found = least;
        return new Attribution(nearest.filter(foot -> found <= FARTHEST), least, words.toString());
    }

    /** Where centres of pressure are, against feet. */
    record Finder(Clock clock, double threshold) {

        private double meanDistance(BitSet frames, PlateLoad plate, FootOutline foot) {
            double sum = 0;
            int known = 0;
            for (int i = frames.nextSetBit(0); i >= 0; i = frames.nextSetBit(i + 1)) {
                double distance = distance(i, plate, foot);
                if (!Double.isNaN(distance)) {
                    sum += distance;
                    known++;
                }
            }
            return known == 0 ? Double.NaN : sum / known;
        }

        /** NaN where the load is too small to be placed, or the foot is not known. */
        double distance(int frame, PlateLoad plate, FootOutline foot) {
            Vector3 place = plate.centreOfPressure(clock.sample(frame), threshold)
                    .map(CentreOfPressure::point)
                    .orElse(Vector3.GAP);
            return place.isGap()
                    ? Double.NaN
                    : foot.distance(place, frame, plate.surface().normal());
        }
    }
}
