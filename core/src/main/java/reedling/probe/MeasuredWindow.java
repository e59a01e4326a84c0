// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import reedling.error.RangeCheck;

/**
 * The part of a run that is measured, cut into batches of equal length. Errors: no length, no batch.
 *
 * @param from start, s
 * @param until end, s, later than the start
 * @param batches number of batches, at least 1
 */
public record MeasuredWindow(double from, double until, int batches) {

    public MeasuredWindow {
        new RangeCheck("measured window")
                .finite("start", from, "s")
                .positive("length", until - from, "s")
                .require(batches > 0, "batches", batches, "", "at least 1")
                .finish();
    }

    /** Number that {@link #batchOf} gives outside the window. */
    public static final int OUTSIDE = -1;

    /** Batch of a time (s); the end belongs to the last batch. */
    public int batchOf(double time) {
        if (!(time >= from && time <= until)) {
            return OUTSIDE;
        }
        return Math.min(batches - 1, (int) ((time - from) / (until - from) * batches));
    }

    /** Batches that are over at a time (s). */
    public int finished(double time) {
        if (time >= until) {
            return batches;
        }
        return time <= from ? 0 : (int) ((time - from) / (until - from) * batches);
    }

    /** Length of a batch, s. */
    public double batchLength() {
        return (until - from) / batches;
    }
}
