package treadwork.model.body;

/** A joint of one side. */
public record Joint(Side side, JointKind kind) {

    public Segment proximal() {
        return Segment.of(kind.proximal(), side);
    }

    public Segment distal() {
        return Segment.of(kind.distal(), side);
    }

    /** The name in results, for example {@code right_knee}. */
    public String key() {
        return side.key() + "_" + kind.key();
    }
}
