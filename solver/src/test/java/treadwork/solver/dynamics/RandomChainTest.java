package treadwork.solver.dynamics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import treadwork.model.body.MassProperties;
import treadwork.model.space.Inertia;
import treadwork.model.space.PoseSeries;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/**
 * The recursion against the momentum rates of random chains, whose poses are functions of time that an automatic
 * differentiation library differentiates: force = rate of momentum, no recursion.
 */
class RandomChainTest {

    /** Rounding of some 500 operations on values up to 1e4. */
    private static final double ROUNDING = 1e-9;

    private static final Vector3 GRAVITY = new Vector3(1.2, -9.7, 0.4);

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void reproducesTheMomentumRatesOfAnyChain(long seed) {
        Random random = new Random(seed);
        List<Link> links = chainFromTheTop(random, 5);
        Collections.reverse(links);
        WrenchSeries ground = new WrenchSeries(vector(random, 1), one(vector(random, 500)), one(vector(random, 50)));

        List<LoadSeries> loads = LimbLoads.of(
                links.stream().map(Link::segment).toList(),
                links.stream().map(link -> one(link.joint())).toList(),
                ground,
                GRAVITY);

        for (int k = 0; k < links.size(); k++) {
            LoadSeries expected = momentumRates(links.subList(0, k + 1), ground);
            String where = "joint " + k + ", seed " + seed;
            assertEquals(
                    0, expected.force().at(0).minus(loads.get(k).force().at(0)).norm(), ROUNDING, where);
            assertEquals(
                    0,
                    expected.moment().at(0).minus(loads.get(k).moment().at(0)).norm(),
                    ROUNDING,
                    where);
        }
    }

    /** A segment, its proximal joint centre, and the rate of its angular momentum as the library finds it. */
    private record Link(MovingSegment segment, Vector3 joint, Vector3 spinRate) {}

    /** F = Σ m (a - g) - ground force, M = Σ [(C - P) × m (a - g) + dH/dt] - ground moment about P. */
    private static LoadSeries momentumRates(List<Link> distal, WrenchSeries ground) {
        Vector3 joint = distal.get(distal.size() - 1).joint();
        Vector3 force = ground.force().at(0).negated();
        Vector3 moment = ground.at(0).about(joint).moment().negated();
        for (Link link : distal) {
            MovingSegment segment = link.segment();
            Vector3 push = segment.acceleration()
                    .at(0)
                    .minus(GRAVITY)
                    .times(segment.mass().mass());
            force = force.plus(push);
            moment =
                    moment.plus(segment.centre().at(0).minus(joint).cross(push)).plus(link.spinRate());
        }
        return new LoadSeries(one(joint), one(force), one(moment));
    }

    private static List<Link> chainFromTheTop(Random random, int count) {
        List<Link> links = new ArrayList<>();
        DerivativeStructure[] origin = polynomials(random, 1);
        DerivativeStructure[][] labFromParent = identity();
        for (int k = 0; k < count; k++) {
            DerivativeStructure[][] labFromBody = product(labFromParent, rotation(polynomials(random, 0.8)));
            links.add(link(random, origin, labFromBody));
            origin = sum(origin, times(labFromBody, constant(vector(random, 0.5))));
            labFromParent = labFromBody;
        }
        return links;
    }

    private static Link link(Random random, DerivativeStructure[] origin, DerivativeStructure[][] labFromBody) {
        MassProperties mass = new MassProperties(
                1 + 9 * random.nextDouble(),
                vector(random, 0.3),
                new Inertia(0.3, 0.2, 0.25, 0.05 * random.nextGaussian(), 0.03, -0.02));
        DerivativeStructure[] centre = sum(origin, times(labFromBody, constant(mass.centre())));
        Vector3 omega = vee(labFromBody, 1);
        Vector3 alpha = vee(labFromBody, 2);
        PoseSeries.Builder pose = new PoseSeries.Builder(1);
        pose.set(0, derivative(origin, 0), matrix(labFromBody));
        MovingSegment segment = new MovingSegment(
                mass, pose.build(), one(omega), one(alpha), one(derivative(centre, 0)), one(derivative(centre, 2)));
        return new Link(segment, derivative(origin, 0), spinRate(labFromBody, mass.inertia()));
    }

    /**
     * The rate of H = Σ over point masses r × m v: the tensor's second moments J = tr(I)/2 E - I give
     * H = vee(Ṙ J Rᵀ - R J Ṙᵀ), so dH/dt = vee(R̈ J Rᵀ - R J R̈ᵀ) = twice the axial vector of R̈ J Rᵀ.
     */
    private static Vector3 spinRate(DerivativeStructure[][] r, Inertia i) {
        double half = (i.xx() + i.yy() + i.zz()) / 2;
        double[][] j = {
            {half - i.xx(), -i.xy(), -i.xz()}, {-i.xy(), half - i.yy(), -i.yz()}, {-i.xz(), -i.yz(), half - i.zz()}
        };
        double[][] m = new double[3][3];
        for (int a = 0; a < 3; a++) {
            for (int b = 0; b < 3; b++) {
                for (int c = 0; c < 3; c++) {
                    for (int d = 0; d < 3; d++) {
                        m[a][b] += r[a][c].getPartialDerivative(2) * j[c][d] * r[b][d].getValue();
                    }
                }
            }
        }
        return new Vector3(m[2][1] - m[1][2], m[0][2] - m[2][0], m[1][0] - m[0][1]);
    }

    /** The axial vector of the skew part of R⁽ⁿ⁾ Rᵀ: ω for n = 1, α for n = 2. */
    private static Vector3 vee(DerivativeStructure[][] r, int order) {
        double[][] m = new double[3][3];
        for (int a = 0; a < 3; a++) {
            for (int b = 0; b < 3; b++) {
                for (int c = 0; c < 3; c++) {
                    m[a][b] += r[a][c].getPartialDerivative(order) * r[b][c].getValue();
                }
            }
        }
        return new Vector3(m[2][1] - m[1][2], m[0][2] - m[2][0], m[1][0] - m[0][1]).times(0.5);
    }

    /** Rodrigues' formula of a rotation vector that is a function of time. */
    private static DerivativeStructure[][] rotation(DerivativeStructure[] v) {
        DerivativeStructure square =
                v[0].multiply(v[0]).add(v[1].multiply(v[1])).add(v[2].multiply(v[2]));
        DerivativeStructure angle = square.sqrt();
        DerivativeStructure s = angle.sin().divide(angle);
        DerivativeStructure t = angle.cos().negate().add(1).divide(square);
        DerivativeStructure zero = v[0].multiply(0);
        DerivativeStructure[][] k = {
            {zero, v[2].negate(), v[1]}, {v[2], zero, v[0].negate()}, {v[1].negate(), v[0], zero}
        };
        DerivativeStructure[][] k2 = product(k, k);
        DerivativeStructure[][] r = identity();
        for (int a = 0; a < 3; a++) {
            for (int b = 0; b < 3; b++) {
                r[a][b] = r[a][b].add(k[a][b].multiply(s)).add(k2[a][b].multiply(t));
            }
        }
        return r;
    }

    private static DerivativeStructure[] polynomials(Random random, double size) {
        DerivativeStructure t = new DerivativeStructure(1, 2, 0, 0.3);
        DerivativeStructure[] result = new DerivativeStructure[3];
        for (int i = 0; i < 3; i++) {
            result[i] = t.multiply(size * 6 * random.nextGaussian())
                    .add(size * 2 * random.nextGaussian())
                    .multiply(t)
                    .add(size * random.nextGaussian());
        }
        return result;
    }

    private static DerivativeStructure[] constant(Vector3 v) {
        return new DerivativeStructure[] {
            new DerivativeStructure(1, 2, v.x()),
            new DerivativeStructure(1, 2, v.y()),
            new DerivativeStructure(1, 2, v.z())
        };
    }

    private static DerivativeStructure[][] identity() {
        return new DerivativeStructure[][] {
            constant(new Vector3(1, 0, 0)), constant(new Vector3(0, 1, 0)), constant(new Vector3(0, 0, 1))
        };
    }

    private static DerivativeStructure[][] product(DerivativeStructure[][] a, DerivativeStructure[][] b) {
        DerivativeStructure[][] result = new DerivativeStructure[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                result[i][j] =
                        a[i][0].multiply(b[0][j]).add(a[i][1].multiply(b[1][j])).add(a[i][2].multiply(b[2][j]));
            }
        }
        return result;
    }

    private static DerivativeStructure[] times(DerivativeStructure[][] a, DerivativeStructure[] v) {
        DerivativeStructure[] result = new DerivativeStructure[3];
        for (int i = 0; i < 3; i++) {
            result[i] = a[i][0].multiply(v[0]).add(a[i][1].multiply(v[1])).add(a[i][2].multiply(v[2]));
        }
        return result;
    }

    private static DerivativeStructure[] sum(DerivativeStructure[] a, DerivativeStructure[] b) {
        return new DerivativeStructure[] {a[0].add(b[0]), a[1].add(b[1]), a[2].add(b[2])};
    }

    private static Vector3 derivative(DerivativeStructure[] v, int order) {
        return order == 0
                ? new Vector3(v[0].getValue(), v[1].getValue(), v[2].getValue())
                : new Vector3(
                        v[0].getPartialDerivative(order),
                        v[1].getPartialDerivative(order),
                        v[2].getPartialDerivative(order));
    }

    private static Rotation matrix(DerivativeStructure[][] r) {
        return new Rotation(
                r[0][0].getValue(),
                r[0][1].getValue(),
                r[0][2].getValue(),
                r[1][0].getValue(),
                r[1][1].getValue(),
                r[1][2].getValue(),
                r[2][0].getValue(),
                r[2][1].getValue(),
                r[2][2].getValue());
    }

    private static Vector3 vector(Random random, double size) {
        return new Vector3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian()).times(size);
    }

    private static VectorSeries one(Vector3 value) {
        return VectorSeries.constant(value, 1);
    }
}
