// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/**
 * Times k x interval at which something is wanted: due at the first step at or after each. What is due next follows from
 * the time alone, so that a resumed run needs nothing saved. Threads: one.
 */
final class Due {

    private final double interval;
    private double next;

    /**
     * @param interval s; infinite for never
     * @param done the last time (s) for which everything was done
     */
    Due(double interval, double done) {
        this.interval = interval;
        next = after(done);
    }

    private double after(double time) {
        if (interval == Double.POSITIVE_INFINITY) {
            return interval;
        }
        double k = Math.floor(time / interval);
        while (k * interval <= time) {
            k++;
        }
        return k * interval;
    }

    /** Whether it is due at a time, s; if so, that time counts as done. */
    boolean take(double time) {
        if (time < next) {
            return false;
        }
        next = after(time);
        return true;
    }
}
