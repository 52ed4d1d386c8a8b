package treadwork.solver.pose;

import treadwork.model.body.Side;
import treadwork.model.space.Vector3;
import treadwork.model.study.HipCentreRule;

/**
 * Regression equations for the hip joint centre, in pelvis axes from the midpoint of the ASISs: X forward, Y up, Z to the
 * subject's right. They give the right hip; the left one has its Z mirrored.
 *
 * <p>PW is the distance between the ASISs, PD that from mid-ASIS to mid-PSIS, LL a leg length. Bone-to-bone distances are
 * meant; markers stand a little off the skin and are taken as they are.
 */
public final class HipCentres {

    private static final double MM = 1e-3;

    private HipCentres() {}

    /**
     * The hip centre in pelvis axes, m.
     *
     * @param size      what the rule needs of the pelvis, m
     * @param legLength the one that {@link #legIsByWayOfTheKnee} asks for, m; not used by every rule
     * @throws IllegalArgumentException for a rule that is no regression
     */
    public static Vector3 inPelvis(HipCentreRule rule, PelvisSize size, double legLength, Side side) {
        Vector3 right = ofRightHip(rule, size, legLength);
        return new Vector3(right.x(), right.y(), side.sign() * right.z());
    }

    private static Vector3 ofRightHip(HipCentreRule rule, PelvisSize size, double legLength) {
        double pw = size.width();
        double pd = size.depth();
        return switch (rule) {
            case HARRINGTON_2007 ->
                new Vector3(
                        -0.24 * pd - 9.9 * MM,
                        -0.16 * pw - 0.04 * legLength - 7.1 * MM,
                        0.28 * pd + 0.16 * pw + 7.9 * MM);
            case HARA_2016 ->
                new Vector3(11 * MM - 0.063 * legLength, -9 * MM - 0.078 * legLength, 8 * MM + 0.086 * legLength);
            case BELL_1989 -> new Vector3(-0.22 * pw, -0.30 * pw, (0.5 - 0.14) * pw);
            case LEARDINI_1999 -> new Vector3(-0.31 * pd, -0.096 * legLength, 0.38 * pw);
            case FUNCTIONAL, MARKER -> throw new IllegalArgumentException(rule.key() + " is no regression");
        };
    }

    /** Whether the rule uses a leg length. */
    static boolean needsLegLength(HipCentreRule rule) {
        return rule == HipCentreRule.HARRINGTON_2007 || rule == HipCentreRule.HARA_2016 || legIsByWayOfTheKnee(rule);
    }

    /** Whether the rule's leg length is ASIS to knee centre plus knee to ankle centre, and not ASIS to medial malleolus. */
    static boolean legIsByWayOfTheKnee(HipCentreRule rule) {
        return rule == HipCentreRule.LEARDINI_1999;
    }

    /** Publication, what the equations need, and how far the coefficients were verified; for help and result sheets. */
    public static String source(HipCentreRule rule) {
        return switch (rule) {
            case HARRINGTON_2007 ->
                "Harrington et al. 2007, J Biomech 40:595-602, equations with pelvic depth, pelvic width"
                        + " and leg length (ASIS to medial malleolus); coefficients from concordant public copies,"
                        + " abstract read, article not read";
            case HARA_2016 ->
                "Hara et al. 2016, Sci Rep 6:37707, equations with leg length (ASIS to medial malleolus);"
                        + " coefficients from concordant public copies, not seen in the article";
            case BELL_1989 ->
                "Bell, Brand and Pedersen 1989, Hum Mov Sci 8:3-16, shares of pelvic width for adults;"
                        + " coefficients read in the article's abstract";
            case LEARDINI_1999 ->
                "Leardini et al. 1999, J Biomech 32:99-103, equations with pelvic depth, pelvic width and"
                        + " leg length (ASIS to knee plus knee to ankle); X and Z coefficients from public copies,"
                        + " Y coefficient (0.096 of leg length) from memory; article not read";
            case FUNCTIONAL -> "functional fit to a movement of the hip; not offered yet";
            case MARKER -> "the place of the landmark that the marker set maps to the hip centre";
        };
    }
}
