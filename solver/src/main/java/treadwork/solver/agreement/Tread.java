package treadwork.solver.agreement;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.body.Side;
import treadwork.model.capture.FrameRange;
import treadwork.model.load.ContactSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.contact.FootOutline;

/**
 * Where one whole stance on one plate pressed, seen from the foot: the mean of the centre of pressure, weighted with the
 * normal force, against the foot as it lay flat.
 *
 * @param plate   its number
 * @param ahead   unit vector along the foot, level, lab axes
 * @param outward unit vector towards the foot's outer side, level
 * @param along   from the heel, as a share of the way to the middle of the metatarsal heads
 * @param across  outward of that line, m
 * @param length  of that way, m
 */
record Tread(int plate, Side side, Vector3 ahead, Vector3 outward, double along, double across, double length) {

    /** A stance that can be judged is whole and of a step's length, s. */
    private static final double SHORTEST_S = 0.3;

    private static final double LONGEST_S = 2;

    static List<Tread> of(Scene scene) {
        List<Tread> treads = new ArrayList<>();
        for (ContactSeries series : scene.contacts().contacts()) {
            FrameRange frames = series.contact().frames();
            double duration = frames.count() / scene.capture().pointRate();
            FrameRange all = scene.capture().range();
            boolean whole = frames.first() > all.first() && frames.last() < all.last();
            if (whole && duration >= SHORTEST_S && duration <= LONGEST_S) {
                scene.feet().stream()
                        .filter(foot -> foot.side() == series.contact().foot())
                        .map(foot -> of(series, foot, scene))
                        .filter(tread -> !Double.isNaN(tread.along + tread.across))
                        .forEach(treads::add);
            }
        }
        return treads;
    }

    private static Tread of(ContactSeries series, FootOutline foot, Scene scene) {
        int from = series.contact().frames().first() - scene.capture().firstFrame();
        Vector3 up = scene.up();
        int flat = from + flattest(foot, from, series.force().size(), up);
        Vector3 heel = foot.heel().at(flat);
        Vector3 heads = foot.first().at(flat).midpoint(foot.fifth().at(flat));
        Vector3 way = level(heads.minus(heel), up);
        Vector3 ahead = way.unit();
        Vector3 outward = ahead.cross(up).times(series.contact().foot().sign());
        Vector3 pressed = meanPressure(series, up).minus(heel);
        return new Tread(
                series.contact().plate(),
                series.contact().foot(),
                ahead,
                outward,
                pressed.dot(ahead) / way.norm(),
                pressed.dot(outward),
                way.norm());
    }

    /** The frame of the contact in which heel and metatarsal heads are lowest together. */
    private static int flattest(FootOutline foot, int from, int count, Vector3 up) {
        int flattest = 0;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < count; i++) {
            Vector3 sum = foot.heel()
                    .at(from + i)
                    .times(2)
                    .plus(foot.first().at(from + i))
                    .plus(foot.fifth().at(from + i));
            double height = sum.dot(up);
            if (height < least) {
                least = height;
                flattest = i;
            }
        }
        return flattest;
    }

    private static Vector3 meanPressure(ContactSeries series, Vector3 up) {
        VectorSeries place = series.centreOfPressure();
        Vector3 sum = Vector3.ZERO;
        double weight = 0;
        for (int i = 0; i < place.size(); i++) {
            if (!place.isGap(i)) {
                double push = series.force().at(i).dot(up);
                sum = sum.plus(place.at(i).times(push));
                weight += push;
            }
        }
        return weight > 0 ? sum.times(1 / weight) : Vector3.GAP;
    }

    private static Vector3 level(Vector3 v, Vector3 up) {
        return v.minus(up.times(v.dot(up)));
    }
}
