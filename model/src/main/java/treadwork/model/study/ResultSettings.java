package treadwork.model.study;

/**
 * In which convention results are given.
 *
 * @param draws of the uncertainty run; 0 for none
 * @param seed  of the draws
 */
public record ResultSettings(
        MomentConvention momentConvention, MomentAxes momentAxes, Normalisation normalise, int draws, long seed) {

    public static final ResultSettings DEFAULT =
            new ResultSettings(MomentConvention.INTERNAL, MomentAxes.JOINT, Normalisation.NONE, 0, 1);
}
