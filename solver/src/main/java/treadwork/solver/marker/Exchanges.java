package treadwork.solver.marker;

import java.util.ArrayList;
import java.util.List;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.NearestName;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.Exchange;

/** Puts labels right that a person has found exchanged. */
public final class Exchanges {

    private Exchanges() {}

    /**
     * The capture with the two points of every exchange in each other's place in its frames.
     *
     * @throws UnusableInputException where a label or the frames are not the capture's
     */
    public static Capture applied(Capture capture, List<Exchange> exchanges) {
        Capture right = capture;
        for (Exchange exchange : exchanges) {
            right = applied(right, exchange);
        }
        return right;
    }

    private static Capture applied(Capture capture, Exchange exchange) {
        int first = place(capture, exchange.first());
        int second = place(capture, exchange.second());
        if (exchange.frames().first() < capture.range().first()
                || exchange.frames().last() > capture.range().last()) {
            throw refusal(
                    capture,
                    "frames-outside",
                    "exchanged names frames " + exchange.frames().first() + " to "
                            + exchange.frames().last() + " of "
                            + capture.range().first() + " to "
                            + capture.range().last(),
                    "Name frames that the capture has, in its own numbers");
        }
        List<PointSeries> points = new ArrayList<>(capture.points());
        points.set(first, mixed(capture, first, second, exchange));
        points.set(second, mixed(capture, second, first, exchange));
        return capture.withPoints(points);
    }

    private static PointSeries mixed(Capture capture, int own, int other, Exchange exchange) {
        PointSeries point = capture.points().get(own);
        VectorSeries elsewhere = capture.points().get(other).positions();
        VectorSeries.Builder mixed = new VectorSeries.Builder(capture.frames());
        for (int i = 0; i < capture.frames(); i++) {
            boolean exchanged = exchange.frames().contains(i + capture.firstFrame());
            mixed.set(i, (exchanged ? elsewhere : point.positions()).at(i));
        }
        return new PointSeries(point.label(), point.description(), mixed.build());
    }

    private static int place(Capture capture, String label) {
        List<String> labels = capture.points().stream().map(PointSeries::label).toList();
        int place = labels.indexOf(label);
        if (place < 0) {
            throw refusal(
                    capture,
                    "label-missing",
                    "exchanged names the label \"" + label + "\", which no point has" + NearestName.hint(label, labels),
                    "Write the label as the capture has it");
        }
        return place;
    }

    private static UnusableInputException refusal(Capture capture, String code, String figure, String mend) {
        return new UnusableInputException(new Finding(
                code,
                Severity.REFUSES,
                capture.name(),
                figure,
                "Computing without the exchange would not be what the study file asks for",
                mend));
    }
}
