package treadwork.model.body;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/**
 * A rigid segment. On every segment X points forward, Y towards the head and Z to the subject's right, on both sides.
 */
public enum Segment {
    PELVIS(SegmentKind.PELVIS, null),
    RIGHT_THIGH(SegmentKind.THIGH, Side.RIGHT),
    LEFT_THIGH(SegmentKind.THIGH, Side.LEFT),
    RIGHT_SHANK(SegmentKind.SHANK, Side.RIGHT),
    LEFT_SHANK(SegmentKind.SHANK, Side.LEFT),
    RIGHT_FOOT(SegmentKind.FOOT, Side.RIGHT),
    LEFT_FOOT(SegmentKind.FOOT, Side.LEFT);

    private final SegmentKind kind;
    private final Side side;

    Segment(SegmentKind kind, Side side) {
        this.kind = kind;
        this.side = side;
    }

    public SegmentKind kind() {
        return kind;
    }

    /** Empty for the pelvis. */
    public Optional<Side> side() {
        return Optional.ofNullable(side);
    }

    /** The name in study files and results, for example {@code right_shank}. */
    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The segment of that kind; on either side the one pelvis. */
    public static Segment of(SegmentKind kind, Side side) {
        return Arrays.stream(values())
                .filter(segment -> segment.kind == kind && (segment.side == null || segment.side == side))
                .findFirst()
                .orElseThrow();
    }

    public static Optional<Segment> ofKey(String key) {
        return Arrays.stream(values())
                .filter(segment -> segment.key().equals(key))
                .findFirst();
    }
}
