// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/**
 * Force and torque on each wall: mean over the samples of a table interval, and the largest force. Threads: one, between
 * steps.
 */
public final class WallLoads implements Persistent {

    /** Numbers a wall: force 3 (N), torque about the pivot 3 (N m). */
    public static final int LOAD = 6;

    private final double[] sums;
    private final double[] largest;
    private final double[] largestEver;
    private long samples;

    /** @param walls number of walls */
    public WallLoads(int walls) {
        sums = new double[LOAD * walls];
        largest = new double[walls];
        largestEver = new double[walls];
    }

    /** Takes the loads of a step, {@link #LOAD} numbers a wall. */
    public void sample(double[] loads) {
        samples++;
        for (int k = 0; k < sums.length; k++) {
            sums[k] += loads[k];
        }
        for (int w = 0; w < largest.length; w++) {
            double x = loads[LOAD * w], y = loads[LOAD * w + 1], z = loads[LOAD * w + 2];
            largest[w] = Math.max(largest[w], Math.sqrt(x * x + y * y + z * z));
            largestEver[w] = Math.max(largestEver[w], largest[w]);
        }
    }

    public int walls() {
        return largest.length;
    }

    /** Mean of one of the numbers of a wall in this interval; not a number without a sample. */
    public double mean(int wall, int number) {
        return sums[LOAD * wall + number] / samples;
    }

    /** Largest force on a wall in this interval, N. */
    public double largest(int wall) {
        return largest[wall];
    }

    /** Largest force on a wall in the whole run, N. */
    public double largestEver(int wall) {
        return largestEver[wall];
    }

    /** Starts a new table interval. */
    public void beginInterval() {
        samples = 0;
        Arrays.fill(sums, 0);
        Arrays.fill(largest, 0);
    }

    @Override
    public String section() {
        return "wall loads";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeLong(samples);
        out.writeDoubles(sums, 0, sums.length);
        out.writeDoubles(largest, 0, largest.length);
        out.writeDoubles(largestEver, 0, largestEver.length);
    }

    @Override
    public void restore(SectionReader in) {
        samples = in.readLong();
        in.readDoubles(sums, 0, sums.length);
        in.readDoubles(largest, 0, largest.length);
        in.readDoubles(largestEver, 0, largestEver.length);
    }
}
