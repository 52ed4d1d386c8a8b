package treadwork.solver.draft;

import treadwork.model.space.Vector3;

/**
 * Where a landmark lies from a place that is known, on the right side of a body 1.75 m tall, and how far people and the
 * hands that place markers differ from it. m: x ahead, y up, z to the right.
 *
 * <p>Heights over stature after Drillis and Contini (1966), from memory: ankle 0.039, knee 0.285, hip 0.530 of it; the
 * remaining lengths and all spreads are common practice and wide on purpose.
 */
record Template(Vector3 from, Vector3 spread) {

    /** The stature of the lengths here, m. */
    static final double STATURE = 1.75;

    /** The cost of a landmark that has no marker: 0.3 % of a χ² of three degrees lie beyond it. */
    static final double NOBODY = 14;

    /** The same of landmarks that many laboratories leave out. */
    static final double NOBODY_OPTIONAL = 10;

    static final Template KNEE_HEIGHT = new Template(new Vector3(0, 0.5, 0.085), new Vector3(1, 0.022, 0.05));
    static final Template ANKLE_HEIGHT = new Template(new Vector3(0, 0.078, 0.085), new Vector3(1, 0.014, 0.06));
    static final Template ASIS_HEIGHT = new Template(new Vector3(0, 0.99, 0), new Vector3(1, 0.035, 0.025));

    /** The outer epicondyle from the inner one. */
    static final Template KNEE = new Template(new Vector3(0, 0, 0.11), new Vector3(0.025, 0.014, 0.02));
    /** The outer malleolus from the inner one. */
    static final Template ANKLE = new Template(new Vector3(-0.01, -0.01, 0.08), new Vector3(0.02, 0.012, 0.015));
    /** The right ASIS from the left one. */
    static final Template ASIS = new Template(new Vector3(0, 0, 0.24), new Vector3(0.015, 0.014, 0.025));

    /** From the middle of the ASISs. */
    static final Template PSIS = new Template(new Vector3(-0.155, 0.03, 0.045), new Vector3(0.025, 0.025, 0.012));

    static final Template SACRUM = new Template(new Vector3(-0.165, 0.01, 0), new Vector3(0.025, 0.03, 0.012));
    static final Template HIP_CENTRE = new Template(new Vector3(-0.07, -0.09, 0.087), new Vector3(0.02, 0.02, 0.012));

    /** From the middle of the malleoli, in the direction of the foot. */
    static final Template HEEL = new Template(new Vector3(-0.06, -0.038, 0), new Vector3(0.018, 0.015, 0.014));

    static final Template FIRST_HEAD =
            new Template(new Vector3(0.13, -0.046, -0.045), new Vector3(0.018, 0.013, 0.012));
    static final Template FIFTH_HEAD = new Template(new Vector3(0.112, -0.055, 0.05), new Vector3(0.02, 0.013, 0.013));
    static final Template SECOND_HEAD =
            new Template(new Vector3(0.14, -0.033, -0.018), new Vector3(0.018, 0.013, 0.012));
    static final Template TOE_TIP = new Template(new Vector3(0.195, -0.04, -0.015), new Vector3(0.02, 0.014, 0.016));

    /** Squared distance in spreads of {@code at}, from the place known, for a body of that stature. */
    double cost(Vector3 at, double stature) {
        double scale = stature / STATURE;
        double x = (at.x() / scale - from.x()) / spread.x();
        double y = (at.y() / scale - from.y()) / spread.y();
        double z = (at.z() / scale - from.z()) / spread.z();
        return x * x + y * y + z * z;
    }

    /** To the point midway, such as a computed joint centre. */
    Template halved() {
        return new Template(from.times(1.0 / 2), spread.times(1 / Math.sqrt(2)));
    }
}
