package treadwork.io.text;

import java.nio.charset.StandardCharsets;

/** Reads one cell as a number, exactly as {@link Double#parseDouble} rounds it. */
final class Numbers {

    /** Powers of ten that a double holds exactly. */
    private static final double[] TEN = new double[23];

    private static final long EXACT = 1L << 53;
    private static final int LONGEST = 400;
    private static final int MOST_DIGITS = 15;

    private final byte[] bytes;
    private final byte decimal;
    private boolean valid;
    private int next;

    static {
        TEN[0] = 1;
        for (int i = 1; i < TEN.length; i++) {
            TEN[i] = TEN[i - 1] * 10;
        }
    }

    Numbers(byte[] bytes, char decimal) {
        this.bytes = bytes;
        this.decimal = (byte) decimal;
    }

    /** Whether the last cell was a number or a gap. */
    boolean valid() {
        return valid;
    }

    /**
     * The number that begins at {@code from}, if it is plain (sign, up to 15 digits, one decimal sign) and ends with
     * {@code delimiter} or at {@code end}; then {@link #next} is where it ends, else -1. Fifteen digits and a power of ten
     * up to 10²² are both exact, so one division rounds as it must.
     */
    double plain(int from, int end, byte delimiter) {
        byte[] text = bytes;
        int at = from;
        boolean negative = at < end && text[at] == '-';
        at += negative ? 1 : 0;
        int first = at;
        long digits = 0;
        int digit;
        while (at < end && (digit = text[at] - '0') >= 0 && digit <= 9) {
            digits = digits * 10 + digit;
            at++;
        }
        int count = at - first;
        int decimals = 0;
        if (at < end && text[at] == decimal && decimal != delimiter) {
            int point = ++at;
            while (at < end && (digit = text[at] - '0') >= 0 && digit <= 9) {
                digits = digits * 10 + digit;
                at++;
            }
            decimals = at - point;
            count += decimals;
        }
        boolean ended = at == end || text[at] == delimiter;
        if (!ended || count == 0 || count > MOST_DIGITS) {
            next = -1;
            return Double.NaN;
        }
        next = at;
        double value = digits / TEN[decimals];
        return negative ? -value : value;
    }

    /** Where the last plain number ended; -1 if it was not plain. */
    int next() {
        return next;
    }

    /** The number between two places; NaN for a gap (empty, NaN, NA, -), and for what is no number. */
    double parse(int start, int end) {
        int from = start;
        int to = end;
        while (from < to && (bytes[from] == ' ' || bytes[from] == '"')) {
            from++;
        }
        while (to > from && (bytes[to - 1] == ' ' || bytes[to - 1] == '"')) {
            to--;
        }
        valid = true;
        if (from == to) {
            return Double.NaN;
        }
        boolean negative = bytes[from] == '-';
        int at = from + (negative || bytes[from] == '+' ? 1 : 0);
        long digits = 0;
        int point = -1;
        int first = at;
        while (at < to && digits < EXACT / 10) {
            byte b = bytes[at];
            if (b >= '0' && b <= '9') {
                digits = digits * 10 + b - '0';
            } else if (b == decimal && point < 0) {
                point = at;
            } else {
                return slow(from, to);
            }
            at++;
        }
        int decimals = point < 0 ? 0 : at - point - 1;
        boolean some = at - first - (point < 0 ? 0 : 1) > 0;
        if (at < to || !some || decimals >= TEN.length) {
            return slow(from, to);
        }
        double value = digits / TEN[decimals];
        return negative ? -value : value;
    }

    private double slow(int from, int to) {
        if (to - from > LONGEST) {
            valid = false;
            return Double.NaN;
        }
        String text = new String(bytes, from, to - from, StandardCharsets.ISO_8859_1);
        if (text.equals("-") || text.equalsIgnoreCase("nan") || text.equalsIgnoreCase("na")) {
            return Double.NaN;
        }
        String plain = decimal == ',' ? text.replace('.', '!').replace(',', '.') : text;
        if (!plain.matches("[+-]?([0-9]+\\.?[0-9]*|\\.[0-9]+)([eE][+-]?[0-9]+)?")) {
            valid = false;
            return Double.NaN;
        }
        double value = Double.parseDouble(plain);
        valid = Double.isFinite(value);
        return value;
    }
}
