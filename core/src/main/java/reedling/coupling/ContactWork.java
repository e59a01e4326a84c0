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

/** Engine stage after the laws: books the work against friction and rolling resistance, 1/2 (old + new force) . motion. */
final class ContactWork implements RowStage {

    private static final int FRICTION_OLD = Lanes.TILE; // float column 1 of the ledger history
    private static final int MOMENT_OLD = 4 * Lanes.TILE;

    @Override
    public void run(RowRange rows) {
        if (rows.block().energyDue()) {
            rows.tally().store(rows.block(), ContactTally.SPRINGS);
        }
        if (Lanes.VECTORISED) {
            vector(rows.block(), rows.ledger(), rows.ledgerAt(), rows.tally().sums());
        } else {
            scalar(rows.block(), rows.ledger(), rows.ledgerAt(), rows.tally().sums());
        }
    }

    private static void vector(ContactBlock block, float[] ledger, int ledgerAt, double[] sums) {
        double[] c = block.columns();
        DoubleVector half = DoubleVector.broadcast(Lanes.SPECIES, 0.5 * block.step());
        DoubleVector sliding = DoubleVector.fromArray(Lanes.SPECIES, sums, ContactTally.SLIDING);
        DoubleVector rolling = DoubleVector.fromArray(Lanes.SPECIES, sums, ContactTally.ROLLING);
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
        sliding.intoArray(sums, ContactTally.SLIDING);
        rolling.intoArray(sums, ContactTally.ROLLING);
    }

    private static DoubleVector old(float[] ledger, int at) {
        return (DoubleVector) FloatVector.fromArray(FloatVector.SPECIES_256, ledger, at)
                .convertShape(VectorOperators.F2D, Lanes.SPECIES, 0);
    }

    private static void keep(DoubleVector value, float[] ledger, int at) {
        ((FloatVector) value.convertShape(VectorOperators.D2F, FloatVector.SPECIES_256, 0)).intoArray(ledger, at);
    }

    private static void scalar(ContactBlock block, float[] ledger, int ledgerAt, double[] sums) {
        double[] c = block.columns();
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
}
