// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * The well of {@link LennardJonesLaw}. With p = (s/x)^6:
 *
 * <pre>F = 24 e/s (s/x) p (2 p - 1) - F_c,   k = -dF/dx = 24 e/s^2 (s/x)^2 p (26 p - 7),   U = 4 e p (p - 1) - V_c + F_c (x - c)</pre>
 *
 * @param depth e, J
 * @param zero s, m
 * @param contact x_c, m
 * @param cutoff c, m
 */
record LennardJonesKernel(double depth, double zero, double contact, double cutoff) implements ContactKernel {

    /** Distance over s below which the force does not grow any more. */
    private static final double CORE = 0.3;

    /** Share of the time to cover the present distance that counts as the duration. */
    private static final double TRAVEL = 0.5;

    /** (s/x)^6. */
    private double sixth(double x) {
        double u = zero / x;
        double squared = u * u;
        return squared * squared * squared;
    }

    private double forceAtCutoff() {
        double p = sixth(cutoff);
        return 24 * depth / cutoff * p * (2 * p - 1);
    }

    private double potentialAtCutoff() {
        double p = sixth(cutoff);
        return 4 * depth * p * (p - 1);
    }

    @Override
    public void apply(ContactBlock block) {
        addForce(block);
        if (block.energyDue()) {
            addStoredEnergy(block);
        }
    }

    private void addForce(ContactBlock block) {
        double[] c = block.columns();
        double shift = forceAtCutoff();
        double perForce = 24 * depth / zero;
        double swing = 0;
        double travel = 0;
        for (int r = 0; r < block.rows(); r++) {
            double raw = contact - c[at(Column.OVERLAP) + r];
            double x = raw > CORE * zero ? raw : CORE * zero;
            if (!(x < cutoff && c[at(Column.TOUCH) + r] > 0)) {
                continue;
            }
            double u = zero / x;
            double squared = u * u;
            double p = squared * squared * squared;
            double force = u * p * (p * 2.0 - 1.0) * perForce - shift;
            c[at(Column.ELASTIC_FORCE) + r] += force;
            c[at(Column.ADHESIVE_LOAD) + r] -= force;
            double slope = squared * p * (p * 26.0 - 7.0) * (perForce / zero);
            c[at(Column.STIFFNESS) + r] += slope > 0 ? slope : 0;
            swing = Math.max(swing, Math.abs(slope) / c[at(Column.EFFECTIVE_MASS) + r]);
            travel = Math.max(travel, Math.abs(c[at(Column.CLOSING) + r]) / x);
        }
        report(block, swing, travel);
    }

    /**
     * Reports the duration of rows in reach.
     *
     * @param swing largest stiffness over mass, 1/s2
     * @param travel largest speed over distance, 1/s
     */
    static void report(ContactBlock block, double swing, double travel) {
        if (swing > 0 || travel > 0) {
            block.reportDuration(Math.min(Math.PI / Math.sqrt(swing), TRAVEL / travel));
        }
    }

    private void addStoredEnergy(ContactBlock block) {
        double[] c = block.columns();
        for (int r = 0; r < block.rows(); r++) {
            double x = contact - c[at(Column.OVERLAP) + r];
            if (x < cutoff && c[at(Column.TOUCH) + r] > 0) {
                c[at(Column.STORED_ENERGY) + r] += energy(x);
            }
        }
    }

    private double energy(double x) {
        double held = Math.max(x, CORE * zero);
        double p = sixth(held);
        double shift = forceAtCutoff();
        double core = (24 * depth / held * p * (2 * p - 1) - shift) * (held - x);
        return 4 * depth * p * (p - 1) - potentialAtCutoff() + shift * (held - cutoff) + core;
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        return TRAVEL * zero / speed;
    }

    @Override
    public double reach(double largestRadius) {
        return cutoff - contact;
    }

    @Override
    public boolean pulls() {
        return true;
    }
}
