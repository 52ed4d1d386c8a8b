package treadwork.solver.pose;

import java.util.Random;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;

/**
 * A smooth motion with exact derivatives: the rotation vector and the path are cubic polynomials of time, differentiated
 * automatically through Rodrigues' formula.
 */
final class SmoothMotion {

    /** Where the body is and how it moves, lab axes. */
    record State(
            Vector3 origin,
            Vector3 velocity,
            Vector3 acceleration,
            Rotation labFromBody,
            Vector3 angularVelocity,
            Vector3 angularAcceleration) {}

    private static final int DEGREE = 3;

    private final double[][] turn;
    private final double[][] path;

    private SmoothMotion(double[][] turn, double[][] path) {
        this.turn = turn;
        this.path = path;
    }

    static SmoothMotion random(Random random) {
        return new SmoothMotion(polynomials(random), polynomials(random));
    }

    private static double[][] polynomials(Random random) {
        double[][] coefficients = new double[3][DEGREE + 1];
        for (double[] polynomial : coefficients) {
            for (int k = 0; k <= DEGREE; k++) {
                polynomial[k] = random.nextGaussian();
            }
        }
        return coefficients;
    }

    /**
     * Exact to rounding. Ω = Ṙ Rᵀ is the skew matrix of ω, and its rate R̈ Rᵀ + Ṙ Ṙᵀ that of α.
     */
    State at(double time) {
        DerivativeStructure t = new DerivativeStructure(1, 2, 0, time);
        DerivativeStructure[] v = new DerivativeStructure[3];
        DerivativeStructure[] p = new DerivativeStructure[3];
        for (int k = 0; k < 3; k++) {
            v[k] = polynomial(turn[k], t);
            p[k] = polynomial(path[k], t);
        }
        DerivativeStructure[][] r = rodrigues(v);
        double[][] spin = new double[3][3];
        double[][] spinRate = new double[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                for (int k = 0; k < 3; k++) {
                    spin[i][j] += d(r[i][k], 1) * d(r[j][k], 0);
                    spinRate[i][j] += d(r[i][k], 2) * d(r[j][k], 0) + d(r[i][k], 1) * d(r[j][k], 1);
                }
            }
        }
        return new State(vector(p, 0), vector(p, 1), vector(p, 2), rotation(r), ofSkew(spin), ofSkew(spinRate));
    }

    private static DerivativeStructure polynomial(double[] coefficients, DerivativeStructure t) {
        DerivativeStructure sum = t.multiply(0);
        for (int k = DEGREE; k >= 0; k--) {
            sum = sum.multiply(t).add(coefficients[k]);
        }
        return sum;
    }

    /** R = E + sin θ/θ K + (1 - cos θ)/θ² K², K the skew matrix of the rotation vector of length θ. */
    private static DerivativeStructure[][] rodrigues(DerivativeStructure[] v) {
        DerivativeStructure square =
                v[0].multiply(v[0]).add(v[1].multiply(v[1])).add(v[2].multiply(v[2]));
        DerivativeStructure angle = square.sqrt();
        DerivativeStructure first = angle.sin().divide(angle);
        DerivativeStructure second = angle.cos().negate().add(1).divide(square);
        DerivativeStructure zero = square.multiply(0);
        DerivativeStructure[][] k = {
            {zero, v[2].negate(), v[1]}, {v[2], zero, v[0].negate()}, {v[1].negate(), v[0], zero}
        };
        DerivativeStructure[][] r = new DerivativeStructure[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                DerivativeStructure twice = zero;
                for (int m = 0; m < 3; m++) {
                    twice = twice.add(k[i][m].multiply(k[m][j]));
                }
                r[i][j] = k[i][j].multiply(first).add(twice.multiply(second)).add(i == j ? 1 : 0);
            }
        }
        return r;
    }

    private static double d(DerivativeStructure value, int order) {
        return value.getPartialDerivative(order);
    }

    private static Vector3 vector(DerivativeStructure[] p, int order) {
        return new Vector3(d(p[0], order), d(p[1], order), d(p[2], order));
    }

    private static Rotation rotation(DerivativeStructure[][] r) {
        return new Rotation(
                d(r[0][0], 0),
                d(r[0][1], 0),
                d(r[0][2], 0),
                d(r[1][0], 0),
                d(r[1][1], 0),
                d(r[1][2], 0),
                d(r[2][0], 0),
                d(r[2][1], 0),
                d(r[2][2], 0));
    }

    private static Vector3 ofSkew(double[][] m) {
        return new Vector3(m[2][1], m[0][2], m[1][0]);
    }
}
