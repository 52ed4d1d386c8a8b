package treadwork.io.text;

/**
 * Whether three columns move as a marker on a body does: across the room, yet at one distance from some other marker.
 * Forces, moments and centres of pressure do not: a step changes them by more than skin moves.
 */
final class Carried {

    /** A person crosses more while walking; one who stands does not, m. */
    private static final double LEAST_WAY = 0.2;

    /** Markers of one segment keep their distance but for the skin, which moves by less, m. */
    private static final double MOST_PLAY = 0.06;

    /** No two markers are glued closer; columns that are nearer are the same signal twice, m. */
    private static final double CLOSEST = 0.005;

    private final Table table;
    private final double metres;

    /** @param metres in one unit of the positions */
    Carried(Table table, double metres) {
        this.table = table;
        this.metres = metres;
    }

    /** Whether the triple at {@code column} is carried along with that at {@code other}. */
    boolean along(int column, int other) {
        double way = 0;
        double least = Double.POSITIVE_INFINITY;
        double most = 0;
        int start = -1;
        int both = 0;
        for (int i = 0; i < table.rows(); i++) {
            double distance = distance(column, i, other, i);
            if (Double.isNaN(distance)) {
                continue;
            }
            start = start < 0 ? i : start;
            way = Math.max(way, distance(column, i, column, start));
            least = Math.min(least, distance);
            most = Math.max(most, distance);
            both++;
        }
        return 2 * both > table.rows() && way > LEAST_WAY && least > CLOSEST && most - least < MOST_PLAY;
    }

    /** Metres; NaN where either is a gap, or all zero. */
    private double distance(int column, int row, int other, int otherRow) {
        double square = 0;
        double size = 0;
        double otherSize = 0;
        for (int k = 0; k < 3; k++) {
            double a = table.column(column + k)[row];
            double b = table.column(other + k)[otherRow];
            square += (a - b) * (a - b);
            size += a * a;
            otherSize += b * b;
        }
        return size > 0 && otherSize > 0 ? Math.sqrt(square) * metres : Double.NaN;
    }
}
