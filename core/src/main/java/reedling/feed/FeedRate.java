// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import reedling.error.RangeCheck;

/**
 * How much is fed and when.
 *
 * <p>Formula: owed(t) = min(total, perSecond (min(t, stop) - start)) from the start on.
 * <p>Errors: rate or total not positive; start not finite; stop before start. Threads: immutable.
 *
 * @param measure what is counted
 * @param perSecond kg/s or 1/s
 * @param total kg or grains at most; may be plus infinity
 * @param start s
 * @param stop s; may be plus infinity
 */
public record FeedRate(Measure measure, double perSecond, double total, double start, double stop) {

    /** What a feed rate counts. */
    public enum Measure {
        /** Mass in kg. */
        MASS,
        /** Number of grains. */
        COUNT
    }

    public FeedRate {
        String unit = measure == Measure.MASS ? "kg" : "grains";
        new RangeCheck("feed")
                .positive("rate", perSecond, unit + "/s")
                .require(total > 0, "total", total, unit, "> 0")
                .finite("start", start, "s")
                .require(stop >= start, "stop", stop, "s", "at least the start, " + start + " s")
                .finish();
    }

    /** Amount that should have been fed by {@code time} (s), kg or grains. */
    public double owed(double time) {
        return Math.min(total, perSecond * Math.max(0, Math.min(time, stop) - start));
    }
}
