package treadwork.solver.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import treadwork.model.body.Joint;
import treadwork.model.load.JointLoads;
import treadwork.model.load.TrialResult;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/** Compares the loads of trials. */
final class Loads {

    private Loads() {}

    static JointLoads of(TrialResult trial, Joint joint) {
        return trial.joints().stream()
                .filter(loads -> loads.joint().equals(joint))
                .findFirst()
                .orElseThrow();
    }

    /** Angles, moments, forces and power, each as one course. */
    static List<ScalarSeries> courses(JointLoads joint) {
        List<ScalarSeries> courses = new ArrayList<>();
        for (VectorSeries vectors : List.of(joint.angles(), joint.moment(), joint.force())) {
            courses.addAll(List.of(vectors.componentX(), vectors.componentY(), vectors.componentZ()));
        }
        courses.add(joint.power());
        return courses;
    }

    /** All courses of all joints agree, gaps included, to {@code share} of each one's range. */
    static void assertSame(TrialResult expected, TrialResult found, double share) {
        assertEquals(expected.joints().size(), found.joints().size(), "joints");
        for (JointLoads joint : expected.joints()) {
            assertSame(joint, of(found, joint.joint()), share);
        }
        assertEquals(expected.support(), found.support(), "support");
    }

    static void assertSame(JointLoads expected, JointLoads found, double share) {
        List<ScalarSeries> one = courses(expected);
        List<ScalarSeries> other = courses(found);
        for (int c = 0; c < one.size(); c++) {
            assertSame(expected.joint().key() + ", course " + c, one.get(c), other.get(c), share);
        }
    }

    /** No frame is off by more than {@code share} of the range, and gaps stand in the same frames. */
    static void assertSame(String what, ScalarSeries expected, ScalarSeries found, double share) {
        double bound = share * range(expected);
        for (int i = 0; i < expected.size(); i++) {
            assertEquals(Double.isNaN(expected.at(i)), Double.isNaN(found.at(i)), what + ", gap in frame " + i);
            double off = Math.abs(found.at(i) - expected.at(i));
            assertTrue(!(off > bound), what + " is off by " + off + " in frame " + i + ", range " + range(expected));
        }
    }

    /** The root mean square of the differences over the range of {@code expected}, frames with a gap left out. */
    static double shareOfRange(ScalarSeries expected, ScalarSeries found) {
        double squares = 0;
        int known = 0;
        for (int i = 0; i < expected.size(); i++) {
            double off = found.at(i) - expected.at(i);
            squares += Double.isNaN(off) ? 0 : off * off;
            known += Double.isNaN(off) ? 0 : 1;
        }
        assertTrue(known > 0, "no frame is known in both");
        return Math.sqrt(squares / known) / range(expected);
    }

    static void assertShare(String what, ScalarSeries expected, ScalarSeries found, double most) {
        double share = shareOfRange(expected, found);
        assertTrue(
                share <= most, String.format(Locale.ROOT, "%s is off by %.3f %% of its range, rms", what, 100 * share));
    }

    static double range(ScalarSeries series) {
        double[] known =
                Arrays.stream(series.toArray()).filter(v -> !Double.isNaN(v)).toArray();
        return Arrays.stream(known).max().orElse(0) - Arrays.stream(known).min().orElse(0);
    }
}
