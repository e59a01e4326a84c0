// SPDX-License-Identifier: Apache-2.0
package reedling.plugins;

import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.structure.NodeStore;

/**
 * Linear and angular momentum of the grains and nodes of a run about the origin, with the sums of magnitudes that say how
 * large round-off may be. Velocities stand at the half step; since v x v = 0 it does not matter at which end of the step
 * the positions stand.
 *
 * @param sum px, py, pz (kg m/s), hx, hy, hz (kg m2/s)
 * @param scale sum of |p| and of |h| over the bodies
 */
public record Momentum(double[] sum, double[] scale) {

    /** Momentum of all grains. */
    public static Momentum of(GrainStore grains) {
        Momentum total = new Momentum(new double[6], new double[2]);
        double[] rows = grains.rows();
        for (int g = 0; g < grains.count(); g++) {
            int at = GrainRow.at(g);
            total.add(
                    rows,
                    at,
                    rows,
                    at + GrainRow.V,
                    rows,
                    at + GrainRow.W,
                    1 / rows[at + GrainRow.INVERSE_MASS],
                    1 / rows[at + GrainRow.INVERSE_INERTIA]);
        }
        return total;
    }

    /** Momentum of all grains and of the free nodes of a structure. */
    public static Momentum of(GrainStore grains, NodeStore nodes) {
        Momentum total = of(grains);
        for (int n = 0; n < nodes.count; n++) {
            total.add(
                    nodes.position,
                    3 * n,
                    nodes.velocity,
                    3 * n,
                    nodes.spin,
                    3 * n,
                    nodes.mass[n],
                    1 / nodes.inverseInertia[n]);
        }
        return total;
    }

    private void add(double[] x, int ix, double[] v, int iv, double[] w, int iw, double mass, double inertia) {
        double linear = 0;
        double angular = 0;
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            double p = mass * v[iv + i];
            double h = mass * (x[ix + j] * v[iv + k] - x[ix + k] * v[iv + j]) + inertia * w[iw + i];
            sum[i] += p;
            sum[3 + i] += h;
            linear += p * p;
            angular += h * h;
        }
        scale[0] += Math.sqrt(linear);
        scale[1] += Math.sqrt(angular);
    }

    /** Largest change of any component since an earlier state, over the larger sum of magnitudes. */
    public double largestChange(Momentum before) {
        double largest = 0;
        for (int i = 0; i < 6; i++) {
            largest = Math.max(largest, Math.abs(sum[i] - before.sum[i]) / Math.max(scale[i / 3], before.scale[i / 3]));
        }
        return largest;
    }
}
