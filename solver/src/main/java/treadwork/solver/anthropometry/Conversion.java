package treadwork.solver.anthropometry;

import treadwork.model.body.MassProperties;
import treadwork.model.body.MassSpread;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Side;
import treadwork.model.space.Inertia;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.solver.pose.SegmentAxes;
import treadwork.solver.pose.SegmentGeometry;

/** Turns a table's row, in its own axes and between its own ends, into mass properties in the segment's axes. */
final class Conversion {

    private Conversion() {}

    /**
     * Centre C = A + c (B - A) between the ends A and B, L apart. I = m L² (ρs² s sᵀ + ρt² t tᵀ + ρl² l lᵀ) with l along
     * the line, t the segment's Z made perpendicular to it, and s perpendicular to both.
     */
    static WeighedSegment onLine(MassSpread.OnLine spread, double mass, Ends ends) {
        double length = ends.length();
        Rotation segmentFromLine = lineAxes(ends);
        Inertia inLine = Inertia.diagonal(
                square(spread.sagittal() * length),
                square(spread.longitudinal() * length),
                square(spread.transverse() * length));
        return new WeighedSegment(
                new MassProperties(
                        mass, between(ends, spread.centre()), inLine.times(mass).in(segmentFromLine)),
                "ends " + ends.description() + "; centre of mass on the line between them; radii of gyration about that"
                        + " line, the segment's Z made perpendicular to it, and the third axis, turned into the segment's"
                        + " axes");
    }

    /**
     * As {@link #onLine}, with the ends moved into the segment's X-Y plane and one radius about both axes across the line.
     * The table gives none about the line. There the segment is taken for a solid cylinder between its ends, of its mass
     * and density: m = δ π R² L, I = m R² / 2.
     */
    static WeighedSegment fromTheSide(MassSpread.InSagittalPlane spread, double mass, Ends ends) {
        Ends flat = ends.fromTheSide();
        double length = flat.length();
        double across = square(spread.radius() * length);
        double along = mass / (spread.density() * Math.PI * length) / 2;
        Inertia inLine = Inertia.diagonal(across, along, across);
        return new WeighedSegment(
                new MassProperties(
                        mass, between(flat, spread.centre()), inLine.times(mass).in(lineAxes(flat))),
                "ends " + flat.description()
                        + ", both moved into the segment's X-Y plane, as the table is planar; centre of"
                        + " mass on the line between them; its one radius of gyration holds about both axes across that"
                        + " line; about the line itself the table gives none: a solid cylinder of the segment's mass,"
                        + " length and density (density from memory) is taken");
    }

    /**
     * C = L c and I = m L² J in the table's axes, which have their origin at the first end and are those of the segment
     * itself, but for the shank's turn about Y, which the table always takes from the malleoli. On the left Z is mirrored:
     * the signs of cz, Jxz and Jyz change.
     */
    static WeighedSegment inAxes(MassSpread.InAxes spread, double mass, Ends ends, SegmentGeometry segment) {
        int sign = segment.segment().side().map(Side::sign).orElse(1);
        double length = ends.length();
        Inertia j = spread.inertia();
        Inertia own = new Inertia(j.xx(), j.yy(), j.zz(), j.xy(), sign * j.xz(), sign * j.yz());
        Vector3 c = new Vector3(
                spread.centre().x(), spread.centre().y(), sign * spread.centre().z());
        Rotation segmentFromTable = tableAxes(segment);
        return new WeighedSegment(
                new MassProperties(
                        mass,
                        ends.from().plus(segmentFromTable.times(c.times(length))),
                        own.times(mass * length * length).in(segmentFromTable)),
                "ends " + ends.description()
                        + "; full centre and tensor in the table's axes, which are the segment's own"
                        + (segment.segment().kind() == SegmentKind.SHANK ? " turned about Y to the malleoli" : "")
                        + (sign < 0 ? "; left side mirrored in Z" : ""));
    }

    /** Columns s, l, t of {@link #onLine}, in segment axes. */
    private static Rotation lineAxes(Ends ends) {
        Vector3 l = ends.to().minus(ends.from()).unit();
        Vector3 z = new Vector3(0, 0, 1);
        Vector3 t = z.minus(l.times(z.dot(l))).unit();
        return Rotation.ofColumns(l.cross(t), l, t);
    }

    private static Rotation tableAxes(SegmentGeometry segment) {
        if (segment.segment().kind() != SegmentKind.SHANK) {
            return Rotation.IDENTITY;
        }
        Vector3 lateral = segment.landmark("lateral_malleolus").orElseThrow();
        Vector3 medial = segment.landmark("medial_malleolus").orElseThrow();
        Vector3 towardsRight = lateral.minus(medial)
                .times(segment.segment().side().orElseThrow().sign());
        return SegmentAxes.longBone(Vector3.ZERO, lateral.midpoint(medial), towardsRight)
                .labFromBody();
    }

    private static Vector3 between(Ends ends, double share) {
        return ends.from().plus(ends.to().minus(ends.from()).times(share));
    }

    private static double square(double value) {
        return value * value;
    }
}
