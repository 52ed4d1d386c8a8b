package treadwork.solver.agreement;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.capture.Plate;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.solver.plate.PlateLoad;
import treadwork.solver.plate.PlatesAsJson;

/**
 * {@code plate-turned} and {@code plate-swapped}: the centre of pressure is far from the feet or runs against the way, and
 * goes with them once the corners are gone round otherwise, or two plates' channels exchanged. Each way is tried through
 * the very computation that the study file's change would lead to.
 */
final class TurnCheck {

    /** A plate described rightly keeps its centre of pressure within the foot to this, m. */
    private static final double NEAR = 0.015;

    /** ... and is worse off by less than this than any other description, m. */
    private static final double GAIN = 0.05;

    /** Two plates are looked at as exchanged only when both are off by more than half a foot's length, m. */
    private static final double FAR = 0.12;

    private TurnCheck() {}

    static List<Finding> of(Scene scene) {
        List<Judged> judged = new ArrayList<>();
        for (PlateLoad load : scene.plates().plates()) {
            FootMatch.of(load, scene).ifPresent(match -> judged.add(new Judged(load.number(), match)));
        }
        List<Finding> findings = new ArrayList<>(swaps(judged, scene));
        for (Judged plate : judged) {
            boolean suspect = plate.match.distance() > NEAR || plate.match.progress() < 0;
            if (suspect && findings.isEmpty()) {
                turn(plate, scene).ifPresent(findings::add);
            }
        }
        return findings;
    }

    private record Judged(int number, FootMatch match) {}

    private static Optional<FootMatch> match(Plate described, Scene scene) {
        return scene.resolve().apply(List.of(described)).plates().stream()
                .map(load -> FootMatch.of(load, scene))
                .flatMap(Optional::stream)
                .findFirst();
    }

    private static Optional<Finding> turn(Judged judged, Scene scene) {
        Plate described = scene.described().get(judged.number - 1);
        Plate best = described;
        FootMatch reached = judged.match;
        for (Plate other : PlateVariants.otherCornerOrders(described)) {
            FootMatch match = match(other, scene).orElse(judged.match);
            if (match.cost() < reached.cost()) {
                best = other;
                reached = match;
            }
        }
        if (reached.distance() > NEAR || judged.match.cost() - reached.cost() < GAIN) {
            return Optional.empty();
        }
        List<Plate> mended = new ArrayList<>(scene.described());
        mended.set(judged.number - 1, best);
        return Optional.of(new Finding(
                        "plate-turned",
                        Severity.WARNING,
                        scene.capture().name() + ", plate " + judged.number,
                        String.format(
                                Locale.ROOT,
                                "the centre of pressure lies %.0f mm off the foot on average and runs %.0f mm along the way;"
                                        + " with the corners gone round otherwise %.0f mm and %.0f mm; limit %.0f mm off",
                                1e3 * judged.match.distance(),
                                1e3 * judged.match.progress(),
                                1e3 * reached.distance(),
                                1e3 * reached.progress(),
                                1e3 * NEAR),
                        "Force and centre of pressure of this plate point the wrong way, so no moment from it can be right",
                        "Check the order of the plate's corners against its axes, or give them in lab.plates")
                .proposing(new Proposal(Proposal.Scope.STUDY, PlatesAsJson.change(mended))));
    }

    private static Collection<Finding> swaps(List<Judged> judged, Scene scene) {
        List<Judged> off =
                judged.stream().filter(plate -> plate.match.distance() > FAR).toList();
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < off.size(); i++) {
            for (int k = i + 1; k < off.size(); k++) {
                swap(off.get(i), off.get(k), scene).ifPresent(findings::add);
            }
        }
        return findings;
    }

    private static Optional<Finding> swap(Judged one, Judged two, Scene scene) {
        Plate first = scene.described().get(one.number - 1);
        Plate second = scene.described().get(two.number - 1);
        if (first.type() != second.type()) {
            return Optional.empty();
        }
        Plate firstMended = PlateVariants.withChannelsOf(first, second);
        Plate secondMended = PlateVariants.withChannelsOf(second, first);
        double reached = Math.max(distance(firstMended, scene), distance(secondMended, scene));
        if (!(reached <= NEAR)) {
            return Optional.empty();
        }
        List<Plate> mended = new ArrayList<>(scene.described());
        mended.set(one.number - 1, firstMended);
        mended.set(two.number - 1, secondMended);
        return Optional.of(new Finding(
                        "plate-swapped",
                        Severity.WARNING,
                        scene.capture().name() + ", plates " + one.number + " and " + two.number,
                        String.format(
                                Locale.ROOT,
                                "their centres of pressure lie %.0f mm and %.0f mm off the feet; with their channels exchanged"
                                        + " %.0f mm at most; limit %.0f mm",
                                1e3 * one.match.distance(),
                                1e3 * two.match.distance(),
                                1e3 * reached,
                                1e3 * FAR),
                        "Each plate shows the load of the other, so neither foot has the reaction that it stands on",
                        "Exchange the channels of the two plates in lab.plates, and check the cables")
                .proposing(new Proposal(Proposal.Scope.STUDY, PlatesAsJson.change(mended))));
    }

    private static double distance(Plate described, Scene scene) {
        return match(described, scene).map(FootMatch::distance).orElse(Double.NaN);
    }
}
