// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.neighbour.PairSegment;

/**
 * Engine stage after all laws: books the work against friction and rolling resistance, 1/2 (old + new force) . motion,
 * notes the stiffest contact, and turns forces into the force rows of both bodies, which then stand in columns 0-7
 * (first) and 8-15 (second): torque 3, normal stiffness, force 3, tangential stiffness.
 *
 * <p>With n the normal, f the friction on the second body, M its rolling moment and l the levers, the force on the
 * second is F = F_n n + f, on the first -F; torques are l1 f x n - M and l2 f x n + M.
 */
final class ContactFinish {

    private static final int FRICTION_OLD = Lanes.TILE; // float column 1 of the ledger history
    private static final int MOMENT_OLD = 4 * Lanes.TILE;

    private ContactFinish() {}

    static void finish(ContactBlock block, float[] ledger, int ledgerAt, ContactTally tally) {
        if (block.energyDue()) {
            tally.store(block, ContactTally.SPRINGS);
        }
        if (Lanes.VECTORISED) {
            work(block, ledger, ledgerAt, tally);
            rows(block, tally);
        } else {
            workScalar(block, ledger, ledgerAt, tally);
            rowsScalar(block, tally);
        }
    }

    private static void work(ContactBlock block, float[] ledger, int ledgerAt, ContactTally tally) {
        double[] c = block.columns();
        DoubleVector half = DoubleVector.broadcast(Lanes.SPECIES, 0.5 * block.step());
        DoubleVector sliding = DoubleVector.fromArray(Lanes.SPECIES, tally.sums(), ContactTally.SLIDING);
        DoubleVector rolling = DoubleVector.fromArray(Lanes.SPECIES, tally.sums(), ContactTally.ROLLING);
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            int l = ledgerAt + PairSegment.LEDGER_COLUMNS * r;
            for (int axis = 0; axis < 3; axis++) {
                DoubleVector friction = load(c, Column.FRICTION + axis, r);
                int f = l + FRICTION_OLD + Lanes.TILE * axis;
                sliding = old(ledger, f).add(friction).mul(half).fma(load(c, Column.SLIDING + axis, r), sliding);
                keep(friction, ledger, f);
                DoubleVector moment = load(c, Column.ROLLING_MOMENT + axis, r);
                int m = l + MOMENT_OLD + Lanes.TILE * axis;
                rolling = old(ledger, m).add(moment).mul(half).fma(load(c, Column.SPIN + axis, r), rolling);
                keep(moment, ledger, m);
            }
        }
        sliding.intoArray(tally.sums(), ContactTally.SLIDING);
        rolling.intoArray(tally.sums(), ContactTally.ROLLING);
    }

    private static DoubleVector old(float[] ledger, int at) {
        return (DoubleVector) FloatVector.fromArray(FloatVector.SPECIES_256, ledger, at)
                .convertShape(VectorOperators.F2D, Lanes.SPECIES, 0);
    }

    private static void keep(DoubleVector value, float[] ledger, int at) {
        ((FloatVector) value.convertShape(VectorOperators.D2F, FloatVector.SPECIES_256, 0)).intoArray(ledger, at);
    }

    private static void workScalar(ContactBlock block, float[] ledger, int ledgerAt, ContactTally tally) {
        double[] c = block.columns();
        double[] sums = tally.sums();
        double half = 0.5 * block.step();
        for (int r = 0; r < block.rows(); r++) {
            int lane = r & Lanes.TILE - 1;
            int l = ledgerAt + PairSegment.LEDGER_COLUMNS * (r - lane) + lane;
            for (int axis = 0; axis < 3; axis++) {
                double friction = c[at(Column.FRICTION + axis) + r];
                int f = l + FRICTION_OLD + Lanes.TILE * axis;
                double slid = c[at(Column.SLIDING + axis) + r];
                sums[ContactTally.SLIDING + lane] =
                        Math.fma((ledger[f] + friction) * half, slid, sums[ContactTally.SLIDING + lane]);
                ledger[f] = (float) friction;
                double moment = c[at(Column.ROLLING_MOMENT + axis) + r];
                int m = l + MOMENT_OLD + Lanes.TILE * axis;
                double spun = c[at(Column.SPIN + axis) + r];
                sums[ContactTally.ROLLING + lane] =
                        Math.fma((ledger[m] + moment) * half, spun, sums[ContactTally.ROLLING + lane]);
                ledger[m] = (float) moment;
            }
        }
    }

    private static void rows(ContactBlock block, ContactTally tally) {
        double[] c = block.columns();
        DoubleVector stiffest = DoubleVector.zero(Lanes.SPECIES);
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            DoubleVector normalForce = load(c, Column.NORMAL_FORCE, r);
            DoubleVector stiffness = load(c, Column.STIFFNESS, r);
            DoubleVector slidingStiffness = load(c, Column.SLIDING_STIFFNESS, r);
            stiffest = Lanes.larger(stiffness.mul(load(c, Column.INVERSE_MASS, r)), stiffest);
            stiffest = Lanes.larger(slidingStiffness.mul(load(c, Column.INVERSE_MASS_SLIDING, r)), stiffest);

            DoubleVector nx = load(c, Column.NORMAL, r), ny = load(c, Column.NORMAL + 1, r), nz = load(c, Column.NORMAL + 2, r);
            DoubleVector fx = load(c, Column.FRICTION, r), fy = load(c, Column.FRICTION + 1, r), fz = load(c, Column.FRICTION + 2, r);
            DoubleVector mx = load(c, Column.ROLLING_MOMENT, r);
            DoubleVector my = load(c, Column.ROLLING_MOMENT + 1, r);
            DoubleVector mz = load(c, Column.ROLLING_MOMENT + 2, r);
            DoubleVector leverFirst = load(c, Column.LEVER_FIRST, r), leverSecond = load(c, Column.LEVER_SECOND, r);
            DoubleVector qx = fy.mul(nz).sub(fz.mul(ny)), qy = fz.mul(nx).sub(fx.mul(nz)), qz = fx.mul(ny).sub(fy.mul(nx));
            DoubleVector gx = nx.fma(normalForce, fx), gy = ny.fma(normalForce, fy), gz = nz.fma(normalForce, fz);

            qx.mul(leverFirst).sub(mx).intoArray(c, at(0) + r);
            qy.mul(leverFirst).sub(my).intoArray(c, at(1) + r);
            qz.mul(leverFirst).sub(mz).intoArray(c, at(2) + r);
            stiffness.intoArray(c, at(3) + r);
            gx.neg().intoArray(c, at(4) + r);
            gy.neg().intoArray(c, at(5) + r);
            gz.neg().intoArray(c, at(6) + r);
            slidingStiffness.intoArray(c, at(7) + r);
            qx.mul(leverSecond).add(mx).intoArray(c, at(8) + r);
            qy.mul(leverSecond).add(my).intoArray(c, at(9) + r);
            qz.mul(leverSecond).add(mz).intoArray(c, at(10) + r);
            stiffness.intoArray(c, at(11) + r);
            gx.intoArray(c, at(12) + r);
            gy.intoArray(c, at(13) + r);
            gz.intoArray(c, at(14) + r);
            slidingStiffness.intoArray(c, at(15) + r);
        }
        tally.frequencySquared(stiffest.reduceLanes(VectorOperators.MAX));
    }

    private static void rowsScalar(ContactBlock block, ContactTally tally) {
        double[] c = block.columns();
        double stiffest = 0;
        for (int r = 0; r < block.rows(); r++) {
            double normalForce = c[at(Column.NORMAL_FORCE) + r];
            double stiffness = c[at(Column.STIFFNESS) + r];
            double slidingStiffness = c[at(Column.SLIDING_STIFFNESS) + r];
            double normalSquared = stiffness * c[at(Column.INVERSE_MASS) + r];
            double slidingSquared = slidingStiffness * c[at(Column.INVERSE_MASS_SLIDING) + r];
            stiffest = normalSquared > stiffest ? normalSquared : stiffest;
            stiffest = slidingSquared > stiffest ? slidingSquared : stiffest;

            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double fx = c[at(Column.FRICTION) + r], fy = c[at(Column.FRICTION + 1) + r], fz = c[at(Column.FRICTION + 2) + r];
            double mx = c[at(Column.ROLLING_MOMENT) + r];
            double my = c[at(Column.ROLLING_MOMENT + 1) + r];
            double mz = c[at(Column.ROLLING_MOMENT + 2) + r];
            double leverFirst = c[at(Column.LEVER_FIRST) + r], leverSecond = c[at(Column.LEVER_SECOND) + r];
            double qx = fy * nz - fz * ny, qy = fz * nx - fx * nz, qz = fx * ny - fy * nx;
            double gx = Math.fma(nx, normalForce, fx), gy = Math.fma(ny, normalForce, fy), gz = Math.fma(nz, normalForce, fz);

            c[at(0) + r] = qx * leverFirst - mx;
            c[at(1) + r] = qy * leverFirst - my;
            c[at(2) + r] = qz * leverFirst - mz;
            c[at(3) + r] = stiffness;
            c[at(4) + r] = -gx;
            c[at(5) + r] = -gy;
            c[at(6) + r] = -gz;
            c[at(7) + r] = slidingStiffness;
            c[at(8) + r] = qx * leverSecond + mx;
            c[at(9) + r] = qy * leverSecond + my;
            c[at(10) + r] = qz * leverSecond + mz;
            c[at(11) + r] = stiffness;
            c[at(12) + r] = gx;
            c[at(13) + r] = gy;
            c[at(14) + r] = gz;
            c[at(15) + r] = slidingStiffness;
        }
        tally.frequencySquared(stiffest);
    }
}
