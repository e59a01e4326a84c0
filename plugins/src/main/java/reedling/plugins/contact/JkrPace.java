// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorMask;
import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.math.Lanes;
import reedling.math.Roots;

/**
 * Third kernel of {@link JkrLaw}: dashpot and time scale. The duration is that of a Hertz impact with the speed the pair
 * has at the bottom of the well, v_eq^2 = v_n^2 + 2 (U - U_min) / m*, and at most half the period of small swings there,
 * pi sqrt(m* / (6/5 E* a_0)), a_0 the contact radius without load.
 *
 * @param alpha damping number, 0 for an elastic contact
 * @param perImpact duration for (m*^2 / (R* v))^(1/5) = 1 SI
 */
record JkrPace(JkrScale scale, double alpha, double perImpact) implements ContactKernel {

    /** Hertz contact time: 2.868266 (m*^2/(R* E*^2 v))^(1/5). */
    private static final double DURATION = 2.868266;

    /** Depth of the well below d = 0 joined, over E* q^4 k^5: z^3 = 3/2 at its bottom. */
    private static final double WELL = 0.3 * StrictMath.pow(1.5, 4.0 / 3) - 0.3;

    /** Contact radius without load, over q^2 k. */
    private static final double UNLOADED = StrictMath.pow(1.5, 2.0 / 3);

    static JkrPace of(JkrScale scale, double alpha) {
        return new JkrPace(scale, alpha, DURATION * StrictMath.pow(scale.modulus(), -0.4));
    }

    @Override
    public void apply(ContactBlock block) {
        if (Lanes.VECTORISED) {
            vector(block);
        } else {
            scalar(block);
        }
    }

    private void vector(ContactBlock block) {
        double[] c = block.columns();
        double dashpot = alpha * StrictMath.sqrt(2.0 / 3);
        DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
        DoubleVector infinite = DoubleVector.broadcast(Lanes.SPECIES, Double.POSITIVE_INFINITY);
        DoubleVector leastImpact = infinite;
        DoubleVector leastSwing = infinite;
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            DoubleVector radius = load(c, Column.EFFECTIVE_RADIUS, r);
            DoubleVector mass = load(c, Column.EFFECTIVE_MASS, r);
            DoubleVector closing = load(c, Column.CLOSING, r);
            DoubleVector q = DoubleVector.fromArray(Lanes.SPECIES, block.history(), block.historyAt(r, scale.root()));
            VectorMask<Double> joined =
                    zero.lt(DoubleVector.fromArray(Lanes.SPECIES, block.history(), block.historyAt(r, scale.joined())));
            store(zero.blend(load(c, Column.STIFFNESS, r).mul(mass).sqrt().mul(dashpot), joined), c, Column.DAMPING, r);

            DoubleVector depth = radius.mul(q).mul(WELL * scale.energy());
            DoubleVector above = load(c, Column.STORED_ENERGY, r).add(depth).mul(2.0);
            above = Lanes.larger(above, zero); // rounding at the bottom of the well
            DoubleVector energy = closing.mul(closing).mul(mass).add(above); // m* v_eq^2
            DoubleVector squared = mass.mul(mass);
            DoubleVector impact =
                    squared.mul(squared).mul(mass).div(energy.mul(radius).mul(radius));
            leastImpact = Lanes.smaller(infinite.blend(impact, joined), leastImpact);
            leastSwing = Lanes.smaller(infinite.blend(mass.div(q.mul(q)), joined), leastSwing);
        }
        report(block, leastImpact.reduceLanes(VectorOperators.MIN), leastSwing.reduceLanes(VectorOperators.MIN));
    }

    private void scalar(ContactBlock block) {
        double[] c = block.columns();
        double dashpot = alpha * StrictMath.sqrt(2.0 / 3);
        double leastImpact = Double.POSITIVE_INFINITY;
        double leastSwing = Double.POSITIVE_INFINITY;
        for (int r = 0; r < block.rows(); r++) {
            double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
            double mass = c[at(Column.EFFECTIVE_MASS) + r];
            double closing = c[at(Column.CLOSING) + r];
            double q = block.history()[block.historyAtRow(r, scale.root())];
            boolean joined = block.history()[block.historyAtRow(r, scale.joined())] > 0;
            c[at(Column.DAMPING) + r] = joined ? Math.sqrt(c[at(Column.STIFFNESS) + r] * mass) * dashpot : 0;

            double depth = radius * q * (WELL * scale.energy());
            double above = (c[at(Column.STORED_ENERGY) + r] + depth) * 2.0;
            above = above > 0 ? above : 0; // rounding at the bottom of the well
            double energy = closing * closing * mass + above; // m* v_eq^2
            double squared = mass * mass;
            double impact = squared * squared * mass / (energy * radius * radius);
            double swing = mass / (q * q);
            leastImpact = joined && impact < leastImpact ? impact : leastImpact;
            leastSwing = joined && swing < leastSwing ? swing : leastSwing;
        }
        report(block, leastImpact, leastSwing);
    }

    private void report(ContactBlock block, double impact, double swing) {
        if (!(swing == Double.POSITIVE_INFINITY)) {
            block.reportDuration(Math.min(perImpact * Roots.tenth(impact), halfPeriod(swing)));
        }
    }

    /** Half the period of small swings, s, for m* / q^2. */
    private double halfPeriod(double swing) {
        return Math.PI * Math.sqrt(swing / (1.2 * scale.modulus() * UNLOADED * scale.length()));
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        double q = Roots.third(radius);
        double energy = mass * speed * speed + 2 * WELL * scale.energy() * radius * q;
        double impact = perImpact * Roots.fifth(mass * mass / (radius * Math.sqrt(energy / mass)));
        return Math.min(impact, halfPeriod(mass / (q * q)));
    }

    @Override
    public double dampingRatio() {
        return alpha / StrictMath.sqrt(6);
    }
}
