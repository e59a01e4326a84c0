// SPDX-License-Identifier: Apache-2.0
package reedling.parallel;

import java.lang.invoke.MethodHandles;
import java.lang.invoke.VarHandle;

/**
 * Long values shared by threads, each on cache lines of its own: 16 longs (128 bytes) apart, because processors fetch
 * lines in pairs, and with one such gap before the first.
 */
final class PaddedLongs {

    private static final VarHandle ELEMENT = MethodHandles.arrayElementVarHandle(long[].class);
    private static final int STRIDE = 16;

    private final long[] lines;

    PaddedLongs(int count) {
        lines = new long[(count + 2) * STRIDE];
    }

    private static int index(int k) {
        return (k + 1) * STRIDE;
    }

    long getPlain(int k) {
        return lines[index(k)];
    }

    void setPlain(int k, long value) {
        lines[index(k)] = value;
    }

    /** Reads a value and everything written before its release. */
    long getAcquire(int k) {
        return (long) ELEMENT.getAcquire(lines, index(k));
    }

    /** Publishes a value and everything written before it. */
    void setRelease(int k, long value) {
        ELEMENT.setRelease(lines, index(k), value);
    }

    long getOpaque(int k) {
        return (long) ELEMENT.getOpaque(lines, index(k));
    }

    /** Claims the present value and leaves the next; no other memory is ordered by it. */
    long getAndIncrement(int k) {
        return (long) ELEMENT.getAndAddRelease(lines, index(k), 1L);
    }

    boolean compareAndSet(int k, long expected, long value) {
        return ELEMENT.compareAndSet(lines, index(k), expected, value);
    }
}
