package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import treadwork.model.finding.Finding;

/**
 * What one plate's channels show to be wrong with them, the body aside.
 *
 * @param unusable whether the plate's load cannot be known at all
 * @param unknown  samples in which it cannot
 * @param noises   to be compared with those of the other plates
 */
record ChannelChecks(boolean unusable, BitSet unknown, List<Finding> findings, List<ChannelNoise> noises) {

    static ChannelChecks of(MeasuredPlate plate, PlateAxes axes) {
        List<Finding> findings = new ArrayList<>();
        DeadChannels dead = DeadChannels.of(plate);
        dead.finding().ifPresent(findings::add);
        ClippedChannels clipped = ClippedChannels.of(plate);
        clipped.finding().ifPresent(findings::add);
        List<Stretch> quiet = plate.unloaded() ? QuietBlocks.of(plate.push(), plate.rate()) : List.of();
        if (!dead.unusable()) {
            BaselineDrift.of(plate, quiet).ifPresent(findings::add);
            PlateUnits.of(plate, axes).ifPresent(findings::add);
        }
        return new ChannelChecks(dead.unusable(), clipped.samples(), findings, ChannelNoise.of(plate, quiet));
    }
}
