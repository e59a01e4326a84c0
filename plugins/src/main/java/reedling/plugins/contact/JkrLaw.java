// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import java.util.List;
import java.util.Locale;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.HistoryColumn;
import reedling.material.MaterialPair;

/**
 * Normal force between elastic, adhesive bodies of round contact: the whole of it, repulsion and attraction.
 *
 * <pre>
 * d = a^2/R* - sqrt(2 pi w a / E*)                          overlap of a contact of radius a, m
 * F = 4 E* a^3 / (3 R*) - sqrt(8 pi w E* a^3)               N
 * scaled: q = R*^(1/3), k = (2 pi w / E*)^(1/3), a = q^2 k z^2, d = q k^2 (z^4 - z), F = 4/3 E* R* k^3 (z^6 - 3/2 z^3)
 * U = E* q^4 k^5 (4/3 (2/5 z^10 - z^7 + 3/8 z^4) + 3/10)    J, from d = 0 joined
 * d_tear = -0.47247 q k^2,  F_pull-off = -3/2 pi w R*
 * </pre>
 *
 * <p>Path: nothing until the bodies touch (d = 0); there the contact springs open to z = 1, with a pull of 4/3 pi w R*; it
 * holds until d falls to d_tear (z = 4^(-1/3)), where 7.09 (w^5 R*^4/E*^2)^(1/3) has been spent. That energy is booked as
 * lost when the contact tears; what the jump at d = 0 sets free is elastic waves and no part of U. A step that holds a
 * jump gets the force whose impulse is that of the jump inside the step, so that the energy is right to second order.
 *
 * <p>Where: w work of adhesion (J/m2); E* contact modulus (Pa); R* effective radius (m). Limits of friction, rolling and
 * twisting come from F + 2 F_pull-off. Stiffness 2 E* a is an upper bound. Damping is that of Hertz with this a; it
 * gives the restitution of the pair where adhesion is weak, and adhesion takes its share on top.
 *
 * <p>Shapes: a block; history 2 doubles: joined (0 or 1), q (m^(1/3)). Valid for: soft, large or sticky grains, Tabor
 * number (R* w^2 / (E*^2 z0^3))^(1/3) above about 5. Stable step: near the speed at which grains stick, 40 steps a contact.
 * Source: Johnson, Kendall and Roberts, Surface energy and the contact of elastic solids, 1971; energy of a cycle and
 * friction's load: Thornton and Ning, A theoretical model for the stick/bounce behaviour of adhesive, elastic-plastic
 * spheres, 1998; Thornton and Yin, Impact of elastic spheres with and without adhesion, 1991 (from memory); the form in z,
 * the energy and the treatment of jumps are derived here. Threads: immutable.
 */
final class JkrLaw implements ContactLaw {

    /** Fold of z^4 - z: the scaled overlap at which a contact tears. */
    static final double TEAR = -0.75 * StrictMath.cbrt(0.25);

    /** Energy of a contact at the fold, over E* q^4 k^5. */
    static final double TEAR_ENERGY = 0.05 * StrictMath.cbrt(0.25) + 0.3;

    /** Tabor number under which attraction acts outside the contact area too, so that this law pulls too little. */
    private static final double LEAST_TABOR = 5;

    private static final double ATOMS = 4e-10; // m, distance of the surfaces' atoms in contact, z0

    private static final double LEAST_WORK = 1e-12; // J/m2: no adhesion that counts, and nothing divides by zero

    private final double work;
    private final double onWalls;
    private final double onWires;

    /**
     * @param work of adhesion between grains, J/m2
     * @param onWalls work of adhesion to walls over that between grains
     * @param onWires work of adhesion to wires over that between grains
     */
    JkrLaw(double work, double onWalls, double onWires) {
        this.work = work;
        this.onWalls = onWalls;
        this.onWires = onWires;
    }

    @Override
    public List<HistoryColumn> history() {
        return List.of(HistoryColumn.scalar("joined"), HistoryColumn.scalar("radius_root"));
    }

    /** Tabor number (R* w^2 / (E*^2 z0^3))^(1/3), z0 = 0.4 nm (Tabor, Surface forces and surface interactions, 1977). */
    static double tabor(double work, double modulus, double radius) {
        double ratio = work / modulus;
        return StrictMath.cbrt(radius * ratio * ratio / (ATOMS * ATOMS * ATOMS));
    }

    @Override
    public List<String> cautions(MaterialPair pair, double radius) {
        double tabor = tabor(work, pair.contactModulus(), radius);
        return tabor >= LEAST_TABOR
                ? List.of()
                : List.of(String.format(
                        Locale.ROOT,
                        "law jkr between %s and %s: the Tabor number is %.2g, below 5, so attraction acts outside the"
                                + " contact area too; take an adhesion law for small, hard grains.",
                        pair.first().name(),
                        pair.second().name(),
                        tabor));
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        double share = switch (kind) {
            case GRAIN_GRAIN -> 1;
            case GRAIN_WALL -> onWalls;
            case GRAIN_WIRE -> onWires;
        };
        JkrScale scale = JkrScale.of(Math.max(LEAST_WORK, share * work), pair.contactModulus(), historyColumn);
        double alpha = StrictMath.sqrt(5) * Restitution.dampingRatio(pair.restitution());
        return ContactKernel.inOrder(new JkrForce(scale), new JkrJumps(scale), JkrPace.of(scale, alpha));
    }
}
