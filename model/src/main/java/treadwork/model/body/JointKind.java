package treadwork.model.body;

import java.util.List;
import java.util.Locale;

/**
 * A joint whatever its side, with the names of its three positive directions about e1 (Z of the proximal segment), e2
 * (the floating axis) and e3 (Y of the distal segment).
 */
public enum JointKind {
    ANKLE(SegmentKind.SHANK, SegmentKind.FOOT, "dorsiflexion", "inversion", "internal_rotation", 1),
    KNEE(SegmentKind.THIGH, SegmentKind.SHANK, "flexion", "adduction", "internal_rotation", -1),
    HIP(SegmentKind.PELVIS, SegmentKind.THIGH, "flexion", "adduction", "internal_rotation", 1);

    private final SegmentKind proximal;
    private final SegmentKind distal;
    private final String first;
    private final String second;
    private final String third;
    private final int firstSign;

    JointKind(SegmentKind proximal, SegmentKind distal, String first, String second, String third, int firstSign) {
        this.proximal = proximal;
        this.distal = distal;
        this.first = first;
        this.second = second;
        this.third = third;
        this.firstSign = firstSign;
    }

    public SegmentKind proximal() {
        return proximal;
    }

    public SegmentKind distal() {
        return distal;
    }

    /** The positive directions about e1, e2 and e3. */
    public List<String> directions() {
        return List.of(first, second, third);
    }

    /**
     * +1 where the named direction is a right-handed turn of the distal segment about the axis, else -1. Knee flexion is
     * left-handed about e1; the directions about e2 and e3 swap from the right limb to the left.
     *
     * @param axis 0, 1 or 2 for e1, e2, e3
     */
    public int sign(int axis, Side side) {
        return axis == 0 ? firstSign : side.sign();
    }

    public String key() {
        return name().toLowerCase(Locale.ROOT);
    }
}
