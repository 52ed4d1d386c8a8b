package treadwork.io.c3d;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * The parameters of a file by group and name.
 *
 * <p>A list of more than 255 entries goes on in a parameter whose name ends in 2, then 3, and so on; the lists here are whole.
 */
final class Parameters {

    private final Map<String, Parameter> named;
    private final List<String> groups;

    /** @param named keys are {@code GROUP:NAME} in capitals */
    Parameters(Map<String, Parameter> named, List<String> groups) {
        this.named = Collections.unmodifiableMap(named);
        this.groups = groups;
    }

    List<String> groups() {
        return groups;
    }

    Optional<Parameter> find(String name) {
        return Optional.ofNullable(named.get(name));
    }

    /** The first number, when it is one. */
    OptionalDouble number(String name) {
        Parameter parameter = named.get(name);
        if (parameter == null || parameter.numbers() == 0 || !Double.isFinite(parameter.number(0))) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(parameter.number(0));
    }

    /** The first number as a count, integers taken without sign. */
    OptionalInt count(String name) {
        OptionalDouble number = number(name);
        if (number.isEmpty()) {
            return OptionalInt.empty();
        }
        double count = number.getAsDouble();
        boolean wrapped = count < 0 && named.get(name).holdsIntegers();
        return OptionalInt.of((int) (wrapped ? count + 0x10000 : count));
    }

    /** The first text, or an empty one. */
    String text(String name) {
        List<String> texts = texts(name, 1);
        return texts.isEmpty() ? "" : texts.get(0);
    }

    /** At most {@code limit} texts, with those of the parameters that continue the list. */
    List<String> texts(String name, int limit) {
        List<String> texts = new ArrayList<>();
        for (Parameter part : parts(name)) {
            for (int i = 0; i < part.texts() && texts.size() < limit; i++) {
                texts.add(part.text(i));
            }
        }
        return texts;
    }

    /** At most {@code limit} numbers, with those of the parameters that continue the list. */
    double[] numbers(String name, int limit) {
        List<Parameter> parts = parts(name);
        int stated = parts.stream().mapToInt(Parameter::numbers).reduce(0, (a, b) -> Math.min(limit, a + b));
        double[] numbers = new double[stated];
        int at = 0;
        for (Parameter part : parts) {
            for (int i = 0; i < part.numbers() && at < stated; i++) {
                numbers[at++] = part.number(i);
            }
        }
        return numbers;
    }

    private List<Parameter> parts(String name) {
        List<Parameter> parts = new ArrayList<>();
        Parameter part = named.get(name);
        while (part != null) {
            parts.add(part);
            part = named.get(name + (parts.size() + 1));
        }
        return parts;
    }
}
