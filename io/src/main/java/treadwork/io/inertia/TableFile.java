package treadwork.io.inertia;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import treadwork.model.body.BodyPoint;
import treadwork.model.body.InertiaRow;
import treadwork.model.body.InertiaSource;
import treadwork.model.body.MassSpread;
import treadwork.model.body.SegmentKind;
import treadwork.model.body.Sex;
import treadwork.model.space.Inertia;
import treadwork.model.space.Vector3;

/** A table file, number for number as published. */
record TableFile(
        String name,
        String title,
        String citation,
        String status,
        Map<String, String> units,
        String axes,
        List<Row> rows) {

    private static final double PERCENT = 0.01;

    InertiaSource source() {
        return new InertiaSource(
                name, title, citation, status, axes, rows.stream().map(Row::row).toList());
    }

    /** Exactly one of the last three stands. */
    record Row(
            String segment,
            String sex,
            double massPercent,
            String from,
            String to,
            OnLine onLine,
            InSagittalPlane inSagittalPlane,
            InAxes inAxes) {

        InertiaRow row() {
            return new InertiaRow(
                    named(SegmentKind.values(), SegmentKind::key, segment),
                    Optional.ofNullable(sex).map(key -> named(Sex.values(), Sex::key, key)),
                    massPercent * PERCENT,
                    BodyPoint.ofKey(from).orElseThrow(),
                    BodyPoint.ofKey(to).orElseThrow(),
                    spread());
        }

        private MassSpread spread() {
            List<Spread> given = Stream.<Spread>of(onLine, inSagittalPlane, inAxes)
                    .filter(Objects::nonNull)
                    .toList();
            if (given.size() != 1) {
                throw new IllegalStateException("a row of the " + segment + " gives " + given.size() + " spreads");
            }
            return given.get(0).spread();
        }
    }

    /** One way in which a row says where the mass lies. */
    sealed interface Spread {
        MassSpread spread();
    }

    record OnLine(double centrePercent, double sagittalPercent, double transversePercent, double longitudinalPercent)
            implements Spread {

        @Override
        public MassSpread spread() {
            return new MassSpread.OnLine(
                    centrePercent * PERCENT,
                    sagittalPercent * PERCENT,
                    transversePercent * PERCENT,
                    longitudinalPercent * PERCENT);
        }
    }

    record InSagittalPlane(
            double centrePercent,
            double radiusPercent,
            @JsonProperty("densityKgM3") double density) implements Spread {

        @Override
        public MassSpread spread() {
            return new MassSpread.InSagittalPlane(centrePercent * PERCENT, radiusPercent * PERCENT, density);
        }
    }

    record InAxes(List<Double> centrePercent, Radii radiusPercent) implements Spread {

        @Override
        public MassSpread spread() {
            Vector3 centre = new Vector3(centrePercent.get(0), centrePercent.get(1), centrePercent.get(2));
            return new MassSpread.InAxes(centre.times(PERCENT), radiusPercent.tensor());
        }
    }

    /** Radii of a tensor's six elements; one written with an i is imaginary, so its square and the element are negative. */
    record Radii(String xx, String yy, String zz, String xy, String xz, String yz) {

        Inertia tensor() {
            return new Inertia(square(xx), square(yy), square(zz), square(xy), square(xz), square(yz));
        }

        private static double square(String radius) {
            boolean imaginary = radius.endsWith("i");
            double share = PERCENT * Double.parseDouble(imaginary ? radius.substring(0, radius.length() - 1) : radius);
            return imaginary ? -share * share : share * share;
        }
    }

    private static <E> E named(E[] values, Function<E, String> key, String name) {
        return Arrays.stream(values)
                .filter(value -> key.apply(value).equals(name))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("no " + name + " is known"));
    }
}
