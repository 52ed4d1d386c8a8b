package treadwork.solver.plausible;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.capture.LengthUnit;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Proposal;
import treadwork.model.finding.Severity;
import treadwork.model.space.Vector3;
import treadwork.solver.pose.SegmentGeometry;
import treadwork.solver.pose.StandingBody;

/** {@code unit-mismatch} of lengths, and {@code landmark-order} from head to foot: whether the body can be a person's. */
public final class BodyCheck {

    /** Thigh and shank of a child of one year are 0.12 m, of the tallest adults 0.6 m (from memory); beyond is another unit, m. */
    private static final double SHORTEST = 0.08;

    private static final double LONGEST = 0.9;

    /** What the length of an adult's thigh or shank is like, m. */
    private static final double USUAL = 0.42;

    private BodyCheck() {}

    /**
     * @param unit of lengths that the standing capture was read with
     * @param up   lab axes
     */
    public static List<Finding> of(StandingBody body, String standing, LengthUnit unit, Vector3 up) {
        List<Finding> findings = new ArrayList<>();
        length(body, standing, unit).ifPresent(findings::add);
        for (Side side : Side.values()) {
            order(body, standing, side, up).ifPresent(findings::add);
        }
        return findings;
    }

    private static Optional<Finding> length(StandingBody body, String standing, LengthUnit unit) {
        double[] lengths = body.segments().values().stream()
                .filter(part -> part.segment().kind() == SegmentKind.THIGH
                        || part.segment().kind() == SegmentKind.SHANK)
                .mapToDouble(SegmentGeometry::length)
                .sorted()
                .toArray();
        double length = lengths.length == 0 ? Double.NaN : lengths[lengths.length / 2];
        if (!(length < SHORTEST || length > LONGEST)) {
            return Optional.empty();
        }
        double factor = Math.pow(10, Math.rint(Math.log10(USUAL / length)));
        Finding finding = new Finding(
                "unit-mismatch",
                Severity.WARNING,
                standing,
                String.format(
                        Locale.ROOT,
                        "thigh and shank are %.3g m long, read in %s; limits %.2f and %.1f m; %s times as much would be a person's",
                        length,
                        unit.symbol(),
                        SHORTEST,
                        LONGEST,
                        String.format(Locale.ROOT, factor >= 1 ? "%.0f" : "%.3g", factor)),
                "All lengths are out by that factor, and so are all moments",
                "State the unit that the captures are really in with lab.pointUnit");
        Optional<LengthUnit> right = unitOf(unit.metres() * factor);
        return Optional.of(right.map(better -> finding.proposing(new Proposal(
                        Proposal.Scope.STUDY, "{ \"lab\": { \"pointUnit\": \"" + better.symbol() + "\" } }")))
                .orElse(finding));
    }

    private static Optional<LengthUnit> unitOf(double metres) {
        for (LengthUnit unit : LengthUnit.values()) {
            if (Math.abs(unit.metres() / metres - 1) < 1e-6) {
                return Optional.of(unit);
            }
        }
        return Optional.empty();
    }

    private static Optional<Finding> order(StandingBody body, String standing, Side side, Vector3 up) {
        SegmentGeometry thigh = body.segments().get(Segment.of(SegmentKind.THIGH, side));
        SegmentGeometry shank = body.segments().get(Segment.of(SegmentKind.SHANK, side));
        SegmentGeometry foot = body.segments().get(Segment.of(SegmentKind.FOOT, side));
        if (shank == null || foot == null) {
            return Optional.empty();
        }
        double knee = shank.standing().origin().dot(up);
        double ankle = foot.standing().origin().dot(up);
        double hip = thigh == null
                ? Double.POSITIVE_INFINITY
                : thigh.standing().origin().dot(up);
        if (hip > knee && knee > ankle) {
            return Optional.empty();
        }
        return Optional.of(
                new Finding(
                        "landmark-order",
                        Severity.WARNING,
                        standing + ", " + side.key() + " leg",
                        String.format(
                                Locale.ROOT,
                                "standing, its knee is %.2f m high and its ankle %.2f m%s; each must be below the one above",
                                knee,
                                ankle,
                                thigh == null ? "" : String.format(Locale.ROOT, ", its hip %.2f m", hip)),
                        "Landmarks stand for each other, so segments point the wrong way",
                        "Check the labels of epicondyles, malleoli and the pelvis in the marker set, and which axis points up"));
    }
}
