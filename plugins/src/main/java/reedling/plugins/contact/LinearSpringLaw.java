// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.material.MaterialPair;
import reedling.math.Lanes;

/**
 * Normal force of a linear spring with a linear dashpot: the contact lasts equally long at any speed.
 *
 * <pre>
 * k = k_0  or  k = m* (v_ref / (q R*))^2      N/m
 * F_el = k d                                  N
 * c = 2 zeta(e) sqrt(k m*)                    N s/m
 * a = k / (2 E*)                              m
 * t_c = pi sqrt(m* / k)                       s
 * </pre>
 *
 * <p>Where: k_0 a stiffness for all pairs; or v_ref a speed at which the undamped overlap grows to the fraction q of the
 * effective radius R* (m); m* effective mass (kg); d overlap (m); e restitution of the material pair, exact for both ends
 * of contact ({@link Restitution}); E* contact modulus (Pa). The body is a linear oscillator of frequency sqrt(k/m*), so a
 * damped contact lasts t_c / sqrt(1 - zeta^2) where the dashpot may pull, and longer than t_c where it may not: t_c is the
 * shortest.
 *
 * <p>The contact radius a is not that of an area: it is the radius of the Hertz contact that is as stiff as this spring.
 * Laws that take their stiffness from it (8 G* a for friction) keep the ratio to k_n that elasticity theory gives, and it
 * does not change during a contact.
 *
 * <p>Shapes: a block of rows; no history. Not for: overlaps, loads or wave speeds of real bodies; k is a number that a user
 * answers for. The dashpot acts with full force from the first touch on, so the step error of restitution is of first
 * order. Stable step: t_c / 10 or less. Errors: see the provider. Source: linear oscillator, textbook; end of contact at
 * zero force: Schwager and Poeschel, Coefficient of restitution and linear-dashpot model revisited, 2007 (from memory);
 * stiffness from a reference impact: common practice, no source. Threads: immutable.
 */
final class LinearSpringLaw implements ContactLaw {

    private static final double APART = 1e-12; // N/m where nothing touches: no step limit, quotients stay finite

    /**
     * How stiff the spring is: one of both numbers is 0.
     *
     * @param fixed k_0, N/m
     * @param referenceSpeed v_ref / q, m/s
     */
    record Stiffness(double fixed, double referenceSpeed) {

        double of(double radius, double mass) {
            double rate = referenceSpeed / radius; // 1/s
            return Math.fma(rate * rate, mass, fixed);
        }
    }

    private final Stiffness stiffness;
    private final boolean dashpotMayPull;

    LinearSpringLaw(Stiffness stiffness, boolean dashpotMayPull) {
        this.stiffness = stiffness;
        this.dashpotMayPull = dashpotMayPull;
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        return new Kernel(
                stiffness,
                Restitution.dampingRatio(pair.restitution(), dashpotMayPull),
                0.5 / pair.contactModulus(),
                dashpotMayPull);
    }

    /**
     * @param dampingRatio zeta
     * @param radius contact radius over stiffness, m2/N
     */
    private record Kernel(Stiffness stiffness, double dampingRatio, double radius, boolean dashpotMayPull)
            implements ContactKernel {

        @Override
        public void apply(ContactBlock block) {
            double slowest = Lanes.VECTORISED ? vector(block) : scalar(block);
            if (!(slowest == Double.POSITIVE_INFINITY)) {
                block.reportDuration(Math.PI * Math.sqrt(slowest));
            }
            if (block.energyDue()) {
                storedEnergy(block);
            }
        }

        /** Returns the smallest m* / k of the touching rows, s2. */
        private double vector(ContactBlock block) {
            double[] c = block.columns();
            DoubleVector fixed = DoubleVector.broadcast(Lanes.SPECIES, stiffness.fixed);
            DoubleVector speed = DoubleVector.broadcast(Lanes.SPECIES, stiffness.referenceSpeed);
            DoubleVector twiceRatio = DoubleVector.broadcast(Lanes.SPECIES, 2 * dampingRatio);
            DoubleVector perStiffness = DoubleVector.broadcast(Lanes.SPECIES, radius);
            DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
            DoubleVector apart = DoubleVector.broadcast(Lanes.SPECIES, APART);
            DoubleVector infinite = DoubleVector.broadcast(Lanes.SPECIES, Double.POSITIVE_INFINITY);
            DoubleVector least = infinite;
            for (int r = 0; r < block.rows(); r += Lanes.TILE) {
                DoubleVector mass = load(c, Column.EFFECTIVE_MASS, r);
                DoubleVector signed = load(c, Column.OVERLAP, r);
                DoubleVector rate = speed.div(load(c, Column.EFFECTIVE_RADIUS, r));
                DoubleVector k = apart.blend(rate.mul(rate).fma(mass, fixed), zero.lt(signed));
                store(k, c, Column.STIFFNESS, r);
                store(k.mul(perStiffness), c, Column.CONTACT_RADIUS, r);
                store(k.mul(Lanes.larger(signed, zero)), c, Column.ELASTIC_FORCE, r);
                store(k.mul(mass).sqrt().mul(twiceRatio), c, Column.DAMPING, r);
                least = Lanes.smaller(infinite.blend(mass.div(k), zero.lt(signed)), least);
            }
            return least.reduceLanes(VectorOperators.MIN);
        }

        private double scalar(ContactBlock block) {
            double[] c = block.columns();
            double least = Double.POSITIVE_INFINITY;
            for (int r = 0; r < block.rows(); r++) {
                double mass = c[at(Column.EFFECTIVE_MASS) + r];
                double signed = c[at(Column.OVERLAP) + r];
                double k = signed > 0 ? stiffness.of(c[at(Column.EFFECTIVE_RADIUS) + r], mass) : APART;
                c[at(Column.STIFFNESS) + r] = k;
                c[at(Column.CONTACT_RADIUS) + r] = k * radius;
                c[at(Column.ELASTIC_FORCE) + r] = k * (signed > 0 ? signed : 0);
                c[at(Column.DAMPING) + r] = Math.sqrt(k * mass) * (2 * dampingRatio);
                double slow = mass / k;
                least = signed > 0 && slow < least ? slow : least;
            }
            return least;
        }

        private static void storedEnergy(ContactBlock block) {
            double[] c = block.columns();
            for (int r = 0; r < block.rows(); r++) {
                double overlap = c[at(Column.OVERLAP) + r];
                c[at(Column.STORED_ENERGY) + r] = overlap > 0 ? 0.5 * c[at(Column.ELASTIC_FORCE) + r] * overlap : 0;
            }
        }

        @Override
        public double duration(double speed, double effectiveRadius, double mass) {
            return Math.PI * Math.sqrt(mass / stiffness.of(effectiveRadius, mass));
        }
    }
}
