package treadwork.solver.contact;

import java.util.List;
import treadwork.model.body.Side;
import treadwork.model.capture.Capture;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.plate.Recordings;

/** Feet made directly from the markers of open recordings. */
final class RecordedFeet {

    private RecordedFeet() {}

    /** Feet of the overground walker, who wears a marker on each heel and on the first and fifth metatarsal heads. */
    static List<FootOutline> walkersFeet(Capture capture) {
        return List.of(
                foot(
                        Side.RIGHT,
                        Recordings.course(capture, "R_HEEL"),
                        Recordings.course(capture, "R_MT_5"),
                        Recordings.course(capture, "R_MT_1")),
                foot(
                        Side.LEFT,
                        Recordings.course(capture, "L_HEEL"),
                        Recordings.course(capture, "L_MT_5"),
                        Recordings.course(capture, "L_MT_1")));
    }

    /** The toe lies ahead of the metatarsal heads by 0.3 of the way from the heel to them (a foot's usual proportion, roughly). */
    static FootOutline foot(Side side, VectorSeries heel, VectorSeries fifth, VectorSeries first) {
        VectorSeries.Builder toe = new VectorSeries.Builder(heel.size());
        for (int i = 0; i < heel.size(); i++) {
            Vector3 ball = fifth.at(i).midpoint(first.at(i));
            toe.set(i, ball.plus(ball.minus(heel.at(i)).times(0.3)));
        }
        return new FootOutline(side, heel, fifth, toe.build(), first);
    }

    /** From the ankle's and the foot's middle points and the fifth metatarsal head; the heel is 0.4 of that length behind the ankle. */
    static FootOutline fromAnkle(Side side, Capture capture, String ankle, String fifth, String middle) {
        VectorSeries ofAnkle = Recordings.course(capture, ankle);
        VectorSeries ofMiddle = Recordings.course(capture, middle);
        VectorSeries ofFifth = Recordings.course(capture, fifth);
        VectorSeries.Builder heel = new VectorSeries.Builder(ofAnkle.size());
        for (int i = 0; i < ofAnkle.size(); i++) {
            Vector3 behind = ofAnkle.at(i).minus(ofMiddle.at(i));
            heel.set(i, ofAnkle.at(i).plus(behind.times(0.4)).minus(new Vector3(0, 0.5 * ofAnkle.y(i), 0)));
        }
        return foot(side, heel.build(), ofFifth, across(ofFifth, ofMiddle));
    }

    /** From the heel and the fifth metatarsal head, in a lab whose y is up and x ahead: the first lies 90 mm across. */
    static FootOutline fromHeel(Side side, Capture capture, String heel, String fifth) {
        VectorSeries ofFifth = Recordings.course(capture, fifth);
        Vector3 inward = new Vector3(0.01, 0, -0.09 * side.sign());
        return foot(side, Recordings.course(capture, heel), ofFifth, shifted(ofFifth, inward));
    }

    /** From heel and toe; the metatarsal heads lie 40 mm to either side of the line between them, 0.7 of the way ahead, z up. */
    static FootOutline fromHeelAndToe(Side side, Capture capture) {
        String letter = side == Side.RIGHT ? "R" : "L";
        VectorSeries heel = Recordings.described(capture, letter + ".Heel");
        VectorSeries toe = Recordings.described(capture, letter + ".Toe");
        VectorSeries.Builder fifth = new VectorSeries.Builder(heel.size());
        VectorSeries.Builder first = new VectorSeries.Builder(heel.size());
        for (int i = 0; i < heel.size(); i++) {
            Vector3 along = toe.at(i).minus(heel.at(i));
            Vector3 right = along.cross(new Vector3(0, 0, 1)).unit().times(0.04 * side.sign());
            Vector3 ball = heel.at(i).plus(along.times(0.7));
            fifth.set(i, ball.plus(right));
            first.set(i, ball.minus(right));
        }
        return new FootOutline(side, heel, fifth.build(), toe, first.build());
    }

    private static VectorSeries across(VectorSeries from, VectorSeries middle) {
        VectorSeries.Builder across = new VectorSeries.Builder(from.size());
        for (int i = 0; i < from.size(); i++) {
            across.set(i, middle.at(i).times(2).minus(from.at(i)));
        }
        return across.build();
    }

    private static VectorSeries shifted(VectorSeries series, Vector3 by) {
        VectorSeries.Builder shifted = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            shifted.set(i, series.at(i).plus(by));
        }
        return shifted.build();
    }
}
