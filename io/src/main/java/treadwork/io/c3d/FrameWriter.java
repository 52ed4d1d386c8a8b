package treadwork.io.c3d;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.util.List;
import treadwork.model.capture.AnalogChannel;
import treadwork.model.capture.Capture;
import treadwork.model.capture.PointSeries;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.VectorSeries;

/** Writes the frames: points, then the frame's analog samples. */
final class FrameWriter {

    /** Residual of a sample that was not seen. */
    private static final int GAP = -1;

    /** Stands in for a coordinate of zero where all three are, since (0, 0, 0) means a gap in many files. */
    private static final float NEXT_TO_ZERO = 1e-30f;

    private final Capture capture;
    private final C3dEncoding encoding;
    private final WriteScaling scaling;
    private final ByteBuffer frame;

    FrameWriter(Capture capture, C3dEncoding encoding, WriteScaling scaling) {
        this.capture = capture;
        this.encoding = encoding;
        this.scaling = scaling;
        int values =
                Layout.POINT_VALUES * capture.points().size() + capture.analog().size() * capture.samplesPerFrame();
        this.frame = ByteBuffer.allocate(values * (encoding.real() ? Float.BYTES : Short.BYTES))
                .order(encoding.processor().order());
    }

    /** Writes all frames and fills up the last block. */
    void write(OutputStream out) throws IOException {
        List<VectorSeries> positions =
                capture.points().stream().map(PointSeries::positions).toList();
        List<ScalarSeries> values =
                capture.analog().stream().map(AnalogChannel::values).toList();
        for (int i = 0; i < capture.frames(); i++) {
            frame.clear();
            for (VectorSeries each : positions) {
                putPoint(each, i);
            }
            for (int sample = 0; sample < capture.samplesPerFrame(); sample++) {
                putSample(values, i * capture.samplesPerFrame() + sample);
            }
            out.write(frame.array());
        }
        long written = (long) capture.frames() * frame.capacity();
        out.write(new byte[(int) ((Header.BLOCK - written % Header.BLOCK) % Header.BLOCK)]);
    }

    private void putPoint(VectorSeries positions, int i) {
        boolean gap = positions.isGap(i);
        double units = 1 / capture.pointUnit().metres();
        if (encoding.real()) {
            float x = gap ? 0 : (float) (positions.x(i) * units);
            float y = gap ? 0 : (float) (positions.y(i) * units);
            float z = gap ? 0 : (float) (positions.z(i) * units);
            putReal(x);
            putReal(y);
            putReal(!gap && x == 0 && y == 0 && z == 0 ? NEXT_TO_ZERO : z);
            putReal(gap ? GAP : 0);
            return;
        }
        double steps = units / scaling.pointStep();
        int x = gap ? 0 : (int) Math.rint(positions.x(i) * steps);
        int y = gap ? 0 : (int) Math.rint(positions.y(i) * steps);
        int z = gap ? 0 : (int) Math.rint(positions.z(i) * steps);
        frame.putShort((short) x).putShort((short) y);
        frame.putShort((short) (!gap && x == 0 && y == 0 && z == 0 ? 1 : z));
        frame.putShort((short) (gap ? GAP : 0));
    }

    private void putSample(List<ScalarSeries> values, int sample) {
        for (int i = 0; i < values.size(); i++) {
            double value = values.get(i).at(sample);
            if (encoding.real()) {
                putReal((float) value);
            } else {
                double steps = Math.rint(value / scaling.analogSteps().get(i));
                frame.putShort((short) ((int) steps + scaling.analogOffset()));
            }
        }
    }

    private void putReal(float value) {
        frame.putInt(encoding.processor().word(value));
    }
}
