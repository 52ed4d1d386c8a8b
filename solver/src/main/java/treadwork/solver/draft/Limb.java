package treadwork.solver.draft;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import treadwork.model.space.Vector3;

/**
 * The landmarks of one leg, seen as a right one.
 *
 * @param spots of that side alone, z to the outside
 */
record Limb(List<Spot> spots, double stature) {

    /** A foot's markers lie within this of the ankle, of a body of {@link Template#STATURE}, m. */
    private static final double FOOT_REACH = 0.3;

    private static final double ABOVE_ANKLE = 0.03;
    private static final int MOST_ON_FOOT = 9;

    /** The cost of taking the inner point for a computed joint centre: about one laboratory in eight keeps such points. */
    private static final double COMPUTED = 4;

    /** Toeing out, degrees: mean and spread over people (common practice). */
    private static final double TOE_OUT = 7;

    private static final double TOE_OUT_SPREAD = 8;
    private static final List<Template> FOOT =
            List.of(Template.HEEL, Template.FIRST_HEAD, Template.FIFTH_HEAD, Template.SECOND_HEAD, Template.TOE_TIP);

    /** In {@link #FOOT}, from here on landmarks that many laboratories leave out. */
    private static final int FIRST_OPTIONAL = 3;

    Limb {
        spots = List.copyOf(spots);
    }

    Shares knee() {
        return pair(Template.KNEE_HEIGHT, Template.KNEE);
    }

    Shares ankle() {
        return pair(Template.ANKLE_HEIGHT, Template.ANKLE);
    }

    /** The middle of the pair that a joint's shares find best. */
    Optional<Vector3> middle(Shares pair) {
        return pair.best(0) < 0 || pair.best(1) < 0
                ? Optional.empty()
                : Optional.of(spots.get(pair.best(0))
                        .at()
                        .midpoint(spots.get(pair.best(1)).at()));
    }

    /** Slot 0 the outer, slot 1 the inner marker of a joint. */
    private Shares pair(Template height, Template apart) {
        Shares shares = new Shares(2, spots.size());
        shares.add(new int[] {Shares.NOBODY, Shares.NOBODY}, 2 * Template.NOBODY);
        for (int i = 0; i < spots.size(); i++) {
            Vector3 one = spots.get(i).at();
            double single = 2 * height.cost(new Vector3(0, one.y(), one.z()), stature) + Template.NOBODY;
            shares.add(new int[] {i, Shares.NOBODY}, single);
            shares.add(new int[] {Shares.NOBODY, i}, single);
            for (int j = 0; j < spots.size(); j++) {
                if (i != j) {
                    Vector3 other = spots.get(j).at();
                    Vector3 middle = one.midpoint(other);
                    double cost = height.cost(new Vector3(0, middle.y(), middle.z()), stature)
                            + apart.cost(one.minus(other), stature);
                    shares.add(new int[] {i, j}, cost);
                    double centred = height.cost(new Vector3(0, other.y(), other.z()), stature)
                            + apart.halved().cost(one.minus(other), stature);
                    shares.add(new int[] {i, Shares.NOBODY}, centred + COMPUTED);
                }
            }
        }
        return shares;
    }

    /** The markers that may be on the foot, numbers in {@link #spots}. */
    List<Integer> onFoot(Shares ankle) {
        Optional<Vector3> middle = middle(ankle);
        return IntStream.range(0, spots.size())
                .filter(i -> i != ankle.best(0) && i != ankle.best(1))
                .filter(i -> middle.map(centre -> isNear(spots.get(i).at().minus(centre)))
                        .orElse(false))
                .limit(MOST_ON_FOOT)
                .boxed()
                .toList();
    }

    private boolean isNear(Vector3 fromAnkle) {
        double scale = stature / Template.STATURE;
        return fromAnkle.y() < ABOVE_ANKLE * scale && fromAnkle.norm() < FOOT_REACH * scale;
    }

    /** Slots: heel, first, fifth, second metatarsal head, toe tip; markers by their place in {@link #onFoot}. */
    Shares foot(Shares ankle) {
        List<Integer> on = onFoot(ankle);
        Shares shares = new Shares(FOOT.size(), on.size());
        double[] nobody = IntStream.range(0, FOOT.size())
                .mapToDouble(slot -> slot < FIRST_OPTIONAL ? Template.NOBODY : Template.NOBODY_OPTIONAL)
                .toArray();
        for (double degrees = TOE_OUT - 3 * TOE_OUT_SPREAD; degrees <= TOE_OUT + 3 * TOE_OUT_SPREAD; degrees += 3) {
            double off = (degrees - TOE_OUT) / TOE_OUT_SPREAD;
            double sine = Math.sin(Math.toRadians(degrees));
            double cosine = Math.cos(Math.toRadians(degrees));
            double[][] costs = new double[FOOT.size()][on.size()];
            for (int j = 0; j < on.size(); j++) {
                Vector3 arm = spots.get(on.get(j)).at().minus(middle(ankle).orElseThrow());
                Vector3 along =
                        new Vector3(arm.x() * cosine + arm.z() * sine, arm.y(), arm.z() * cosine - arm.x() * sine);
                for (int slot = 0; slot < FOOT.size(); slot++) {
                    costs[slot][j] = FOOT.get(slot).cost(along, stature);
                }
            }
            shares.addAll(costs, nobody, new int[0], off * off);
        }
        return shares;
    }
}
