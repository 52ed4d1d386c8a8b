package treadwork.io.fuzz;

import java.util.stream.Collectors;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/** The kind of a result. */
final class Results {

    private Results() {}

    /** After looking at every number, since series are made when they are asked for. */
    static String kind(Capture capture) {
        long known = 0;
        for (PointSeries point : capture.points()) {
            VectorSeries course = point.positions();
            for (int i = 0; i < course.size(); i++) {
                known += course.isGap(i) ? 0 : 1;
            }
        }
        for (AnalogChannel channel : capture.analog()) {
            ScalarSeries values = channel.values();
            for (int i = 0; i < values.size(); i++) {
                known += Double.isNaN(values.at(i)) ? 0 : 1;
            }
        }
        return "read " + size(capture.points().size()) + " " + size(capture.frames()) + " "
                + size(capture.analog().size()) + " " + size(capture.samplesPerFrame()) + " "
                + size(capture.plates().size()) + " " + size(capture.events().size()) + " " + size(known) + " "
                + capture.findings().stream()
                        .map(Finding::code)
                        .distinct()
                        .sorted()
                        .collect(Collectors.joining(" "));
    }

    static String kind(Finding refusal) {
        return refusal.code() + " "
                + refusal.figure().replaceAll("\"[^\"]*\"", "\"\"").replaceAll("[-+.\\d]+", "0");
    }

    private static int size(long count) {
        return 64 - Long.numberOfLeadingZeros(count);
    }
}
