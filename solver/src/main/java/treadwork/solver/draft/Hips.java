package treadwork.solver.draft;

import java.util.List;
import java.util.Optional;
import treadwork.model.space.Vector3;

/** The landmarks of the pelvis, among markers of both sides. */
record Hips(List<Spot> spots, double stature) {

    private static final List<Template> BEHIND =
            List.of(Template.PSIS, Template.PSIS, Template.SACRUM, Template.HIP_CENTRE, Template.HIP_CENTRE);

    /** Right, left or (0) in the middle. */
    private static final int[] SIDES = {1, -1, 0, 1, -1};

    /** A pair of ASISs that costs more cannot be one. */
    private static final double HOPELESS = 45;

    Hips {
        spots = List.copyOf(spots);
    }

    /** Slots: right and left ASIS, right and left PSIS, sacrum, right and left hip centre. */
    Shares shares() {
        Shares shares = new Shares(2 + BEHIND.size(), spots.size());
        double[] nobody = BEHIND.stream().mapToDouble(slot -> Template.NOBODY).toArray();
        // One PSIS without the other is of no use, so both or none.
        double[] bothPsis = nobody.clone();
        bothPsis[0] = Double.POSITIVE_INFINITY;
        bothPsis[1] = Double.POSITIVE_INFINITY;
        shares.add(new int[] {-1, -1, -1, -1, -1, -1, -1}, (2 + nobody.length) * Template.NOBODY);
        for (int right = 0; right < spots.size(); right++) {
            for (int left = 0; left < spots.size(); left++) {
                Vector3 apart = spots.get(right).at().minus(spots.get(left).at());
                Vector3 middle = spots.get(right).at().midpoint(spots.get(left).at());
                double cost = Template.ASIS.cost(apart, stature)
                        + Template.ASIS_HEIGHT.cost(new Vector3(0, middle.y(), middle.z()), stature);
                if (right != left && cost < HOPELESS) {
                    int[] front = {right, left};
                    shares.addAll(costs(middle, true), bothPsis, front, cost);
                    shares.addAll(costs(middle, false), nobody, front, cost);
                }
            }
        }
        return shares;
    }

    /** Midway between the best pair of ASISs. */
    Optional<Vector3> middle() {
        Shares shares = shares();
        return shares.best(0) < 0 || shares.best(1) < 0
                ? Optional.empty()
                : Optional.of(spots.get(shares.best(0))
                        .at()
                        .midpoint(spots.get(shares.best(1)).at()));
    }

    private double[][] costs(Vector3 middle, boolean withPsis) {
        double[][] costs = new double[BEHIND.size()][spots.size()];
        for (int slot = 0; slot < BEHIND.size(); slot++) {
            for (int i = 0; i < spots.size(); i++) {
                Vector3 arm = spots.get(i).at().minus(middle);
                double out = SIDES[slot] < 0 ? -arm.z() : arm.z();
                costs[slot][i] = slot < 2 && !withPsis
                        ? Double.POSITIVE_INFINITY
                        : BEHIND.get(slot).cost(new Vector3(arm.x(), arm.y(), out), stature);
            }
        }
        return costs;
    }
}
