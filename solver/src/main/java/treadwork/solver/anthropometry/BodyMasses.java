package treadwork.solver.anthropometry;

import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import treadwork.model.body.InertiaRow;
import treadwork.model.body.InertiaSource;
import treadwork.model.body.MassProperties;
import treadwork.model.body.MassSpread;
import treadwork.model.body.Segment;
import treadwork.model.body.SegmentKind;
import treadwork.model.finding.Finding;
import treadwork.model.finding.Severity;
import treadwork.model.finding.UnusableInputException;
import treadwork.model.space.Inertia;
import treadwork.model.study.Orthosis;
import treadwork.solver.pose.SegmentGeometry;
import treadwork.solver.pose.StandingBody;

/** Weighs the measured segments of a body. */
public final class BodyMasses {

    private BodyMasses() {}

    /**
     * Mass properties of every measured segment, in its own axes. The pelvis is left out unless a person gives it: the
     * recursion from the feet does not need it. Values that a person gives replace a segment's whole; those for segments
     * that are not measured are not used.
     *
     * @param given a person's own values
     * @throws UnusableInputException {@code sex-missing} where the table needs the subject's sex, {@code segment-mass} where
     *     no body can have the values given
     */
    public static Map<Segment, WeighedSegment> of(
            StandingBody body, BodyMass subject, InertiaSource table, Map<Segment, MassProperties> given) {
        given.forEach((segment, mass) -> requirePhysical(segment, mass, subject));
        Map<Segment, WeighedSegment> weighed = new EnumMap<>(Segment.class);
        body.segments().forEach((segment, geometry) -> {
            if (given.containsKey(segment)) {
                weighed.put(segment, new WeighedSegment(given.get(segment), "given in the study file, segment axes"));
            } else if (segment.kind() != SegmentKind.PELVIS) {
                weighed.put(segment, fromTable(geometry, subject, table));
            }
        });
        return weighed;
    }

    /**
     * The same body with devices on: each a point mass fixed to its segment (parallel axes). A device on a segment that was
     * not weighed is not used.
     *
     * @throws UnusableInputException {@code segment-mass} where a device's mass is not above zero
     */
    public static Map<Segment, WeighedSegment> wearing(Map<Segment, WeighedSegment> bare, List<Orthosis> orthoses) {
        Map<Segment, WeighedSegment> dressed = new EnumMap<>(Segment.class);
        dressed.putAll(bare);
        for (Orthosis orthosis : orthoses) {
            requirePhysical(orthosis);
            dressed.computeIfPresent(orthosis.segment(), (segment, weighed) -> with(weighed, orthosis));
        }
        return dressed;
    }

    private static WeighedSegment with(WeighedSegment weighed, Orthosis orthosis) {
        MassProperties device = new MassProperties(orthosis.massKg(), orthosis.centre(), Inertia.ZERO);
        String words = String.format(
                Locale.ROOT,
                "%s; with \"%s\", %.3f kg as a point mass",
                weighed.source(),
                orthosis.condition(),
                device.mass());
        return new WeighedSegment(weighed.mass().plus(device), words);
    }

    private static WeighedSegment fromTable(SegmentGeometry geometry, BodyMass subject, InertiaSource table) {
        SegmentKind kind = geometry.segment().kind();
        if (table.isBySex() && subject.sex().isEmpty()) {
            throw sexMissing(subject, table);
        }
        InertiaRow row = table.row(kind, subject.sex())
                .orElseThrow(() -> new IllegalStateException(table.name() + " has no " + kind.key()));
        double mass = row.massShare() * subject.kg();
        WeighedSegment weighed = spread(row, mass, geometry);
        String sex = row.sex().map(value -> ", " + value.key()).orElse("");
        String words = String.format(
                Locale.ROOT,
                "%s%s, %s: %.2f %% of %.2f kg; %s",
                table.name(),
                sex,
                kind.key(),
                row.massShare() * 100,
                subject.kg(),
                weighed.source());
        return new WeighedSegment(weighed.mass(), words);
    }

    private static WeighedSegment spread(InertiaRow row, double mass, SegmentGeometry geometry) {
        Ends ends = Ends.of(row, geometry);
        if (row.spread() instanceof MassSpread.OnLine spread) {
            return Conversion.onLine(spread, mass, ends);
        }
        if (row.spread() instanceof MassSpread.InSagittalPlane spread) {
            return Conversion.fromTheSide(spread, mass, ends);
        }
        return Conversion.inAxes((MassSpread.InAxes) row.spread(), mass, ends, geometry);
    }

    private static UnusableInputException sexMissing(BodyMass subject, InertiaSource table) {
        return new UnusableInputException(new Finding(
                "sex-missing",
                Severity.REFUSES,
                "subject " + subject.subject(),
                table.name() + " has a column each for women and men, and subjects[].sex is not stated",
                "The masses and centres of the segments differ between the two by up to an eighth",
                "State subjects[].sex as \"female\" or \"male\", or set body.inertia to \"winter-dempster\""));
    }

    private static void requirePhysical(Segment segment, MassProperties mass, BodyMass subject) {
        boolean weighs = mass.mass() > 0 && mass.mass() < subject.kg();
        if (!weighs) {
            throw unphysical(
                    "subject " + subject.subject() + ", body.segments." + segment.key(),
                    String.format(
                            Locale.ROOT,
                            "massKg is %.3f, above 0 and below the body's %.2f is needed",
                            mass.mass(),
                            subject.kg()));
        }
        if (!Double.isFinite(mass.centre().norm()) || !mass.inertia().isPhysical()) {
            throw unphysical(
                    "subject " + subject.subject() + ", body.segments." + segment.key(),
                    "no rigid body can have the tensor inertiaKgm2 " + numbers(mass.inertia())
                            + " about the centre comM: no principal moment may be below 0 or above the sum of the other two");
        }
    }

    private static void requirePhysical(Orthosis orthosis) {
        boolean weighs = orthosis.massKg() > 0 && Double.isFinite(orthosis.massKg());
        if (!weighs || !Double.isFinite(orthosis.centre().norm())) {
            throw unphysical(
                    "orthosis \"" + orthosis.condition() + "\" on "
                            + orthosis.segment().key(),
                    String.format(
                            Locale.ROOT,
                            "massKg is %.3f and comM %s; a mass above 0 at a place is needed",
                            orthosis.massKg(),
                            orthosis.centre()));
        }
    }

    private static String numbers(Inertia i) {
        return String.format(
                Locale.ROOT, "[%.6g, %.6g, %.6g, %.6g, %.6g, %.6g]", i.xx(), i.yy(), i.zz(), i.xy(), i.xz(), i.yz());
    }

    private static UnusableInputException unphysical(String where, String figure) {
        return new UnusableInputException(new Finding(
                "segment-mass",
                Severity.REFUSES,
                where,
                figure,
                "The loads of this segment and all above it would be wrong",
                "Give mass in kg, the centre in m and the tensor about it in kg·m² as [Ixx, Iyy, Izz, Ixy, Ixz, Iyz], or leave"
                        + " the segment to the table"));
    }
}
