package treadwork.solver.agreement;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.load.ContactSeries;
import treadwork.model.space.Plane;
import treadwork.model.space.Vector3;
import treadwork.model.space.Wrench;
import treadwork.solver.plate.CentreOfPressure;
import treadwork.solver.plate.PlateLoad;

/**
 * Proof of a sensor origin whose sign was mended, by the way of the centre of pressure at push-off: the forward shear there
 * moves it by twice the depth times shear over normal force, so with the wrong sign it runs back towards the heel.
 */
final class OriginProof {

    private static final String CODE = "plate-origin";

    /** The part of a stance that is looked at: its last, while the foot still bears load. */
    private static final double FROM = 0.7;

    private static final double TO = 0.95;

    private static final double LEAST_N = 50;

    /** A difference below this decides nothing, m. */
    private static final double DECIDES = 0.005;

    private OriginProof() {}

    /** For every plate whose origin was mended and that was walked on. */
    static List<Finding> of(Scene scene) {
        Vector3 way = FootMatch.travel(scene);
        List<Finding> proofs = new ArrayList<>();
        for (PlateLoad plate : scene.plates().plates()) {
            String where = scene.capture().name() + ", plate " + plate.number();
            boolean mended = scene.plates().findings().stream()
                    .anyMatch(finding -> finding.code().equals(CODE)
                            && finding.mended()
                            && finding.where().equals(where));
            if (mended && !way.isGap()) {
                proof(plate, way, where, scene).ifPresent(proofs::add);
            }
        }
        return proofs;
    }

    private static Optional<Finding> proof(PlateLoad plate, Vector3 way, String where, Scene scene) {
        double depth =
                Math.abs(scene.described().get(plate.number() - 1).origin().z());
        double mended = 0;
        double stated = 0;
        int stances = 0;
        for (ContactSeries series : scene.contacts().contacts()) {
            if (series.contact().plate() == plate.number()) {
                int first = series.contact().frames().first() - scene.capture().firstFrame();
                int count = series.contact().frames().count();
                int from = scene.sample(first + (int) (FROM * count));
                int to = scene.sample(first + (int) (TO * count));
                double withMended =
                        place(plate, to, 0).minus(place(plate, from, 0)).dot(way);
                double withStated = place(plate, to, 2 * depth)
                        .minus(place(plate, from, 2 * depth))
                        .dot(way);
                if (!Double.isNaN(withMended + withStated)) {
                    mended += withMended;
                    stated += withStated;
                    stances++;
                }
            }
        }
        if (stances == 0 || !(Math.abs(mended - stated) / stances >= DECIDES)) {
            return Optional.empty();
        }
        return Optional.of(finding(mended / stances, stated / stances, where));
    }

    private static Finding finding(double mended, double stated, String where) {
        boolean proved = mended > stated;
        return new Finding(
                CODE,
                proved ? Severity.NOTE : Severity.WARNING,
                where,
                String.format(
                        Locale.ROOT,
                        "late in stance the centre of pressure runs %.0f mm along the way with the sensor origin that is used,"
                                + " %.0f mm with the stated one; it should run forward",
                        1e3 * mended,
                        1e3 * stated),
                proved
                        ? "The feet bear out that the sign of the stated origin was lost"
                        : "The feet contradict the sign of the origin that is used, so moments late in stance may be wrong",
                proved
                        ? "Nothing needs mending"
                        : "Look up the sensors' depth in the plate's sheet, and check it with the rod test");
    }

    /** Where the load acts when the sensors lie {@code higher} above where they are taken to lie. */
    private static Vector3 place(PlateLoad plate, int sample, double higher) {
        Plane surface = plate.surface();
        Wrench load = plate.smooth().at(sample);
        Vector3 moment = load.moment().plus(surface.normal().cross(load.force()).times(higher));
        return CentreOfPressure.of(new Wrench(load.axes(), load.point(), load.force(), moment), surface, LEAST_N)
                .map(CentreOfPressure::point)
                .orElse(Vector3.GAP);
    }
}
