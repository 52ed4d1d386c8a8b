package treadwork.model.space;

import java.util.function.UnaryOperator;

/**
 * The pose of a body a frame, held as its origin and the three columns of {@code labFromBody}; a frame with a NaN is a gap.
 */
public final class PoseSeries {

    private final VectorSeries origin;
    private final VectorSeries axisX;
    private final VectorSeries axisY;
    private final VectorSeries axisZ;

    private PoseSeries(VectorSeries origin, VectorSeries axisX, VectorSeries axisY, VectorSeries axisZ) {
        this.origin = origin;
        this.axisX = axisX;
        this.axisY = axisY;
        this.axisZ = axisZ;
    }

    public int size() {
        return origin.size();
    }

    public Pose at(int i) {
        return new Pose(origin.at(i), rotation(i));
    }

    /** {@code labFromBody} of frame {@code i}. */
    public Rotation rotation(int i) {
        return Rotation.ofColumns(axisX.at(i), axisY.at(i), axisZ.at(i));
    }

    public boolean isGap(int i) {
        return origin.isGap(i) || axisX.isGap(i) || axisY.isGap(i) || axisZ.isGap(i);
    }

    /** The origin in lab axes, m. */
    public VectorSeries origin() {
        return origin;
    }

    /** The body's X axis in lab axes. */
    public VectorSeries axisX() {
        return axisX;
    }

    /** The body's Y axis in lab axes. */
    public VectorSeries axisY() {
        return axisY;
    }

    /** The body's Z axis in lab axes. */
    public VectorSeries axisZ() {
        return axisZ;
    }

    /** Where a point fixed in the body is in the lab, a frame; a gap where the pose is one. */
    public VectorSeries toLab(Vector3 inBody) {
        VectorSeries.Builder points = new VectorSeries.Builder(size());
        for (int i = 0; i < size(); i++) {
            points.set(i, origin.at(i).plus(rotation(i).times(inBody)));
        }
        return points.build();
    }

    /** Applies {@code operation} to each of the four vector series. */
    public PoseSeries eachSeries(UnaryOperator<VectorSeries> operation) {
        return new PoseSeries(
                operation.apply(origin), operation.apply(axisX), operation.apply(axisY), operation.apply(axisZ));
    }

    /** Fills a series pose by pose. */
    public static final class Builder {

        private final VectorSeries.Builder origin;
        private final VectorSeries.Builder axisX;
        private final VectorSeries.Builder axisY;
        private final VectorSeries.Builder axisZ;

        public Builder(int size) {
            origin = new VectorSeries.Builder(size);
            axisX = new VectorSeries.Builder(size);
            axisY = new VectorSeries.Builder(size);
            axisZ = new VectorSeries.Builder(size);
        }

        public void set(int i, Vector3 at, Rotation labFromBody) {
            origin.set(i, at);
            axisX.set(i, labFromBody.xx(), labFromBody.yx(), labFromBody.zx());
            axisY.set(i, labFromBody.xy(), labFromBody.yy(), labFromBody.zy());
            axisZ.set(i, labFromBody.xz(), labFromBody.yz(), labFromBody.zz());
        }

        /** Ends the filling: the builder cannot be used again. */
        public PoseSeries build() {
            return new PoseSeries(origin.build(), axisX.build(), axisY.build(), axisZ.build());
        }
    }
}
