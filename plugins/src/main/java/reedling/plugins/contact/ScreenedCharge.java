// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * Repulsion of equal charges of {@link LennardJonesLaw}, after its well and in a plain loop, because the exponential
 * function must give the same bits everywhere. With V = K q^2 exp(-x/l) / x:
 *
 * <pre>F = V (1/x + 1/l) - F_c,   k = V (2/x^2 + 2/(x l) + 1/l^2),   U = V - V_c + F_c (x - c)</pre>
 *
 * @param charge q, C
 * @param core distance below which the force does not grow any more, m
 * @param contact x_c, m
 * @param cutoff c, m
 * @param screening l, m
 */
record ScreenedCharge(double charge, double core, double contact, double cutoff, double screening)
        implements ContactKernel {

    private static final double COULOMB = 8.9875517923e9; // N m2/C2, 1 / (4 pi epsilon_0), CODATA 2018

    private double potential(double x) {
        return COULOMB * charge * charge * StrictMath.exp(-x / screening) / x;
    }

    private double force(double x) {
        return potential(x) * (1 / x + 1 / screening);
    }

    @Override
    public void apply(ContactBlock block) {
        double[] c = block.columns();
        double shift = force(cutoff);
        double atCutoff = potential(cutoff);
        double swing = 0;
        double travel = 0;
        for (int r = 0; r < block.rows(); r++) {
            double raw = contact - c[at(Column.OVERLAP) + r];
            double x = Math.max(raw, core);
            if (!(x < cutoff && c[at(Column.TOUCH) + r] > 0)) {
                continue;
            }
            double value = potential(x);
            double force = value * (1 / x + 1 / screening) - shift;
            double slope = value * (2 / (x * x) + 2 / (x * screening) + 1 / (screening * screening));
            c[at(Column.ELASTIC_FORCE) + r] += force;
            c[at(Column.ADHESIVE_LOAD) + r] -= force;
            c[at(Column.STIFFNESS) + r] += slope;
            if (block.energyDue()) {
                c[at(Column.STORED_ENERGY) + r] += value - atCutoff + shift * (x - cutoff) + force * (x - raw);
            }
            swing = Math.max(swing, slope / c[at(Column.EFFECTIVE_MASS) + r]);
            travel = Math.max(travel, Math.abs(c[at(Column.CLOSING) + r]) / x);
        }
        LennardJonesKernel.report(block, swing, travel);
    }
}
