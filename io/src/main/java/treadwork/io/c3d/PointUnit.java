package treadwork.io.c3d;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import treadwork.model.capture.LengthUnit;

/** The unit of length of a file. */
final class PointUnit {

    /** So short a beginning of a word still tells the units apart. */
    private static final int SHORTEST = 3;

    private static final Map<String, LengthUnit> WORDS = Map.of(
            "millimetres", LengthUnit.MM,
            "millimeters", LengthUnit.MM,
            "centimetres", LengthUnit.CM,
            "centimeters", LengthUnit.CM,
            "metres", LengthUnit.M,
            "meters", LengthUnit.M);

    private PointUnit() {}

    /** The user's word, else the file's. Some files state a unit for every point: then all that are known must agree. */
    static LengthUnit of(Parameters parameters, Optional<LengthUnit> byUser, Reading reading) {
        List<String> stated = parameters.texts("POINT:UNITS", Header.FULL).stream()
                .filter(text -> !text.isEmpty())
                .distinct()
                .limit(5)
                .toList();
        List<LengthUnit> known = stated.stream()
                .flatMap(text -> ofText(text).stream())
                .distinct()
                .toList();
        if (byUser.isPresent()) {
            if (!stated.isEmpty() && !known.equals(List.of(byUser.get()))) {
                reading.note(Notices.unitReplaced(
                        reading.file(), stated.get(0), byUser.get().symbol()));
            }
            return byUser.get();
        }
        if (known.size() != 1) {
            throw Refusals.pointUnit(reading.file(), stated);
        }
        return known.get(0);
    }

    /** A symbol, or a word or its beginning, since short fields cut it off. */
    private static Optional<LengthUnit> ofText(String text) {
        Optional<LengthUnit> symbol = LengthUnit.ofSymbol(text);
        if (symbol.isPresent() || text.length() < SHORTEST) {
            return symbol;
        }
        String word = text.toLowerCase(Locale.ROOT);
        return WORDS.entrySet().stream()
                .filter(entry -> entry.getKey().startsWith(word))
                .map(Map.Entry::getValue)
                .findFirst();
    }
}
