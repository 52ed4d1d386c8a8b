package treadwork.model.capture;

import java.util.Arrays;

/** A 6×6 calibration matrix: output (three forces, three moments) = matrix × the six scaled channels. */
public final class CalibrationMatrix {

    public static final int SIZE = 6;

    private final double[] byRows;

    private CalibrationMatrix(double[] byRows) {
        if (byRows.length != SIZE * SIZE) {
            throw new IllegalArgumentException(byRows.length + " elements, not 36");
        }
        this.byRows = byRows;
    }

    public static CalibrationMatrix ofRows(double... byRows) {
        return new CalibrationMatrix(byRows.clone());
    }

    public double at(int row, int column) {
        return byRows[row * SIZE + column];
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof CalibrationMatrix matrix && Arrays.equals(byRows, matrix.byRows);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(byRows);
    }
}
