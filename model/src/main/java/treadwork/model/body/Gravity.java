package treadwork.model.body;

/** The pull of the earth, as the whole program reckons with it. */
public final class Gravity {

    /** m/s²; the round value that gait laboratories use (common practice), 0.03 % above standard gravity. */
    public static final double ACCELERATION = 9.81;

    private Gravity() {}
}
