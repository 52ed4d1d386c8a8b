package treadwork.model.study;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;

/**
 * How the body is built from the standing capture.
 *
 * @param overrides mass properties that a person gives for a segment, in place of the table's
 */
public record BodySettings(
        InertiaTable inertia,
        HipCentreRule hipCentre,
        ShankAxis shankAxis,
        PoseMethod pose,
        Map<Segment, MassProperties> overrides) {

    public static final BodySettings DEFAULT = new BodySettings(
            InertiaTable.DE_LEVA_1996,
            HipCentreRule.HARRINGTON_2007,
            ShankAxis.MALLEOLI,
            PoseMethod.SEGMENT_FIT,
            Map.of());

    public BodySettings {
        EnumMap<Segment, MassProperties> copy = new EnumMap<>(Segment.class);
        copy.putAll(overrides);
        overrides = Collections.unmodifiableMap(copy);
    }
}
