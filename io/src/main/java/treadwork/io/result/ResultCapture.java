package treadwork.io.result;

import java.util.Map;
import treadwork.model.body.Joint;
import treadwork.model.capture.Capture;
import treadwork.model.space.VectorSeries;

/**
 * What a C3D file with results is made from, besides the results.
 *
 * @param movement the capture that was computed, whole
 * @param centres  of the solved joints in every frame of {@code movement}, lab axes, m
 */
public record ResultCapture(Capture movement, Map<Joint, VectorSeries> centres) {

    public ResultCapture {
        centres = Map.copyOf(centres);
    }
}
