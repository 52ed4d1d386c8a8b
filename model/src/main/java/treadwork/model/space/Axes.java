package treadwork.model.space;

/** A named coordinate system in which vectors are written. */
public record Axes(String name) {

    public static final Axes LAB = new Axes("lab");

    /**
     * @param deed what was to be done, for the message
     * @throws IllegalArgumentException if {@code other} is another system
     */
    public void requireSame(Axes other, String deed) {
        if (!equals(other)) {
            throw new IllegalArgumentException(
                    "cannot " + deed + " in " + name + " axes and in " + other.name + " axes");
        }
    }
}
