package treadwork.solver.plate;

import treadwork.model.capture.CalibrationMatrix;
import treadwork.model.capture.Plate;
import treadwork.model.space.Rotation;
import treadwork.model.space.Vector3;

/**
 * The six components of a plate's load as sums of its channels: three forces, N, and three moments about the centre of
 * the surface, N·m. Calibration, the step from sensor origin to surface, and the turn into lab axes are all linear, so
 * they are one matrix, and a sample costs one product.
 */
final class ChannelMatrix {

    private static final int COMPONENTS = 6;
    private static final int FIRST_MOMENT = 3;

    private final double[][] rows;

    private ChannelMatrix(double[][] rows) {
        this.rows = rows;
    }

    /**
     * In plate axes, as the file stores them.
     *
     * <p>Three forces and three moments come as they are, or through the calibration matrix. Of four sensors with half
     * distances a along x and b along y: Fx = x12 + x34, Fy = y14 + y23, Fz = z1 + z2 + z3 + z4, Mx = b (z1 + z2 - z3 -
     * z4), My = a (-z1 + z2 + z3 - z4), Mz = b (-x12 + x34) + a (y14 - y23) (statics). Then M' = M - o × F, with o from
     * the sensor origin to the surface; of four sensors o = (0, 0, third value). Of a plate that gives its centre of
     * pressure only the forces and the free moment are summed here: columns 3 and 4 are zero.
     *
     * @param origin plate axes, m, mended
     */
    static ChannelMatrix inPlate(Plate plate, Vector3 origin) {
        return switch (plate.type()) {
            case FORCE_AND_CENTRE_OF_PRESSURE -> directly(plate).withoutColumns(3, 4);
            case FORCE_AND_MOMENT -> directly(plate).aboutSurface(origin);
            case CALIBRATED -> calibrated(plate).aboutSurface(origin);
            case FOUR_SENSORS -> fourSensors(origin.x(), origin.y()).aboutSurface(new Vector3(0, 0, origin.z()));
        };
    }

    private static ChannelMatrix directly(Plate plate) {
        double[][] rows = new double[COMPONENTS][COMPONENTS];
        for (int i = 0; i < COMPONENTS; i++) {
            rows[i][i] = i < FIRST_MOMENT ? 1 : plate.channelUnit().metres();
        }
        return new ChannelMatrix(rows);
    }

    private static ChannelMatrix calibrated(Plate plate) {
        CalibrationMatrix calibration = plate.calibration().orElseThrow();
        double[][] rows = new double[COMPONENTS][COMPONENTS];
        for (int i = 0; i < COMPONENTS; i++) {
            double unit = i < FIRST_MOMENT ? 1 : plate.channelUnit().metres();
            for (int j = 0; j < COMPONENTS; j++) {
                rows[i][j] = calibration.at(i, j) * unit;
            }
        }
        return new ChannelMatrix(rows);
    }

    private static ChannelMatrix fourSensors(double a, double b) {
        return new ChannelMatrix(new double[][] {
            {1, 1, 0, 0, 0, 0, 0, 0},
            {0, 0, 1, 1, 0, 0, 0, 0},
            {0, 0, 0, 0, 1, 1, 1, 1},
            {0, 0, 0, 0, b, b, -b, -b},
            {0, 0, 0, 0, -a, a, a, -a},
            {-b, b, a, -a, 0, 0, 0, 0}
        });
    }

    private ChannelMatrix withoutColumns(int... columns) {
        double[][] kept = new double[COMPONENTS][];
        for (int i = 0; i < COMPONENTS; i++) {
            kept[i] = rows[i].clone();
            for (int column : columns) {
                kept[i][column] = 0;
            }
        }
        return new ChannelMatrix(kept);
    }

    private ChannelMatrix aboutSurface(Vector3 origin) {
        double[][] moved = new double[COMPONENTS][columns()];
        for (int j = 0; j < columns(); j++) {
            Vector3 force = force(j);
            put(moved, j, force, moment(j).minus(origin.cross(force)));
        }
        return new ChannelMatrix(moved);
    }

    /** The same in lab axes. */
    ChannelMatrix in(Rotation labFromPlate) {
        return turned(labFromPlate, 1);
    }

    /** The reaction to it. */
    ChannelMatrix negated() {
        return turned(Rotation.IDENTITY, -1);
    }

    private ChannelMatrix turned(Rotation rotation, double sign) {
        double[][] turned = new double[COMPONENTS][columns()];
        for (int j = 0; j < columns(); j++) {
            put(
                    turned,
                    j,
                    rotation.times(force(j)).times(sign),
                    rotation.times(moment(j)).times(sign));
        }
        return new ChannelMatrix(turned);
    }

    int columns() {
        return rows[0].length;
    }

    /** What channel {@code j} adds to component {@code i} for each unit that it shows. */
    double at(int i, int j) {
        return rows[i][j];
    }

    private Vector3 force(int j) {
        return new Vector3(rows[0][j], rows[1][j], rows[2][j]);
    }

    private Vector3 moment(int j) {
        return new Vector3(rows[3][j], rows[4][j], rows[5][j]);
    }

    private static void put(double[][] rows, int j, Vector3 force, Vector3 moment) {
        rows[0][j] = force.x();
        rows[1][j] = force.y();
        rows[2][j] = force.z();
        rows[3][j] = moment.x();
        rows[4][j] = moment.y();
        rows[5][j] = moment.z();
    }
}
