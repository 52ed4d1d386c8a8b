package treadwork.io.c3d;

import java.lang.invoke.MethodHandles;
import java.lang.invoke.VarHandle;
import java.nio.ByteOrder;

/**
 * The formats in which frames hold their numbers.
 *
 * <p>A point is four of them: x, y, z and a residual below zero where it was not seen. It counts as seen when its residual is not
 * below zero, its coordinates are numbers, and not all three are exactly zero: |x| + |y| + |z| tells the last two by one figure.
 *
 * <p>Each format has its own {@link #firstUnseen}, though they read alike: in a loop that they shared, every number would cost a
 * call as soon as a program has met three formats, and the loop runs over all frames of all files.
 */
enum StoredNumber {
    /** 32-bit IEEE reals, low byte first. */
    LITTLE_REAL(Float.BYTES) {
        @Override
        float at(byte[] bytes, int at) {
            return Float.intBitsToFloat((int) LITTLE_INT.get(bytes, at));
        }

        @Override
        int firstUnseen(byte[] bytes, int frameAt, int from, int points) {
            int point = from;
            while (point < points && seen(bytes, frameAt + 4 * Float.BYTES * point)) {
                point++;
            }
            return point;
        }

        private boolean seen(byte[] bytes, int at) {
            float x = Float.intBitsToFloat((int) LITTLE_INT.get(bytes, at));
            float y = Float.intBitsToFloat((int) LITTLE_INT.get(bytes, at + 4));
            float z = Float.intBitsToFloat((int) LITTLE_INT.get(bytes, at + 8));
            float residual = Float.intBitsToFloat((int) LITTLE_INT.get(bytes, at + 12));
            return residual >= 0 && isPosition(x, y, z);
        }
    },
    /** 32-bit IEEE reals, high byte first. */
    BIG_REAL(Float.BYTES) {
        @Override
        float at(byte[] bytes, int at) {
            return Float.intBitsToFloat((int) BIG_INT.get(bytes, at));
        }

        @Override
        int firstUnseen(byte[] bytes, int frameAt, int from, int points) {
            int point = from;
            while (point < points && seen(bytes, frameAt + 4 * Float.BYTES * point)) {
                point++;
            }
            return point;
        }

        private boolean seen(byte[] bytes, int at) {
            float x = Float.intBitsToFloat((int) BIG_INT.get(bytes, at));
            float y = Float.intBitsToFloat((int) BIG_INT.get(bytes, at + 4));
            float z = Float.intBitsToFloat((int) BIG_INT.get(bytes, at + 8));
            float residual = Float.intBitsToFloat((int) BIG_INT.get(bytes, at + 12));
            return residual >= 0 && isPosition(x, y, z);
        }
    },
    /** 32-bit reals of the VAX F format. */
    VAX_REAL(Float.BYTES) {
        @Override
        float at(byte[] bytes, int at) {
            return VaxReal.decode((int) LITTLE_INT.get(bytes, at));
        }

        @Override
        int firstUnseen(byte[] bytes, int frameAt, int from, int points) {
            int point = from;
            while (point < points && seen(bytes, frameAt + 4 * Float.BYTES * point)) {
                point++;
            }
            return point;
        }

        private boolean seen(byte[] bytes, int at) {
            float x = VaxReal.decode((int) LITTLE_INT.get(bytes, at));
            float y = VaxReal.decode((int) LITTLE_INT.get(bytes, at + 4));
            float z = VaxReal.decode((int) LITTLE_INT.get(bytes, at + 8));
            float residual = VaxReal.decode((int) LITTLE_INT.get(bytes, at + 12));
            return residual >= 0 && isPosition(x, y, z);
        }
    },
    /** 16-bit integers, low byte first; the four of a point are one 64-bit word, the residual on top. */
    LITTLE_INTEGER(Short.BYTES) {
        @Override
        float at(byte[] bytes, int at) {
            return (short) LITTLE_SHORT.get(bytes, at);
        }

        @Override
        int firstUnseen(byte[] bytes, int frameAt, int from, int points) {
            int point = from;
            while (point < points && seen((long) LITTLE_LONG.get(bytes, frameAt + Long.BYTES * point))) {
                point++;
            }
            return point;
        }

        private boolean seen(long point) {
            return point >= 0 && point << Short.SIZE != 0;
        }
    },
    /** 16-bit integers, high byte first; the four of a point are one 64-bit word, the residual at its end. */
    BIG_INTEGER(Short.BYTES) {
        @Override
        float at(byte[] bytes, int at) {
            return (short) BIG_SHORT.get(bytes, at);
        }

        @Override
        int firstUnseen(byte[] bytes, int frameAt, int from, int points) {
            int point = from;
            while (point < points && seen((long) BIG_LONG.get(bytes, frameAt + Long.BYTES * point))) {
                point++;
            }
            return point;
        }

        private boolean seen(long point) {
            return (short) point >= 0 && point >>> Short.SIZE != 0;
        }
    };

    private static final VarHandle LITTLE_INT = view(int[].class, ByteOrder.LITTLE_ENDIAN);
    private static final VarHandle BIG_INT = view(int[].class, ByteOrder.BIG_ENDIAN);
    private static final VarHandle LITTLE_SHORT = view(short[].class, ByteOrder.LITTLE_ENDIAN);
    private static final VarHandle BIG_SHORT = view(short[].class, ByteOrder.BIG_ENDIAN);
    private static final VarHandle LITTLE_LONG = view(long[].class, ByteOrder.LITTLE_ENDIAN);
    private static final VarHandle BIG_LONG = view(long[].class, ByteOrder.BIG_ENDIAN);

    private final int width;

    StoredNumber(int width) {
        this.width = width;
    }

    private static VarHandle view(Class<?> numbers, ByteOrder order) {
        return MethodHandles.byteArrayViewVarHandle(numbers, order);
    }

    static StoredNumber of(Processor processor, boolean real) {
        return switch (processor) {
            case INTEL -> real ? LITTLE_REAL : LITTLE_INTEGER;
            case DEC -> real ? VAX_REAL : LITTLE_INTEGER;
            case MIPS -> real ? BIG_REAL : BIG_INTEGER;
        };
    }

    /** Bytes in one number. */
    int width() {
        return width;
    }

    /** The number that begins at byte {@code at}; integers are taken with sign. */
    abstract float at(byte[] bytes, int at);

    /**
     * The first point that was not seen, of those from {@code from} on; {@code points} if all were.
     *
     * @param frameAt byte at which the first point of the frame begins
     */
    abstract int firstUnseen(byte[] bytes, int frameAt, int from, int points);

    /** Whether three coordinates are numbers and not all zero. Their size is summed up as doubles, which do not overflow. */
    private static boolean isPosition(float x, float y, float z) {
        double size = (double) Math.abs(x) + Math.abs(y) + Math.abs(z);
        return size > 0 && size <= Double.MAX_VALUE;
    }
}
