// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.math.Roots;

/**
 * First kernel of {@link JkrLaw}: contact radius, force and stored energy, and in column LOST_ENERGY whether the contact is
 * joined now, for {@link JkrJumps}.
 *
 * <p>z is the larger root of z^4 - z = D. With t = sqrt(D - D_tear), z is smooth in t down to the fold; the start value
 * z^2 = z_f^2 + b t + (1 - b) t^2 / (t + 1.45) is exact in value and slope at the fold and in the limit of large t, and
 * within 0.2 % between, so that three Newton steps reach the last digits everywhere. A plain loop: its roots and quotients
 * make a vector form too long for one compile unit, and its vectors became objects.
 */
record JkrForce(JkrScale scale) implements ContactKernel {

    private static final double FOLD_SQUARED = StrictMath.cbrt(0.0625);
    private static final double SLOPE = 2 / StrictMath.sqrt(6);
    private static final double BEND = 1.45;
    private static final double LEAST = 1e-16; // of t^2: at the fold itself Newton's step is 0 / 0
    private static final double APART = 1e-30; // m, contact radius where nothing is joined; keeps quotients finite
    private static final double REACH = 2 * -JkrLaw.TEAR; // scaled; beyond the tear by what a step may overshoot

    @Override
    public void apply(ContactBlock block) {
        rememberRoots(block);
        force(block);
    }

    /** Third roots of R* of new rows; R* of a contact does not change. */
    private void rememberRoots(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        for (int r = 0; r < block.rows(); r++) {
            int at = block.historyAtRow(r, scale.root());
            if (!(history[at] > 0)) {
                history[at] = Roots.third(c[at(Column.EFFECTIVE_RADIUS) + r]);
            }
        }
    }

    private void force(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        for (int r = 0; r < block.rows(); r++) {
            double overlap = c[at(Column.OVERLAP) + r];
            double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
            double q = history[block.historyAtRow(r, scale.root())];
            double before = history[block.historyAtRow(r, scale.joined())];

            // 1 larger root of z^4 - z = D
            double d = overlap * scale.overlap() / q;
            double fold = d - JkrLaw.TEAR;
            double t = Math.sqrt(fold > LEAST ? fold : LEAST);
            double z = Math.sqrt(t * t * (1 - SLOPE) / (t + BEND) + t * SLOPE + FOLD_SQUARED);
            for (int k = 0; k < 3; k++) {
                double squared = z * z;
                z -= (squared * squared - (z + d)) / (squared * z * 4.0 - 1.0);
            }

            // 2 joined while it was, or touches, and has not torn
            boolean joined = (before > 0 || overlap > 0) && fold > 0 && c[at(Column.TOUCH) + r] > 0;
            c[at(Column.LOST_ENERGY) + r] = joined ? 1.0 : 0.0;

            // 3 contact radius, force, load, energy
            double squared = z * z;
            double cube = squared * z;
            double area = joined ? q * q * scale.length() * squared : APART;
            c[at(Column.CONTACT_RADIUS) + r] = area;
            c[at(Column.STIFFNESS) + r] = area * (2 * scale.modulus());
            c[at(Column.ELASTIC_FORCE) + r] = joined ? radius * scale.force() * cube * (cube - 1.5) : 0;
            c[at(Column.ADHESIVE_LOAD) + r] = joined ? radius * scale.load() : 0;
            double shape = ((cube * 0.4 - 1.0) * cube + 0.375) * (squared * squared);
            c[at(Column.STORED_ENERGY) + r] = joined ? (shape * (4.0 / 3) + 0.3) * (radius * q * scale.energy()) : 0;
        }
    }

    @Override
    public double reach(double largestRadius) {
        return REACH * StrictMath.cbrt(largestRadius) / scale.overlap();
    }

    @Override
    public boolean pulls() {
        return true;
    }
}
