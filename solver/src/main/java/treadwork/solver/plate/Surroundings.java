package treadwork.solver.plate;

import java.util.BitSet;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.Vector3;

/** What the markers say about whether anything can be on a plate. */
record Surroundings(Capture capture, PlateTop top) {

    /** Markers of a foot that stands on the plate's edge may hang over it by half a foot's breadth, m. */
    private static final double BESIDE = 0.05;

    /** Ankle markers of a standing foot are lower than this above the ground, m. */
    private static final double ABOVE = 0.3;

    /** Markers under the surface are slips of the corners, not feet, m. */
    private static final double BELOW = -0.1;

    /** This many frames, evenly spread, tell the share to a few per cent. */
    private static final int FRAMES_LOOKED_AT = 40;

    /** The share of {@code samples} in which some marker is over the plate within a foot's height; 1 where no marker is seen. */
    double shareOccupied(BitSet samples) {
        int total = samples.cardinality();
        int step = Math.max(1, total / FRAMES_LOOKED_AT);
        int looked = 0;
        int occupied = 0;
        int place = 0;
        for (int i = samples.nextSetBit(0); i >= 0; i = samples.nextSetBit(i + 1)) {
            if (place++ % step == 0) {
                looked++;
                occupied += isOccupied(i / capture.samplesPerFrame()) ? 1 : 0;
            }
        }
        return looked == 0 ? 1 : (double) occupied / looked;
    }

    private boolean isOccupied(int frame) {
        boolean seen = false;
        for (PointSeries point : capture.points()) {
            if (!point.positions().isGap(frame)) {
                seen = true;
                Vector3 at = point.positions().at(frame);
                double height = top.surface().heightOf(at);
                if (height > BELOW && height < ABOVE && top.overhang(at) < BESIDE) {
                    return true;
                }
            }
        }
        return !seen;
    }
}
