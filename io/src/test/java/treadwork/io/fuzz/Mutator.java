package treadwork.io.fuzz;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

/** Spoils inputs: bits and bytes, numbers of two and four bytes, digits, words, and whole stretches. */
final class Mutator {

    /** Inputs grow no longer than this. */
    static final int LONGEST = 1 << 20;

    private static final int[] NUMBERS = {
        0,
        1,
        2,
        3,
        4,
        6,
        8,
        80,
        84,
        85,
        86,
        127,
        128,
        255,
        256,
        512,
        1000,
        32766,
        32767,
        32768,
        65534,
        65535,
        65536,
        0x7fffffff,
        0x80000000,
        -1,
        -2,
        0x7f800000,
        0x7fc00000,
        0x3f800000,
        0x00000001
    };

    private static final List<String> DIGITS = List.of(
            "0", "-0", "1", "-1", "9999999999", "1e308", "1e-308", "1e999", "NaN", "0.1", ",", ".", "1.5.2", "+", "-");

    private final Random random;

    Mutator(Random random) {
        this.random = random;
    }

    /** One to eight changes of a copy. */
    byte[] mutated(byte[] input, byte[] other, List<String> words) {
        byte[] changed = input.clone();
        int changes = 1 << random.nextInt(4);
        for (int i = 0; i < changes; i++) {
            changed = change(changed, other, words);
        }
        return changed.length > LONGEST ? Arrays.copyOf(changed, LONGEST) : changed;
    }

    private byte[] change(byte[] bytes, byte[] other, List<String> words) {
        if (bytes.length == 0) {
            return other.clone();
        }
        return switch (random.nextInt(10)) {
            case 0 -> withBit(bytes);
            case 1 -> withByte(bytes);
            case 2 -> withNumber(bytes, 2);
            case 3 -> withNumber(bytes, 4);
            case 4 -> cut(bytes, place(bytes), Math.min(bytes.length, 1 << random.nextInt(12)));
            case 5 -> inserted(bytes, place(bytes), copied(bytes));
            case 6 -> inserted(bytes, place(bytes), copied(other));
            case 7 -> inserted(bytes, place(bytes), word(words));
            case 8 -> over(bytes, place(bytes), word(words));
            default -> Arrays.copyOf(bytes, place(bytes));
        };
    }

    /** Early places more often: that is where headers are. */
    private int place(byte[] bytes) {
        int within = random.nextInt(3) == 0 ? bytes.length : Math.min(bytes.length, 1 << (4 + random.nextInt(9)));
        return random.nextInt(within);
    }

    private byte[] withBit(byte[] bytes) {
        bytes[place(bytes)] ^= (byte) (1 << random.nextInt(8));
        return bytes;
    }

    private byte[] withByte(byte[] bytes) {
        bytes[place(bytes)] = (byte) random.nextInt(256);
        return bytes;
    }

    private byte[] withNumber(byte[] bytes, int width) {
        int at = place(bytes) & -2;
        int value = random.nextInt(4) == 0 ? random.nextInt() : NUMBERS[random.nextInt(NUMBERS.length)];
        boolean big = random.nextBoolean();
        for (int k = 0; k < width && at + k < bytes.length; k++) {
            bytes[at + k] = (byte) (value >>> (8 * (big ? width - 1 - k : k)));
        }
        return bytes;
    }

    private byte[] copied(byte[] bytes) {
        if (bytes.length == 0) {
            return bytes;
        }
        int from = random.nextInt(bytes.length);
        byte[] piece = Arrays.copyOfRange(bytes, from, Math.min(bytes.length, from + (1 << random.nextInt(14))));
        int times = random.nextInt(20) == 0 ? 1 + random.nextInt(64) : 1;
        byte[] repeated = new byte[piece.length * times];
        for (int i = 0; i < times; i++) {
            System.arraycopy(piece, 0, repeated, i * piece.length, piece.length);
        }
        return repeated;
    }

    private byte[] word(List<String> words) {
        List<String> from = random.nextInt(3) == 0 ? DIGITS : words;
        return from.get(random.nextInt(from.size())).getBytes(StandardCharsets.UTF_8);
    }

    private static byte[] over(byte[] bytes, int at, byte[] piece) {
        System.arraycopy(piece, 0, bytes, at, Math.min(piece.length, bytes.length - at));
        return bytes;
    }

    private static byte[] cut(byte[] bytes, int at, int length) {
        int end = Math.min(bytes.length, at + length);
        byte[] rest = new byte[bytes.length - (end - at)];
        System.arraycopy(bytes, 0, rest, 0, at);
        System.arraycopy(bytes, end, rest, at, bytes.length - end);
        return rest;
    }

    private static byte[] inserted(byte[] bytes, int at, byte[] piece) {
        int length = Math.min(piece.length, LONGEST - Math.min(LONGEST, bytes.length));
        byte[] longer = new byte[bytes.length + length];
        System.arraycopy(bytes, 0, longer, 0, at);
        System.arraycopy(piece, 0, longer, at, length);
        System.arraycopy(bytes, at, longer, at + length, bytes.length - at);
        return longer;
    }
}
