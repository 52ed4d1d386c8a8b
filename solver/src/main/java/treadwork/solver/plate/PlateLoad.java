package treadwork.solver.plate;

import java.util.Optional;
import treadwork.model.space.Plane;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.WrenchSeries;

/**
 * What one plate does to the body standing on it, an analog sample, lab axes, about the centre of its surface.
 *
 * @param number counted from 1, in the capture's order
 * @param raw    zeroed, not filtered; the moment is a gap throughout where the plate's description does not allow one
 * @param smooth the same after the plate filter
 * @param cutoffHz where that filter is at -3 dB; NaN where nothing was smoothed
 */
public record PlateLoad(int number, PlateTop top, WrenchSeries raw, WrenchSeries smooth, double cutoffHz) {

    /** The top of the plate, normal up. */
    public Plane surface() {
        return top.surface();
    }

    /** How hard the plate pushes up along its normal, unfiltered, N. */
    public ScalarSeries rawPush() {
        return push(raw);
    }

    /** How hard the plate pushes up along its normal after the filter, N. */
    public ScalarSeries smoothPush() {
        return push(smooth);
    }

    /** Where the unfiltered load of sample {@code i} acts; empty below {@code threshold} newtons or when not known. */
    public Optional<CentreOfPressure> centreOfPressure(int i, double threshold) {
        return CentreOfPressure.of(raw.at(i), surface(), threshold);
    }

    private ScalarSeries push(WrenchSeries load) {
        Vector3 n = surface().normal();
        ScalarSeries.Builder push = new ScalarSeries.Builder(load.size());
        for (int i = 0; i < load.size(); i++) {
            push.set(
                    i,
                    n.x() * load.force().x(i)
                            + n.y() * load.force().y(i)
                            + n.z() * load.force().z(i));
        }
        return push.build();
    }
}
