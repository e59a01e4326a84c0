// SPDX-License-Identifier: Apache-2.0
package reedling.parallel;

import java.util.concurrent.locks.LockSupport;

/**
 * How a thread waits: it spins for some tens of microseconds, which is shorter than waking a thread would take, then
 * yields the core to whoever needs it, then sleeps briefly and ever longer, so that an idle team costs next to nothing.
 */
final class Patience {

    private static final int SPINS = 1_000;
    private static final int YIELDS = 1_000;
    private static final long SHORTEST_SLEEP = 50_000; // ns

    private final long longestSleep;
    private int turns;
    private long sleep = SHORTEST_SLEEP;

    /** Sleeps no longer than this at a time, ns. */
    Patience(long longestSleep) {
        this.longestSleep = longestSleep;
    }

    /** Starts again with spinning; called when what was waited for has come. */
    void reset() {
        turns = 0;
        sleep = SHORTEST_SLEEP;
    }

    /** Waits a little. */
    void await() {
        if (turns < SPINS) {
            turns++;
            Thread.onSpinWait();
        } else if (turns < SPINS + YIELDS) {
            turns++;
            Thread.yield();
        } else {
            LockSupport.parkNanos(sleep);
            sleep = Math.min(2 * sleep, longestSleep);
        }
    }
}
