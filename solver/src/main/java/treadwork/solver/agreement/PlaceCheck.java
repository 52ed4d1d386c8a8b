package treadwork.solver.agreement;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.solver.plate.PlatesAsJson;

/**
 * {@code plate-place}: the centre of pressure lies off the foot by a fixed vector.
 *
 * <p>A person presses on about the same place of the sole in every step ({@link Tread}). Unknown are that place, a habit of
 * the person known beforehand to some millimetres and mirrored between the feet, and the shift of the plate or plates that
 * are accused; all of it by least squares, prior and steps weighted with their spreads. Accused is the one plate, or all
 * together, whose shift explains most of what is left without it; then the next, until none is above the limit.
 */
final class PlaceCheck {

    /** Adults press on average here between heel and metatarsal heads, and their habits spread so (open recordings). */
    private static final double HABIT_ALONG = 0.78;

    private static final double SPREAD_ALONG = 0.04;
    private static final double SPREAD_ACROSS_M = 0.008;

    /** From step to step of one person (open recordings), and with how many degrees of freedom that is believed. */
    private static final double STEP_M = 0.006;

    private static final int BELIEVED = 4;

    /** A shift below this is not told from none; 10 mm changes walking moments by 7 to 14 per cent (McCaw and DeVita 1995), m. */
    static final double LIMIT_M = 0.012;

    private static final double ERRORS = 3;

    private PlaceCheck() {}

    static List<Finding> of(Scene scene) {
        List<Tread> treads = Tread.of(scene);
        List<Finding> findings = new ArrayList<>();
        Set<Integer> moved = new TreeSet<>();
        Optional<Shift> next = worst(treads, moved, scene.up());
        while (next.isPresent()) {
            Shift shift = next.orElseThrow();
            findings.add(finding(shift, scene));
            moved.addAll(shift.plates());
            next = shift.plates().size() > 1 ? Optional.empty() : worst(treads, moved, scene.up());
        }
        return findings;
    }

    /** The shift that explains most; empty where none is beyond the limit. */
    private static Optional<Shift> worst(List<Tread> treads, Set<Integer> moved, Vector3 up) {
        List<Tread> trusted =
                treads.stream().filter(tread -> !moved.contains(tread.plate())).toList();
        Set<Integer> plates = new TreeSet<>();
        trusted.forEach(tread -> plates.add(tread.plate()));
        List<Set<Integer>> candidates = new ArrayList<>();
        plates.forEach(plate -> candidates.add(Set.of(plate)));
        if (moved.isEmpty() && plates.size() > 1) {
            candidates.add(plates);
        }
        return candidates.stream()
                .map(accused -> Shift.fit(trusted, accused, up))
                .filter(shift -> shift.vector().norm() >= shift.limit())
                .max((a, b) -> Double.compare(a.explained(), b.explained()));
    }

    /**
     * How far the accused plates are from where they are said to be.
     *
     * @param vector        from where they are to where they are said to be, lab axes, level, m
     * @param standardError of its length, m
     * @param explained     by how much it lessens the weighted sum of squares
     */
    record Shift(Set<Integer> plates, Vector3 vector, double standardError, double explained) {

        double limit() {
            return Math.max(LIMIT_M, ERRORS * standardError);
        }

        static Shift fit(List<Tread> treads, Set<Integer> accused, Vector3 up) {
            LeastSquares without = system(treads, Set.of(), up, STEP_M);
            LeastSquares with = system(treads, accused, up, STEP_M);
            double step = Math.sqrt((BELIEVED * STEP_M * STEP_M + with.squares() * STEP_M * STEP_M)
                    / (BELIEVED + Math.max(0, 2 * treads.size() - 4)));
            LeastSquares believed = system(treads, accused, up, step);
            Vector3 east = east(up);
            Vector3 vector = east.times(believed.value(2)).plus(up.cross(east).times(believed.value(3)));
            double error = Math.sqrt((believed.variance(2) + believed.variance(3)) / 2);
            return new Shift(accused, vector, error, without.squares() - with.squares());
        }

        private static LeastSquares system(List<Tread> treads, Set<Integer> accused, Vector3 up, double step) {
            LeastSquares system = new LeastSquares(4);
            double length = treads.stream().mapToDouble(Tread::length).average().orElse(0);
            system.add(new double[] {1, 0, 0, 0}, 0, SPREAD_ALONG * length);
            system.add(new double[] {0, 1, 0, 0}, 0, SPREAD_ACROSS_M);
            // A plate that is accused of nothing is where it is said to be.
            double free = accused.isEmpty() ? 1e-9 : 10;
            system.add(new double[] {0, 0, 1, 0}, 0, free);
            system.add(new double[] {0, 0, 0, 1}, 0, free);
            Vector3 east = east(up);
            Vector3 north = up.cross(east);
            for (Tread tread : treads) {
                double moved = accused.contains(tread.plate()) ? 1 : 0;
                Vector3 a = tread.ahead().times(moved);
                Vector3 o = tread.outward().times(moved);
                double along = (tread.along() - HABIT_ALONG) * tread.length();
                system.add(new double[] {1, 0, a.dot(east), a.dot(north)}, along, step);
                system.add(new double[] {0, 1, o.dot(east), o.dot(north)}, tread.across(), step);
            }
            return system;
        }

        /** Some level unit vector, the same for every plate. */
        private static Vector3 east(Vector3 up) {
            Vector3 some = Math.abs(up.x()) < 0.5 ? new Vector3(1, 0, 0) : new Vector3(0, 1, 0);
            return some.minus(up.times(some.dot(up))).unit();
        }
    }

    private static Finding finding(Shift shift, Scene scene) {
        Vector3 v = shift.vector().times(1e3);
        String plates = shift.plates().size() == 1
                ? "plate " + shift.plates().iterator().next()
                : "plates "
                        + String.join(
                                ", ",
                                shift.plates().stream().map(String::valueOf).toList());
        Finding finding = new Finding(
                "plate-place",
                Severity.WARNING,
                scene.capture().name() + ", " + plates,
                String.format(
                        Locale.ROOT,
                        "the centre of pressure lies off the foot by (%.0f, %.0f, %.0f) mm, lab axes (standard error %.0f mm);"
                                + " limit %.0f mm",
                        v.x() + 0.0,
                        v.y() + 0.0,
                        v.z() + 0.0,
                        1e3 * shift.standardError(),
                        1e3 * shift.limit()),
                "The plate seems to stand elsewhere than described; every moment is off by the force times that distance",
                "Check where the plate was measured to stand, best with the rod test, or give its corners in lab.plates");
        List<Plate> mended = new ArrayList<>(scene.described());
        for (int number : shift.plates()) {
            mended.set(
                    number - 1, shifted(mended.get(number - 1), shift.vector().negated()));
        }
        return finding.proposing(new Proposal(Proposal.Scope.STUDY, PlatesAsJson.change(mended)));
    }

    private static Plate shifted(Plate plate, Vector3 by) {
        return PlateVariants.withCorners(
                plate, plate.corners().stream().map(corner -> corner.plus(by)).toList());
    }
}
