// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/**
 * Vortex of Rankine on top of a uniform flow: inside the core the gas turns like a rigid body, u = spin x r; outside it
 * falls off as u = spin R_c^2 / r without rotation. An infinite core gives the rigid body everywhere.
 *
 * <p>Source: Rankine, A manual of applied mechanics, 1858 (from memory).
 *
 * @param velocity uniform part, m/s
 * @param spin rad/s about the axis, right-handed
 * @param axis 0, 1 or 2
 * @param core radius of the core, m
 * @param centre a point of the axis, m
 */
record VortexFlow(double[] velocity, double spin, int axis, double core, double[] centre) implements GasFlow {

    @Override
    public void at(double x, double y, double z, double[] out) {
        int first = (axis + 1) % 3;
        int second = (axis + 2) % 3;
        out[0] = x - centre[0];
        out[1] = y - centre[1];
        out[2] = z - centre[2];
        double a = out[first];
        double b = out[second];
        double squared = a * a + b * b;
        boolean inside = squared <= core * core;
        double turn = inside ? spin : spin * core * core / squared;
        out[axis] = velocity[axis];
        out[first] = velocity[first] - turn * b;
        out[second] = velocity[second] + turn * a;
        out[3] = 0;
        out[4] = 0;
        out[5] = 0;
        out[3 + axis] = inside ? spin : 0;
    }
}
