package treadwork.solver.proof;

import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import treadwork.model.space.Vector3;

/**
 * The motion of a plate's description that makes its loads those of the rod.
 *
 * <p>A rod that is pointed at both ends transmits a force along its axis through its tip, but for its weight: with the hand's
 * force at the other end and moments taken there, u × (F - (1 - s) m g n) = 0, where F is what the plate does to the rod, u
 * the axis, s the centre of mass as a share of the length, and n points up. A point takes no moment. If the plate is moved by
 * t and turned by R against its description, F = R f and M = R m about c + t, where f and m are what the description makes of
 * the channels and c is the described centre. So for every frame, with the tip at p:
 *
 * <pre>
 * R m - (p - c - t) × R f = 0          u × (R f - (1 - s) m g n) = 0
 * </pre>
 *
 * <p>Gauss and Newton's steps on both, weighted by their own scatter; neither divides by a force. The derivatives take F along
 * the rod and M = (p - c - t) × F, as they should be: with the measured values the noise would count as information. After
 * the idea of the test of J. P. Holden, W. S. Selbie and S. J. Stanhope, Gait and Posture 17 (2003) 205-213; the equations
 * are derived here.
 *
 * @param placement the motion
 * @param known     which of its six numbers (place x, y, z; turn x, y, z) the data determine; the others were held at 0
 * @param errors    standard errors of the six, m and rad, if the errors of frames are independent
 */
record PlacementFit(Placement placement, BitSet known, List<Double> errors) {

    static final int UNKNOWNS = 6;

    private static final int STEPS = 12;

    /** Below this a step changes nothing, m and rad. */
    private static final double CONVERGED = 1e-13;

    /** Of a good plate and good markers: N·m and N; what scatters less is not believed when the data are asked what they tell. */
    private static final double USUAL_MOMENT = 0.15;

    private static final double USUAL_FORCE = 1;

    /** A component known no better than this is not given, m and rad: under half of what is accepted. */
    private static final double LARGEST_MOVE = 0.002;

    private static final double LARGEST_TURN = Math.toRadians(0.5);

    private static final double SMALLEST = 1e-9;

    /**
     * What does not change from frame to frame.
     *
     * @param centre of the surface as described, m
     * @param normal up
     * @param lift   what of the rod's weight the plate bears beside what runs along the rod, N
     */
    record Model(Vector3 centre, Vector3 normal, double lift) {

        Vector3 arm(RodFrame frame, Placement placement) {
            return frame.tip().minus(centre).minus(placement.moved());
        }

        Vector3 momentAboutTip(RodFrame frame, Placement placement) {
            Vector3 force = placement.turned().times(frame.force());
            return placement
                    .turned()
                    .times(frame.moment())
                    .minus(arm(frame, placement).cross(force));
        }

        Vector3 across(RodFrame frame, Placement placement) {
            return frame.axis().cross(placement.turned().times(frame.force()).minus(normal.times(lift)));
        }

        /** The force of that size that does run along the rod. */
        Vector3 ideal(RodFrame frame, Placement placement) {
            Vector3 weight = normal.times(lift);
            double along = placement.turned().times(frame.force()).minus(weight).dot(frame.axis());
            return frame.axis().times(along).plus(weight);
        }
    }

    /** Leaves out, one after the other, what the data do not determine. */
    static PlacementFit of(List<RodFrame> frames, Model model) {
        BitSet known = new BitSet();
        known.set(0, UNKNOWNS);
        while (true) {
            PlacementFit fit = of(frames, model, known);
            Normal normal = Normal.of(frames, model, fit.placement, new double[] {USUAL_MOMENT, USUAL_FORCE});
            double[] errors = normal.errors(known);
            int worst = -1;
            double most = 1;
            for (int k = known.nextSetBit(0); k >= 0; k = known.nextSetBit(k + 1)) {
                double share = errors[k] / (k < 3 ? LARGEST_MOVE : LARGEST_TURN);
                if (!(share <= most)) {
                    most = share;
                    worst = k;
                }
            }
            if (worst < 0) {
                return fit;
            }
            known.clear(worst);
        }
    }

    private static PlacementFit of(List<RodFrame> frames, Model model, BitSet known) {
        Placement placement = Placement.NONE;
        double[] scatter = {USUAL_MOMENT, USUAL_FORCE};
        Normal normal = Normal.of(frames, model, placement, scatter);
        for (int i = 0; i < STEPS; i++) {
            double[] step = normal.step(known);
            placement = placement.stepped(step);
            RodMisfit misfit = RodMisfit.of(frames, model, placement);
            scatter = new double[] {Math.max(SMALLEST, misfit.moment()), Math.max(SMALLEST, misfit.across())};
            normal = Normal.of(frames, model, placement, scatter);
            if (i > 2 && new ArrayRealVector(step).getLInfNorm() < CONVERGED) {
                break;
            }
        }
        List<Double> errors = Arrays.stream(normal.errors(known)).boxed().toList();
        return new PlacementFit(placement, (BitSet) known.clone(), errors);
    }

    /** The normal equations of one step. */
    private record Normal(RealMatrix matrix, ArrayRealVector right) {

        static Normal of(List<RodFrame> frames, Model model, Placement placement, double[] scatter) {
            RealMatrix matrix = new Array2DRowRealMatrix(UNKNOWNS, UNKNOWNS);
            ArrayRealVector right = new ArrayRealVector(UNKNOWNS);
            for (RodFrame frame : frames) {
                Vector3 force = model.ideal(frame, placement);
                Vector3 arm = model.arm(frame, placement);
                Vector3[] moments = new Vector3[UNKNOWNS];
                Vector3[] across = new Vector3[UNKNOWNS];
                for (int k = 0; k < UNKNOWNS; k++) {
                    Vector3 e = axis(k % 3);
                    Vector3 turned = e.cross(force);
                    moments[k] = k < 3 ? turned : e.cross(arm.cross(force)).minus(arm.cross(turned));
                    across[k] = k < 3 ? Vector3.ZERO : frame.axis().cross(turned);
                }
                add(matrix, right, moments, model.momentAboutTip(frame, placement), scatter[0]);
                add(matrix, right, across, model.across(frame, placement), scatter[1]);
            }
            return new Normal(matrix, right);
        }

        private static void add(
                RealMatrix matrix, ArrayRealVector right, Vector3[] derivatives, Vector3 residual, double scatter) {
            double weight = 1 / (scatter * scatter);
            for (int k = 0; k < UNKNOWNS; k++) {
                right.addToEntry(k, -weight * derivatives[k].dot(residual));
                for (int j = 0; j < UNKNOWNS; j++) {
                    matrix.addToEntry(k, j, weight * derivatives[k].dot(derivatives[j]));
                }
            }
        }

        private static Vector3 axis(int k) {
            return new Vector3(k == 0 ? 1 : 0, k == 1 ? 1 : 0, k == 2 ? 1 : 0);
        }

        double[] step(BitSet known) {
            int[] places = known.stream().toArray();
            double[] step = new double[UNKNOWNS];
            if (places.length > 0) {
                ArrayRealVector some = new ArrayRealVector(places.length);
                for (int k = 0; k < places.length; k++) {
                    some.setEntry(k, right.getEntry(places[k]));
                }
                double[] solved = solver(places).getSolver().solve(some).toArray();
                for (int k = 0; k < places.length; k++) {
                    step[places[k]] = solved[k];
                }
            }
            return step;
        }

        /** Of what is not known no number. */
        double[] errors(BitSet known) {
            int[] places = known.stream().toArray();
            double[] errors = new double[UNKNOWNS];
            Arrays.fill(errors, Double.NaN);
            if (places.length > 0) {
                RealMatrix covariance = solver(places).getSolver().getInverse();
                for (int k = 0; k < places.length; k++) {
                    errors[places[k]] = Math.sqrt(covariance.getEntry(k, k));
                }
            }
            return errors;
        }

        /** A trace of certainty that the description is right keeps the equations solvable whatever the data leave open. */
        private CholeskyDecomposition solver(int[] places) {
            RealMatrix some = matrix.getSubMatrix(places, places);
            for (int k = 0; k < places.length; k++) {
                some.addToEntry(k, k, 1e-12 * matrix.getTrace());
            }
            return new CholeskyDecomposition(some, 1e-6, 0);
        }
    }
}
