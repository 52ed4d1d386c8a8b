package treadwork.io.c3d;

import java.io.EOFException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;

/** The bytes of a file, wherever they are. */
sealed interface Bytes {

    long size();

    /**
     * A view of {@code length} bytes from {@code offset} on, its position 0, good until the next call.
     *
     * @throws EOFException if there are not so many
     */
    ByteBuffer at(long offset, int length) throws IOException;

    /**
     * Copies {@code length} bytes from {@code offset} on to {@code to}, from its byte {@code at} on. Several threads may do so at
     * the same time.
     *
     * @throws EOFException if there are not so many
     */
    void copy(long offset, byte[] to, int at, int length) throws IOException;

    /** Bytes in memory. */
    final class Held implements Bytes {

        private final byte[] bytes;

        Held(byte[] bytes) {
            this.bytes = bytes;
        }

        @Override
        public long size() {
            return bytes.length;
        }

        @Override
        public ByteBuffer at(long offset, int length) throws EOFException {
            if (offset > bytes.length - length) {
                throw new EOFException();
            }
            return ByteBuffer.wrap(bytes, (int) offset, length).slice();
        }

        @Override
        public void copy(long offset, byte[] to, int at, int length) throws EOFException {
            if (offset > bytes.length - length) {
                throw new EOFException();
            }
            System.arraycopy(bytes, (int) offset, to, at, length);
        }
    }

    /** Bytes of an open file, of which only the part asked for is in memory. */
    final class OfFile implements Bytes {

        private final FileChannel channel;
        private final long size;
        private ByteBuffer buffer = ByteBuffer.allocate(0);

        OfFile(FileChannel channel) throws IOException {
            this.channel = channel;
            this.size = channel.size();
        }

        @Override
        public long size() {
            return size;
        }

        @Override
        public ByteBuffer at(long offset, int length) throws IOException {
            if (offset > size - length) {
                throw new EOFException();
            }
            if (buffer.capacity() < length) {
                buffer = ByteBuffer.allocate(length);
            }
            buffer.clear().limit(length);
            fill(buffer, offset);
            return buffer.flip();
        }

        @Override
        public void copy(long offset, byte[] to, int at, int length) throws IOException {
            fill(ByteBuffer.wrap(to, at, length), offset);
        }

        private void fill(ByteBuffer into, long offset) throws IOException {
            long place = offset - into.position();
            while (into.hasRemaining()) {
                if (channel.read(into, place + into.position()) < 0) {
                    throw new EOFException();
                }
            }
        }
    }
}
