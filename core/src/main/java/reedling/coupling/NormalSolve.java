// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.neighbour.PairSegment;

/**
 * Engine stage after the normal laws: the normal force with its dashpot taken at the end of the step, in closed form
 * for the pair,
 *
 * <pre>v_d = (v - h F_el / (2 m)) / (1 + h c / (2 m)),   F_n = max(F_el + c v_d, min(F_el, 0))</pre>
 *
 * where v is the closing speed at the half step (m/s), h the step (s), c the dashpot (N s/m), 1/m the true inverse mass
 * (1/kg). A contact may not pull unless its elastic force does, or unless the normal law lets its dashpot pull: then F_n
 * = F_el + c v_d until the overlap is used up. Books the dashpot's work, 1/2 (old + new force) v h.
 *
 * <p>Source of the clipped end of contact: Schwager and Poeschel, Coefficient of restitution and linear-dashpot model
 * revisited, 2007 (from memory).
 */
final class NormalSolve implements RowStage {

    /** Overlap over effective radius at which a run is stopped: far outside what contact laws can mean. */
    static final double DEEPEST = 0.5;

    private static final int HISTORY_RADIUS = 0;

    private final double
            least; // N, under which the dashpot may not take the force: 0, or minus infinity where it may pull

    NormalSolve(boolean dashpotMayPull) {
        least = dashpotMayPull ? Double.NEGATIVE_INFINITY : 0;
    }

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        ContactTally tally = rows.tally();
        if (Lanes.VECTORISED) {
            vector(block, rows.ledger(), rows.ledgerAt(), tally, least);
        } else {
            scalar(block, rows.ledger(), rows.ledgerAt(), tally, least);
        }
        if (!(block.shortestDuration() == Double.POSITIVE_INFINITY)) {
            tally.duration(block.shortestDuration());
        }
    }

    private static void vector(
            ContactBlock block, float[] ledger, int ledgerAt, ContactTally tally, double leastForce) {
        double[] c = block.columns();
        double[] history = block.history();
        double halfStep = 0.5 * block.step();
        DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
        DoubleVector least = DoubleVector.broadcast(Lanes.SPECIES, leastForce);
        DoubleVector half = DoubleVector.broadcast(Lanes.SPECIES, halfStep);
        DoubleVector deepest = DoubleVector.broadcast(Lanes.SPECIES, -DEEPEST);
        DoubleVector work = DoubleVector.fromArray(Lanes.SPECIES, tally.sums(), ContactTally.NORMAL);
        DoubleVector excess = DoubleVector.broadcast(Lanes.SPECIES, Double.NEGATIVE_INFINITY);
        DoubleVector touched = DoubleVector.zero(Lanes.SPECIES);
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            DoubleVector touch = load(c, Column.TOUCH, r);
            touched = touched.max(touch);
            DoubleVector elastic = load(c, Column.ELASTIC_FORCE, r);
            DoubleVector damping = load(c, Column.DAMPING, r);
            DoubleVector closing = load(c, Column.CLOSING, r);
            DoubleVector halfOverMass = half.mul(load(c, Column.INVERSE_MASS, r));

            DoubleVector speed = halfOverMass.neg().fma(elastic, closing).div(halfOverMass.fma(damping, one));
            // in this order a force that is not a number stays one, and the guard sees it
            DoubleVector total = Lanes.larger(Lanes.smaller(elastic, least), damping.fma(speed, elastic))
                    .mul(touch);
            DoubleVector dashpot = total.sub(elastic.mul(touch));
            store(total, c, Column.NORMAL_FORCE, r);

            int l = ledgerAt + PairSegment.LEDGER_COLUMNS * r;
            DoubleVector old = (DoubleVector) FloatVector.fromArray(FloatVector.SPECIES_256, ledger, l)
                    .convertShape(VectorOperators.F2D, Lanes.SPECIES, 0);
            work = old.add(dashpot).mul(half).fma(closing, work);
            ((FloatVector) dashpot.convertShape(VectorOperators.D2F, FloatVector.SPECIES_256, 0)).intoArray(ledger, l);

            int at = block.historyAt(r, HISTORY_RADIUS);
            DoubleVector radius = load(c, Column.CONTACT_RADIUS, r);
            store(DoubleVector.fromArray(Lanes.SPECIES, history, at).div(radius), c, Column.RADIUS_RATIO, r);
            radius.mul(touch).intoArray(history, at);
            excess = Lanes.larger(load(c, Column.EFFECTIVE_RADIUS, r).fma(deepest, load(c, Column.OVERLAP, r)), excess);
        }
        work.intoArray(tally.sums(), ContactTally.NORMAL);
        tally.excess(excess.reduceLanes(VectorOperators.MAX));
        tally.touch(touched.reduceLanes(VectorOperators.MAX) > 0);
    }

    private static void scalar(
            ContactBlock block, float[] ledger, int ledgerAt, ContactTally tally, double leastForce) {
        double[] c = block.columns();
        double[] history = block.history();
        double half = 0.5 * block.step();
        double[] sums = tally.sums();
        double excess = Double.NEGATIVE_INFINITY;
        boolean touched = false;
        for (int r = 0; r < block.rows(); r++) {
            int lane = r & Lanes.TILE - 1;
            int tile = r - lane;
            double touch = c[at(Column.TOUCH) + r];
            touched |= touch > 0;
            double elastic = c[at(Column.ELASTIC_FORCE) + r];
            double damping = c[at(Column.DAMPING) + r];
            double closing = c[at(Column.CLOSING) + r];
            double halfOverMass = half * c[at(Column.INVERSE_MASS) + r];

            double speed = Math.fma(-halfOverMass, elastic, closing) / Math.fma(halfOverMass, damping, 1.0);
            double pull = elastic < leastForce ? elastic : leastForce;
            double raw = Math.fma(damping, speed, elastic);
            double total = (pull > raw ? pull : raw) * touch;
            double dashpot = total - elastic * touch;
            c[at(Column.NORMAL_FORCE) + r] = total;

            int l = ledgerAt + PairSegment.LEDGER_COLUMNS * tile + lane;
            sums[ContactTally.NORMAL + lane] =
                    Math.fma((ledger[l] + dashpot) * half, closing, sums[ContactTally.NORMAL + lane]);
            ledger[l] = (float) dashpot;

            int at = block.historyAtRow(r, HISTORY_RADIUS);
            double radius = c[at(Column.CONTACT_RADIUS) + r];
            c[at(Column.RADIUS_RATIO) + r] = history[at] / radius;
            history[at] = radius * touch;
            double over = Math.fma(c[at(Column.EFFECTIVE_RADIUS) + r], -DEEPEST, c[at(Column.OVERLAP) + r]);
            excess = over > excess ? over : excess;
        }
        tally.excess(excess);
        tally.touch(touched);
    }
}
