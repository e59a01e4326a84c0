// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/** Velocity of a gas over space, before any change with time. Threads: immutable. */
interface GasFlow {

    /**
     * Writes the gas at a point.
     *
     * @param x m, world axes
     * @param out velocity, m/s, in 0 to 2; its rate of rotation (half the curl), rad/s, in 3 to 5
     */
    void at(double x, double y, double z, double[] out);
}
