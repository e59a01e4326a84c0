// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import reedling.particle.RandomStream;

/**
 * A smooth random motion of two spheres that ends as it began, apart. The overlap comes and goes a few times; the line of
 * centres wobbles, both bodies turn, and the whole drifts about, all on the scale of the slip that a firm contact bears.
 *
 * <p>Threads: one.
 */
final class RandomCycle implements PairMotion {

    private static final int WAVES = 3;
    private static final int CURVES = 12;
    private static final double GAP = 0.2; // at the ends, over the depth

    private final double radii;
    private final double duration;
    private final double depth;
    private final int dips;
    private final double dipPhase;
    private final double[] axis = new double[3];
    private final double[] amplitude = new double[CURVES * WAVES];
    private final double[] phase = new double[CURVES * WAVES];

    /**
     * @param seed the same seed gives the same motion
     * @param couple radii
     * @param duration s
     */
    RandomCycle(long seed, Couple couple, double duration) {
        RandomStream random = new RandomStream(seed);
        this.duration = duration;
        radii = couple.firstRadius() + couple.secondRadius();
        depth = random.uniform(0.3, 1.5) * Reference.DEPTH * couple.effectiveRadius();
        dips = 2 + (int) (4 * random.uniform());
        dipPhase = 2 * Math.PI * random.uniform();
        double size = 0;
        for (int k = 0; k < 3; k++) {
            axis[k] = random.normal();
            size += axis[k] * axis[k];
        }
        for (int k = 0; k < 3; k++) {
            axis[k] /= Math.sqrt(size);
        }
        for (int k = 0; k < amplitude.length; k++) {
            // curves: direction of the line of centres, place of the first body (over the radii), angles of both bodies
            amplitude[k] = random.normal() * 2 * depth / radii / (1 + k % WAVES);
            phase[k] = 2 * Math.PI * random.uniform();
        }
    }

    @Override
    public void at(double time, double[] pose) {
        double turn = 2 * Math.PI * time / duration;
        double hump = Math.sin(0.5 * turn);
        double share = hump * hump * (0.4 + 0.6 * Math.cos(dips * turn + dipPhase));
        double distance = radii - depth * ((1 + GAP) * share - GAP);
        double nx = axis[0] + wave(0, turn), ny = axis[1] + wave(1, turn), nz = axis[2] + wave(2, turn);
        double scale = distance / Math.sqrt(nx * nx + ny * ny + nz * nz);
        for (int k = 0; k < 3; k++) {
            pose[k] = radii * wave(3 + k, turn);
        }
        pose[3] = pose[0] + scale * nx;
        pose[4] = pose[1] + scale * ny;
        pose[5] = pose[2] + scale * nz;
        for (int k = 0; k < 6; k++) {
            pose[ANGLES + k] = wave(6 + k, turn);
        }
    }

    /** A sum of sines that is 0 at both ends. */
    private double wave(int curve, double turn) {
        double sum = 0;
        for (int k = 0; k < WAVES; k++) {
            int at = curve * WAVES + k;
            sum += amplitude[at] * (Math.sin((k + 1) * turn + phase[at]) - Math.sin(phase[at]));
        }
        return sum;
    }
}
