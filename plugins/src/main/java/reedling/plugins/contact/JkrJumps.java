// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * Second kernel of {@link JkrLaw}: steps in which a contact springs open or tears. Kick-drift-kick takes half of the force
 * at the end of a step for this step and half for the next, wherever in the step the jump was; the force is set so that
 * its impulse is that of the jump at its place, for a next step of equal length:
 *
 * <pre>
 * opening after touching at d = 0:   F' = F (d / u + 1/2),            u = v h, the approach in the step
 * tearing at d_t:                    F' = F_t (1/2 - (d_t - d) / u),   u = -v h
 * </pre>
 */
record JkrJumps(JkrScale scale) implements ContactKernel {

    /** F over 4/3 E* R* k^3 at the fold, where z^3 = 1/4. */
    private static final double TEAR_FORCE = 0.25 * (0.25 - 1.5);

    @Override
    public void apply(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        for (int r = 0; r < block.rows(); r++) {
            int joinedAt = block.historyAtRow(r, scale.joined());
            int rootAt = block.historyAtRow(r, scale.root());
            double before = history[joinedAt];
            double now = c[at(Column.LOST_ENERGY) + r];
            double lost = 0;
            if (now > before) {
                open(c, r, block.step());
            } else if (now < before) {
                lost = tear(c, r, block.step(), history[rootAt]);
            }
            c[at(Column.LOST_ENERGY) + r] = lost;
            history[joinedAt] = now;
            history[rootAt] *= c[at(Column.TOUCH) + r];
        }
    }

    private static void open(double[] c, int r, double step) {
        double overlap = c[at(Column.OVERLAP) + r];
        double approach = c[at(Column.CLOSING) + r] * step;
        if (approach > overlap) {
            c[at(Column.ELASTIC_FORCE) + r] *= overlap / approach + 0.5;
        }
    }

    /** Returns the energy lost, J. */
    private double tear(double[] c, int r, double step, double q) {
        double apart = -c[at(Column.CLOSING) + r] * step;
        double beyond = JkrLaw.TEAR * q / scale.overlap() - c[at(Column.OVERLAP) + r];
        boolean inOwnReach = beyond < -JkrLaw.TEAR * q / scale.overlap(); // that of the largest grains decides nothing
        if (apart > beyond && inOwnReach) {
            double force = TEAR_FORCE * scale.force() * (q * q * q);
            c[at(Column.ELASTIC_FORCE) + r] = force * (0.5 - beyond / apart);
        }
        return JkrLaw.TEAR_ENERGY * scale.energy() * (q * q) * (q * q);
    }
}
