package treadwork.solver.agreement;

import java.util.BitSet;
import java.util.List;
import java.util.Map;
import treadwork.model.body.Side;
import treadwork.model.load.Support;
import treadwork.model.space.VectorSeries;
import treadwork.solver.plate.PlateLoad;

/**
 * All that the plates do to the body, smoothed, an analog sample, and the frames in which that is all that holds it up.
 *
 * @param force    lab axes, N
 * @param measured frames in which neither foot stands on anything else
 */
record GroundForce(VectorSeries force, BitSet measured) {

    GroundForce {
        measured = (BitSet) measured.clone();
    }

    static GroundForce of(Scene scene) {
        int samples = scene.sample(scene.capture().frames());
        double[] x = new double[samples];
        double[] y = new double[samples];
        double[] z = new double[samples];
        for (PlateLoad plate : scene.plates().plates()) {
            VectorSeries force = plate.smooth().force();
            for (int k = 0; k < samples; k++) {
                x[k] += force.x(k);
                y[k] += force.y(k);
                z[k] += force.z(k);
            }
        }
        return new GroundForce(VectorSeries.of(x, y, z), measured(scene));
    }

    private static BitSet measured(Scene scene) {
        BitSet measured = new BitSet();
        Map<Side, List<Support>> support = scene.contacts().support();
        if (support.size() == Side.values().length) {
            measured.set(0, scene.capture().frames());
        }
        for (List<Support> foot : support.values()) {
            for (int i = 0; i < foot.size(); i++) {
                if (foot.get(i) == Support.UNMEASURED) {
                    measured.clear(i);
                }
            }
        }
        return measured;
    }
}
