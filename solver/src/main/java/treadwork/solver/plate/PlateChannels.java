package treadwork.solver.plate;

import java.util.BitSet;
import java.util.List;
import java.util.stream.IntStream;
import treadwork.model.capture.Capture;
import treadwork.model.capture.Plate;
import treadwork.model.capture.PlateType;
import treadwork.model.space.ScalarSeries;
import treadwork.model.space.Vector3;
import treadwork.model.space.VectorSeries;
import treadwork.model.space.WrenchSeries;

/** The signals of one plate, in the order of its type and the units of the file. */
final class PlateChannels {

    private static final int COP_X = 3;
    private static final int COP_Y = 4;

    private final Plate plate;
    private final double[][] signals;
    private final int size;

    private PlateChannels(Plate plate, double[][] signals, int size) {
        this.plate = plate;
        this.signals = signals;
        this.size = size;
    }

    static PlateChannels of(Plate plate, Capture capture) {
        double[][] signals = plate.channels().stream()
                .map(place -> capture.analog().get(place).values().toArray())
                .toArray(double[][]::new);
        return new PlateChannels(plate, signals, capture.frames() * capture.samplesPerFrame());
    }

    static boolean present(Plate plate, Capture capture) {
        List<Integer> places = plate.channels();
        return capture.samplesPerFrame() > 0
                && places.stream()
                        .allMatch(place -> place >= 0
                                && place < capture.analog().size()
                                && capture.analog().get(place).values().size()
                                        >= capture.frames() * capture.samplesPerFrame());
    }

    int size() {
        return size;
    }

    int count() {
        return signals.length;
    }

    /** Not a copy; nobody writes to it. */
    double[] signal(int j) {
        return signals[j];
    }

    /** Whether no signal ever changes. */
    boolean isFlat() {
        return IntStream.range(0, signals.length).allMatch(this::isFlat);
    }

    /** Whether that signal never changes. */
    boolean isFlat(int j) {
        for (double value : signals[j]) {
            if (value != signals[j][0]) {
                return false;
            }
        }
        return true;
    }

    /**
     * The same with each signal's mean over {@code samples} taken off. Where the centre of pressure is given, it stays:
     * it is not a load, and of an unloaded plate it means nothing.
     */
    PlateChannels zeroedOver(BitSet samples) {
        double[][] zeroed = new double[signals.length][];
        for (int j = 0; j < signals.length; j++) {
            double[] signal = signals[j].clone();
            double mean = isPlace(j) ? 0 : mean(signal, samples);
            for (int i = 0; i < size; i++) {
                signal[i] -= mean;
            }
            zeroed[j] = signal;
        }
        return new PlateChannels(plate, zeroed, size);
    }

    /** Whether the signal is a centre of pressure. */
    boolean isPlace(int j) {
        return plate.type() == PlateType.FORCE_AND_CENTRE_OF_PRESSURE && (j == COP_X || j == COP_Y);
    }

    private static double mean(double[] signal, BitSet samples) {
        double sum = 0;
        int known = 0;
        for (int i = samples.nextSetBit(0); i >= 0; i = samples.nextSetBit(i + 1)) {
            if (!Double.isNaN(signal[i])) {
                sum += signal[i];
                known++;
            }
        }
        return known == 0 ? 0 : sum / known;
    }

    /** Component {@code row} of the load, a sample: 0 to 2 the forces, 3 to 5 the moments. */
    double[] component(ChannelMatrix matrix, int row) {
        double[] sum = new double[size];
        for (int j = 0; j < signals.length; j++) {
            double weight = matrix.at(row, j);
            if (weight != 0) {
                double[] signal = signals[j];
                for (int i = 0; i < size; i++) {
                    sum[i] += weight * signal[i];
                }
            }
        }
        return sum;
    }

    /**
     * The load in lab axes about the centre of the surface.
     *
     * @param inPlate the channels' weights in plate axes, the sign mended
     */
    WrenchSeries load(ChannelMatrix inPlate, PlateAxes axes) {
        if (plate.type() == PlateType.FORCE_AND_CENTRE_OF_PRESSURE) {
            return loadAtCentreOfPressure(inPlate, axes);
        }
        ChannelMatrix inLab = inPlate.in(axes.labFromPlate());
        return new WrenchSeries(
                axes.centre(),
                VectorSeries.of(component(inLab, 0), component(inLab, 1), component(inLab, 2)),
                VectorSeries.of(component(inLab, 3), component(inLab, 4), component(inLab, 5)));
    }

    /** M = P × F + T, P on the surface: the product is formed here, before any filter, so that no division follows. */
    private WrenchSeries loadAtCentreOfPressure(ChannelMatrix inPlate, PlateAxes axes) {
        double[] fx = component(inPlate, 0);
        double[] fy = component(inPlate, 1);
        double[] fz = component(inPlate, 2);
        double[] freeMoment = component(inPlate, 5);
        double unit = plate.channelUnit().metres();
        VectorSeries.Builder forces = new VectorSeries.Builder(size);
        VectorSeries.Builder moments = new VectorSeries.Builder(size);
        for (int i = 0; i < size; i++) {
            Vector3 force = new Vector3(fx[i], fy[i], fz[i]);
            double px = placed(signals[COP_X][i], fz[i]) * unit;
            double py = placed(signals[COP_Y][i], fz[i]) * unit;
            Vector3 moment = new Vector3(py * fz[i], -px * fz[i], px * fy[i] - py * fx[i] + freeMoment[i]);
            forces.set(i, axes.labFromPlate().times(force));
            moments.set(i, axes.labFromPlate().times(moment));
        }
        return new WrenchSeries(axes.centre(), forces.build(), moments.build());
    }

    /** Some files hold no number for the centre of pressure of a plate that carries nothing; nothing acts there. */
    private static double placed(double place, double normalForce) {
        return normalForce == 0 && Double.isNaN(place) ? 0 : place;
    }

    /** The force that the plate's own z axis sees, times {@code side}, N: the push, but for its sign. */
    ScalarSeries push(ChannelMatrix inPlate, double side) {
        double[] push = component(inPlate, 2);
        for (int i = 0; i < size; i++) {
            push[i] *= side;
        }
        return ScalarSeries.of(push);
    }
}
