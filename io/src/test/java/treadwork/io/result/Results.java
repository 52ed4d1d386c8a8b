package treadwork.io.result;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import treadwork.model.body.Joint;
import treadwork.model.body.JointKind;
import treadwork.model.body.Landmark;
import treadwork.model.body.MassProperties;
import treadwork.model.body.Segment;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.JointLoads;
import treadwork.model.load.SegmentSheet;
import treadwork.model.load.Support;
import treadwork.model.load.TrialResult;
import treadwork.model.space.Inertia;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.BodySettings;
import treadwork.model.study.LabAxis;
import treadwork.model.study.LabSettings;
import treadwork.model.study.MarkerSet;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.MomentConvention;
import treadwork.model.study.Normalisation;
import treadwork.model.study.Processing;
import treadwork.model.study.ResultSettings;
import treadwork.model.study.Subject;
import treadwork.model.study.Trial;

/** Whole valid results; every number in them is another one, so that no two columns can be taken for each other. */
final class Results {

    static final int FIRST_FRAME = 101;
    static final double RATE = 200;

    private Results() {}

    /** Both limbs, left before right, so that the order of columns cannot be that of the list. Frame 2 is a gap on the left. */
    static TrialResult bothLimbs(int frames) {
        List<JointLoads> joints = new ArrayList<>();
        for (Side side : List.of(Side.LEFT, Side.RIGHT)) {
            for (JointKind kind : List.of(JointKind.HIP, JointKind.ANKLE, JointKind.KNEE)) {
                joints.add(loads(new Joint(side, kind), frames));
            }
        }
        Map<Side, List<Support>> support = new EnumMap<>(Side.class);
        support.put(Side.RIGHT, supports(Support.PLATE, frames));
        support.put(Side.LEFT, supports(Support.UNMEASURED, frames));
        return result(frames, joints, support);
    }

    static TrialResult rightAnkle(int frames) {
        return result(
                frames,
                List.of(loads(new Joint(Side.RIGHT, JointKind.ANKLE), frames)),
                Map.of(Side.RIGHT, supports(Support.AIR, frames)));
    }

    static ResultSettings settings(MomentAxes axes, Normalisation normalise) {
        return new ResultSettings(MomentConvention.INTERNAL, axes, normalise, 0, 1);
    }

    static TrialRecord record() {
        return record(72.4, "sha-of-walk", Processing.DEFAULT);
    }

    static TrialRecord record(double mass, String hash, Processing processing) {
        MarkerSet set =
                new MarkerSet(Map.of(Landmark.RIGHT_HEEL, "RH"), Map.of(Segment.RIGHT_FOOT, List.of("RH", "R1", "R5")));
        Trial trial = new Trial(
                "S01/walk-01.c3d",
                "brace on",
                set,
                LabSettings.DEFAULT,
                BodySettings.DEFAULT,
                processing,
                ResultSettings.DEFAULT,
                Optional.empty(),
                Optional.of(new FrameRange(1, 400)),
                List.of());
        Subject subject =
                new Subject("S01", mass, Optional.empty(), Optional.empty(), "S01/standing.c3d", set, List.of(trial));
        return new TrialRecord("0.1.0", subject, trial, List.of(new InputFile("S01/walk-01.c3d", hash)));
    }

    /** What stands in a frame: the number of the joint, of the quantity, of the component, and of the frame. */
    static double value(Joint joint, int quantity, int component, int frame) {
        int limb = joint.side() == Side.RIGHT ? 1 : 4;
        int number = limb + List.of(JointKind.values()).indexOf(joint.kind());
        return number * 1000 + quantity * 100 + component * 10 + frame / 1024.0;
    }

    private static JointLoads loads(Joint joint, int frames) {
        VectorSeries[] three = new VectorSeries[3];
        for (int quantity = 0; quantity < 3; quantity++) {
            VectorSeries.Builder builder = new VectorSeries.Builder(frames);
            for (int i = 0; i < frames; i++) {
                builder.set(i, vector(joint, quantity, i));
            }
            three[quantity] = builder.build();
        }
        ScalarSeries.Builder power = new ScalarSeries.Builder(frames);
        for (int i = 0; i < frames; i++) {
            power.set(i, isGap(joint, i) ? Double.NaN : value(joint, 3, 0, i));
        }
        return new JointLoads(joint, three[0], three[1], three[2], power.build());
    }

    private static Vector3 vector(Joint joint, int quantity, int i) {
        return isGap(joint, i)
                ? Vector3.GAP
                : new Vector3(value(joint, quantity, 0, i), value(joint, quantity, 1, i), value(joint, quantity, 2, i));
    }

    private static boolean isGap(Joint joint, int i) {
        return joint.side() == Side.LEFT && i == 2;
    }

    private static List<Support> supports(Support support, int frames) {
        return new ArrayList<>(Collections.nCopies(frames, support));
    }

    private static TrialResult result(int frames, List<JointLoads> joints, Map<Side, List<Support>> support) {
        Contact contact = new Contact(2, Side.LEFT, new FrameRange(103, 104), "from the foot's outline");
        ContactSeries series = new ContactSeries(
                contact,
                VectorSeries.of(new double[] {1.5, 2.5}, new double[] {-3, -4}, new double[] {700, 710}),
                VectorSeries.of(
                        new double[] {0.1, Double.NaN}, new double[] {0.2, Double.NaN}, new double[] {0, Double.NaN}),
                ScalarSeries.of(-0.25, Double.NaN));
        MassProperties mass =
                new MassProperties(11.5, new Vector3(0.01, -0.02, 0.03), new Inertia(0.1, 0.2, 0.15, 0.01, 0.02, 0.03));
        return new TrialResult(
                FIRST_FRAME,
                frames,
                RATE,
                LabAxis.PLUS_Z,
                joints,
                support,
                List.of(series),
                List.of(new SegmentSheet(Segment.PELVIS, mass, Double.NaN, "a table", 0.0021)),
                List.of(new Finding("plate-sign", Severity.WARNING, "plate 2", "-700 N", "turned", "nothing", true)));
    }
}
