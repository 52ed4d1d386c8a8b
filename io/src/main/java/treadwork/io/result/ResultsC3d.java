package treadwork.io.result;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import treadwork.io.c3d.C3dWriter;
import treadwork.io.c3d.ComputedPoint;
import treadwork.io.c3d.ComputedPoints;
import treadwork.model.capture.Capture;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.load.Contact;
import treadwork.model.load.ContactSeries;
import treadwork.model.load.JointLoads;
import treadwork.model.load.TrialResult;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;
import treadwork.model.study.MomentAxes;
import treadwork.model.study.ResultSettings;

/**
 * {@code results.c3d}: the measured capture, and beside its markers what was computed, three numbers a frame under the names of the
 * other result files: joint centres, angles, moments, forces, powers and ground reactions.
 */
final class ResultsC3d {

    private static final double DEGREES = 180 / Math.PI;

    private final Capture movement;
    private final TrialResult result;
    private final ResultSettings settings;
    private final LoadUnits units;
    private final List<ComputedPoint> points = new ArrayList<>();

    private ResultsC3d(Capture movement, TrialResult result, ResultSettings settings) {
        this.movement = movement;
        this.result = result;
        this.settings = settings;
        this.units = LoadUnits.of(settings.normalise());
    }

    /** Writes the file; frames that the result does not have are gaps of the computed points. */
    static void write(ResultCapture source, TrialResult result, TrialRecord record, Path file) throws IOException {
        ResultsC3d all =
                new ResultsC3d(source.movement(), result, record.trial().results());
        for (JointLoads loads : result.joints()) {
            VectorSeries centre = source.centres().get(loads.joint());
            if (centre != null) {
                all.centre(loads, centre);
            }
            all.joint(loads);
        }
        all.reactions();
        ComputedPoints computed =
                new ComputedPoints(record.programVersion(), all.points, SettingsLines.of(record, result.up()));
        try {
            C3dWriter.write(source.movement(), computed, file);
        } catch (IllegalArgumentException tooMuch) {
            throw new UnusableInputException(
                    new Finding(
                            "results-c3d",
                            Severity.REFUSES,
                            source.movement().name(),
                            "a C3D file cannot hold the capture and its results together: " + tooMuch.getMessage(),
                            "Nothing is written for this trial",
                            "Compute it without --c3d"),
                    tooMuch);
        }
    }

    private void centre(JointLoads loads, VectorSeries centre) {
        String unit = movement.pointUnit().symbol();
        add(loads.joint().key() + "_centre", "joint centre, lab axes", unit, inFileUnits(centre));
    }

    private VectorSeries inFileUnits(VectorSeries metres) {
        return times(metres, 1 / movement.pointUnit().metres());
    }

    private void joint(JointLoads loads) {
        String joint = loads.joint().key();
        String directions = String.join(", ", loads.joint().kind().directions());
        boolean named = settings.momentAxes() == MomentAxes.JOINT;
        String axes = settings.momentAxes().key();
        String moment = settings.momentConvention().key() + " moment, "
                + (named ? directions + ", joint axes" : "x, y, z, " + axes + " axes");
        String force =
                "what the proximal segment does to the distal one, x, y, z, " + (named ? "proximal" : axes) + " axes";
        add(joint + "_angle", directions, "deg", times(inMovement(loads.angles()), DEGREES));
        add(joint + "_moment", moment, units.moment(), inMovement(loads.moment()));
        add(joint + "_force", force, units.force(), inMovement(loads.force()));
        VectorSeries power = scalar(loads.power());
        add(joint + "_power", "power as first number, positive is generation", units.power(), inMovement(power));
    }

    /** One set of three for a foot on a plate, however often it stands there. */
    private void reactions() {
        Map<String, List<ContactSeries>> byFoot = new LinkedHashMap<>();
        for (ContactSeries series : result.contacts()) {
            Contact contact = series.contact();
            String name = "plate_" + contact.plate() + "_" + contact.foot().key();
            byFoot.computeIfAbsent(name, key -> new ArrayList<>()).add(series);
        }
        byFoot.forEach(this::reaction);
    }

    private void reaction(String name, List<ContactSeries> contacts) {
        VectorSeries.Builder force = gaps();
        VectorSeries.Builder centre = gaps();
        VectorSeries.Builder moment = gaps();
        for (ContactSeries contact : contacts) {
            int first = contact.contact().frames().first();
            put(contact.force(), first, force);
            put(contact.centreOfPressure(), first, centre);
            put(scalar(contact.freeMoment()), first, moment);
        }
        String unit = movement.pointUnit().symbol();
        add(name + "_force", "ground reaction on the foot, lab axes", "N", force.build());
        add(name + "_centre_of_pressure", "centre of pressure, lab axes", unit, inFileUnits(centre.build()));
        add(name + "_free_moment", "free moment about the upward normal as first number", "Nm", moment.build());
    }

    private void add(String label, String what, String unit, VectorSeries values) {
        points.add(new ComputedPoint(label, what + "; " + unit, unit, values));
    }

    private VectorSeries inMovement(VectorSeries inResult) {
        VectorSeries.Builder whole = gaps();
        put(inResult, result.firstFrame(), whole);
        return whole.build();
    }

    private VectorSeries.Builder gaps() {
        VectorSeries.Builder series = new VectorSeries.Builder(movement.frames());
        for (int i = 0; i < movement.frames(); i++) {
            series.set(i, Double.NaN, Double.NaN, Double.NaN);
        }
        return series;
    }

    /** Puts a series whose first frame has the number {@code first} in its place. */
    private void put(VectorSeries part, int first, VectorSeries.Builder whole) {
        int from = first - movement.firstFrame();
        for (int i = 0; i < part.size(); i++) {
            if (from + i >= 0 && from + i < movement.frames()) {
                whole.set(from + i, part.x(i), part.y(i), part.z(i));
            }
        }
    }

    /** A number a frame as the first of three, the others zero. */
    private static VectorSeries scalar(ScalarSeries values) {
        VectorSeries.Builder series = new VectorSeries.Builder(values.size());
        for (int i = 0; i < values.size(); i++) {
            series.set(i, values.at(i), 0, 0);
        }
        return series.build();
    }

    private static VectorSeries times(VectorSeries series, double factor) {
        VectorSeries.Builder product = new VectorSeries.Builder(series.size());
        for (int i = 0; i < series.size(); i++) {
            product.set(i, series.x(i) * factor, series.y(i) * factor, series.z(i) * factor);
        }
        return product.build();
    }
}
