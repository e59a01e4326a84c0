// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

/**
 * Memory layout of one grain: sixteen doubles, two 64-byte lines, so that eight pairs can be turned into columns by
 * loading whole lines. Force rows take one line a grain; their two spare places carry the sums of contact stiffness
 * that the stability estimate needs.
 */
public final class GrainRow {

    /** Doubles a grain. */
    public static final int LENGTH = 16;

    /** Doubles before the first row: behind a 16-byte header rows start on a line where the array itself does. */
    public static final int PAD = 6;

    /** Centre, m. */
    public static final int X = 0;

    /** Radius, m. */
    public static final int RADIUS = 3;

    /** Velocity, m/s, at the half step once a run has started. */
    public static final int V = 4;

    /** 1/kg. */
    public static final int INVERSE_MASS = 7;

    /** Spin, rad/s, world axes. */
    public static final int W = 8;

    /** 1/(kg m2). */
    public static final int INVERSE_INERTIA = 11;

    /** Radius times spin, m/s; kept equal to the product whenever the spin is written. */
    public static final int RADIUS_W = 12;

    /** Radius again, m, so that a tile of second lines holds it. */
    public static final int RADIUS_AGAIN = 15;

    /** Doubles in a force row. */
    public static final int FORCE_LENGTH = 8;

    /** Torque, N m, in a force row. */
    public static final int TORQUE = 0;

    /** Sum of normal contact stiffness, N/m, in a force row. */
    public static final int NORMAL_STIFFNESS = 3;

    /** Force, N, in a force row. */
    public static final int FORCE = 4;

    /** Sum of tangential contact stiffness, N/m, in a force row. */
    public static final int TANGENTIAL_STIFFNESS = 7;

    private GrainRow() {}

    /** Index of the first double of a grain's row. */
    public static int at(int grain) {
        return PAD + LENGTH * grain;
    }

    /** Index of the first double of a grain's force row. */
    public static int forceAt(int grain) {
        return PAD + FORCE_LENGTH * grain;
    }
}
