package treadwork.solver.cli;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.solver.run.Inspection;

/** An inspection as text for a person. */
final class InspectionText {

    private static final String LEVELS = " ▁▂▃▄▅▆▇█";
    private static final int SPARK_WIDTH = 60;
    private static final int MAP_WIDTH = 40;
    private static final int WIDTH = 100;

    private InspectionText() {}

    static String of(String file, Inspection inspection) {
        Capture capture = inspection.capture();
        StringBuilder text = new StringBuilder();
        line(text, "%s", file);
        line(
                text,
                "  %d frames, %d to %d, at %s Hz: %.2f s; %s; lengths in %s",
                capture.frames(),
                capture.range().first(),
                capture.range().last(),
                rate(capture.pointRate()),
                capture.frames() / capture.pointRate(),
                capture.storage(),
                capture.pointUnit().symbol());
        line(
                text,
                "  up is %s",
                inspection
                        .up()
                        .map(axis -> axis.key() + ", from plates and markers")
                        .orElse("not known from the file"));
        markers(text, inspection);
        channels(text, capture);
        plates(text, inspection);
        events(text, capture);
        findings(text, inspection);
        return text.toString();
    }

    private static void markers(StringBuilder text, Inspection inspection) {
        List<Inspection.MarkerSummary> markers = inspection.markers();
        int frames = inspection.capture().frames();
        list(
                text,
                markers.size() + " points: ",
                markers.stream().map(Inspection.MarkerSummary::label).toList());
        TextTable table = new TextTable().words().words().numbers(3);
        table.row("    points with gaps", "seen, over the record", "seen %", "gaps", "longest s");
        boolean any = false;
        for (Inspection.MarkerSummary marker : markers) {
            if (marker.seen() < frames) {
                any = true;
                table.row(
                        "    " + marker.label(),
                        "|" + gapMap(marker.course()) + "|",
                        OutcomeTable.number("%.1f", 100.0 * marker.seen() / frames),
                        Integer.toString(marker.gaps()),
                        OutcomeTable.number("%.2f", marker.longestGapS()));
            }
        }
        text.append(any ? table.toString() : "");
    }

    private static void channels(StringBuilder text, Capture capture) {
        if (capture.analog().isEmpty()) {
            line(text, "  no analog channels");
            return;
        }
        list(
                text,
                capture.analog().size() + " analog channels at " + rate(capture.analogRate()) + " Hz: ",
                capture.analog().stream().map(AnalogChannel::label).toList());
    }

    private static void plates(StringBuilder text, Inspection inspection) {
        for (Inspection.PlateSummary summary : inspection.plates()) {
            Plate plate = summary.plate();
            line(
                    text,
                    "  plate %d: type %d, %.0f × %.0f mm, centre at %s m, greatest push %s N",
                    summary.number(),
                    plate.type().code(),
                    1000 * plate.corners().get(0).minus(plate.corners().get(1)).norm(),
                    1000 * plate.corners().get(1).minus(plate.corners().get(2)).norm(),
                    point(plate.centre()),
                    OutcomeTable.number("%.0f", summary.peak()));
            summary.push().ifPresent(push -> line(text, "    |%s|", spark(push, summary.peak())));
        }
    }

    private static void events(StringBuilder text, Capture capture) {
        if (!capture.events().isEmpty()) {
            line(
                    text,
                    "  events: %s",
                    capture.events().stream()
                            .map(event -> String.format(
                                    Locale.ROOT,
                                    "%s %.3f s",
                                    (event.context() + " " + event.label()).strip(),
                                    event.timeS()))
                            .collect(Collectors.joining(", ")));
        }
    }

    private static void findings(StringBuilder text, Inspection inspection) {
        if (inspection.findings().isEmpty()) {
            line(text, "  nothing found wrong");
        }
        for (Finding finding : inspection.findings()) {
            line(text, "  %s", FindingLines.line(finding));
            FindingLines.change(finding).forEach(changed -> line(text, "    %s", changed));
        }
    }

    /** A block where the point is seen throughout a stretch of the record, a lighter one where in part, a dot where never. */
    private static String gapMap(VectorSeries course) {
        StringBuilder map = new StringBuilder();
        for (int k = 0; k < MAP_WIDTH; k++) {
            int from = (int) ((long) k * course.size() / MAP_WIDTH);
            int to = Math.max(from + 1, (int) ((long) (k + 1) * course.size() / MAP_WIDTH));
            int seen = 0;
            for (int i = from; i < Math.min(to, course.size()); i++) {
                seen += course.isGap(i) ? 0 : 1;
            }
            map.append(seen == 0 ? '·' : seen == to - from ? '█' : '▒');
        }
        return map.toString();
    }

    /** The greatest push in each of {@value #SPARK_WIDTH} equal stretches of the record, as blocks. */
    private static String spark(ScalarSeries push, double peak) {
        StringBuilder spark = new StringBuilder();
        for (int k = 0; k < SPARK_WIDTH; k++) {
            int from = (int) ((long) k * push.size() / SPARK_WIDTH);
            int to = (int) ((long) (k + 1) * push.size() / SPARK_WIDTH);
            double greatest = 0;
            for (int i = from; i < to; i++) {
                greatest = Math.max(greatest, push.at(i));
            }
            int level = peak > 0 ? (int) Math.round(greatest / peak * (LEVELS.length() - 1)) : 0;
            spark.append(LEVELS.charAt(Math.min(level, LEVELS.length() - 1)));
        }
        return spark.toString();
    }

    /** Names after one another, broken between names so that no line is wider than {@value #WIDTH} columns. */
    private static void list(StringBuilder text, String heading, List<String> names) {
        StringBuilder line = new StringBuilder("  " + heading);
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i) + (i + 1 < names.size() ? "," : "");
            if (line.length() + name.length() > WIDTH) {
                line(text, "%s", line.toString().stripTrailing());
                line = new StringBuilder("    ");
            }
            line.append(name).append(' ');
        }
        line(text, "%s", line.toString().stripTrailing());
    }

    private static String rate(double hz) {
        return hz == Math.rint(hz) ? String.format(Locale.ROOT, "%.0f", hz) : String.format(Locale.ROOT, "%.3f", hz);
    }

    private static String point(Vector3 v) {
        return String.format(Locale.ROOT, "%.3f, %.3f, %.3f", v.x(), v.y(), v.z());
    }

    private static void line(StringBuilder text, String format, Object... values) {
        text.append(values.length == 0 ? format : String.format(Locale.ROOT, format, values))
                .append(System.lineSeparator());
    }
}
