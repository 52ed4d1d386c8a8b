package treadwork.solver.plate;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PointSeries;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.model.study.LabAxis;

/**
 * Which signed axis of the lab points up.
 *
 * @param axis     empty where neither the plates nor a person say it
 * @param findings {@code lab-up-unknown} with an empty axis; {@code lab-up} where a person contradicts the plates, or the
 *                 plates each other
 */
public record LabUp(Optional<LabAxis> axis, List<Finding> findings) {

    /** Of the capture's frames about this many are looked at. */
    private static final int FRAMES_LOOKED_AT = 50;

    public LabUp {
        findings = List.copyOf(findings);
    }

    /**
     * The axis nearest to the plates' normals on the side that the markers are on; a person's word goes before it.
     *
     * @param stated what the study file says
     */
    public static LabUp find(Capture capture, List<Plate> plates, Optional<LabAxis> stated) {
        Map<LabAxis, Integer> votes = new EnumMap<>(LabAxis.class);
        for (Plate plate : plates) {
            vote(plate, capture).ifPresent(axis -> votes.merge(axis, 1, Integer::sum));
        }
        Optional<LabAxis> seen =
                votes.entrySet().stream().max(Map.Entry.comparingByValue()).map(Map.Entry::getKey);
        List<Finding> findings = new ArrayList<>();
        if (votes.size() > 1) {
            findings.add(disagreeing(capture, votes));
        }
        if (stated.isPresent() && seen.isPresent() && !stated.equals(seen)) {
            findings.add(contradicted(capture, stated.orElseThrow(), seen.orElseThrow()));
        }
        Optional<LabAxis> axis = stated.or(() -> seen);
        if (axis.isEmpty()) {
            findings.add(unknown(capture));
        }
        return new LabUp(axis, findings);
    }

    private static Optional<LabAxis> vote(Plate plate, Capture capture) {
        PlateAxes axes = PlateAxes.of(plate);
        int above = axes.describe(plate) ? markersAbove(axes, capture) : 0;
        return above == 0
                ? Optional.empty()
                : Optional.of(LabAxis.nearest(axes.labFromPlate().columnZ().times(above)));
    }

    /** Positive where more markers are on the side of the plate's z than on the other, negative the other way; 0 unseen. */
    private static int markersAbove(PlateAxes axes, Capture capture) {
        int above = 0;
        Vector3 z = axes.labFromPlate().columnZ();
        int step = Math.max(1, capture.frames() / FRAMES_LOOKED_AT);
        for (PointSeries point : capture.points()) {
            for (int i = 0; i < capture.frames(); i += step) {
                double height = point.positions().at(i).minus(axes.centre()).dot(z);
                above += height > 0 ? 1 : height < 0 ? -1 : 0;
            }
        }
        return above;
    }

    private static Finding unknown(Capture capture) {
        return new Finding(
                "lab-up-unknown",
                Severity.REFUSES,
                capture.name(),
                "no force plate with markers over it shows which lab axis points up",
                "Without it the direction of gravity, and so every load, is unknown",
                "Set lab.up in the study file, for example to \"+z\"");
    }

    private static Finding contradicted(Capture capture, LabAxis stated, LabAxis seen) {
        return new Finding(
                "lab-up",
                Severity.WARNING,
                capture.name(),
                String.format(
                        Locale.ROOT,
                        "lab.up says %s, the plates' surfaces with the markers above them say %s",
                        stated.key(),
                        seen.key()),
                "The stated axis is used; if it is wrong, gravity and every load are wrong",
                "Set lab.up to auto, or mend the plates' corners");
    }

    private static Finding disagreeing(Capture capture, Map<LabAxis, Integer> votes) {
        return new Finding(
                "lab-up",
                Severity.WARNING,
                capture.name(),
                "the plates disagree about which lab axis points up: " + inWords(votes),
                "The axis of most plates is used",
                "Mend the plates' corners, or set lab.up in the study file");
    }

    private static String inWords(Map<LabAxis, Integer> votes) {
        return String.join(
                ", ",
                votes.entrySet().stream()
                        .map(vote -> vote.getKey().key() + " by " + vote.getValue())
                        .toList());
    }
}
