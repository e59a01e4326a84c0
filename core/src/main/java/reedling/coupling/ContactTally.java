// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;

/**
 * What the contact rows of one chunk add up to in a step: work done against dashpots, friction and rolling resistance,
 * energy stored in contact springs, step limits and the deepest overlap. Sums run in eight accumulators by row number
 * modulo 8, so that they do not depend on how a kernel runs; limits are minima, which no order can change.
 *
 * <p>Threads: written by the task of its chunk, read between phases.
 */
public final class ContactTally {

    /** Accumulators of the work against normal dashpots. */
    static final int NORMAL = 0;

    /** Accumulators of the work against friction. */
    static final int SLIDING = Lanes.TILE;

    /** Accumulators of the work against rolling resistance. */
    static final int ROLLING = 2 * Lanes.TILE;

    /** Accumulators of the energy that normal forces store. */
    static final int STORED = 3 * Lanes.TILE;

    /** Accumulators of the energy in tangential and rolling springs. */
    static final int SPRINGS = 4 * Lanes.TILE;

    private final double[] sums = new double[5 * Lanes.TILE];
    private double shortestDuration = Double.POSITIVE_INFINITY;
    private double approachLimit = Double.POSITIVE_INFINITY;
    private double largestFrequencySquared;
    private double deepestExcess = Double.NEGATIVE_INFINITY;
    private boolean touching;

    /** Starts a step. */
    public void clear() {
        Arrays.fill(sums, 0);
        shortestDuration = Double.POSITIVE_INFINITY;
        approachLimit = Double.POSITIVE_INFINITY;
        largestFrequencySquared = 0;
        deepestExcess = Double.NEGATIVE_INFINITY;
        touching = false;
    }

    double[] sums() {
        return sums;
    }

    /** Adds the stored-energy column of a block to one of the channels. */
    void store(ContactBlock block, int channel) {
        double[] c = block.columns();
        for (int r = 0; r < block.rows(); r++) {
            sums[channel + (r & Lanes.TILE - 1)] += c[ContactBlock.at(Column.STORED_ENERGY) + r];
        }
    }

    private double sum(int channel) {
        double total = 0;
        for (int k = 0; k < Lanes.TILE; k++) {
            total += sums[channel + k];
        }
        return total;
    }

    /** Work against dashpots, friction and rolling resistance in the past step, J. */
    public double work() {
        return sum(NORMAL) + sum(SLIDING) + sum(ROLLING);
    }

    /** Energy in tangential and rolling springs, J; 0 unless it was asked for. */
    public double springEnergy() {
        return sum(SPRINGS);
    }

    /** Energy that normal forces store, J; 0 unless it was asked for. */
    public double storedEnergy() {
        return sum(STORED);
    }

    /** Shortest contact duration, s. */
    public double shortestDuration() {
        return shortestDuration;
    }

    void duration(double seconds) {
        if (Double.isNaN(seconds) || seconds < shortestDuration) {
            shortestDuration = seconds;
        }
    }

    /** Longest step that bodies about to touch allow, s. */
    public double approachLimit() {
        return approachLimit;
    }

    void approach(double limit) {
        approachLimit = Math.min(approachLimit, limit);
    }

    /** Largest squared frequency of a single contact, 1/s2. */
    public double largestFrequencySquared() {
        return largestFrequencySquared;
    }

    void frequencySquared(double value) {
        largestFrequencySquared = Math.max(largestFrequencySquared, value);
    }

    /** Largest excess of an overlap over the accepted fraction of its effective radius, m; above 0 the guard stops. */
    public double deepestExcess() {
        return deepestExcess;
    }

    void excess(double value) {
        deepestExcess = Math.max(deepestExcess, value);
    }

    /** True when at least one pair of bodies overlaps. */
    public boolean touching() {
        return touching;
    }

    void touch(boolean any) {
        touching |= any;
    }
}
