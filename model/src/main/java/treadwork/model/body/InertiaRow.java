package treadwork.model.body;

import java.util.Optional;

/**
 * One segment of an inertia table.
 *
 * @param sex       empty where the row holds for both
 * @param massShare of the whole body's mass
 * @param from      first end; the origin of the table's axes
 * @param to        second end; the distance between both is the length that all shares refer to
 */
public record InertiaRow(
        SegmentKind segment, Optional<Sex> sex, double massShare, BodyPoint from, BodyPoint to, MassSpread spread) {}
