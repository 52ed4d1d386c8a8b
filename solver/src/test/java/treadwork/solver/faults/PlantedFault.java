package treadwork.solver.faults;

import java.util.function.UnaryOperator;
import treadwork.fixtures.walker.WalkerSettings;

/**
 * A mistake of one size.
 *
 * @param code    of the finding that it must lead to
 * @param what    in words, with its size
 * @param matters whether this is the size that must be found
 * @param setting what it changes in how the walk is made
 * @param change  what it changes in what was made
 */
record PlantedFault(
        String code,
        String what,
        boolean matters,
        UnaryOperator<WalkerSettings> setting,
        UnaryOperator<NoisyWalk> change) {

    NoisyWalk in(int seed) {
        return change.apply(NoisyWalk.of(setting.apply(NoisyWalk.settings(seed))));
    }
}
