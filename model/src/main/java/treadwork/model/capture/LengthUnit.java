package treadwork.model.capture;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** The unit of length of a capture file. */
public enum LengthUnit {
    MM("mm", 1e-3),
    CM("cm", 1e-2),
    M("m", 1);

    private final String symbol;
    private final double metres;

    LengthUnit(String symbol, double metres) {
        this.symbol = symbol;
        this.metres = metres;
    }

    public String symbol() {
        return symbol;
    }

    /** Metres in one unit. */
    public double metres() {
        return metres;
    }

    /** The unit of that symbol, blanks and case aside. */
    public static Optional<LengthUnit> ofSymbol(String text) {
        String symbol = text.strip().toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(unit -> unit.symbol.equals(symbol))
                .findFirst();
    }
}
