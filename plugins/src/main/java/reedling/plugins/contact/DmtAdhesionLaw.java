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
 * Constant attraction of stiff, dry bodies of round contact as long as they overlap, added to the elastic force of the
 * normal law.
 *
 * <pre>
 * F_c = 2 pi w R*                              N, the pull-off force
 * F_el = F_H - F_c    for d > 0                N, F_H of the normal law
 * U = U_H - F_c d                              J
 * t_a = 2.868266 (m*^2 / (R* E*^2 v_a))^(1/5),  v_a^2 = 4/5 F_c d_0 / m*,  d_0 = (F_c / (4/3 E* sqrt(R*)))^(2/3)   s
 * </pre>
 *
 * <p>Where: w work of adhesion (J/m2), of the case and the same for all material pairs; R* effective radius (m); d overlap
 * (m); m* effective mass (kg); E* contact modulus (Pa). d_0 is the overlap of a contact that no other force loads, and t_a
 * the impact time that goes with the frequency it has there; the law asks for no longer one, however slow the approach. The
 * limits of friction, rolling and twisting come from F_n + F_c, which is the elastic pressure in the contact.
 *
 * <p>The attraction starts and ends with the overlap: it has a potential and loses no energy in a cycle, and bodies part
 * where they touched. So an elastic impact rebounds with the speed it came with, and a damped one sticks below a certain
 * speed. The jump of the force at the touch makes the step error there one of first order in F_c.
 *
 * <p>Shapes: a block of rows; no history. Valid for: stiff, small bodies of low surface energy, Tabor number
 * (R* w^2 / (E*^2 z^3))^(1/3) below 0.1, z the range of the surface forces (m). Not for: soft or large grains, for which an
 * adhesion with hysteresis is meant. Stable step: t_a / 10 or less. Source: Derjaguin, Muller and Toporov, Effect of contact
 * deformations on the adhesion of particles, 1975; Tabor 1977 (both from memory). Threads: immutable.
 */
final class DmtAdhesionLaw implements ContactLaw {

    private static final double DURATION = 2.868266; // of a Hertz impact, as in HertzLaw

    private final double workOfAdhesion;

    /**
     * @param workOfAdhesion w, J/m2
     */
    DmtAdhesionLaw(double workOfAdhesion) {
        this.workOfAdhesion = workOfAdhesion;
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        double modulus = pair.contactModulus();
        double perRadius = 2 * Math.PI * workOfAdhesion;
        // for m* = 1 kg and R* = 1 m
        double overlap = StrictMath.pow(perRadius / (4.0 / 3 * modulus), 2.0 / 3);
        double duration = DURATION * StrictMath.pow(modulus, -0.4) * StrictMath.pow(0.8 * perRadius * overlap, -0.1);
        return new Kernel(perRadius, duration);
    }

    /**
     * @param perRadius F_c / R*, N/m
     * @param duration t_a for m* = 1 kg and R* = 1 m, s; it goes with m*^(1/2) R*^(-1/3)
     */
    private record Kernel(double perRadius, double duration) implements ContactKernel {

        @Override
        public void apply(ContactBlock block) {
            double least = Lanes.VECTORISED ? vector(block) : scalar(block);
            if (!(least == Double.POSITIVE_INFINITY)) {
                block.reportDuration(duration * StrictMath.cbrt(Math.sqrt(least)));
            }
            if (block.energyDue()) {
                storedEnergy(block);
            }
        }

        /** Returns the smallest m*^3 / R*^2 of the touching rows, to whose sixth root the time is proportional. */
        private double vector(ContactBlock block) {
            double[] c = block.columns();
            DoubleVector pull = DoubleVector.broadcast(Lanes.SPECIES, perRadius);
            DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
            DoubleVector infinite = DoubleVector.broadcast(Lanes.SPECIES, Double.POSITIVE_INFINITY);
            DoubleVector least = infinite;
            for (int r = 0; r < block.rows(); r += Lanes.TILE) {
                DoubleVector radius = load(c, Column.EFFECTIVE_RADIUS, r);
                DoubleVector mass = load(c, Column.EFFECTIVE_MASS, r);
                DoubleVector overlap = load(c, Column.OVERLAP, r);
                DoubleVector force = zero.blend(radius.mul(pull), zero.lt(overlap));
                store(load(c, Column.ELASTIC_FORCE, r).sub(force), c, Column.ELASTIC_FORCE, r);
                store(load(c, Column.ADHESIVE_LOAD, r).add(force), c, Column.ADHESIVE_LOAD, r);
                DoubleVector slow = mass.mul(mass).mul(mass).div(radius.mul(radius));
                least = Lanes.smaller(infinite.blend(slow, zero.lt(overlap)), least);
            }
            return least.reduceLanes(VectorOperators.MIN);
        }

        private double scalar(ContactBlock block) {
            double[] c = block.columns();
            double least = Double.POSITIVE_INFINITY;
            for (int r = 0; r < block.rows(); r++) {
                double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                double mass = c[at(Column.EFFECTIVE_MASS) + r];
                double overlap = c[at(Column.OVERLAP) + r];
                double force = overlap > 0 ? radius * perRadius : 0;
                c[at(Column.ELASTIC_FORCE) + r] -= force;
                c[at(Column.ADHESIVE_LOAD) + r] += force;
                double slow = mass * mass * mass / (radius * radius);
                least = overlap > 0 && slow < least ? slow : least;
            }
            return least;
        }

        private void storedEnergy(ContactBlock block) {
            double[] c = block.columns();
            for (int r = 0; r < block.rows(); r++) {
                double overlap = c[at(Column.OVERLAP) + r];
                double force = c[at(Column.EFFECTIVE_RADIUS) + r] * perRadius;
                c[at(Column.STORED_ENERGY) + r] -= overlap > 0 ? force * overlap : 0;
            }
        }

        @Override
        public double duration(double speed, double radius, double mass) {
            return duration * StrictMath.cbrt(Math.sqrt(mass * mass * mass / (radius * radius)));
        }

        @Override
        public boolean pulls() {
            return true;
        }
    }
}
