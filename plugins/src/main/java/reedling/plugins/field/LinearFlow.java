// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/**
 * Uniform flow with a shear: u = u0 + rate (r_across - centre_across) e_along.
 *
 * @param velocity u0, m/s, at the centre
 * @param rate 1/s; 0 for a uniform flow
 * @param along axis (0, 1, 2) of the shear's velocity
 * @param across another axis, along which it grows
 * @param centre m
 */
record LinearFlow(double[] velocity, double rate, int along, int across, double[] centre) implements GasFlow {

    @Override
    public void at(double x, double y, double z, double[] out) {
        double place = across == 0 ? x : across == 1 ? y : z;
        out[0] = velocity[0];
        out[1] = velocity[1];
        out[2] = velocity[2];
        out[along] += rate * (place - centre[across]);
        out[3] = 0;
        out[4] = 0;
        out[5] = 0;
        // curl of rate r_b e_a is rate e_b x e_a: minus the third axis when a, b, third are in cyclic order
        boolean cyclic = (along + 1) % 3 == across;
        out[3 + 3 - along - across] = cyclic ? -0.5 * rate : 0.5 * rate;
    }
}
