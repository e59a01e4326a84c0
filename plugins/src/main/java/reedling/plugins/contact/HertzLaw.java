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
import reedling.math.Roots;

/**
 * Normal force between elastic bodies of round contact, small overlap, any speed below that of sound.
 *
 * <pre>
 * a = sqrt(R* d)                       radius of contact, m
 * F_el = 4/3 E* a d                    N
 * k_n = 2 E* a                         N/m
 * c = alpha sqrt(2/3 k_n m*)           N s/m, alpha = sqrt(5) zeta(e), so c = alpha sqrt(m* k) d^(1/4), k = 4/3 E* sqrt(R*)
 * t_c = 2.868266 (m*^2 / (R* E*^2 v_eq))^(1/5),  v_eq^2 = v_n^2 + 4/5 F_el d / m*     s
 * </pre>
 *
 * <p>Where: d overlap (m); R* effective radius (m); m* effective mass (kg); E* contact modulus (Pa); v_n closing speed
 * (m/s); e restitution of the material pair. v_eq is the speed the pair had: constant through an elastic contact.
 *
 * <p>End of contact: by default the total force never pulls, and zeta is calibrated for that. Where the dashpot may pull,
 * it does so until the overlap is used up, with the smaller zeta that then gives the same restitution. The asked restitution
 * is exact in both; peak force and duration differ, and the default has no pull that dry bodies do not show. While the dashpot
 * pulls there is no friction.
 *
 * <p>Shapes: a block of rows; no history. Stable step: t_c / 10 or less. Errors: restitution below 0.05 is refused by
 * the case file. Source: Hertz 1882; Johnson, Contact Mechanics, 1985; Tsuji, Tanaka and Ishida, Lagrangian numerical
 * simulation of plug flow, 1992 (damping form; from memory); {@link Restitution}. Threads: immutable.
 */
final class HertzLaw implements ContactLaw {

    /** Hertz contact time: 2.943275 d_max / v = 2.868266 (m*^2/(R* E*^2 v))^(1/5). */
    private static final double DURATION = 2.868266;

    private static final double SMALLEST_OVERLAP = 1e-40; // m, keeps roots and quotients finite where nothing touches

    private final boolean dashpotMayPull;

    HertzLaw(boolean dashpotMayPull) {
        this.dashpotMayPull = dashpotMayPull;
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        double modulus = pair.contactModulus();
        return new Kernel(
                modulus,
                StrictMath.sqrt(5) * Restitution.dampingRatio(pair.restitution(), dashpotMayPull),
                DURATION * StrictMath.pow(modulus, -0.4),
                dashpotMayPull);
    }

    /**
     * @param modulus E*, Pa
     * @param alpha damping number, 0 for an elastic contact
     * @param duration contact time for (m*^2 / (R* v))^(1/5) = 1 SI
     * @param dashpotMayPull until the overlap is used up
     */
    private record Kernel(double modulus, double alpha, double duration, boolean dashpotMayPull)
            implements ContactKernel {

        @Override
        public void apply(ContactBlock block) {
            double slowest = Lanes.VECTORISED ? vector(block) : scalar(block);
            if (!(slowest >= tenthPower(block.shortestDuration() / duration))) {
                block.reportDuration(duration * Roots.tenth(slowest));
            }
            if (block.energyDue()) {
                storedEnergy(block);
            }
        }

        /** x^10, rounded up: a root costs as much as a tile, and most blocks hold no contact shorter than those before. */
        private static double tenthPower(double x) {
            double squared = x * x;
            double fourth = squared * squared;
            return fourth * fourth * squared * (1 + 1e-12);
        }

        /** Returns the smallest (m*^2 / R*)^2 / v_eq^2 of the touching rows, to whose tenth root the time is proportional. */
        private double vector(ContactBlock block) {
            double[] c = block.columns();
            double damping = alpha * StrictMath.sqrt(2.0 / 3);
            DoubleVector smallest = DoubleVector.broadcast(Lanes.SPECIES, SMALLEST_OVERLAP);
            DoubleVector twiceModulus = DoubleVector.broadcast(Lanes.SPECIES, 2 * modulus);
            DoubleVector twoThirds = DoubleVector.broadcast(Lanes.SPECIES, 2.0 / 3);
            DoubleVector dashpot = DoubleVector.broadcast(Lanes.SPECIES, damping);
            DoubleVector share = DoubleVector.broadcast(Lanes.SPECIES, 0.8);
            DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
            DoubleVector infinite = DoubleVector.broadcast(Lanes.SPECIES, Double.POSITIVE_INFINITY);
            DoubleVector least = infinite;
            for (int r = 0; r < block.rows(); r += Lanes.TILE) {
                DoubleVector radius = load(c, Column.EFFECTIVE_RADIUS, r);
                DoubleVector mass = load(c, Column.EFFECTIVE_MASS, r);
                DoubleVector closing = load(c, Column.CLOSING, r);
                DoubleVector signed = load(c, Column.OVERLAP, r);
                DoubleVector overlap = Lanes.larger(signed, smallest);

                DoubleVector area = radius.mul(overlap).sqrt();
                DoubleVector stiffness = area.mul(twiceModulus);
                DoubleVector force = stiffness.mul(overlap).mul(twoThirds);
                store(area, c, Column.CONTACT_RADIUS, r);
                store(stiffness, c, Column.STIFFNESS, r);
                store(force, c, Column.ELASTIC_FORCE, r);
                store(stiffness.mul(mass).sqrt().mul(dashpot), c, Column.DAMPING, r);

                DoubleVector massSquared = mass.mul(mass);
                DoubleVector speedTimesMass = closing.mul(closing).mul(mass); // m* v_eq^2
                speedTimesMass = force.mul(overlap).mul(share).add(speedTimesMass);
                // (m^2/R)^2 / v_eq^2 = m^5 / (R^2 m v_eq^2)
                DoubleVector slow = massSquared
                        .mul(massSquared)
                        .mul(mass)
                        .div(speedTimesMass.mul(radius).mul(radius));
                least = Lanes.smaller(infinite.blend(slow, zero.lt(signed)), least);
            }
            return least.reduceLanes(VectorOperators.MIN);
        }

        private double scalar(ContactBlock block) {
            double[] c = block.columns();
            double damping = alpha * StrictMath.sqrt(2.0 / 3);
            double least = Double.POSITIVE_INFINITY;
            for (int r = 0; r < block.rows(); r++) {
                double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                double mass = c[at(Column.EFFECTIVE_MASS) + r];
                double closing = c[at(Column.CLOSING) + r];
                double signed = c[at(Column.OVERLAP) + r];
                double overlap = signed > SMALLEST_OVERLAP ? signed : SMALLEST_OVERLAP;

                double area = Math.sqrt(radius * overlap);
                double stiffness = area * (2 * modulus);
                double force = stiffness * overlap * (2.0 / 3);
                c[at(Column.CONTACT_RADIUS) + r] = area;
                c[at(Column.STIFFNESS) + r] = stiffness;
                c[at(Column.ELASTIC_FORCE) + r] = force;
                c[at(Column.DAMPING) + r] = Math.sqrt(stiffness * mass) * damping;

                double massSquared = mass * mass;
                double speedTimesMass = force * overlap * 0.8 + closing * closing * mass;
                double slow = massSquared * massSquared * mass / (speedTimesMass * radius * radius);
                least = signed > 0 && slow < least ? slow : least;
            }
            return least;
        }

        private static void storedEnergy(ContactBlock block) {
            double[] c = block.columns();
            for (int r = 0; r < block.rows(); r++) {
                double overlap = c[at(Column.OVERLAP) + r];
                c[at(Column.STORED_ENERGY) + r] = overlap > 0 ? 0.4 * c[at(Column.ELASTIC_FORCE) + r] * overlap : 0;
            }
        }

        @Override
        public double duration(double speed, double radius, double mass) {
            return duration * Roots.fifth(mass * mass / (radius * speed));
        }

        @Override
        public double dampingRatio() {
            return alpha / StrictMath.sqrt(6);
        }
    }
}
