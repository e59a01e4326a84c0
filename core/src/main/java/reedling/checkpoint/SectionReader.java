// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.lang.foreign.MemorySegment;
import java.lang.foreign.ValueLayout;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/**
 * Reads one section in the order in which it was written; arrays are copied in one go. Reading past its end is refused
 * with a {@link reedling.error.ReedlingException} that names the section.
 * Threads: one at a time; not after its {@link CheckpointReader} was closed.
 */
public final class SectionReader {

    private final Path file;
    private final String name;
    private final MemorySegment bytes;
    private long position;

    SectionReader(Path file, String name, MemorySegment bytes) {
        this.file = file;
        this.name = name;
        this.bytes = bytes;
    }

    long size() {
        return bytes.byteSize();
    }

    /** Bytes not yet read. */
    public long remaining() {
        return bytes.byteSize() - position;
    }

    private long take(long count) {
        if (count < 0 || count > remaining()) {
            throw CheckpointFault.SECTION_TOO_SHORT.in(
                    file,
                    "section " + name,
                    bytes.byteSize() + " bytes, of which " + remaining() + " are left when " + count + " are read");
        }
        long start = position;
        position += count;
        return start;
    }

    public int readByte() {
        return bytes.get(ValueLayout.JAVA_BYTE, take(Byte.BYTES));
    }

    public boolean readBoolean() {
        return readByte() != 0;
    }

    public int readInt() {
        return bytes.get(CheckpointFormat.INT, take(Integer.BYTES));
    }

    public long readLong() {
        return bytes.get(CheckpointFormat.LONG, take(Long.BYTES));
    }

    public double readDouble() {
        return bytes.get(CheckpointFormat.DOUBLE, take(Double.BYTES));
    }

    /** Counterpart of {@code writeText}. */
    public String readText() {
        int length = readInt();
        long start = take(length);
        return new String(bytes.asSlice(start, length).toArray(ValueLayout.JAVA_BYTE), StandardCharsets.UTF_8);
    }

    /** Fills elements {@code from} (inclusive) to {@code to} (exclusive). */
    public void readBytes(byte[] values, int from, int to) {
        int count = to - from;
        MemorySegment.copy(bytes, ValueLayout.JAVA_BYTE, take(count), values, from, count);
    }

    /** Fills elements {@code from} (inclusive) to {@code to} (exclusive). */
    public void readInts(int[] values, int from, int to) {
        int count = to - from;
        MemorySegment.copy(bytes, CheckpointFormat.INT, take((long) count * Integer.BYTES), values, from, count);
    }

    /** Fills elements {@code from} (inclusive) to {@code to} (exclusive). */
    public void readLongs(long[] values, int from, int to) {
        int count = to - from;
        MemorySegment.copy(bytes, CheckpointFormat.LONG, take((long) count * Long.BYTES), values, from, count);
    }

    /** Fills elements {@code from} (inclusive) to {@code to} (exclusive). */
    public void readFloats(float[] values, int from, int to) {
        int count = to - from;
        MemorySegment.copy(bytes, CheckpointFormat.FLOAT, take((long) count * Float.BYTES), values, from, count);
    }

    /** Fills elements {@code from} (inclusive) to {@code to} (exclusive), every bit as it was. */
    public void readDoubles(double[] values, int from, int to) {
        int count = to - from;
        MemorySegment.copy(bytes, CheckpointFormat.DOUBLE, take((long) count * Double.BYTES), values, from, count);
    }
}
