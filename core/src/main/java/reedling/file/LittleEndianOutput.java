// SPDX-License-Identifier: Apache-2.0
package reedling.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;

/**
 * Numbers as little-endian bytes, in bulk: an array is copied into a large buffer in one go, and {@link #next} decides
 * where full buffers go (kept in memory, or into a channel). Per-value stream calls cost about ten times as much.
 * Threads: one at a time.
 */
public abstract class LittleEndianOutput {

    private ByteBuffer buffer;
    private long passedOn;

    protected LittleEndianOutput(ByteBuffer first) {
        buffer = first.order(ByteOrder.LITTLE_ENDIAN);
    }

    /** Takes a buffer ready to be read and returns one of at least 8 bytes to fill, maybe the same one, cleared. */
    protected abstract ByteBuffer next(ByteBuffer filled) throws IOException;

    /** The buffer being filled, for subclasses that hand over the last one. */
    protected final ByteBuffer current() {
        return buffer;
    }

    /** Passes on what is in the buffer. */
    protected final void pass() throws IOException {
        buffer.flip();
        passedOn += buffer.remaining();
        buffer = next(buffer).order(ByteOrder.LITTLE_ENDIAN);
    }

    /** Bytes written so far. */
    public final long count() {
        return passedOn + buffer.position();
    }

    private ByteBuffer room(int bytes) throws IOException {
        if (buffer.remaining() < bytes) {
            pass();
        }
        return buffer;
    }

    public final void writeByte(int value) throws IOException {
        room(Byte.BYTES).put((byte) value);
    }

    public final void writeBoolean(boolean value) throws IOException {
        writeByte(value ? 1 : 0);
    }

    public final void writeInt(int value) throws IOException {
        room(Integer.BYTES).putInt(value);
    }

    public final void writeLong(long value) throws IOException {
        room(Long.BYTES).putLong(value);
    }

    public final void writeDouble(double value) throws IOException {
        room(Double.BYTES).putDouble(value);
    }

    /** Length in bytes as an int, then UTF-8. */
    public final void writeText(String text) throws IOException {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        writeInt(bytes.length);
        writeBytes(bytes, 0, bytes.length);
    }

    /** Elements {@code from} (inclusive) to {@code to} (exclusive), without a length. */
    public final void writeBytes(byte[] values, int from, int to) throws IOException {
        for (int next = from; next < to; ) {
            int count = Math.min(room(Byte.BYTES).remaining(), to - next);
            buffer.put(values, next, count);
            next += count;
        }
    }

    /** Elements {@code from} (inclusive) to {@code to} (exclusive), without a length. */
    public final void writeInts(int[] values, int from, int to) throws IOException {
        for (int next = from; next < to; ) {
            int count = Math.min(room(Integer.BYTES).remaining() / Integer.BYTES, to - next);
            buffer.asIntBuffer().put(values, next, count);
            next += advance(count, Integer.BYTES);
        }
    }

    /** Elements {@code from} (inclusive) to {@code to} (exclusive), without a length. */
    public final void writeLongs(long[] values, int from, int to) throws IOException {
        for (int next = from; next < to; ) {
            int count = Math.min(room(Long.BYTES).remaining() / Long.BYTES, to - next);
            buffer.asLongBuffer().put(values, next, count);
            next += advance(count, Long.BYTES);
        }
    }

    /** Elements {@code from} (inclusive) to {@code to} (exclusive), without a length. */
    public final void writeFloats(float[] values, int from, int to) throws IOException {
        for (int next = from; next < to; ) {
            int count = Math.min(room(Float.BYTES).remaining() / Float.BYTES, to - next);
            buffer.asFloatBuffer().put(values, next, count);
            next += advance(count, Float.BYTES);
        }
    }

    /** Elements {@code from} (inclusive) to {@code to} (exclusive), every bit kept, without a length. */
    public final void writeDoubles(double[] values, int from, int to) throws IOException {
        for (int next = from; next < to; ) {
            int count = Math.min(room(Double.BYTES).remaining() / Double.BYTES, to - next);
            buffer.asDoubleBuffer().put(values, next, count);
            next += advance(count, Double.BYTES);
        }
    }

    private int advance(int count, int size) {
        buffer.position(buffer.position() + count * size);
        return count;
    }
}
