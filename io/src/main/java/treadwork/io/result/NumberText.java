package treadwork.io.result;

/**
 * Numbers for tables: ten significant digits, which is within 5e-10 of the value, {@code .} in every locale, no
 * trailing zeros, and plain notation between 1e-9 and 1e15. Beyond these a number is written as {@link Double#toString}
 * does, which every reader of tables parses too.
 */
final class NumberText {

    /** Room that no number exceeds: sign, 0 and point, eight zeros and ten digits; or the 24 of {@code Double.toString}. */
    static final int LONGEST = 32;

    private static final int DIGITS = 10;
    private static final long LEAST = 1_000_000_000L;
    private static final double PLAIN_FROM = 1e-9;
    private static final double PLAIN_BELOW = 1e15;

    /** Powers of ten that a double holds exactly, as far as the plain range needs them: 9 + 9 places, and one to spare. */
    private static final double[] POWERS = powers(20);

    private NumberText() {}

    /**
     * Writes {@code value} into {@code text} from {@code at} on; nothing where it is not known.
     *
     * @return where the next character goes
     */
    static int put(double value, char[] text, int at) {
        if (!Double.isFinite(value)) {
            return at;
        }
        double size = Math.abs(value);
        if (size == 0) {
            text[at] = '0';
            return at + 1;
        }
        if (size < PLAIN_FROM || size >= PLAIN_BELOW) {
            String words = Double.toString(value);
            words.getChars(0, words.length(), text, at);
            return at + words.length();
        }
        int next = at;
        if (value < 0) {
            text[next++] = '-';
        }
        return plain(size, text, next);
    }

    /**
     * The logarithm may come out whole for a number just below that power of ten; by so little that its ten digits are
     * those of the power itself.
     */
    private static int plain(double size, char[] text, int at) {
        int exponent = (int) Math.floor(Math.log10(size));
        long digits = scaled(size, exponent);
        if (digits >= LEAST * 10) {
            exponent++;
            digits = scaled(size, exponent);
        }
        int count = DIGITS;
        while (digits % 10 == 0) {
            digits /= 10;
            count--;
        }
        return place(digits, count, exponent, text, at);
    }

    /** The first ten digits of a number whose first digit stands for 10 to the {@code exponent}. */
    private static long scaled(double size, int exponent) {
        int shift = DIGITS - 1 - exponent;
        return Math.round(shift >= 0 ? size * POWERS[shift] : size / POWERS[-shift]);
    }

    private static int place(long digits, int count, int exponent, char[] text, int at) {
        int next = at;
        if (exponent < 0) {
            text[next++] = '0';
            text[next++] = '.';
            for (int i = exponent + 1; i < 0; i++) {
                text[next++] = '0';
            }
            return spell(digits, count, text, next);
        }
        int whole = exponent + 1;
        if (count <= whole) {
            next = spell(digits, count, text, next);
            for (int i = count; i < whole; i++) {
                text[next++] = '0';
            }
            return next;
        }
        int end = spell(digits, count, text, next);
        System.arraycopy(text, next + whole, text, next + whole + 1, end - next - whole);
        text[next + whole] = '.';
        return end + 1;
    }

    private static int spell(long digits, int count, char[] text, int at) {
        long left = digits;
        for (int i = at + count - 1; i >= at; i--) {
            text[i] = (char) ('0' + left % 10);
            left /= 10;
        }
        return at + count;
    }

    private static double[] powers(int count) {
        double[] powers = new double[count];
        powers[0] = 1;
        for (int i = 1; i < count; i++) {
            powers[i] = powers[i - 1] * 10;
        }
        return powers;
    }
}
