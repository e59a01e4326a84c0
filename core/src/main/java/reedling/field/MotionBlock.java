// SPDX-License-Identifier: Apache-2.0
package reedling.field;

import java.util.Arrays;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * A range of grains as a {@link MotionForce} sees them: at the end of the past step, with every other force known, but
 * before the closing half kick. So a row's velocity v~ is still that of the middle of the past step, and the velocity at
 * the present time is v = v~ + h/2 (F_others + F) / m with the force F looked for.
 *
 * <p>Threads: belongs to one worker.
 */
public final class MotionBlock {

    /** Doubles a grain in {@link #own()}, laid out as a force row. */
    public static final int LENGTH = GrainRow.FORCE_LENGTH;

    private final GrainStore grains;
    private final double[] spare = new double[8];
    private double[] own = new double[0];
    private int from;
    private int to;
    private double time;
    private double halfPast;
    private double fastestRate;

    public MotionBlock(GrainStore grains) {
        this.grains = grains;
    }

    /**
     * Takes a range of grains and clears the own rows.
     *
     * @param firstGrain first grain
     * @param endGrain one past the last
     * @param now time of the positions, s
     * @param half half of the past step, s; 0 before the first
     */
    public void open(int firstGrain, int endGrain, double now, double half) {
        from = firstGrain;
        to = endGrain;
        time = now;
        halfPast = half;
        fastestRate = 0;
        int length = LENGTH * (endGrain - firstGrain);
        if (own.length < length) {
            own = new double[length];
        }
        Arrays.fill(own, 0, length, 0);
    }

    public GrainStore grains() {
        return grains;
    }

    public int from() {
        return from;
    }

    public int to() {
        return to;
    }

    /** Time of the positions, s. */
    public double time() {
        return time;
    }

    /** Half of the past step, s. */
    public double halfPast() {
        return halfPast;
    }

    /** Where a motion force writes: one row a grain from {@link #ownAt}, laid out as a force row; zeros at first. */
    public double[] own() {
        return own;
    }

    /** Index of a grain's first double in {@link #own()}. */
    public int ownAt(int grain) {
        return LENGTH * (grain - from);
    }

    /** Eight doubles for the force's own use. */
    public double[] spare() {
        return spare;
    }

    /** Notes how fast a grain answers to the force, |dF/dv| / m or |dT/dw| / I, 1/s; the largest bounds the step. */
    public void rate(double perSecond) {
        fastestRate = perSecond > fastestRate ? perSecond : fastestRate;
    }

    /** The largest rate noted, 1/s. */
    public double fastestRate() {
        return fastestRate;
    }

    /** Adds the own rows, times a sign, to the grains' force rows. */
    public void addTo(double[] forces, double sign) {
        for (int g = from; g < to; g++) {
            int f = GrainRow.forceAt(g);
            int o = ownAt(g);
            for (int axis = 0; axis < 3; axis++) {
                forces[f + GrainRow.FORCE + axis] += sign * own[o + GrainRow.FORCE + axis];
                forces[f + GrainRow.TORQUE + axis] += sign * own[o + GrainRow.TORQUE + axis];
            }
        }
    }
}
