// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;

/** Bytes that a piece of work allocates on this thread. */
final class Allocation {

    private Allocation() {}

    /**
     * Least number of bytes a call over several rounds: vectors, for one, live on the heap until the compiler has had its
     * turn. Not a number where the Java machine cannot count.
     */
    static double leastBytes(Runnable work, int calls, int rounds) {
        if (!(ManagementFactory.getThreadMXBean() instanceof ThreadMXBean counter)
                || !counter.isThreadAllocatedMemorySupported()) {
            return Double.NaN;
        }
        double least = Double.POSITIVE_INFINITY;
        for (int round = 0; round < rounds && least > 0; round++) {
            long before = counter.getCurrentThreadAllocatedBytes();
            for (int k = 0; k < calls; k++) {
                work.run();
            }
            least = Math.min(least, (counter.getCurrentThreadAllocatedBytes() - before) / (double) calls);
        }
        return least;
    }
}
