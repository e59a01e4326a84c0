// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.error.RangeCheck;
import reedling.material.MaterialPair;

/**
 * Force across the gap between two bodies from a potential of their distance x: attraction that turns into steep
 * repulsion, and, if the bodies carry charge, screened repulsion of like charges.
 *
 * <pre>
 * V = 4 e [(s/x)^12 - (s/x)^6] + K q^2 exp(-x/l) / x          J
 * F = -dV/dx + dV/dx at the cut-off,  x = gap + x_c           N, repulsive positive; 0 beyond the cut-off
 * </pre>
 *
 * <p>Where: e depth of the well (J); s distance of zero potential (m); q charge of each body (C); l screening length (m);
 * K = 8.9875517923e9 N m2/C2; x_c distance of surfaces that touch (m): the sum of the radii makes x the distance of the
 * centres. Force and energy are shifted so that both end at zero at the cut-off: the well is shallower by
 * a hundredth at c = 3.5 s and by a thousandth at 5.2 s. Below 0.3 s the force stays as it is there.
 *
 * <p>The normal force of the case acts beside it where bodies overlap; friction sees that one only. Not for: use beside an
 * adhesion law that already holds the same attraction. All contacts have the same potential, whatever their radii.
 *
 * <p>Shapes: a block; no history. Stable step: N steps in half a swing at the present stiffness and in the time of half
 * the present distance. Source: textbook potentials of Lennard-Jones, Coulomb and Yukawa; shifting the force is common
 * practice. Threads: immutable.
 *
 * @param depth e, J
 * @param zero s, m
 * @param contact x_c, m
 * @param cutoff c, m
 * @param charge q, C
 * @param screening l, m
 */
record LennardJonesLaw(double depth, double zero, double contact, double cutoff, double charge, double screening)
        implements ContactLaw {

    LennardJonesLaw {
        new RangeCheck("lennard-jones")
                .require(cutoff > contact, "cutoff", cutoff, "m", "more than contact_distance, " + contact + " m")
                .require(cutoff > zero, "cutoff", cutoff, "m", "more than zero_distance, " + zero + " m")
                .finish();
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        ContactKernel well = new LennardJonesKernel(depth, zero, contact, cutoff);
        return charge == 0
                ? well
                : ContactKernel.inOrder(well, new ScreenedCharge(charge, 0.3 * zero, contact, cutoff, screening));
    }
}
